using System;
using System.Globalization;
using System.Linq;
using System.Text;
using RadicalSites.Cli.Input;
using RadicalSites.Cli.Output;
using RadicalSites.Diagnostics;

namespace RadicalSites.Cli.Pipeline;

/// <summary>One run of a command over records: which part of the input, where to, and what came of it.</summary>
internal sealed class RecordRun(ToolHost host, PipelineOptions options, OutputPlan plan, string dataVersion)
{
    /// <summary>Runs to the end of the input, a limit, an error that stops, or a signal.</summary>
    /// <returns>The exit code.</returns>
    internal int Run()
    {
        (long from, long most, bool isCut) = Selection();
        using var input = new InputSequence(options.Inputs);
        using OutputTarget target = options.OutputFile is { } path
            ? FileTarget.Open(path, Job(), options.Resume)
            : new StreamTarget(host.Output, "standard output", owned: false);
        long skip = from + target.RecordsBefore;
        if (input.Skip(skip) < skip)
        {
            throw new ToolException(
                ExitCode.InputOutput, "the input has fewer records than the unfinished output; it is not the same input.");
        }

        if (target.IsEmpty && plan.Header.Length > 0 && options.Shard is not { Part: > 1 })
        {
            target.Write(Encoding.UTF8.GetBytes(plan.Header), 0, 0);
        }

        var log = new PipelineLog(host, input, options.Quiet, options.IsSingle);
        var pipeline = new RecordPipeline(input, plan, target, options, most - target.RecordsBefore, log, host.Cancellation);
        try
        {
            pipeline.Run();
        }
        finally
        {
            log.Clear();
        }

        return Finish(pipeline, target, log, isCut || IsCut(input, pipeline, most));
    }

    // First record (from 0) and number of records of this run, and whether the limit leaves some out.
    private (long From, long Most, bool IsCut) Selection()
    {
        if (options.Shard is not { } shard)
        {
            return (0, options.Limit, false);
        }

        // Contiguous blocks, so that the outputs joined in order are the output of one run.
        using var counting = new InputSequence(options.Inputs);
        long all = counting.Skip(long.MaxValue);
        long count = Math.Min(all, options.Limit);
        long from = (long)((Int128)count * (shard.Part - 1) / shard.Parts);
        long to = (long)((Int128)count * shard.Part / shard.Parts);
        return (from, to - from, all > count);
    }

    private bool IsCut(InputSequence input, RecordPipeline pipeline, long most) =>
        options.Shard is null && pipeline.Records >= most && !host.Cancellation.IsCancellationRequested && input.Skip(1) > 0;

    private int Finish(RecordPipeline pipeline, OutputTarget target, PipelineLog log, bool isCut)
    {
        if (pipeline.Cancelled || pipeline.StoppedOnError)
        {
            log.Say(string.Create(
                CultureInfo.InvariantCulture,
                $"radicalsites: {(pipeline.Cancelled ? "interrupted" : "stopped at an error")} after {pipeline.Records} records."));
            if (target.Abandon() is { } advice)
            {
                log.Say("  " + advice);
            }
        }
        else
        {
            target.Complete();
            if (isCut)
            {
                log.Say("radicalsites: " + ProblemCatalogue.General.LimitReached.Format(options.Limit, "records"));
            }
        }

        if (pipeline.Failed > 0 && !options.IsSingle)
        {
            log.Say(string.Create(CultureInfo.InvariantCulture, $"radicalsites: {pipeline.Failed} of {pipeline.Records} records failed."));
        }

        return pipeline.HadInternalError ? ExitCode.Internal
            : pipeline.Cancelled ? ExitCode.LimitOrCancelled
            : pipeline.Failed > 0 ? ExitCode.SomeFailed
            : isCut || pipeline.ReachedLimit ? ExitCode.LimitOrCancelled
            : ExitCode.Done;
    }

    private string Job() => string.Join(
        '\n',
        (string[])
        [
            typeof(RecordRun).Assembly.GetName().Version?.ToString() ?? "", dataVersion, options.Job,
            .. options.Inputs.Select(static item => item.Name + "|" + item.StoredLength?.ToString(CultureInfo.InvariantCulture)),
        ]);
}
