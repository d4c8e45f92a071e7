using System;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Smiles;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesParse
{
    private bool Bracket(ReadOnlySpan<char> text, ref int at)
    {
        int open = at++;
        int isotope = 0;
        int digits = 0;
        while (at < text.Length && char.IsAsciiDigit(text[at]) && digits < 4)
        {
            isotope = (10 * isotope) + text[at++] - '0';
            digits++;
        }

        if (digits > 3)
        {
            return Fail(Entry.Bracket, at - 1, "an isotope has at most three digits");
        }

        if (!Symbol(text, ref at, out int element, out bool aromatic))
        {
            return false;
        }

        int index = draft.AtomCount;
        ref BuilderAtom atom = ref draft.AddAtom();
        atom.Element = (byte)element;
        atom.Isotope = (ushort)isotope;
        atom.IsAromatic = aromatic;
        atom.Position = open;
        draft.HasAromatic |= aromatic;
        draft.HasHydrogenAtoms |= element == 1;

        StereoKind kind = StereoKind.Tetrahedral;
        int configuration = 0;
        if (at < text.Length && text[at] == '@' && !Chirality(text, ref at, out kind, out configuration))
        {
            return false;
        }

        if (at < text.Length && text[at] == 'H')
        {
            at++;
            int count = 1;
            if (at < text.Length && char.IsAsciiDigit(text[at]))
            {
                count = text[at++] - '0';
                if (at < text.Length && char.IsAsciiDigit(text[at]))
                {
                    count = (10 * count) + text[at++] - '0';
                }
            }

            atom.Hydrogens = (sbyte)count;
        }

        if (at < text.Length && text[at] is '+' or '-' && !Charge(text, ref at, ref atom))
        {
            return false;
        }

        if (at < text.Length && text[at] == ':' && !Class(text, ref at, ref atom))
        {
            return false;
        }

        if (at >= text.Length || text[at] != ']')
        {
            return at >= text.Length
                ? Fail(Entry.Bracket, open, "the closing ] is missing")
                : Fail(Entry.Bracket, at, $"unexpected '{text[at]}'");
        }

        at++;
        if (configuration > 0)
        {
            OpenMark(index, kind, configuration, atom.Hydrogens);
        }

        Attach(index, aromatic);
        return true;
    }

    private bool Symbol(ReadOnlySpan<char> text, ref int at, out int element, out bool aromatic)
    {
        element = -1;
        aromatic = false;
        if (at >= text.Length)
        {
            return Fail(Entry.Bracket, at - 1, "the symbol is missing");
        }

        char c = text[at];
        if (c == '*')
        {
            element = 0;
            at++;
            return true;
        }

        if (char.IsAsciiLetterUpper(c))
        {
            if (at + 1 < text.Length && char.IsAsciiLetterLower(text[at + 1]))
            {
                element = ElementSymbols.Find(c, text[at + 1]);
                if (element > 0)
                {
                    at += 2;
                    return true;
                }
            }

            element = ElementSymbols.Find(c, '\0');
            if (element > 0)
            {
                at++;
                return true;
            }
        }
        else if (char.IsAsciiLetterLower(c))
        {
            aromatic = true;
            char next = at + 1 < text.Length ? text[at + 1] : '\0';
            (element, int length) = (c, next) switch
            {
                ('s', 'e') => (34, 2),
                ('a', 's') => (33, 2),
                ('t', 'e') => (52, 2),
                ('c', _) => (6, 1),
                ('n', _) => (7, 1),
                ('o', _) => (8, 1),
                ('s', _) => (16, 1),
                ('p', _) => (15, 1),
                ('b', _) => (5, 1),
                _ => (-1, 0),
            };
            if (element > 0)
            {
                at += length;
                return true;
            }
        }

        int end = at;
        while (end < text.Length && end < at + 3 && char.IsAsciiLetter(text[end]))
        {
            end++;
        }

        return end > at
            ? Fail(Entry.UnknownElement, at, text[at..end].ToString())
            : Fail(Entry.Bracket, at, "the symbol is missing");
    }

    private bool Charge(ReadOnlySpan<char> text, ref int at, ref BuilderAtom atom)
    {
        char sign = text[at++];
        int size = 1;
        if (at < text.Length && char.IsAsciiDigit(text[at]))
        {
            size = text[at++] - '0';
            if (at < text.Length && char.IsAsciiDigit(text[at]))
            {
                size = (10 * size) + text[at++] - '0';
            }
        }
        else
        {
            while (at < text.Length && text[at] == sign)
            {
                size++;
                at++;
            }
        }

        if (size > 15)
        {
            return Fail(Entry.Bracket, at - 1, "a charge is at most 15");
        }

        atom.Charge = (sbyte)(sign == '+' ? size : -size);
        return true;
    }

    private bool Class(ReadOnlySpan<char> text, ref int at, ref BuilderAtom atom)
    {
        int start = ++at;
        long value = 0;
        while (at < text.Length && char.IsAsciiDigit(text[at]) && at - start < 10)
        {
            value = (10 * value) + text[at++] - '0';
        }

        if (at == start || value > int.MaxValue)
        {
            return Fail(Entry.Bracket, start - 1, "an atom class is a number of up to nine digits");
        }

        atom.AtomClass = (int)value;
        return true;
    }

    private bool Chirality(ReadOnlySpan<char> text, ref int at, out StereoKind kind, out int configuration)
    {
        int start = at++;
        kind = StereoKind.Tetrahedral;
        configuration = 1;
        if (at < text.Length && text[at] == '@')
        {
            configuration = 2;
            at++;
            return true;
        }

        if (at + 1 >= text.Length)
        {
            return true;
        }

        (kind, int most) = (text[at], text[at + 1]) switch
        {
            ('T', 'H') => (StereoKind.Tetrahedral, 2),
            ('A', 'L') => (StereoKind.Allene, 2),
            ('S', 'P') => (StereoKind.SquarePlanar, 3),
            ('T', 'B') => (StereoKind.TrigonalBipyramidal, 20),
            ('O', 'H') => (StereoKind.Octahedral, 30),
            _ => (StereoKind.Tetrahedral, 0),
        };
        if (most == 0)
        {
            return true;
        }

        at += 2;
        int value = 0;
        int digits = 0;
        while (at < text.Length && char.IsAsciiDigit(text[at]) && digits < 2)
        {
            value = (10 * value) + text[at++] - '0';
            digits++;
        }

        configuration = value;
        return (digits > 0 && value >= 1 && value <= most) || Fail(Entry.Bracket, start, $"this stereo code runs from 1 to {most}");
    }
}
