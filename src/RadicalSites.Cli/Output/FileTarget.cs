using System;
using System.IO;

namespace RadicalSites.Cli.Output;

/// <summary>
/// A file written under a temporary name beside its final one and renamed when it is whole; a journal beside it says how
/// far it is, so that an interrupted run can go on.
/// </summary>
internal sealed class FileTarget : OutputTarget
{
    private readonly string path;
    private readonly FileStream part;
    private readonly OutputJournal journal;

    private FileTarget(string path, FileStream part, OutputJournal journal)
    {
        this.path = path;
        this.part = part;
        this.journal = journal;
    }

    internal override long RecordsBefore => journal.Records;

    internal override long FailedBefore => journal.Failed;

    internal override bool IsEmpty => journal.Length == 0;

    internal static string PartOf(string path) => path + ".part";

    internal static string JournalOf(string path) => path + ".journal";

    /// <summary>Opens the target.</summary>
    /// <param name="path">The final name.</param>
    /// <param name="job">What decides the bytes of the output; an unfinished output of another job is refused.</param>
    /// <param name="resume">Whether to go on where an interrupted run has stopped.</param>
    internal static OutputTarget Open(string path, string job, bool resume)
    {
        if (Directory.Exists(path))
        {
            throw new ToolException(ExitCode.InputOutput, $"{path} is a folder, not a file.");
        }

        try
        {
            if (OpenUnrenamable(path) is { } device)
            {
                return new StreamTarget(device, path, true);
            }

            var part = new FileStream(
                PartOf(path), resume ? FileMode.OpenOrCreate : FileMode.Create, FileAccess.ReadWrite, FileShare.None, 0);
            try
            {
                OutputJournal journal = OutputJournal.Open(JournalOf(path), job, part, resume);
                return new FileTarget(path, part, journal);
            }
            catch
            {
                part.Dispose();
                throw;
            }
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            throw Failure(path, problem);
        }
    }

    // Devices and named pipes are written to in place; nothing can be renamed to them.
    private static FileStream? OpenUnrenamable(string path)
    {
        if (!File.Exists(path))
        {
            return null;
        }

        var stream = new FileStream(path, FileMode.Open, FileAccess.Write, FileShare.ReadWrite, 0);
        if (!stream.CanSeek || Path.GetFullPath(path).StartsWith("/dev/", StringComparison.Ordinal))
        {
            return stream;
        }

        stream.Dispose();
        return null;
    }

    internal override void Write(ReadOnlySpan<byte> data, long records, long failed)
    {
        try
        {
            part.Write(data);
            journal.Add(data, records, failed);
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            throw Failure(path, problem);
        }
    }

    internal override void Complete()
    {
        try
        {
            // On disk before the name says that it is whole.
            part.Flush(flushToDisk: true);
            part.Dispose();
            File.Move(PartOf(path), path, overwrite: true);
            journal.Delete();
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            throw Failure(path, problem);
        }
    }

    internal override string? Abandon() =>
        $"what is done so far is in {PartOf(path)}; the same command with --resume goes on from there.";

    protected override void Dispose(bool disposing)
    {
        part.Dispose();
        journal.Dispose();
        base.Dispose(disposing);
    }
}
