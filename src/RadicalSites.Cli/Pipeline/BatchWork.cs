using System;
using System.Collections.Generic;
using System.Text;
using System.Threading;
using RadicalSites.Cli.Input;
using RadicalSites.Cli.Output;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Formats.Streams;
using RadicalSites.Molecules;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Pipeline;

/// <summary>One batch on its way through the pipeline: records in, bytes out.</summary>
internal sealed class BatchWork : IDisposable
{
    /// <summary>Longest SMILES that is read, in characters; a longer one is a failed record.</summary>
    internal const int LongestSmiles = 1 << 20;

    private static readonly UTF8Encoding Strict = new(false, throwOnInvalidBytes: true);

    internal RecordBatch Batch { get; } = new();

    internal PooledBuffer Output { get; } = new();

    internal List<RecordFailure> Failures { get; } = [];

    /// <summary>Records written; fewer than the batch holds when the work was stopped.</summary>
    internal int Completed { get; private set; }

    /// <summary>Whether a mistake of the program was met.</summary>
    internal bool HadInternalError { get; private set; }

    internal bool ReachedLimit { get; private set; }

    internal ManualResetEventSlim Done { get; } = new(false);

    public void Dispose() => Done.Dispose();

    internal void Reset()
    {
        Output.Clear();
        Failures.Clear();
        Completed = 0;
        HadInternalError = false;
        ReachedLimit = false;
        Done.Reset();
    }

    /// <summary>Computes the records one by one; stops after the current one when asked to.</summary>
    internal void Compute(RecordWriter writer, bool stopOnError, CancellationToken cancellation)
    {
        for (int i = 0; i < Batch.Count && !cancellation.IsCancellationRequested; i++)
        {
            int before = Output.Length;
            bool isOk;
            try
            {
                isOk = Compute(writer, i);
            }
            catch (OperationCanceledException) when (cancellation.IsCancellationRequested)
            {
                // A long calculation gives up in its middle; the record is not done.
                Output.Truncate(before);
                return;
            }

            Completed++;
            if (!isOk && stopOnError)
            {
                return;
            }
        }
    }

    private bool Compute(RecordWriter writer, int index)
    {
        int before = Output.Length;
        bool isLine = Batch.Format == InputFormat.Smiles;
        long number = isLine ? Batch.Records[index].Number : Batch.Blocks[index].Number;
        RecordSource source = new(number, null, null);
        FormatProblem? problem = null;
        try
        {
            Molecule? molecule = isLine
                ? ReadSmiles(Batch.Records[index], ref source, out problem)
                : ReadBlock(Batch.Blocks[index], ref source, out problem);
            if (molecule is not null)
            {
                writer.Write(source, molecule, Output);
                ReachedLimit |= writer.ReachedLimit;
                writer.ReachedLimit = false;
                return true;
            }
        }
        catch (MoleculeFormatException refusal)
        {
            problem = refusal.Problem;
        }
#pragma warning disable CA1031 // One record that trips over a mistake of the program must not take the others with it.
        catch (Exception mistake) when (mistake is not (ToolException or OperationCanceledException))
#pragma warning restore CA1031
        {
            HadInternalError = true;
            problem = new FormatProblem
            {
                Descriptor = ProblemCatalogue.General.Internal,
                Message = ProblemCatalogue.General.Internal.Format($"{mistake.GetType().Name}: {mistake.Message}"),
            };
        }

        Output.Truncate(before);
        Failures.Add(new RecordFailure(
            number, isLine ? Batch.Records[index].Line : Batch.Blocks[index].FirstLine, Batch.Source, problem!));
        writer.WriteProblem(source, problem!, Output);
        return false;
    }

    private Molecule? ReadSmiles(Input.RawRecord record, ref RecordSource source, out FormatProblem? problem)
    {
        string line = Decode(Batch.BytesOf(record));
        int end = line.AsSpan().IndexOfAny(' ', '\t');
        string smiles = end < 0 ? line : line[..end];
        string? name = end < 0 ? null : line.AsSpan(end).Trim(" \t").ToString();
        bool isTooLong = smiles.Length > LongestSmiles;
        source = new RecordSource(record.Number, isTooLong ? smiles[..80] + "..." : smiles, string.IsNullOrEmpty(name) ? null : name);
        if (isTooLong)
        {
            problem = new FormatProblem
            {
                Descriptor = ProblemCatalogue.Smiles.TooLong,
                Message = ProblemCatalogue.Smiles.TooLong.Format(smiles.Length, LongestSmiles),
                Position = LongestSmiles,
            };
            return null;
        }

        return SmilesReader.TryParse(smiles, out Molecule? molecule, out problem) ? molecule : null;
    }

    private static Molecule? ReadBlock(
        Formats.Streams.RawRecord record, ref RecordSource source, out FormatProblem? problem)
    {
        InputRecord read = RecordReader.Parse(record);
        source = new RecordSource(record.Number, null, read.Name) { Remarks = read.Remarks };
        problem = read.Problem;
        return read.Molecule;
    }

    // Old files carry names in Latin-1; reading them as such loses nothing.
    private static string Decode(ReadOnlySpan<byte> bytes)
    {
        try
        {
            return Strict.GetString(bytes);
        }
        catch (DecoderFallbackException)
        {
            return Encoding.Latin1.GetString(bytes);
        }
    }
}
