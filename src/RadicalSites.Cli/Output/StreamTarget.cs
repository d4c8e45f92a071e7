using System;
using System.IO;

namespace RadicalSites.Cli.Output;

/// <summary>Standard output, or a device that is no regular file.</summary>
internal sealed class StreamTarget(Stream stream, string name, bool owned) : OutputTarget
{
    internal override void Write(ReadOnlySpan<byte> data, long records, long failed)
    {
        try
        {
            stream.Write(data);
            stream.Flush();
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            throw Failure(name, problem);
        }
    }

    internal override void Complete()
    {
        try
        {
            stream.Flush();
        }
        catch (IOException problem)
        {
            throw Failure(name, problem);
        }
    }

    internal override string? Abandon() => null;

    protected override void Dispose(bool disposing)
    {
        if (owned)
        {
            stream.Dispose();
        }

        base.Dispose(disposing);
    }
}
