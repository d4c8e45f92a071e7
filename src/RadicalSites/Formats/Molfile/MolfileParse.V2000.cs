using System;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Molfile;
using Remark = RadicalSites.Diagnostics.ProblemCatalogue.MolfileRemarks;

namespace RadicalSites.Formats.Molfile;

/// <content>Atom and bond block of V2000.</content>
internal sealed partial class MolfileParse
{
    private bool Blocks(ref LineCursor cursor, int atoms, int bonds, int texts)
    {
        for (int i = 0; i < atoms; i++)
        {
            if (!cursor.Next() || IsEnd(cursor.Current))
            {
                return Fail(Entry.Truncated, ref cursor, 0, "atom", i, atoms);
            }

            if (!AtomLine(ref cursor))
            {
                return false;
            }
        }

        for (int i = 0; i < bonds; i++)
        {
            if (!cursor.Next() || IsEnd(cursor.Current))
            {
                return Fail(Entry.Truncated, ref cursor, 0, "bond", i, bonds);
            }

            if (!BondLine(ref cursor, atoms))
            {
                return false;
            }
        }

        for (int i = 0; i < 2 * texts; i++)
        {
            cursor.Next();
        }

        return Properties(ref cursor);
    }

    private static bool IsEnd(ReadOnlySpan<char> line) =>
        line.StartsWith("M  ", StringComparison.Ordinal) || line.StartsWith("$$$$", StringComparison.Ordinal)
        || line.StartsWith(">", StringComparison.Ordinal);

    private bool AtomLine(ref LineCursor cursor)
    {
        ReadOnlySpan<char> line = cursor.Current;
        ReadOnlySpan<char> symbol = FieldText.Columns(line, 31, 3).Trim(' ');
        Span<int> fields = stackalloc int[12];
        if (symbol.IsEmpty || symbol.IndexOfAny(' ', '.') >= 0 || char.IsAsciiDigit(symbol[0])
            || !FieldText.TryNumber(FieldText.Columns(line, 0, 10), out double x)
            || !FieldText.TryNumber(FieldText.Columns(line, 10, 10), out double y)
            || !FieldText.TryNumber(FieldText.Columns(line, 20, 10), out double z)
            || !AtomFields(line, fields))
        {
            return AtomWords(ref cursor);
        }

        return AtomOf(ref cursor, symbol, 31, new Point(x, y, z), fields);
    }

    // dd ccc sss hhh bbb vvv HHH rrr iii mmm nnn eee
    private static bool AtomFields(ReadOnlySpan<char> line, Span<int> fields)
    {
        fields.Clear();
        if (!FieldText.TryInteger(FieldText.Columns(line, 34, 2), out fields[0]))
        {
            return false;
        }

        int column = 36;
        for (int i = 1; i < fields.Length && column < line.Length; i++, column += 3)
        {
            ReadOnlySpan<char> field = line.Slice(column, Math.Min(3, line.Length - column));
            if (field is not "  0" && !FieldText.TryInteger(field, out fields[i]))
            {
                return false;
            }
        }

        return true;
    }

    private bool AtomWords(ref LineCursor cursor)
    {
        ReadOnlySpan<char> rest = cursor.Current;
        Span<double> position = stackalloc double[3];
        for (int i = 0; i < 3; i++)
        {
            ReadOnlySpan<char> word = FieldText.Word(ref rest);
            if (word.IsEmpty || !FieldText.TryNumber(word, out position[i]))
            {
                return Fail(
                    Entry.Field, ref cursor, Math.Min(10 * i, cursor.Current.Length), FieldText.Columns(cursor.Current, 10 * i, 10).ToString(),
                    "coordinate");
            }
        }

        ReadOnlySpan<char> symbol = FieldText.Word(ref rest);
        if (symbol.IsEmpty)
        {
            return Fail(Entry.Symbol, ref cursor, Math.Min(31, cursor.Current.Length), "");
        }

        int column = cursor.Current.Length - rest.Length - symbol.Length;
        Span<int> fields = stackalloc int[12];
        fields.Clear();
        for (int i = 0; i < fields.Length; i++)
        {
            ReadOnlySpan<char> word = FieldText.Word(ref rest);
            if (!FieldText.TryInteger(word, out fields[i]))
            {
                return Fail(Entry.Field, ref cursor, cursor.Current.Length - rest.Length - word.Length, word.ToString(), "number of the atom block");
            }
        }

        Note(Remark.Misaligned, cursor.Line);
        return AtomOf(ref cursor, symbol, column, new Point(position[0], position[1], position[2]), fields);
    }

