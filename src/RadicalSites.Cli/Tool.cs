using System;
using System.CommandLine;
using System.CommandLine.Help;
using System.IO;
using System.Linq;
using RadicalSites.Cli.Commands;
using RadicalSites.Diagnostics;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Cli;

/// <summary>Runs one invocation of the tool.</summary>
internal static class Tool
{
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
                host.Error.Write("No command given.\n");
                using var help = new StringWriter(System.Globalization.CultureInfo.InvariantCulture) { NewLine = "\n" };
                root.Parse(["--help"]).Invoke(new InvocationConfiguration { Output = help, Error = help });
                host.Error.Write(HelpText.Finish(help.ToString(), root.Name));
                return ExitCode.WrongUsage;
            }

            ParseResult parsed = root.Parse(arguments);
            if (parsed.Errors.Count > 0)
            {
                string[] messages = [.. parsed.Errors.Select(static error => error.Message).Distinct()];
                foreach (string message in messages.Where(message => messages.Length == 1 || !message.StartsWith("Required command", StringComparison.Ordinal)))
                {
                    host.Error.Write($"radicalsites: {message}\n");
                }

                host.Error.Write("Try 'radicalsites --help' or 'radicalsites COMMAND --help'.\n");
                return ExitCode.WrongUsage;
            }

            using var text = new StringWriter(System.Globalization.CultureInfo.InvariantCulture) { NewLine = "\n" };
            int code = parsed.Invoke(new InvocationConfiguration
            {
                Output = text,
                Error = host.Error,
                EnableDefaultExceptionHandler = false,
                ProcessTerminationTimeout = null,
            });
            host.Output.Write(System.Text.Encoding.UTF8.GetBytes(
                parsed.Action is HelpAction ? HelpText.Finish(text.ToString(), parsed.CommandResult.Command.Name) : text.ToString()));
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

    private static int WriteVersion(ToolHost host)
    {
        using var writer = new StreamWriter(host.Output, new System.Text.UTF8Encoding(false), leaveOpen: true) { NewLine = "\n" };
        writer.Write($"radicalsites {typeof(Tool).Assembly.GetName().Version?.ToString(3)}, data {BdeTable.Default.Version}\n");
        return ExitCode.Done;
    }
}
