using System.Collections.Generic;
using System.IO;
using RadicalSites.Formats.Streams;

namespace RadicalSites.Cli.Input;

/// <summary>Molfiles and SDF, cut by the library.</summary>
/// <param name="stream">The stream, plain or gzip.</param>
/// <param name="source">Name for messages.</param>
/// <param name="format">Molfile or SDF.</param>
/// <param name="isLive">Whether a program may wait for the answer to each record.</param>
internal sealed class BlockFeed(Stream stream, string source, InputFormat format, bool isLive) : IRecordFeed
{
    private readonly IEnumerator<Formats.Streams.RawRecord> records = RecordReader.Split(stream, format).GetEnumerator();

    public InputFormat Format => format;

    public string Source => source;

    public void Dispose() => records.Dispose();

    /// <inheritdoc/>
    public bool Read(RecordBatch? batch, long most, ref long number)
    {
        for (long read = 0; read < most && batch is not { IsFull: true }; read++)
        {
            if (isLive && batch is not null && read > 0)
            {
                return true;
            }

            try
            {
                if (!records.MoveNext())
                {
                    return false;
                }
            }
            catch (System.Exception problem) when (problem is IOException or InvalidDataException or System.UnauthorizedAccessException)
            {
                throw new ToolException(ExitCode.InputOutput, $"{source}: cannot read: {problem.Message}", problem);
            }

            batch?.Add(records.Current with { Number = number });
            number++;
        }

        return true;
    }
}
