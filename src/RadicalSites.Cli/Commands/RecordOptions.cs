using System;
using System.CommandLine;
using System.Globalization;
using System.Text;
using RadicalSites.Cli.Pipeline;

namespace RadicalSites.Cli.Commands;

/// <summary>Options of every command that works on records.</summary>
internal sealed class RecordOptions
{
    private readonly Argument<string[]> inputs = new("INPUT")
    {
        Description = "SMILES, or a file (.smi, .smiles, also .gz), or - for standard input (SMILES, white space, name).",
        Arity = ArgumentArity.ZeroOrMore,
    };

    private readonly Option<string> format;

    private readonly Option<string?> output = new("--output") { Description = "Write to this file; it appears under its name when complete." };
    private readonly Option<string> onError = new("--on-error")
    {
        Description = "What to do after a record that cannot be read: continue or stop.",
        DefaultValueFactory = static _ => "continue",
    };

    private readonly Option<int> threads = new("--threads") { Description = "Threads; 0 = one for each core.", DefaultValueFactory = static _ => 1 };
    private readonly Option<long?> limit = new("--limit") { Description = "Stop after this many records (exit code 4 when there are more)." };
    private readonly Option<string?> shard = new("--shard") { Description = "Part K of N by record number, as K/N; outputs joined in order equal one run." };
    private readonly Option<bool> resume = new("--resume") { Description = "Go on after the last complete record of an interrupted run with --output." };
    private readonly Option<bool> quiet = new("--quiet") { Description = "No progress on standard error." };
    private readonly Option<bool> noColor = new("--no-color") { Description = "No colour (the tool uses none)." };

    internal RecordOptions(params string[] formats)
    {
        format = new Option<string>("--format")
        {
            Description = "Output: " + string.Join(", ", formats) + ".",
            DefaultValueFactory = _ => formats[0],
        };
        format.AcceptOnlyFromAmong(formats);
        onError.AcceptOnlyFromAmong("continue", "stop");
    }

    internal void AddTo(Command command)
    {
        command.Arguments.Add(inputs);
        foreach (Option option in (Option[])[format, output, onError, threads, limit, shard, resume, quiet, noColor])
        {
            command.Options.Add(option);
        }
    }

    internal PipelineOptions Read(ParseResult parsed, ToolHost host)
    {
        string[] given = parsed.GetValue(inputs) ?? [];
        if (given.Length == 0)
        {
            given = host.InputIsTerminal
                ? throw new ToolException(ExitCode.WrongUsage, "no input: give a SMILES, a file, or - for standard input.")
                : ["-"];
        }

        int count = parsed.GetValue(threads);
        if (count is < 0 or > 1024)
        {
            throw new ToolException(ExitCode.WrongUsage, "--threads takes 0 to 1024.");
        }

        long? most = parsed.GetValue(limit);
        if (most is < 0)
        {
            throw new ToolException(ExitCode.WrongUsage, "--limit takes a number of records, 0 or more.");
        }

        return new PipelineOptions
        {
            Inputs = given,
            Format = Enum.Parse<OutputFormat>(parsed.GetValue(format)!, ignoreCase: true),
            OutputFile = parsed.GetValue(output),
            StopOnError = parsed.GetValue(onError) == "stop",
            Threads = count == 0 ? Environment.ProcessorCount : count,
            Limit = most ?? long.MaxValue,
            Shard = ReadShard(parsed.GetValue(shard)),
            Resume = parsed.GetValue(resume),
            Quiet = parsed.GetValue(quiet),
        };
    }

    internal static int Run(ToolHost host, PipelineOptions options, Func<InputRecord, Rendered> render, string header) =>
        new RecordPipeline(host, options, render, Encoding.UTF8.GetBytes(header)).Run();

    private static (int Part, int Parts)? ReadShard(string? text)
    {
        if (text is null)
        {
            return null;
        }

        string[] parts = text.Split('/');
        return parts.Length == 2 && int.TryParse(parts[0], NumberStyles.None, CultureInfo.InvariantCulture, out int part)
            && int.TryParse(parts[1], NumberStyles.None, CultureInfo.InvariantCulture, out int all) && part >= 1 && part <= all
            ? (part, all)
            : throw new ToolException(ExitCode.WrongUsage, $"--shard takes K/N with 1 <= K <= N, not '{text}'.");
    }
}
