using System;
using System.Collections.Generic;
using System.Diagnostics;
using System.Globalization;
using System.Linq;
using System.Threading.Tasks;
using RadicalSites.Diagnostics;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Reads records in blocks, renders each block on several threads, writes it in order: constant memory, one order.</summary>
internal sealed class RecordPipeline(ToolHost host, PipelineOptions options, Func<InputRecord, Rendered> render, byte[] header)
{
    private const int BlockSize = 512;

    private readonly Stopwatch clock = Stopwatch.StartNew();
    private TimeSpan lastReport = TimeSpan.Zero;
    private long done;
    private long failed;

    /// <summary>Runs to the end of the input, a limit, an error that stops, or a signal.</summary>
    /// <returns>The exit code.</returns>
    internal int Run()
    {
        using var output = OutputTarget.Open(host, options);
        long skip = output.RecordsDone;
        done = skip;
        bool first = options.Shard is not { Part: > 1 };
        if (skip == 0 && first && header.Length > 0)
        {
            output.Write(header);
        }

        bool limited = false;
        bool stopped = false;
        var block = new List<RawRecord>(BlockSize);
        using IEnumerator<RawRecord> records = Selected().GetEnumerator();
        long position = 0;
        while (!stopped && !host.Cancellation.IsCancellationRequested)
        {
            block.Clear();
            while (block.Count < BlockSize && records.MoveNext())
            {
                if (position >= options.Limit)
                {
                    limited = true;
                    break;
                }

                if (position++ >= skip)
                {
                    block.Add(records.Current);
                }
            }

            if (block.Count == 0 && (limited || position >= skip))
            {
                break;
            }

            stopped = WriteBlock(output, Render(block));
            output.Commit(done);
            Report(final: false);
            if (limited)
            {
                break;
            }
        }

        Report(final: true);
        bool cancelled = host.Cancellation.IsCancellationRequested;
        output.Finish(complete: !cancelled && !stopped);
        if (cancelled)
        {
            host.Error.Write($"radicalsites: interrupted after {done.ToString(CultureInfo.InvariantCulture)} records.\n");
        }

        return cancelled || limited ? ExitCode.LimitOrCancelled : failed > 0 ? ExitCode.SomeFailed : ExitCode.Done;
    }

    private IEnumerable<RawRecord> Selected()
    {
        if (options.Shard is not { } shard)
        {
            return RecordInput.Read(options.Inputs, host);
        }

        if (options.Inputs.Contains("-"))
        {
            throw new ToolException(ExitCode.WrongUsage, "--shard needs files: standard input cannot be counted beforehand.");
        }

        // Contiguous blocks of record numbers, so that the outputs joined in order are the output of one run.
        long count = RecordInput.Read(options.Inputs, host).LongCount();
        long from = count * (shard.Part - 1) / shard.Parts;
        long to = count * shard.Part / shard.Parts;
        return RecordInput.Read(options.Inputs, host).Where(record => record.Number > from && record.Number <= to);
    }

    private Rendered[] Render(List<RawRecord> block)
    {
        var rendered = new Rendered[block.Count];
        if (options.Threads == 1 || block.Count == 1)
        {
            for (int i = 0; i < rendered.Length; i++)
            {
                rendered[i] = render(RecordInput.Parse(block[i]));
            }
        }
        else
        {
            Parallel.For(
                0, rendered.Length, new ParallelOptions { MaxDegreeOfParallelism = options.Threads },
                i => rendered[i] = render(RecordInput.Parse(block[i])));
        }

        return rendered;
    }

    // Returns whether to stop.
    private bool WriteBlock(OutputTarget output, Rendered[] rendered)
    {
        foreach (Rendered record in rendered)
        {
            output.Write(record.Bytes);
            done++;
            if (record.Problem is { } problem)
            {
                failed++;
                Complain(record.Record, problem);
                if (options.StopOnError)
                {
                    return true;
                }
            }
        }

        return false;
    }

    private void Complain(InputRecord record, FormatProblem problem)
    {
        if (options.OutputFile is null && record.Line == 0)
        {
            // A SMILES given as an argument: the whole message with its caret.
            host.Error.Write(problem.Render() + "\n");
            return;
        }

        string place = problem.Position >= 0 ? string.Create(CultureInfo.InvariantCulture, $", position {problem.Position}") : "";
        host.Error.Write(string.Create(
            CultureInfo.InvariantCulture,
            $"record {record.Source.Number}, line {record.Line}{place}: {problem.Code}: {problem.Message}\n"));
    }

    private void Report(bool final)
    {
        if (options.Quiet || !host.ErrorIsTerminal || RecordInput.IsSingleArgument(options.Inputs))
        {
            return;
        }

        if (!final && clock.Elapsed - lastReport < TimeSpan.FromMilliseconds(500))
        {
            return;
        }

        lastReport = clock.Elapsed;
        double rate = done / Math.Max(1e-9, clock.Elapsed.TotalSeconds);
        host.Error.Write(string.Create(CultureInfo.InvariantCulture, $"\r{done} records, {failed} failed, {rate:F0} records/s   "));
        if (final)
        {
            host.Error.Write("\n");
        }
    }
}
