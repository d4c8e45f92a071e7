using System;
using System.Collections.Generic;
using System.CommandLine;
using System.IO;
using System.Linq;

namespace RadicalSites.Cli.Commands;

/// <summary>The help of a command, in lines of at most 100 characters.</summary>
internal static class HelpText
{
    private const int Width = 100;
    private const int LeftColumn = 27;

    // What stands for the value of an option; others take their own name in capitals.
    private static readonly Dictionary<string, string> Values = new()
    {
        ["--output"] = "FILE", ["--input-format"] = "WORD", ["--format"] = "WORD", ["--bde-table"] = "FILE", ["--calibration"] = "FILE", ["--threads"] = "N", ["--limit"] = "N",
        ["--shard"] = "K/N", ["--reagent"] = "ID", ["--solvent"] = "ID", ["--temperature"] = "T", ["--want"] = "SMILES",
        ["--batch"] = "AMOUNT", ["--equivalents"] = "X", ["--solvent-volume"] = "ML", ["--heat-capacity"] = "J/GK",
        ["--points"] = "N", ["--halogens"] = "N", ["--times"] = "N", ["--most"] = "N", ["--halogen"] = "X",
        ["--on-error"] = "WORD", ["--stereo"] = "WORD", ["--rows"] = "WORD", ["--order"] = "WORD",
    };

    internal static void Write(TextWriter writer, Command command)
    {
        string path = Path(command);
        Wrap(writer, command is RootCommand ? command.Description! : path + ": " + command.Description, "", "");
        writer.Write($"\nUsage:\n  {path}{Usage(command)}\n");
        if (command.Arguments.Count > 0)
        {
            writer.Write("\nArguments:\n");
            foreach (Argument argument in command.Arguments)
            {
                Item(writer, argument.Name, argument.Description);
            }
        }

        if (command.Subcommands.Count > 0)
        {
            writer.Write("\nCommands:\n");
            foreach (Command sub in command.Subcommands)
            {
                Item(writer, sub.Name + string.Concat(sub.Arguments.Select(static one => " " + one.Name)), sub.Description);
            }
        }

        writer.Write("\nOptions:\n");
        foreach (Option option in command.Options.Where(static option => !option.Hidden))
        {
            Item(writer, Label(option), Text(option));
        }

        if (command is RootCommand)
        {
            writer.Write(CommandTree.Closing);
        }
        else if (CommandExamples.ByCommand.TryGetValue(command.Name, out string? examples) && command.Parents.First() is RootCommand)
        {
            writer.Write("\nExamples:\n" + examples + "\n");
        }
    }

    private static string Path(Command command) => command is RootCommand
        ? "radicalsites"
        : string.Join(' ', command.Parents.OfType<Command>().Take(1).Select(Path)) + " " + command.Name;

    private static string Usage(Command command)
    {
        string arguments = string.Concat(command.Arguments.Select(static one =>
            one.Arity.MaximumNumberOfValues > 1 ? $" [{one.Name} ...]" : one.Arity.MinimumNumberOfValues == 0 ? $" [{one.Name}]" : $" {one.Name}"));
        return (command.Subcommands.Count == 0 ? "" : command is RootCommand ? " COMMAND" : " [COMMAND]") + arguments + " [options]";
    }

    private static string Label(Option option) => option.Aliases.Contains("-h") ? "--help, -h"
        : option.ValueType == typeof(bool) || option.Arity.MaximumNumberOfValues == 0 ? option.Name
        : option.Name + " " + (Values.TryGetValue(option.Name, out string? value) ? value : option.Name.TrimStart('-').ToUpperInvariant());

    private static string Text(Option option)
    {
        string text = option.Aliases.Contains("-h") ? "Print this help."
            : option.Name == "--version" ? "Print the versions of tool and data."
            : option.Description ?? "";
        return option.HasDefaultValue && option.ValueType != typeof(bool) && option.GetDefaultValue() is { } value
            ? string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{text} [default: {value}]")
            : option.Required ? text + " [required]" : text;
    }

    private static void Item(TextWriter writer, string label, string? text)
    {
        string first = ("  " + label).PadRight(LeftColumn);
        if (first.Length > LeftColumn)
        {
            writer.Write(first + "\n");
            first = new string(' ', LeftColumn);
        }

        Wrap(writer, text ?? "", first, new string(' ', LeftColumn));
    }

    private static void Wrap(TextWriter writer, string text, string first, string indent)
    {
        foreach (string paragraph in text.Split('\n'))
        {
            string line = first;
            bool isEmpty = true;
            foreach (string word in paragraph.Split(' '))
            {
                if (!isEmpty && line.Length + 1 + word.Length > Width)
                {
                    writer.Write(line.TrimEnd() + "\n");
                    line = indent;
                    isEmpty = true;
                }

                line += (isEmpty ? "" : " ") + word;
                isEmpty = false;
            }

            writer.Write(line.TrimEnd() + "\n");
            first = indent;
        }
    }
}
