using System;
using System.Collections.Generic;
using System.CommandLine;
using System.Globalization;
using System.Linq;
using RadicalSites.Cli.Input;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Formats.Streams;

namespace RadicalSites.Cli.Commands;

/// <summary>Options of every command that works on records.</summary>
internal sealed class RecordOptions
{
    private readonly Argument<string[]> inputs = new("INPUT")
    {
        Description = "SMILES, or a file (.smi, .smiles, .mol, .sdf, also .gz), or - for standard input. A line of .smi is SMILES, white space, optional name.",
        Arity = ArgumentArity.ZeroOrMore,
    };

    private static readonly Dictionary<string, InputFormat> FormatNames = new()
    {
        ["smi"] = InputFormat.Smiles, ["mol"] = InputFormat.Molfile, ["sdf"] = InputFormat.Sdf,
    };

    private readonly string[] formats;
    private readonly Option<string> format;

    private readonly Option<string?> inputFormat = new("--input-format") { Description = "Format of inputs whose name does not say it: smi, mol or sdf; smi when not given." };

    private readonly Option<string?> output = new("--output") { Description = "Write to this file; it gets its name when it is whole. Its ending decides the format when --format is not given." };
    private readonly Option<string> onError = new("--on-error")
    {
        Description = "After a record that cannot be read: continue or stop.",
        DefaultValueFactory = static _ => "continue",
    };

    private readonly Option<int> threads = new("--threads") { Description = "Threads; one for each core when not given. The output does not depend on it." };
    private readonly Option<long?> limit = new("--limit") { Description = "Stop after this many records; exit code 4 when there are more." };
    private readonly Option<string?> shard = new("--shard") { Description = "Part K of N by record number, as K/N; outputs joined in order equal one run." };
    private readonly Option<bool> resume = new("--resume") { Description = "Go on after the last complete record of an interrupted run with --output." };
    private readonly Option<bool> quiet = new("--quiet") { Description = "No progress on standard error; failures are still reported." };
    private readonly Option<bool> noColor = new("--no-color") { Description = "No colour; output is plain text in any case." };

    internal RecordOptions(params string[] formats)
    {
        this.formats = formats;
        inputFormat.AcceptOnlyFromAmong([.. FormatNames.Keys]);
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
        foreach (Option option in (Option[])[format, inputFormat, output, onError, threads, limit, shard, resume, quiet, noColor])
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

        InputFormat? forced = parsed.GetValue(inputFormat) is { } name ? FormatNames[name] : null;
        InputItem[] items = Array.ConvertAll(given, text => ReadInput(text, forced, host, parsed));
        if (items.Count(static item => item.IsStandardInput) > 1)
        {
            throw new ToolException(ExitCode.WrongUsage, "standard input (-) can be read once only.");
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

        string? file = parsed.GetValue(output);
        if (parsed.GetValue(resume) && file is null)
        {
            throw new ToolException(ExitCode.WrongUsage, "--resume needs --output FILE.");
        }

        (int Part, int Parts)? part = ReadShard(parsed.GetValue(shard));
        if (part is not null && items.Any(static item => item.IsStandardInput))
        {
            throw new ToolException(
                ExitCode.WrongUsage, "--shard needs files: the records of standard input cannot be counted beforehand.");
        }

        return new PipelineOptions
        {
            Inputs = items,
            Format = ReadFormat(parsed, file),
            OutputFile = file,
            StopOnError = parsed.GetValue(onError) == "stop",
            Threads = items.All(static item => item.IsArgument) ? 1 : count == 0 ? Environment.ProcessorCount : count,
            Limit = most ?? long.MaxValue,
            Shard = part,
            Resume = parsed.GetValue(resume),
            Quiet = parsed.GetValue(quiet),
            Job = JobOf(parsed),
        };
    }

    private static InputItem ReadInput(string text, InputFormat? forced, ToolHost host, ParseResult parsed)
    {
        // No SMILES starts with a hyphen, so this is a mistyped option.
        if (text.Length > 1 && text[0] == '-')
        {
            string? near = parsed.CommandResult.Command.Options.Select(static option => option.Name)
                .FirstOrDefault(name => name.StartsWith(text[..Math.Min(text.Length, 5)], StringComparison.Ordinal));
            throw new ToolException(
                ExitCode.WrongUsage, $"there is no option '{text}'{(near is null ? "" : $"; did you mean {near}?")}");
        }

        return InputItem.Of(text, forced, host.Input);
    }

    // Without --format the ending of the output file decides, then the default of the command.
    private OutputFormat ReadFormat(ParseResult parsed, string? file)
    {
        if (parsed.GetResult(format) is { Implicit: false } || file is null)
        {
            return Enum.Parse<OutputFormat>(parsed.GetValue(format)!, ignoreCase: true);
        }

        string ending = System.IO.Path.GetExtension(file).TrimStart('.');
        return formats.FirstOrDefault(one => one.Equals(ending, StringComparison.OrdinalIgnoreCase)) is { } byName
            ? Enum.Parse<OutputFormat>(byName, ignoreCase: true)
            : Enum.Parse<OutputFormat>(parsed.GetValue(format)!, ignoreCase: true);
    }

    // Everything that can change the bytes; how fast and how loud the run goes cannot.
    private string JobOf(ParseResult parsed)
    {
        Option[] without = [output, threads, resume, quiet, noColor];
        return parsed.CommandResult.Command.Name + "\n" + string.Join('\n', parsed.CommandResult.Command.Options
            .Where(option => !without.Contains(option))
            .Select(option => option.Name + "=" + string.Join(' ', parsed.GetResult(option)?.Tokens.Select(static t => t.Value) ?? [])));
    }

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
