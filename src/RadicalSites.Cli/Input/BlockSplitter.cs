using System;
using System.IO;

namespace RadicalSites.Cli.Input;

/// <summary>Records that a line <c>$$$$</c> ends, as in SDF; a molfile is a single one.</summary>
/// <remarks>
/// Inside a data value such a line is data when the lines that follow go on with another data header before any
/// connection table could begin; the reader of the library decides likewise.
/// </remarks>
internal sealed class BlockSplitter(Stream stream, string source, RecordFormat format)
    : RecordSplitter(stream, source, format)
{
    private const int LinesBeforeCounts = 4;

    protected override int FindEnd(ReadOnlySpan<byte> data, int from, bool isLast)
    {
        int at = Math.Max(0, from - 8);
        while (at < data.Length)
        {
            int found = data[at..].IndexOf("$$$$"u8);
            if (found < 0)
            {
                break;
            }

            at += found;
            int end = EndOfLine(data, at, isLast);
            if (end < 0)
            {
                return 0;
            }

            bool alone = (at == 0 || data[at - 1] is (byte)'\n' or (byte)'\r') && data[(at + 4)..end].Trim(" \t\r\n"u8).IsEmpty;
            if (alone)
            {
                if (!IsInValue(data, at))
                {
                    return end;
                }

                int verdict = GoesOnAsData(data[end..], isLast);
                if (verdict == 0)
                {
                    return end;
                }

                if (verdict < 0)
                {
                    return 0;
                }
            }

            at = end;
        }

        return isLast ? data.Length : 0;
    }

    protected override bool Keep(ReadOnlySpan<byte> record, out ReadOnlySpan<byte> kept)
    {
        long lines = 0;
        for (int i = 0; i < record.Length; i++)
        {
            lines += record[i] == '\n' || (record[i] == '\r' && (i + 1 == record.Length || record[i + 1] != '\n')) ? 1 : 0;
        }

        Line += lines;
        ReadOnlySpan<byte> trimmed = record.TrimEnd(" \t\r\n"u8);
        kept = trimmed.EndsWith("$$$$"u8) ? trimmed[..^4] : record;
        return !trimmed.IsEmpty;
    }

    // Offset behind the line; -1 when its end is not in sight yet.
    private static int EndOfLine(ReadOnlySpan<byte> data, int from, bool isLast)
    {
        int end = data[from..].IndexOfAny((byte)'\n', (byte)'\r');
        if (end < 0)
        {
            return isLast ? data.Length : -1;
        }

        end += from;
        if (data[end] == '\n')
        {
            return end + 1;
        }

        return end + 1 < data.Length ? end + (data[end + 1] == '\n' ? 2 : 1) : isLast ? data.Length : -1;
    }

    // Back over the lines before: a data header without a blank line after it means that a value is open.
    private static bool IsInValue(ReadOnlySpan<byte> data, int at)
    {
        while (at > 0)
        {
            ReadOnlySpan<byte> before = data[..(at - (at > 1 && data[at - 1] == '\n' && data[at - 2] == '\r' ? 2 : 1))];
            int start = before.LastIndexOfAny((byte)'\n', (byte)'\r') + 1;
            ReadOnlySpan<byte> line = before[start..];
            if (line.Trim(" \t"u8).IsEmpty || line.StartsWith("M  END"u8))
            {
                return false;
            }

            if (line[0] == '>')
            {
                return true;
            }

            at = start;
        }

        return false;
    }

    // 1 = data, 0 = the record ends, -1 = more text is needed.
    private static int GoesOnAsData(ReadOnlySpan<byte> rest, bool isLast)
    {
        bool afterBlank = true;
        for (int i = 0; i < LinesBeforeCounts; i++)
        {
            if (rest.IsEmpty)
            {
                return isLast ? 0 : -1;
            }

            int end = EndOfLine(rest, 0, isLast);
            if (end < 0)
            {
                return -1;
            }

            ReadOnlySpan<byte> line = rest[..end];
            if (line.IndexOf("V2000"u8) >= 0 || line.IndexOf("V3000"u8) >= 0)
            {
                return 0;
            }

            if (afterBlank && line[0] == '>' && line.Contains((byte)'<'))
            {
                return 1;
            }

            afterBlank = line.Trim(" \t\r\n"u8).IsEmpty;
            rest = rest[end..];
        }

        return 0;
    }
}
