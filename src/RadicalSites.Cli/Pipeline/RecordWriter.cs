using System;
using RadicalSites.Cli.Output;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Computes one record and writes it in one format; belongs to one thread at a time.</summary>
internal abstract class RecordWriter : IDisposable
{
    /// <summary>Whether some record ran into a limit, which the exit code then says.</summary>
    internal bool ReachedLimit { get; set; }

    /// <summary>Computes and writes a record.</summary>
    internal abstract void Write(RecordSource source, Molecule molecule, PooledBuffer output);

    /// <summary>Writes the record of an input that could not be read.</summary>
    internal abstract void WriteProblem(RecordSource source, FormatProblem problem, PooledBuffer output);

    public void Dispose()
    {
        Dispose(true);
        GC.SuppressFinalize(this);
    }

    protected virtual void Dispose(bool disposing)
    {
    }
}
