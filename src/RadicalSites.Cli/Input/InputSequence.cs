using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;

namespace RadicalSites.Cli.Input;

/// <summary>All inputs of a command line as one numbered sequence of records.</summary>
internal sealed class InputSequence(IReadOnlyList<InputItem> items) : IDisposable
{
    private int next;
    private long number = 1;
    private IRecordFeed? current;
    private Stream? stored;
    private long finishedBytes;

    internal IReadOnlyList<InputItem> Items => items;

    /// <summary>Stored bytes read so far; less than zero when the size of an input is not known.</summary>
    internal double FractionRead
    {
        get
        {
            long total = 0;
            foreach (InputItem item in items)
            {
                if (item.StoredLength is not { } length)
                {
                    return -1;
                }

                total += length;
            }

            long here = 0;
            try
            {
                here = stored is { CanSeek: true } ? stored.Position : 0;
            }
            catch (ObjectDisposedException)
            {
                // The reader has just moved on to the next input.
            }

            return total == 0 ? -1 : (finishedBytes + here) / (double)total;
        }
    }

    internal bool ReadsStandardInput => items.Any(static item => item.IsStandardInput);

    public void Dispose() => current?.Dispose();

    /// <summary>Fills a batch with the next records of one source.</summary>
    /// <returns>Whether there was any record.</returns>
    internal bool Read(RecordBatch batch, long most)
    {
        batch.Clear();
        while (Current() is { } splitter)
        {
            batch.Format = splitter.Format;
            batch.Source = splitter.Source;
            bool goesOn = splitter.Read(batch, most, ref number);
            if (!goesOn)
            {
                Close();
            }

            if (batch.Count > 0)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>Passes over records.</summary>
    /// <returns>Number of records passed over; less than asked for at the end of the input.</returns>
    internal long Skip(long count)
    {
        long first = number;
        while (number - first < count && Current() is { } splitter)
        {
            if (!splitter.Read(null, count - (number - first), ref number))
            {
                Close();
            }
        }

        return number - first;
    }

    private IRecordFeed? Current()
    {
        if (current is null && next < items.Count)
        {
            current = items[next].Open(out stored);
        }

        return current;
    }

    private void Close()
    {
        finishedBytes += items[next].StoredLength ?? 0;
        current?.Dispose();
        current = null;
        stored = null;
        next++;
    }
}