    private bool AtomOf(
        ref LineCursor cursor, scoped ReadOnlySpan<char> symbol, int column, Point point, scoped ReadOnlySpan<int> fields)
    {
        int element = AtomSymbol.Find(symbol, out int isotope);
        if (element <= 0)
        {
            return AtomSymbol.IsGeneric(symbol)
                ? Fail(Entry.QueryAtom, ref cursor, column, symbol.ToString())
                : Fail(Entry.Symbol, ref cursor, column, symbol.ToString());
        }

        if (fields[3] != 0)
        {
            return Fail(Entry.QueryProperty, ref cursor, 42, "the hydrogen count field");
        }

        if (fields[1] is < 0 or > 7 || fields[5] is < 0 or > 15 || fields[9] < 0)
        {
            return Fail(Entry.Field, ref cursor, 36, FieldText.Columns(cursor.Current, 36, 27).ToString(), "charge, valence and map number of an atom");
        }

        ref BuilderAtom atom = ref AddAtom(cursor.Line);
        int index = draft.AtomCount - 1;
        points[index] = point;
        atom.Element = (byte)element;
        atom.AtomClass = fields[9];
        draft.HasHydrogenAtoms |= element == 1;
        if (isotope > 0)
        {
            atom.Isotope = (ushort)isotope;
            raw[index].NamedIsotope = true;
        }
        else if (fields[0] != 0)
        {
            int mass = (int)Math.Round(AtomicWeights.Find(element) ?? 0) + fields[0];
            if (mass <= fields[0] || mass <= 0)
            {
                return Fail(Entry.Field, ref cursor, 34, FieldText.Columns(cursor.Current, 34, 2).ToString(), "mass difference of this element");
            }

            atom.Isotope = (ushort)mass;
        }

        if (fields[1] == 4)
        {
            raw[index].Radical = 2;
        }
        else if (fields[1] != 0)
        {
            atom.Charge = (sbyte)(4 - fields[1]);
        }

        raw[index].Parity = (byte)(fields[2] is >= 1 and <= 3 ? fields[2] : 0);
        raw[index].Valence = (sbyte)(fields[5] == 0 ? -1 : fields[5] == 15 ? 0 : fields[5]);
        return true;
    }

    private bool BondLine(ref LineCursor cursor, int atoms)
    {
        ReadOnlySpan<char> line = cursor.Current;
        Span<int> fields = stackalloc int[7];
        fields.Clear();
        bool aligned = line.Length >= 7;
        for (int i = 0, column = 0; aligned && i < 7 && column < line.Length; i++, column += 3)
        {
            aligned = FieldText.TryInteger(line.Slice(column, Math.Min(3, line.Length - column)), out fields[i]);
        }

        if (!aligned)
        {
            ReadOnlySpan<char> rest = line;
            for (int i = 0; i < 7; i++)
            {
                ReadOnlySpan<char> word = FieldText.Word(ref rest);
                if (!FieldText.TryInteger(word, out fields[i]) || (i < 3 && word.IsEmpty))
                {
                    return Fail(Entry.Field, ref cursor, line.Length - rest.Length - word.Length, word.ToString(), "number of the bond block");
                }
            }

            Note(Remark.Misaligned, cursor.Line);
        }

        return BondOf(ref cursor, fields[0], fields[1], fields[2], MarkOf(fields[2], fields[3]), fields[5], atoms);
    }

    private static byte MarkOf(int type, int stereo) => (type, stereo) switch
    {
        (1, 1) => BondMark.Up,
        (1, 6) => BondMark.Down,
        (1, 4) => BondMark.Either,
        (2, 3) => BondMark.Either,
        _ => BondMark.None,
    };

    private bool BondOf(ref LineCursor cursor, int first, int second, int type, byte mark, int topology, int atoms)
    {
        if ((uint)(first - 1) >= (uint)atoms || (uint)(second - 1) >= (uint)atoms)
        {
            return Fail(Entry.AtomNumber, ref cursor, 0, (uint)(first - 1) >= (uint)atoms ? first : second, atoms);
        }

        if (first == second)
        {
            return Fail(Entry.BondDuplicate, ref cursor, 0, first, second);
        }

        if (topology != 0)
        {
            return Fail(Entry.QueryBond, ref cursor, 0, "ring or chain topology");
        }

        switch (type)
        {
            case >= 1 and <= 4:
                AddBond(first - 1, second - 1, type, mark, cursor.Line);
                return true;
            case >= 5 and <= 8:
                return Fail(Entry.QueryBond, ref cursor, 0, $"bond type {type}");
            case 9 or 10 or 0:
                return Fail(Entry.BondType, ref cursor, 0, type == 9 ? "the dative bond (type 9)" : type == 10 ? "the hydrogen bond (type 10)" : "bond type 0");
            default:
                return Fail(Entry.Field, ref cursor, 0, type, "bond type");
        }
    }
}
