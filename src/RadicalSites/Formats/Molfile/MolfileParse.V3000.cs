using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Molfile;
using Remark = RadicalSites.Diagnostics.ProblemCatalogue.MolfileRemarks;

namespace RadicalSites.Formats.Molfile;

/// <content>Blocks of V3000.</content>
internal sealed partial class MolfileParse
{
    private char[] joined = new char[512];
    private Dictionary<int, int>? indexOfNumber;
    private int firstLineOfEntry;

    private bool Extended(ref LineCursor cursor)
    {
        indexOfNumber = null;
        int atoms = 0;
        int bonds = 0;
        bool sawAtoms = false;
        bool inTable = false;
        while (NextEntry(ref cursor, out ReadOnlySpan<char> entry))
        {
            ReadOnlySpan<char> rest = entry;
            switch (FieldText.Word(ref rest))
            {
                case "BEGIN":
                    ReadOnlySpan<char> block = FieldText.Word(ref rest);
                    if (block.SequenceEqual("CTAB"))
                    {
                        if (inTable)
                        {
                            return FailEntry(entry, "a second connection table begins");
                        }

                        inTable = true;
                    }
                    else if (block.SequenceEqual("ATOM"))
                    {
                        sawAtoms = true;
                        if (!ExtendedAtoms(ref cursor, atoms))
                        {
                            return false;
                        }
                    }
                    else if (block.SequenceEqual("BOND"))
                    {
                        if (!ExtendedBonds(ref cursor, bonds))
                        {
                            return false;
                        }
                    }
                    else if (!OtherBlock(ref cursor, block))
                    {
                        return false;
                    }

                    break;
                case "COUNTS":
                    if (!FieldText.TryInteger(FieldText.Word(ref rest), out atoms) || !FieldText.TryInteger(FieldText.Word(ref rest), out bonds)
                        || atoms < 0 || bonds < 0)
                    {
                        return FailEntry(entry, "COUNTS is followed by the numbers of atoms and bonds");
                    }

                    FieldText.Word(ref rest);
                    FieldText.Word(ref rest);
                    chiralFlag = FieldText.TryInteger(FieldText.Word(ref rest), out int flag) && flag == 1;
                    break;
                case "LINKNODE":
                    return Fail(Entry.QueryProperty, firstLineOfEntry, entry, 0, ["the link node"]);
                case "END":
                    break;
                default:
                    return FailEntry(entry, "unknown keyword");
            }
        }

        if (failure is not null)
        {
            return false;
        }

        return sawAtoms || (inTable && atoms == 0)
            ? draft.BondCount == bonds || Fail(Entry.Truncated, ref cursor, 0, "bond", draft.BondCount, bonds)
            : Fail(Entry.Truncated, ref cursor, 0, "atom", 0, atoms);
    }

    // The next "M  V30" entry with its continuation lines joined; false at M  END, at the end of the record, or on failure.
    private bool NextEntry(ref LineCursor cursor, out ReadOnlySpan<char> entry)
    {
        entry = default;
        int length = 0;
        while (true)
        {
            LineCursor before = cursor;
            if (!cursor.Next() || cursor.Current.StartsWith("$$$$", StringComparison.Ordinal) || (cursor.Current.Length > 0 && cursor.Current[0] == '>'))
            {
                cursor = before;
                if (length > 0)
                {
                    return FailEntry(joined.AsSpan(0, length), "the line it continues on is missing");
                }

                Note(Remark.MissingEnd);
                return false;
            }

            ReadOnlySpan<char> line = cursor.Current.TrimEnd();
            if (line.IsEmpty)
            {
                continue;
            }

            if (!line.StartsWith("M  V30", StringComparison.Ordinal))
            {
                ReadOnlySpan<char> rest = line;
                return FieldText.Word(ref rest).SequenceEqual("M") && FieldText.Word(ref rest).SequenceEqual("END") && length == 0
                    ? false
                    : Fail(Entry.ExtendedSyntax, ref cursor, 0, "it does not start with M  V30");
            }

            ReadOnlySpan<char> part = line[6..];
            part = length == 0 ? part.TrimStart(' ') : part.Length > 0 && part[0] == ' ' ? part[1..] : part;
            if (length == 0)
            {
                firstLineOfEntry = cursor.Line;
                if (part.Length == 0 || part[^1] != '-')
                {
                    entry = part;
                    return true;
                }
            }

            bool goesOn = part.Length > 0 && part[^1] == '-';
            part = goesOn ? part[..^1] : part;
            if (length + part.Length > joined.Length)
            {
                Array.Resize(ref joined, 2 * (length + part.Length));
            }

            part.CopyTo(joined.AsSpan(length));
            length += part.Length;
            if (!goesOn)
            {
                entry = joined.AsSpan(0, length);
                return true;
            }

            if (length == 0)
            {
                joined[length++] = ' ';
            }
        }
    }

