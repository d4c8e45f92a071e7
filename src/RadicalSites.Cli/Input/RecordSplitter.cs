using System;
using System.Globalization;
using System.IO;
using RadicalSites.Formats.Streams;

namespace RadicalSites.Cli.Input;

/// <summary>Cuts a stream into records without understanding them; memory is bounded by the largest record.</summary>
internal abstract class RecordSplitter(Stream stream, string source, long firstLine = 1)
    : IRecordFeed
{
    private const int LargestRecord = 1 << 28;

    private byte[] buffer = new byte[1 << 17];
    private int start;
    private int end;
    private int scanned;
    private bool atEnd;
    private bool isFirstRead = true;

    public InputFormat Format => InputFormat.Smiles;

    public string Source => source;

    /// <summary>1-based line of the next record.</summary>
    protected long Line { get; set; } = firstLine;

    public void Dispose()
    {
        stream.Dispose();
        GC.SuppressFinalize(this);
    }

    /// <inheritdoc/>
    public bool Read(RecordBatch? batch, long most, ref long number)
    {
        long read = 0;
        while (read < most && batch is not { IsFull: true })
        {
            int length = FindEnd(buffer.AsSpan(start, end - start), scanned, atEnd);
            if (length > 0)
            {
                ReadOnlySpan<byte> record = buffer.AsSpan(start, length);
                long line = Line;
                start += length;
                scanned = 0;
                if (Keep(record, out ReadOnlySpan<byte> kept))
                {
                    batch?.Add(number, line, kept);
                    number++;
                    read++;
                }
            }
            else if (atEnd)
            {
                return false;
            }
            else if (read > 0 && batch is not null)
            {
                return true;
            }
            else
            {
                scanned = end - start;
                Fill();
            }
        }

        return true;
    }

    /// <summary>Length of the first record with its end mark; 0 when more data is needed, or nothing is left.</summary>
    protected abstract int FindEnd(ReadOnlySpan<byte> data, int from, bool isLast);

    /// <summary>Strips the end mark and counts lines; blank stretches are no records.</summary>
    protected abstract bool Keep(ReadOnlySpan<byte> record, out ReadOnlySpan<byte> kept);

    private void Fill()
    {
        if (start > 0)
        {
            buffer.AsSpan(start, end - start).CopyTo(buffer);
            end -= start;
            start = 0;
        }

        if (end == buffer.Length)
        {
            if (buffer.Length >= LargestRecord)
            {
                throw new ToolException(ExitCode.InputOutput, string.Create(
                    CultureInfo.InvariantCulture, $"{source}, line {Line}: a record is larger than {LargestRecord >> 20} MiB."));
            }

            Array.Resize(ref buffer, 2 * buffer.Length);
        }

        try
        {
            // The first read goes on until a byte order mark could be told.
            do
            {
                int count = stream.Read(buffer, end, buffer.Length - end);
                end += count;
                atEnd = count == 0;
            }
            while (isFirstRead && end < 3 && !atEnd);
        }
        catch (Exception problem) when (problem is IOException or InvalidDataException or UnauthorizedAccessException)
        {
            throw new ToolException(ExitCode.InputOutput, $"{source}: cannot read: {problem.Message}", problem);
        }

        if (isFirstRead)
        {
            isFirstRead = false;
            start = buffer.AsSpan(0, end).StartsWith("\uFEFF"u8) ? 3 : 0;
        }
    }
}
