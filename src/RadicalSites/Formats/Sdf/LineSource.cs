using System;
using System.Collections.Generic;
using System.IO;

namespace RadicalSites.Formats.Sdf;

/// <summary>Lines of a text reader as spans; LF, CR LF and CR end a line, and a line longer than a limit is cut.</summary>
/// <remarks>Memory is bounded by the longest line allowed.</remarks>
internal sealed class LineSource(TextReader reader, int longestLine)
{
    private readonly Queue<string> ahead = new();
    private char[] buffer = new char[1 << 14];
    private int start;
    private int end;
    private bool ended;
    private bool swallowLineFeed;

    /// <summary>Lines given out so far.</summary>
    internal long Line { get; private set; }

    /// <summary>Whether the line given out last was longer than the limit; it was cut then.</summary>
    internal bool IsCut { get; private set; }

    /// <summary>Goes to the next line.</summary>
    /// <param name="line">The line without its end; valid until the next call.</param>
    /// <returns>False at the end of the text.</returns>
    internal bool Next(out ReadOnlySpan<char> line)
    {
        if (ahead.TryDequeue(out string? known))
        {
            Line++;
            line = known;
            return true;
        }

        if (!Scan(out line))
        {
            return false;
        }

        Line++;
        return true;
    }

    /// <summary>Looks at a line that is not given out yet.</summary>
    /// <param name="index">0 = the next line.</param>
    /// <returns>The line, or null behind the end.</returns>
    internal string? Peek(int index)
    {
        while (ahead.Count <= index)
        {
            if (!Scan(out ReadOnlySpan<char> line))
            {
                return null;
            }

            ahead.Enqueue(line.ToString());
        }

        foreach (string line in ahead)
        {
            if (index-- == 0)
            {
                return line;
            }
        }

        return null;
    }

    private bool Scan(out ReadOnlySpan<char> line)
    {
        IsCut = false;
        int searched = 0;
        while (true)
        {
            if (swallowLineFeed && start < end)
            {
                swallowLineFeed = false;
                start += buffer[start] == '\n' ? 1 : 0;
            }

            int found = buffer.AsSpan(start + searched, end - start - searched).IndexOfAny('\n', '\r');
            if (found >= 0)
            {
                int length = searched + found;
                line = buffer.AsSpan(start, Math.Min(length, longestLine));
                IsCut |= length > longestLine;
                swallowLineFeed = buffer[start + length] == '\r';
                start += length + 1;
                return true;
            }

            searched = end - start;
            if (searched > longestLine)
            {
                // Keep what the limit allows and let the rest pass.
                IsCut = true;
                end = start + longestLine;
                searched = longestLine;
            }

            if (ended)
            {
                line = buffer.AsSpan(start, searched);
                start = end;
                return searched > 0;
            }

            Fill();
        }
    }

    private void Fill()
    {
        if (start > 0)
        {
            buffer.AsSpan(start, end - start).CopyTo(buffer);
            end -= start;
            start = 0;
        }

        if (buffer.Length - end < 1024)
        {
            Array.Resize(ref buffer, 2 * buffer.Length);
        }

        int count = reader.Read(buffer, end, buffer.Length - end);
        ended = count == 0;
        end += count;
    }
}