    private bool ExtendedAtoms(ref LineCursor cursor, int count)
    {
        while (NextEntry(ref cursor, out ReadOnlySpan<char> entry))
        {
            if (entry.StartsWith("END ATOM", StringComparison.Ordinal))
            {
                return draft.AtomCount == count || Fail(Entry.Truncated, ref cursor, 0, "atom", draft.AtomCount, count);
            }

            if (draft.AtomCount == count)
            {
                return FailEntry(entry, "there are more atoms than the counts line states");
            }

            if (!ExtendedAtom(entry))
            {
                return false;
            }
        }

        return failure is null ? Fail(Entry.Truncated, ref cursor, 0, "atom", draft.AtomCount, count) : false;
    }

    private bool ExtendedAtom(ReadOnlySpan<char> entry)
    {
        ReadOnlySpan<char> rest = entry;
        if (!FieldText.TryInteger(FieldText.Word(ref rest), out int number) || number < 1)
        {
            return FailEntry(entry, "an atom line starts with its index");
        }

        ReadOnlySpan<char> symbol = FieldText.Word(ref rest).Trim('"');
        if (symbol.IsEmpty || symbol[0] == '[' || symbol.SequenceEqual("NOT"))
        {
            return Fail(Entry.QueryAtom, firstLineOfEntry, entry, 0, ["atom list"]);
        }

        int element = AtomSymbol.Find(symbol, out int isotope);
        if (element <= 0)
        {
            return Fail(
                AtomSymbol.IsGeneric(symbol) ? Entry.QueryAtom : Entry.Symbol, firstLineOfEntry, entry,
                entry.Length - rest.Length - symbol.Length, [symbol.ToString()]);
        }

        if (!Coordinate(ref rest, out double x) || !Coordinate(ref rest, out double y) || !Coordinate(ref rest, out double z)
            || !FieldText.TryInteger(FieldText.Word(ref rest), out int map) || map < 0)
        {
            return FailEntry(entry, "the type is followed by x, y, z and the map number");
        }

        ref BuilderAtom atom = ref AddAtom(firstLineOfEntry);
        int index = draft.AtomCount - 1;
        if (number != index + 1 || indexOfNumber is not null)
        {
            if (!MapNumber(number, index))
            {
                return FailEntry(entry, "the index occurs twice");
            }
        }

        atom.Element = (byte)element;
        atom.AtomClass = map;
        atom.Isotope = (ushort)isotope;
        raw[index].NamedIsotope = isotope > 0;
        draft.HasHydrogenAtoms |= element == 1;
        points[index] = new Point(x, y, z);
        return ExtendedAtomOptions(entry, rest, index);
    }

    private static bool Coordinate(ref ReadOnlySpan<char> rest, out double value)
    {
        ReadOnlySpan<char> word = FieldText.Word(ref rest);
        value = 0;
        return !word.IsEmpty && FieldText.TryNumber(word, out value);
    }

    // Indices may be any different numbers; the map is made only when they are not 1, 2, 3 ...
    private bool MapNumber(int number, int index)
    {
        if (indexOfNumber is null)
        {
            indexOfNumber = [];
            for (int i = 0; i < index; i++)
            {
                indexOfNumber.Add(i + 1, i);
            }
        }

        return indexOfNumber.TryAdd(number, index);
    }

    private bool ExtendedAtomOptions(ReadOnlySpan<char> entry, ReadOnlySpan<char> rest, int index)
    {
        while (NextOption(ref rest, out ReadOnlySpan<char> key, out ReadOnlySpan<char> value))
        {
            bool isNumber = FieldText.TryInteger(value, out int number);
            bool good = true;
            switch (key)
            {
                case "CHG":
                    good = isNumber && SetValue(index, 'C', number);
                    break;
                case "RAD":
                    good = isNumber && SetValue(index, 'R', number);
                    break;
                case "MASS":
                    good = isNumber && SetValue(index, 'I', number);
                    break;
                case "CFG":
                    good = isNumber && number is >= 0 and <= 3;
                    raw[index].Parity = (byte)(good ? number : 0);
                    break;
                case "VAL":
                    good = isNumber && number is >= -1 and <= 14;
                    raw[index].Valence = (sbyte)(number == 0 ? -1 : Math.Max(0, number));
                    break;
                case "HCOUNT" or "SUBST" or "UNSAT" or "RBCNT" or "ATTCHPT" or "RGROUPS":
                    if (!isNumber || number != 0)
                    {
                        return Fail(Entry.QueryProperty, firstLineOfEntry, entry, 0, [$"the property {key}"]);
                    }

                    break;
                default:
                    // STBOX, INVRET, EXACHG, CLASS, SEQID ...: reactions, searches and display.
                    break;
            }

            if (!good)
            {
                return FailEntry(entry, $"the value of {key} is out of range");
            }
        }

        return true;
    }

