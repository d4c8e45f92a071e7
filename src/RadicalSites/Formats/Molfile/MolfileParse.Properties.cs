using System;
using System.Globalization;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Molfile;
using Remark = RadicalSites.Diagnostics.ProblemCatalogue.MolfileRemarks;

namespace RadicalSites.Formats.Molfile;

/// <content>Property lines of V2000.</content>
internal sealed partial class MolfileParse
{
    private static readonly string[] RepeatUnits = ["SRU", "MON", "MER", "COP", "CRO", "MOD", "GRA", "ANY"];

    private bool Properties(ref LineCursor cursor)
    {
        while (true)
        {
            LineCursor before = cursor;
            if (!cursor.Next())
            {
                Note(Remark.MissingEnd);
                return true;
            }

            ReadOnlySpan<char> line = cursor.Current;
            if (line.IsWhiteSpace())
            {
                continue;
            }

            if (line.StartsWith("$$$$", StringComparison.Ordinal) || line[0] == '>')
            {
                Note(Remark.MissingEnd);
                cursor = before;
                return true;
            }

            switch (line[0])
            {
                case 'M':
                    ReadOnlySpan<char> rest = line[1..];
                    ReadOnlySpan<char> key = FieldText.Word(ref rest);
                    if (key.SequenceEqual("END"))
                    {
                        return true;
                    }

                    if (!PropertyLine(ref cursor, key))
                    {
                        return false;
                    }

                    break;
                case 'A' when line.Length > 1 && line[1] == ' ':
                    if (!Alias(ref cursor))
                    {
                        return false;
                    }

                    break;
                case 'G' when line.Length > 1 && line[1] == ' ':
                    Note(Remark.UnknownProperty, cursor.Line, "group abbreviation");
                    cursor.Next();
                    break;
                case 'V' when line.Length > 1 && line[1] == ' ':
                    Note(Remark.UnknownProperty, cursor.Line, "atom value");
                    break;
                case 'S' when line.StartsWith("S  SKP", StringComparison.Ordinal):
                    FieldText.TryInteger(FieldText.Columns(line, 6, 3), out int skipped);
                    for (int i = 0; i < skipped; i++)
                    {
                        cursor.Next();
                    }

                    break;
                default:
                    return Fail(Entry.PropertyLine, ref cursor, 0, "a line of the property block starts with M, A, V, G or S; perhaps the counts line is too small");
            }
        }
    }

    private bool PropertyLine(ref LineCursor cursor, scoped ReadOnlySpan<char> key)
    {
        switch (key)
        {
            case "CHG" or "RAD":
                if (!chargesReset)
                {
                    chargesReset = true;
                    ResetCharges();
                }

                return Pairs(ref cursor, key[0]);
            case "ISO":
                if (!isotopesReset)
                {
                    isotopesReset = true;
                    ResetIsotopes();
                }

                return Pairs(ref cursor, 'I');
            case "ALS" or "RGP" or "LOG" or "SUB" or "UNS" or "RBC" or "LIN" or "APO" or "AAL" or "RBD":
                return Fail(Entry.QueryProperty, ref cursor, 3, $"the property {key}");
            case "ZBO" or "ZCH" or "HYD":
                return Fail(Entry.BondType, ref cursor, 3, $"the zero-order bond extension {key}");
            case "STY":
                return GroupTypes(ref cursor);
            case "SST" or "SLB" or "SAL" or "SBL" or "SPA" or "SMT" or "SDI" or "SDS" or "SCL" or "SAP" or "SBV" or "SBT"
                or "SCN" or "SNC" or "SPL" or "CRS" or "SDT" or "SDD" or "SCD" or "SED" or "MRV" or "SCR":
                // Parts of a group whose type line was looked at already; they draw or label it.
                return true;
            default:
                Note(Remark.UnknownProperty, cursor.Line, "M  " + (key.Length > 16 ? key[..16] : key).ToString());
                return true;
        }
    }

    private void ResetCharges()
    {
        for (int i = 0; i < draft.AtomCount; i++)
        {
            draft.Atoms[i].Charge = 0;
            raw[i].Radical = 0;
        }
    }

