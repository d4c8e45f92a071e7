using System;
using System.IO;

namespace RadicalSites.Cli.Input;

/// <summary>One record a line; blank lines and lines that start with # are no records.</summary>
internal sealed class LineSplitter(Stream stream, string source) : RecordSplitter(stream, source)
{
    protected override int FindEnd(ReadOnlySpan<byte> data, int from, bool isLast)
    {
        int at = data[from..].IndexOf((byte)'\n');
        return at >= 0 ? from + at + 1 : isLast ? data.Length : 0;
    }

    protected override bool Keep(ReadOnlySpan<byte> record, out ReadOnlySpan<byte> kept)
    {
        Line++;
        kept = record.Trim(" \t\r\n"u8);
        return !kept.IsEmpty && kept[0] != (byte)'#';
    }
}
