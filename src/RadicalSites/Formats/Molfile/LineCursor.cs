using System;

namespace RadicalSites.Formats.Molfile;

/// <summary>Walks over the lines of a text; LF, CR LF and CR end a line, also mixed.</summary>
internal ref struct LineCursor
{
    private ReadOnlySpan<char> rest;

    internal LineCursor(ReadOnlySpan<char> text)
    {
        rest = text;
    }

    /// <summary>1-based number of the line read last.</summary>
    internal int Line { get; private set; }

    /// <summary>The line read last.</summary>
    internal ReadOnlySpan<char> Current { get; private set; }

    internal readonly bool IsAtEnd => rest.IsEmpty;

    /// <summary>Goes to the next line.</summary>
    /// <returns>False at the end of the text; <see cref="Current"/> is empty then.</returns>
    internal bool Next()
    {
        if (rest.IsEmpty)
        {
            Current = default;
            return false;
        }

        Line++;
        int end = rest.IndexOfAny('\n', '\r');
        if (end < 0)
        {
            Current = rest;
            rest = default;
            return true;
        }

        Current = rest[..end];
        bool pair = rest[end] == '\r' && end + 1 < rest.Length && rest[end + 1] == '\n';
        rest = rest[(end + (pair ? 2 : 1))..];
        return true;
    }
}
