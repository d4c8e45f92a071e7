using System;
using System.CommandLine;
using System.CommandLine.Help;
using System.IO;
using System.Linq;
using RadicalSites.Cli.Commands;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Cli;

/// <summary>Runs one invocation of the tool.</summary>
internal static class Tool
{
    private static readonly ParserConfiguration Parsing = new() { EnablePosixBundling = false, ResponseFileTokenReplacer = null };

    /// <summary>Parses the arguments and runs the command.</summary>
    /// <returns>The exit code.</returns>
    internal static int Run(string[] arguments, ToolHost host)
    {
        try
        {
            RootCommand root = CommandTree.Build(host);
            if (arguments.Length == 1 && arguments[0] == "--version")
            {
                return WriteVersion(host);
            }

            if (arguments.Length == 0)
            {
                host.Error.Write("radicalsites: no command given.\n\n");
                HelpText.Write(host.Error, root);
                return ExitCode.WrongUsage;
            }

            CheckCommand(arguments[0], root);
            ParseResult parsed = root.Parse(arguments, Parsing);
            if (parsed.Errors.Count > 0)
            {
                string path = parsed.CommandResult.Command is RootCommand ? "" : parsed.CommandResult.Command.Name + " ";
                throw new ToolException(
                    ExitCode.WrongUsage,
                    string.Join("\nradicalsites: ", parsed.Errors.Select(static error => error.Message).Distinct()) + $"\n  See 'radicalsites {path}--help'.");
            }

            using var text = new StringWriter(System.Globalization.CultureInfo.InvariantCulture) { NewLine = "\n" };
            int code = parsed.Invoke(new InvocationConfiguration
            {
                Output = text,
                Error = host.Error,
                EnableDefaultExceptionHandler = false,
                ProcessTerminationTimeout = null,
            });
            if (parsed.Action is HelpAction)
            {
                text.GetStringBuilder().Clear();
                HelpText.Write(text, parsed.CommandResult.Command);
            }

            host.Output.Write(System.Text.Encoding.UTF8.GetBytes(text.ToString()));
            host.Output.Flush();
            return code;
        }
        catch (ToolException error)
        {
            host.Error.Write($"radicalsites: {error.Message}\n");
            return error.ExitCode;
        }
        catch (TableFormatException error)
        {
            host.Error.Write($"radicalsites: {error.Message}\n");
            return ExitCode.InputOutput;
        }
        catch (IOException error)
        {
            host.Error.Write($"radicalsites: {error.Message}\n");
            return ExitCode.InputOutput;
        }
        catch (UnauthorizedAccessException error)
        {
            host.Error.Write($"radicalsites: {error.Message}\n");
            return ExitCode.InputOutput;
        }
        catch (OperationCanceledException)
        {
            host.Error.Write("radicalsites: cancelled.\n");
            return ExitCode.LimitOrCancelled;
        }
#pragma warning disable CA1031 // The last line of defence: a stack trace is no message for a user.
        catch (Exception error)
#pragma warning restore CA1031
        {
            host.Error.Write($"radicalsites: internal error ({error.GetType().Name}: {error.Message}). Please report the input that caused it.\n");
            return ExitCode.Internal;
        }
    }

    private static void CheckCommand(string first, RootCommand root)
    {
        if (first.StartsWith('-') || root.Subcommands.Any(command => command.Name == first))
        {
            return;
        }

        string? near = root.Subcommands.Select(static command => command.Name)
            .Where(name => Distance(name, first) <= 2).MinBy(name => Distance(name, first));
        throw new ToolException(
            ExitCode.WrongUsage,
            near is not null ? $"there is no command '{first}'; did you mean {near}?"
            : SmilesReader.TryParse(first, out _, out _) ? $"'{first}' is no command; for a molecule write: radicalsites predict '{first}'"
            : $"there is no command '{first}'; 'radicalsites --help' lists them.");
    }

    // Edits between two words: letters put in, left out or replaced.
    private static int Distance(string left, string right)
    {
        var row = Enumerable.Range(0, right.Length + 1).ToArray();
        for (int i = 1; i <= left.Length; i++)
        {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= right.Length; j++)
            {
                int above = row[j];
                row[j] = Math.Min(Math.Min(row[j], row[j - 1]) + 1, diagonal + (left[i - 1] == right[j - 1] ? 0 : 1));
                diagonal = above;
            }
        }

        return row[^1];
    }

    private static int WriteVersion(ToolHost host)
    {
        using var writer = new StreamWriter(host.Output, new System.Text.UTF8Encoding(false), leaveOpen: true) { NewLine = "\n" };
        writer.Write($"radicalsites {typeof(Tool).Assembly.GetName().Version?.ToString(3)}, data {BdeTable.Default.Version}\n");
        return ExitCode.Done;
    }
}
