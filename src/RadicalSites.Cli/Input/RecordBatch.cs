using System;
using System.Collections.Generic;
using RadicalSites.Formats.Streams;

namespace RadicalSites.Cli.Input;

/// <summary>Consecutive records of one source, read but not yet understood.</summary>
internal sealed class RecordBatch
{
    internal const int MostRecords = 256;
    internal const int MostBytes = 1 << 16;

    private byte[] data = new byte[4096];
    private int length;

    /// <summary>Lines of SMILES.</summary>
    internal List<RawRecord> Records { get; } = [];

    /// <summary>Records of a molfile or SDF.</summary>
    internal List<Formats.Streams.RawRecord> Blocks { get; } = [];

    internal int Count => Records.Count + Blocks.Count;

    internal InputFormat Format { get; set; }

    /// <summary>Name of the source for messages.</summary>
    internal string Source { get; set; } = "";

    internal bool IsFull => Count >= MostRecords || length >= MostBytes;

    internal ReadOnlySpan<byte> BytesOf(RawRecord record) => data.AsSpan(record.Start, record.Length);

    internal void Add(long number, long line, ReadOnlySpan<byte> record)
    {
        if (length + record.Length > data.Length)
        {
            Array.Resize(ref data, Math.Max(2 * data.Length, length + record.Length));
        }

        record.CopyTo(data.AsSpan(length));
        Records.Add(new RawRecord(number, line, length, record.Length));
        length += record.Length;
    }

    internal void Add(Formats.Streams.RawRecord block)
    {
        Blocks.Add(block);
        length += block.Text.Length;
    }

    internal void Clear()
    {
        Blocks.Clear();
        Records.Clear();
        length = 0;
        if (data.Length > 4 * MostBytes)
        {
            data = new byte[4096];
        }
    }
}
