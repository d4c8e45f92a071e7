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
        foreach (Input.RawRecord record in Batch.Records)
        {
            if (cancellation.IsCancellationRequested)
            {
                return;
            }

            int before = Output.Length;
            bool isOk;
            try
            {
                isOk = Compute(writer, record);
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

    private bool Compute(RecordWriter writer, Input.RawRecord record)
    {
        int before = Output.Length;
        RecordSource source = new(record.Number, null, null);
        FormatProblem? problem = null;
        try
        {
            Molecule? molecule = Batch.Format == RecordFormat.Smiles
                ? ReadSmiles(record, ref source, out problem)
                : ReadBlock(record, ref source, out problem);
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
        Failures.Add(new RecordFailure(record.Number, record.Line, Batch.Source, problem!));
        writer.WriteProblem(source, problem!, Output);
        return false;
    }

    private Molecule? ReadSmiles(Input.RawRecord record, ref RecordSource source, out FormatProblem? problem)
    {
        string line = Decode(Batch.BytesOf(record));
        int end = line.AsSpan().IndexOfAny(' ', '\t');
        string smiles = end < 0 ? line : line[..end];
        string? name = end < 0 ? null : line.AsSpan(end).Trim(" \t").ToString();
        source = new RecordSource(record.Number, smiles, string.IsNullOrEmpty(name) ? null : name);
        return SmilesReader.TryParse(smiles, out Molecule? molecule, out problem) ? molecule : null;
    }

    private Molecule? ReadBlock(Input.RawRecord record, ref RecordSource source, out FormatProblem? problem)
    {
        string text = Decode(Batch.BytesOf(record));
        InputRecord block = RecordReader.Parse(new Formats.Streams.RawRecord
        {
            Number = record.Number,
            FirstLine = record.Line,
            LastLine = record.Line,
            Format = InputFormat.Sdf,
            Text = text,
        });
        source = new RecordSource(record.Number, null, block.Name);
        problem = block.Problem;
        return block.Molecule;
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
