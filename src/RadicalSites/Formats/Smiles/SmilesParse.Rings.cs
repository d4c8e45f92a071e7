using System;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Smiles;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesParse
{
    private bool RingBond(ReadOnlySpan<char> text, ref int at)
    {
        int position = at;
        if (!RingNumber(text, ref at, out int number))
        {
            return false;
        }

        if (previous < 0)
        {
            return Fail(Entry.UnexpectedCharacter, position, text[position].ToString());
        }

        char symbol = bondSymbol;
        bondSymbol = '\0';
        for (int i = openingCount - 1; i >= 0; i--)
        {
            if (openings[i].Number == number)
            {
                RingOpening opening = openings[i];
                Array.Copy(openings, i + 1, openings, i, openingCount - i - 1);
                openingCount--;
                return CloseRing(opening, symbol, position);
            }
        }

        if (openingCount == openings.Length)
        {
            Array.Resize(ref openings, 2 * openingCount);
        }

        openings[openingCount++] = new RingOpening
        {
            Number = number,
            Atom = previous,
            Symbol = symbol,
            Position = position,
            Carrier = markCount > 0 ? AppendCarrier(previous, -2) : -1,
            Mark = draft.BondCount,
        };
        return true;
    }

    private bool RingNumber(ReadOnlySpan<char> text, ref int at, out int number)
    {
        char c = text[at++];
        number = c - '0';
        if (c != '%')
        {
            return true;
        }

        if (at < text.Length && text[at] == '(')
        {
            int start = ++at;
            number = 0;
            while (at < text.Length && char.IsAsciiDigit(text[at]) && at - start < 6)
            {
                number = (10 * number) + text[at++] - '0';
            }

            if (at == start || at >= text.Length || text[at] != ')')
            {
                return Fail(Entry.RingNumber, start - 2);
            }

            at++;
            return true;
        }

        if (at + 1 >= text.Length || !char.IsAsciiDigit(text[at]) || !char.IsAsciiDigit(text[at + 1]))
        {
            return Fail(Entry.RingNumber, at - 1);
        }

        number = (10 * (text[at] - '0')) + text[at + 1] - '0';
        at += 2;
        return true;
    }

    private bool CloseRing(in RingOpening opening, char symbol, int position)
    {
        int begin = opening.Atom;
        int end = previous;
        if (begin == end || HasBond(begin, end))
        {
            return Fail(Entry.RingSelf, position, opening.Position, [opening.Number]);
        }

        char first = opening.Symbol;
        if (first != '\0' && symbol != '\0' && !Agree(first, symbol))
        {
            return Fail(Entry.RingMismatch, position, opening.Position, [opening.Number]);
        }

        // A direction at the closing end is seen from the other side.
        char joined = first != '\0' && first != '-' ? first : symbol == '/' ? '\\' : symbol == '\\' ? '/' : symbol != '\0' ? symbol : first;
        bool bothAromatic = draft.Atoms[begin].IsAromatic && draft.Atoms[end].IsAromatic;
        AddBond(begin, end, joined, bothAromatic, position);
        LeaveOpenBesideWildcard(begin, end, joined);
        if (markCount > 0)
        {
            if (opening.Carrier >= 0)
            {
                SetCarrier(begin, opening.Carrier, end);
            }

            AppendCarrier(end, begin);
        }

        return true;
    }

    private static bool Agree(char first, char second) => (first, second) switch
    {
        ('/', '\\') or ('\\', '/') => true,
        ('/', '/') or ('\\', '\\') => false,
        ('/' or '\\', '-') or ('-', '/' or '\\') => true,
        _ => first == second,
    };

    // Only the last bonds can join these atoms if the ring is short; a long list is scanned from its end.
    private bool HasBond(int begin, int end)
    {
        for (int i = draft.BondCount - 1; i >= 0; i--)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            if ((bond.Begin == begin && bond.End == end) || (bond.Begin == end && bond.End == begin))
            {
                return true;
            }

            // Bonds are stored in the order of their later atom; before it no bond of that atom can stand.
            if (bond.Begin < end && bond.End < end)
            {
                break;
            }
        }

        return false;
    }
}
