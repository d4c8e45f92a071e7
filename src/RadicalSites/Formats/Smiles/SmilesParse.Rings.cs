using System;
using System.Collections.Generic;
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
        if (number < openingOfNumber.Length && openingOfNumber[number] > 0)
        {
            int place = openingOfNumber[number] - 1;
            RingOpening opening = openings[place];
            openingOfNumber[number] = 0;
            openingCount--;
            if (place < openingCount)
            {
                openings[place] = openings[openingCount];
                openingOfNumber[openings[place].Number] = place + 1;
            }

            return CloseRing(opening, symbol, position);
        }

        if (openingCount == openings.Length)
        {
            Array.Resize(ref openings, 2 * openingCount);
        }

        if (number >= openingOfNumber.Length)
        {
            Array.Resize(ref openingOfNumber, Math.Max(number + 1, Math.Min(2 * openingOfNumber.Length, 1_000_000)));
        }

        openingOfNumber[number] = openingCount + 1;
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
        if (ringCount == ringEnds.Length)
        {
            Array.Resize(ref ringEnds, 2 * ringCount);
        }

        ringEnds[ringCount++] = new RingEnds(draft.BondCount - 1, opening.Number, opening.Position, position);
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

    // Bonds are stored in the order of their later atom, so bonds of this atom stand at the end. Of an atom with very many
    // ring bonds only the last are looked at here; the rest is settled once, after the scan.
    private bool HasBond(int begin, int end)
    {
        int limit = Math.Max(0, draft.BondCount - 32);
        for (int i = draft.BondCount - 1; i >= limit; i--)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            if ((bond.Begin == begin && bond.End == end) || (bond.Begin == end && bond.End == begin))
            {
                return true;
            }

            if (bond.Begin < end && bond.End < end)
            {
                return false;
            }
        }

        mayRepeatBond |= limit > 0;
        return false;
    }

    private bool RingBondsDiffer()
    {
        var seen = new HashSet<long>();
        int ring = 0;
        for (int i = 0; i < draft.BondCount; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            bool closesRing = ring < ringCount && ringEnds[ring].Bond == i;
            long pair = ((long)Math.Min(bond.Begin, bond.End) << 32) | (uint)Math.Max(bond.Begin, bond.End);
            if (!seen.Add(pair) && closesRing)
            {
                return Fail(Entry.RingSelf, ringEnds[ring].Closing, ringEnds[ring].Opening, [ringEnds[ring].Number]);
            }

            ring += closesRing ? 1 : 0;
        }

        return true;
    }

    private void ForgetOpenings()
    {
        for (int i = 0; i < openingCount; i++)
        {
            openingOfNumber[openings[i].Number] = 0;
        }

        openingCount = 0;
    }

    private bool FailUnclosed()
    {
        int first = 0;
        for (int i = 1; i < openingCount; i++)
        {
            first = openings[i].Position < openings[first].Position ? i : first;
        }

        return Fail(Entry.RingUnclosed, openings[first].Position, openings[first].Number);
    }
}
