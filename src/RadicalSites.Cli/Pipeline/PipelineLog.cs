using System;
using System.Collections.Generic;
using System.Diagnostics;
using System.Globalization;
using System.IO;
using RadicalSites.Cli.Input;
using RadicalSites.Diagnostics;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Messages of a run on standard error: failed records, and progress when a person watches.</summary>
internal sealed class PipelineLog(ToolHost host, InputSequence input, bool quiet, bool isSingle)
{
    private const long MillisecondsBetween = 250;
    private const int LongestMessage = 300;

    private readonly Stopwatch clock = Stopwatch.StartNew();
    private readonly bool showsProgress = host.ErrorIsTerminal && !quiet && !isSingle;
    private long nextUpdate = 1000;
    private bool hasLine;

    internal void Report(List<RecordFailure> failures)
    {
        foreach (RecordFailure failure in failures)
        {
            Clear();
            Say(isSingle ? "radicalsites: " + failure.Problem.Render() : OneLine(failure));
        }
    }

    internal void Progress(long records, long failed)
    {
        if (!showsProgress || clock.ElapsedMilliseconds < nextUpdate)
        {
            return;
        }

        nextUpdate = clock.ElapsedMilliseconds + MillisecondsBetween;
        double seconds = clock.Elapsed.TotalSeconds;
        double fraction = input.FractionRead;
        string rest = fraction is > 0 and <= 1
            ? string.Create(CultureInfo.InvariantCulture, $", {100 * fraction:0} %, {Span(seconds * (1 - fraction) / fraction)} left")
            : "";
        string text = string.Create(
            CultureInfo.InvariantCulture, $"\r{records:N0} records, {records / seconds:N0}/s, {failed:N0} failed{rest}   ");
        hasLine = true;
        Try(() => host.Error.Write(text));
    }

    internal void Clear()
    {
        if (hasLine)
        {
            hasLine = false;
            Try(() => host.Error.Write("\r" + new string(' ', 78) + "\r"));
        }
    }

    internal void Say(string message) => Try(() => host.Error.WriteLine(message));

    // record, line, code, message: one line however long the input was.
    private static string OneLine(RecordFailure failure)
    {
        FormatProblem problem = failure.Problem;
        string where = failure.Line == 0
            ? string.Create(CultureInfo.InvariantCulture, $"record {failure.Number}")
            : string.Create(
                CultureInfo.InvariantCulture,
                $"{failure.Source}: record {failure.Number}, line {(problem.Line > 0 ? problem.Line : failure.Line)}");
        string place = problem.Position < 0
            ? ""
            : string.Create(CultureInfo.InvariantCulture, $", position {problem.Position}");
        string message = problem.Message.Length > LongestMessage ? problem.Message[..LongestMessage] + "..." : problem.Message;
        return $"{where}{place}: {problem.Code}: {message.ReplaceLineEndings(" ")}";
    }

    private static string Span(double seconds) => seconds >= 3600
        ? string.Create(CultureInfo.InvariantCulture, $"{(int)(seconds / 3600)} h {(int)(seconds % 3600 / 60)} min")
        : string.Create(CultureInfo.InvariantCulture, $"{(int)(seconds / 60)}:{(int)(seconds % 60):00}");

    private static void Try(Action write)
    {
        try
        {
            write();
        }
        catch (IOException)
        {
            // Nobody reads the messages; the data and the exit code still count.
        }
    }
}
