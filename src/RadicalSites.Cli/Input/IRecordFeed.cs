using System;
using RadicalSites.Formats.Streams;

namespace RadicalSites.Cli.Input;

/// <summary>Cuts one source into records.</summary>
internal interface IRecordFeed : IDisposable
{
    /// <summary>Format of the records.</summary>
    InputFormat Format { get; }

    /// <summary>Name of the source for messages.</summary>
    string Source { get; }

    /// <summary>Reads records until the batch is full, the input ends, or the next read could block.</summary>
    /// <param name="batch">Batch to add to, or <see langword="null"/> to skip.</param>
    /// <param name="most">Most records to read, 1 or more.</param>
    /// <param name="number">Number of the next record; counted on.</param>
    /// <returns>Whether the input goes on.</returns>
    bool Read(RecordBatch? batch, long most, ref long number);
}