    private void ResetIsotopes()
    {
        for (int i = 0; i < draft.AtomCount; i++)
        {
            if (!raw[i].NamedIsotope)
            {
                draft.Atoms[i].Isotope = 0;
            }
        }
    }

    // "M  CHGnn8 aaa vvv ...": by columns, or by words when the columns are shifted.
    private bool Pairs(ref LineCursor cursor, char kind)
    {
        ReadOnlySpan<char> line = cursor.Current;
        int keyEnd = line.IndexOf(kind == 'C' ? "CHG" : kind == 'R' ? "RAD" : "ISO", StringComparison.Ordinal) + 3;
        ReadOnlySpan<char> rest = line[keyEnd..];
        if (!FieldText.TryInteger(FieldText.Columns(rest, 0, 3), out int count) || count is < 1 or > 999)
        {
            return Fail(Entry.PropertyLine, ref cursor, keyEnd, "the number of entries is missing");
        }

        rest = rest[Math.Min(3, rest.Length)..];
        for (int i = 0; i < count; i++)
        {
            ReadOnlySpan<char> first = FieldText.Columns(rest, 8 * i, 4);
            ReadOnlySpan<char> second = FieldText.Columns(rest, (8 * i) + 4, 4);
            if (!FieldText.TryInteger(first, out int number) || !FieldText.TryInteger(second, out int value)
                || first.IsWhiteSpace() || second.IsWhiteSpace())
            {
                return Fail(Entry.PropertyLine, ref cursor, Math.Min(keyEnd + 3 + (8 * i), line.Length), $"entry {i + 1} of {count} is missing or no number");
            }

            if (number < 1 || number > draft.AtomCount)
            {
                return Fail(Entry.AtomNumber, ref cursor, keyEnd + 3 + (8 * i), number, draft.AtomCount);
            }

            if (!SetValue(number - 1, kind, value))
            {
                return Fail(Entry.PropertyLine, ref cursor, keyEnd + 7 + (8 * i), $"the value {value.ToString(CultureInfo.InvariantCulture)} is out of range");
            }
        }

        return true;
    }

    private bool SetValue(int atom, char kind, int value)
    {
        switch (kind)
        {
            case 'C':
                draft.Atoms[atom].Charge = (sbyte)Math.Clamp(value, -15, 15);
                return value is >= -15 and <= 15;
            case 'R':
                raw[atom].Radical = (byte)Math.Clamp(value, 0, 3);
                return value is >= 0 and <= 3;
            default:
                draft.Atoms[atom].Isotope = (ushort)Math.Clamp(value, 0, 999);
                return value is >= 0 and <= 399;
        }
    }

    private bool Alias(ref LineCursor cursor)
    {
        if (!FieldText.TryInteger(cursor.Current[1..], out int number) || number < 1 || number > draft.AtomCount)
        {
            return Fail(Entry.PropertyLine, ref cursor, 0, "an alias line names one atom of the molecule");
        }

        cursor.Next();
        ReadOnlySpan<char> text = cursor.Current.Trim();
        (remarks ??= []).Add(Diagnostics.Diagnostic.Create(
            Remark.Alias, [], number, (text.Length > 80 ? text[..80] : text).ToString()));
        return true;
    }

    private bool GroupTypes(ref LineCursor cursor)
    {
        ReadOnlySpan<char> rest = cursor.Current[Math.Min(9, cursor.Current.Length)..];
        while (true)
        {
            FieldText.Word(ref rest);
            ReadOnlySpan<char> type = FieldText.Word(ref rest);
            if (type.IsEmpty)
            {
                return true;
            }

            if (IsRepeatUnit(type))
            {
                return Fail(Entry.Polymer, ref cursor, cursor.Current.Length - rest.Length - type.Length, type.ToString());
            }
        }
    }

    private static bool IsRepeatUnit(ReadOnlySpan<char> type)
    {
        foreach (string unit in RepeatUnits)
        {
            if (type.SequenceEqual(unit))
            {
                return true;
            }
        }

        return false;
    }
}