    private bool ExtendedBonds(ref LineCursor cursor, int count)
    {
        while (NextEntry(ref cursor, out ReadOnlySpan<char> entry))
        {
            if (entry.StartsWith("END BOND", StringComparison.Ordinal))
            {
                return true;
            }

            ReadOnlySpan<char> rest = entry;
            if (!FieldText.TryInteger(FieldText.Word(ref rest), out _) || !FieldText.TryInteger(FieldText.Word(ref rest), out int type)
                || !FieldText.TryInteger(FieldText.Word(ref rest), out int first) || !FieldText.TryInteger(FieldText.Word(ref rest), out int second))
            {
                return FailEntry(entry, "a bond line holds index, type and two atoms");
            }

            if (draft.BondCount == count)
            {
                return FailEntry(entry, "there are more bonds than the counts line states");
            }

            byte mark = BondMark.None;
            int topology = 0;
            while (NextOption(ref rest, out ReadOnlySpan<char> key, out ReadOnlySpan<char> value))
            {
                if (key.SequenceEqual("CFG"))
                {
                    mark = ExtendedMark(type, value);
                }
                else if (key.SequenceEqual("TOPO") && !value.SequenceEqual("0"))
                {
                    topology = 1;
                }
                else if (key.SequenceEqual("ENDPTS"))
                {
                    return Fail(Entry.BondType, firstLineOfEntry, entry, 0, ["the bond to several atoms (ENDPTS)"]);
                }
            }

            if (indexOfNumber is not null)
            {
                first = indexOfNumber.TryGetValue(first, out int index) ? index + 1 : -first;
                second = indexOfNumber.TryGetValue(second, out index) ? index + 1 : -second;
            }

            if (!BondOf(ref cursor, first, second, type, mark, topology, draft.AtomCount))
            {
                return false;
            }
        }

        return failure is null ? Fail(Entry.Truncated, ref cursor, 0, "bond", draft.BondCount, count) : false;
    }

    private static byte ExtendedMark(int type, ReadOnlySpan<char> value) => value switch
    {
        "1" when type == 1 => BondMark.Up,
        "3" when type == 1 => BondMark.Down,
        "2" when type is 1 or 2 => BondMark.Either,
        _ => BondMark.None,
    };

    private bool OtherBlock(ref LineCursor cursor, scoped ReadOnlySpan<char> block)
    {
        if (block.SequenceEqual("RGROUP") || block.SequenceEqual("TEMPLATE"))
        {
            return Fail(Entry.QueryProperty, ref cursor, 0, $"the block {block}");
        }

        bool groups = block.SequenceEqual("SGROUP");
        bool collection = block.SequenceEqual("COLLECTION");
        string name = (block.Length > 32 ? block[..32] : block).ToString();
        bool noted = false;
        if (!groups && !collection)
        {
            Note(Remark.UnknownProperty, cursor.Line, "block " + name);
        }

        while (NextEntry(ref cursor, out ReadOnlySpan<char> entry))
        {
            ReadOnlySpan<char> rest = entry;
            if (FieldText.Word(ref rest).SequenceEqual("END") && FieldText.Word(ref rest).SequenceEqual(name))
            {
                return true;
            }

            if (collection && !noted && (entry.StartsWith("MDLV30/STERAC", StringComparison.Ordinal) || entry.StartsWith("MDLV30/STEREL", StringComparison.Ordinal)))
            {
                noted = true;
                Note(Remark.StereoGroups);
            }

            rest = entry;
            FieldText.Word(ref rest);
            if (groups && IsRepeatUnit(FieldText.Word(ref rest)))
            {
                return Fail(Entry.Polymer, firstLineOfEntry, entry, 0, ["that repeats (see the line)"]);
            }
        }

        return failure is null ? FailEntry(name, "the block is not closed") : false;
    }

    // "KEY=value", where the value may be a list in parentheses or a quoted text.
    private static bool NextOption(ref ReadOnlySpan<char> rest, out ReadOnlySpan<char> key, out ReadOnlySpan<char> value)
    {
        key = default;
        value = default;
        rest = rest.TrimStart(' ');
        int equals = rest.IndexOf('=');
        if (equals < 0)
        {
            return false;
        }

        key = rest[..equals].Trim(' ');
        int space = key.LastIndexOf(' ');
        key = space < 0 ? key : key[(space + 1)..];
        rest = rest[(equals + 1)..];
        char close = rest.IsEmpty ? '\0' : rest[0] == '(' ? ')' : rest[0] == '"' ? '"' : '\0';
        if (close != '\0')
        {
            int end = rest[1..].IndexOf(close);
            value = end < 0 ? rest : rest[..(end + 2)];
            rest = rest[value.Length..];
            return true;
        }

        value = FieldText.Word(ref rest);
        return true;
    }

    private bool FailEntry(ReadOnlySpan<char> entry, string reason) => Fail(Entry.ExtendedSyntax, firstLineOfEntry, entry, 0, [reason]);
}
