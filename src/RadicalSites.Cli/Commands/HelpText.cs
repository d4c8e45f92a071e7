using System;

namespace RadicalSites.Cli.Commands;

/// <summary>Finishes the help of the parser library: the tool's own name, trimmed lines, examples.</summary>
internal static class HelpText
{
    private static readonly string ExecutableName = new System.CommandLine.RootCommand().Name;

    internal static string Finish(string help, string command)
    {
        string text = help.ReplaceLineEndings("\n").Replace(ExecutableName + " ", "radicalsites ", StringComparison.Ordinal);
        string[] lines = text.Split('\n');
        for (int i = 0; i < lines.Length; i++)
        {
            lines[i] = lines[i].TrimEnd();
        }

        text = string.Join('\n', lines).TrimEnd('\n') + "\n";
        return CommandExamples.ByCommand.TryGetValue(command, out string? examples)
            ? text + "\nExamples:\n" + examples + "\n"
            : text;
    }
}
