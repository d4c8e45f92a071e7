using System;

namespace RadicalSites.Cli.Output;

/// <summary>Where the data goes: a stream, or a file that appears only when it is whole.</summary>
internal abstract class OutputTarget : IDisposable
{
    /// <summary>Records that the target holds already from an earlier, interrupted run.</summary>
    internal virtual long RecordsBefore => 0;

    /// <summary>Failed ones among them.</summary>
    internal virtual long FailedBefore => 0;

    /// <summary>Whether the header is still to be written.</summary>
    internal virtual bool IsEmpty => true;

    public void Dispose()
    {
        Dispose(true);
        GC.SuppressFinalize(this);
    }

    /// <summary>Writes whole records.</summary>
    /// <param name="data">The bytes.</param>
    /// <param name="records">Records so far, these included.</param>
    /// <param name="failed">Failed ones among them.</param>
    internal abstract void Write(ReadOnlySpan<byte> data, long records, long failed);

    /// <summary>Ends a complete output.</summary>
    internal abstract void Complete();

    /// <summary>Ends an output that is not complete; what helps to resume stays.</summary>
    /// <returns>What the user can do now, or <see langword="null"/>.</returns>
    internal abstract string? Abandon();

    protected virtual void Dispose(bool disposing)
    {
    }

    protected static ToolException Failure(string name, Exception problem) => new(
        ExitCode.InputOutput,
        problem.Message.Contains("Broken pipe", StringComparison.OrdinalIgnoreCase)
            ? $"{name}: the reader has closed the pipe; the rest of the output is lost."
            : $"{name}: cannot write: {problem.Message}", problem);
}
