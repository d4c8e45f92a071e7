using System;
using System.IO;

namespace RadicalSites.Formats.Sdf;

/// <summary>Cuts a text into SDF records without understanding them.</summary>
/// <remarks>
/// A line <c>$$$$</c> ends a record, and so does the end of the text. Inside a data value such a line counts as data when
/// the lines that follow go on with the value and another data header, before any connection table could begin.
/// </remarks>
internal sealed class SdfSplitter(TextReader reader, int longestRecord)
{
    private const int LinesBeforeCounts = 4;

    private readonly LineSource lines = new(reader, longestRecord);
    private char[] text = new char[4096];
    private int length;

    /// <summary>The record without its terminator, lines separated by LF.</summary>
    internal ReadOnlySpan<char> Text => text.AsSpan(0, length);

    /// <summary>1-based first line of the record.</summary>
    internal long FirstLine { get; private set; }

    /// <summary>1-based last line of the record.</summary>
    internal long LastLine => lines.Line;

    /// <summary>Whether the record passed the limit; its text is cut then.</summary>
    internal bool IsTooLong { get; private set; }

    /// <summary>Goes to the next record.</summary>
    /// <returns>False when nothing but white space is left.</returns>
    internal bool Next()
    {
        length = 0;
        IsTooLong = false;
        FirstLine = lines.Line + 1;
        bool blank = true;
        bool inValue = false;
        long number = 0;
        while (lines.Next(out ReadOnlySpan<char> line))
        {
            number++;
            bool terminator = line.StartsWith("$$$$", StringComparison.Ordinal) && line.TrimEnd().Length == 4;
            if (terminator && !(inValue && IsData()))
            {
                return true;
            }

            bool empty = line.IsWhiteSpace();
            blank &= empty;
            inValue = !empty && (inValue || (number > LinesBeforeCounts && line[0] == '>'));
            Append(line);
            IsTooLong |= lines.IsCut;
        }

        return !blank;
    }

    private bool IsData()
    {
        bool afterBlank = true;
        for (int i = 0; i < LinesBeforeCounts; i++)
        {
            string? next = lines.Peek(i);
            if (next is null || next.Contains("V2000", StringComparison.Ordinal) || next.Contains("V3000", StringComparison.Ordinal))
            {
                return false;
            }

            if (afterBlank && next.StartsWith('>') && next.Contains('<', StringComparison.Ordinal))
            {
                return true;
            }

            afterBlank = string.IsNullOrWhiteSpace(next);
        }

        return false;
    }

    private void Append(ReadOnlySpan<char> line)
    {
        if (length + line.Length + 1 > longestRecord)
        {
            IsTooLong = true;
            return;
        }

        if (length + line.Length + 1 > text.Length)
        {
            Array.Resize(ref text, Math.Min(longestRecord, Math.Max(2 * text.Length, length + line.Length + 1)));
        }

        line.CopyTo(text.AsSpan(length));
        length += line.Length;
        text[length++] = '\n';
    }
}
