using System;
using System.Globalization;
using System.IO;
using System.Linq;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Where records go: standard output, or a file written beside its final name and renamed at the end.</summary>
/// <remarks>
/// A journal beside the unfinished file notes after each block how many records and bytes are complete. After a crash
/// <c>--resume</c> cuts the file back to the last note that it still holds and goes on from there, so the finished file
/// has the same bytes as one made in a single run.
/// </remarks>
internal sealed class OutputTarget : IDisposable
{
    private readonly Stream stream;
    private readonly string? path;
    private readonly StreamWriter? journal;
    private long length;

    private OutputTarget(Stream stream, string? path, StreamWriter? journal, long recordsDone, long length)
    {
        this.stream = stream;
        this.path = path;
        this.journal = journal;
        this.length = length;
        RecordsDone = recordsDone;
    }

    /// <summary>Records that an earlier run completed.</summary>
    internal long RecordsDone { get; }

    internal static OutputTarget Open(ToolHost host, PipelineOptions options)
    {
        if (options.OutputFile is not { } path)
        {
            return options.Resume
                ? throw new ToolException(ExitCode.WrongUsage, "--resume needs --output FILE.")
                : new OutputTarget(new BufferedStream(host.Output, 1 << 16), null, null, 0, 0);
        }

        string part = PartOf(path);
        string notes = JournalOf(path);
        (long records, long bytes) = options.Resume && File.Exists(part) ? LastNote(notes, new FileInfo(part).Length) : (0, 0);
        var file = new FileStream(part, bytes > 0 ? FileMode.Open : FileMode.Create, FileAccess.Write, FileShare.Read, 1 << 16);
        file.SetLength(bytes);
        file.Position = bytes;
        var journal = new StreamWriter(notes, append: false);
        if (bytes > 0)
        {
            journal.Write(Note(records, bytes));
            journal.Flush();
        }

        return new OutputTarget(file, path, journal, records, bytes);
    }

    internal void Write(byte[] bytes)
    {
        try
        {
            stream.Write(bytes);
        }
        catch (IOException error)
        {
            throw new ToolException(ExitCode.InputOutput, $"cannot write the output: {error.Message}");
        }

        length += bytes.Length;
    }

    /// <summary>Notes that all records up to a number are written.</summary>
    internal void Commit(long records)
    {
        Flush();
        if (journal is not null)
        {
            journal.Write(Note(records, length));
            journal.Flush();
        }
    }

    /// <summary>Gives the file its final name when the run is complete; otherwise leaves it for <c>--resume</c>.</summary>
    internal void Finish(bool complete)
    {
        Flush();
        if (path is null || !complete)
        {
            return;
        }

        stream.Dispose();
        journal!.Dispose();
        File.Move(PartOf(path), path, overwrite: true);
        File.Delete(JournalOf(path));
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        if (path is not null)
        {
            stream.Dispose();
            journal?.Dispose();
        }
    }

    private static string PartOf(string path) => path + ".part";

    private static string JournalOf(string path) => path + ".part.journal";

    private static string Note(long records, long bytes) => string.Create(CultureInfo.InvariantCulture, $"{records} {bytes} .\n");

    // The last complete note whose bytes the file still has.
    private static (long Records, long Bytes) LastNote(string path, long available)
    {
        if (!File.Exists(path))
        {
            return (0, 0);
        }

        foreach (string line in File.ReadLines(path).Reverse())
        {
            string[] parts = line.Split(' ');
            if (parts.Length == 3 && parts[2] == "."
                && long.TryParse(parts[0], NumberStyles.None, CultureInfo.InvariantCulture, out long records)
                && long.TryParse(parts[1], NumberStyles.None, CultureInfo.InvariantCulture, out long bytes) && bytes <= available)
            {
                return (records, bytes);
            }
        }

        return (0, 0);
    }

    private void Flush()
    {
        try
        {
            stream.Flush();
        }
        catch (IOException error)
        {
            throw new ToolException(ExitCode.InputOutput, $"cannot write the output: {error.Message}");
        }
    }
}
