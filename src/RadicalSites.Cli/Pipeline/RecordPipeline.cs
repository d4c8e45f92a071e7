using System;
using System.Collections.Concurrent;
using System.Collections.Generic;
using System.Threading;
using System.Threading.Tasks;
using RadicalSites.Cli.Input;
using RadicalSites.Cli.Output;

namespace RadicalSites.Cli.Pipeline;

/// <summary>
/// Reads, computes on several threads and writes in input order. A fixed number of batches goes round, so memory does not
/// grow with the input and a slow reader of the output slows the input down.
/// </summary>
internal sealed class RecordPipeline
{
    private readonly InputSequence input;
    private readonly OutputPlan plan;
    private readonly OutputTarget target;
    private readonly PipelineOptions options;
    private readonly PipelineLog log;
    private readonly CancellationToken cancellation;

    private long remaining;

    internal RecordPipeline(
        InputSequence input, OutputPlan plan, OutputTarget target, PipelineOptions options, long most,
        PipelineLog log, CancellationToken cancellation)
    {
        this.input = input;
        this.plan = plan;
        this.target = target;
        this.options = options;
        this.log = log;
        this.cancellation = cancellation;
        remaining = most;
        Records = target.RecordsBefore;
        Failed = target.FailedBefore;
    }

    /// <summary>Records written, those of an earlier run included.</summary>
    internal long Records { get; private set; }

    internal long Failed { get; private set; }

    internal bool HadInternalError { get; private set; }

    internal bool ReachedLimit { get; private set; }

    /// <summary>Whether it ended before the input because of an error, with <c>--on-error stop</c>.</summary>
    internal bool StoppedOnError { get; private set; }

    /// <summary>Whether it ended before the input because it was cancelled.</summary>
    internal bool Cancelled { get; private set; }

    internal void Run()
    {
        if (options.Threads == 1 && !input.ReadsStandardInput)
        {
            RunAlone();
        }
        else
        {
            RunParallel();
        }
    }

    private void RunAlone()
    {
        using RecordWriter writer = plan.CreateWriter();
        using var work = new BatchWork();
        while (!cancellation.IsCancellationRequested && ReadNext(work))
        {
            work.Compute(writer, options.StopOnError, cancellation);
            if (!Write(work))
            {
                return;
            }
        }

        Cancelled |= cancellation.IsCancellationRequested;
    }

    private void RunParallel()
    {
        int count = options.Threads * 4;
        using var free = new BlockingCollection<BatchWork>();
        using var toDo = new BlockingCollection<BatchWork>();
        using var inOrder = new BlockingCollection<BatchWork>();
        var works = new List<BatchWork>(count);
        for (int i = 0; i < count; i++)
        {
            works.Add(new BatchWork());
            free.Add(works[i]);
        }

        using var end = CancellationTokenSource.CreateLinkedTokenSource(cancellation);
        Task reading = Start(() => ReadAll(free, toDo, inOrder, end.Token));
        var workers = new Task[options.Threads];
        for (int i = 0; i < workers.Length; i++)
        {
            workers[i] = Start(() => ComputeAll(toDo, end.Token));
        }

        try
        {
            while (TakeNext(inOrder) is { } work)
            {
                work.Done.Wait(CancellationToken.None);
                bool goesOn = Write(work);
                free.Add(work, CancellationToken.None);
                if (!goesOn)
                {
                    break;
                }
            }

            Cancelled |= cancellation.IsCancellationRequested && !StoppedOnError;
        }
        finally
        {
            // A reader that waits for standard input is left behind; the process ends without it.
            end.Cancel();
            toDo.CompleteAdding();
            Task.WaitAll(workers, CancellationToken.None);
            Join(reading);
            foreach (BatchWork work in works)
            {
                work.Dispose();
            }
        }
    }

    private void ReadAll(
        BlockingCollection<BatchWork> free, BlockingCollection<BatchWork> toDo, BlockingCollection<BatchWork> inOrder,
        CancellationToken end)
    {
        try
        {
            while (!end.IsCancellationRequested)
            {
                BatchWork work = free.Take(end);
                if (!ReadNext(work))
                {
                    break;
                }

                // What the writer waits for is always on its way through the workers.
                toDo.Add(work, end);
                inOrder.Add(work, end);
            }
        }
        catch (Exception problem)
            when (end.IsCancellationRequested && problem is OperationCanceledException or InvalidOperationException)
        {
            // The writer has stopped and closed the queues.
        }
        finally
        {
            inOrder.CompleteAdding();
            toDo.CompleteAdding();
        }
    }

    // After a cancellation what is finished is still written; a reader that waits for its input is not waited for.
    private BatchWork? TakeNext(BlockingCollection<BatchWork> inOrder)
    {
        try
        {
            return inOrder.TryTake(out BatchWork? work, Timeout.Infinite, cancellation) ? work : null;
        }
        catch (OperationCanceledException)
        {
            return inOrder.TryTake(out BatchWork? work) ? work : null;
        }
    }

    private void ComputeAll(BlockingCollection<BatchWork> toDo, CancellationToken end)
    {
        using RecordWriter writer = plan.CreateWriter();
        foreach (BatchWork work in toDo.GetConsumingEnumerable(CancellationToken.None))
        {
            try
            {
                work.Compute(writer, options.StopOnError, end);
            }
            finally
            {
                work.Done.Set();
            }
        }
    }

    private bool ReadNext(BatchWork work)
    {
        work.Reset();
        if (remaining <= 0 || !input.Read(work.Batch, remaining))
        {
            return false;
        }

        remaining -= work.Batch.Count;
        return true;
    }

    // Returns whether the next batch may follow.
    private bool Write(BatchWork work)
    {
        log.Report(work.Failures);
        Records += work.Completed;
        Failed += work.Failures.Count;
        HadInternalError |= work.HadInternalError;
        ReachedLimit |= work.ReachedLimit;
        target.Write(work.Output.Written, Records, Failed);
        log.Progress(Records, Failed);
        if (options.StopOnError && work.Failures.Count > 0)
        {
            StoppedOnError = true;
            return false;
        }

        return work.Completed == work.Batch.Count;
    }

    private static Task Start(Action action) =>
        Task.Factory.StartNew(action, CancellationToken.None, TaskCreationOptions.LongRunning, TaskScheduler.Default);

    private void Join(Task reading)
    {
        try
        {
            if (reading.Wait(options.ReaderGrace, CancellationToken.None))
            {
                reading.GetAwaiter().GetResult();
            }
        }
        catch (AggregateException problems)
        {
            System.Runtime.ExceptionServices.ExceptionDispatchInfo.Throw(problems.InnerException!);
        }
    }
}
