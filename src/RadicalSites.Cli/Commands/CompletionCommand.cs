using System.Collections.Generic;
using System.CommandLine;
using System.IO;
using System.Linq;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>completion</c>: a script that completes commands, options and their fixed values.</summary>
internal static class CompletionCommand
{
    internal static Command Build()
    {
        var command = new Command("completion", "Completion script for a shell.");
        var shell = new Argument<string>("SHELL") { Description = "bash, zsh, fish or pwsh." };
        shell.AcceptOnlyFromAmong("bash", "zsh", "fish", "pwsh");
        command.Arguments.Add(shell);
        command.SetAction(parsed =>
        {
            var root = (Command)parsed.RootCommandResult.Command;
            TextWriter writer = parsed.InvocationConfiguration.Output;
            switch (parsed.GetValue(shell))
            {
                case "fish":
                    Fish(writer, root);
                    break;
                case "pwsh":
                    PowerShell(writer, root);
                    break;
                case "zsh":
                    writer.Write("#compdef radicalsites\nautoload -U +X bashcompinit && bashcompinit\n");
                    Bash(writer, root);
                    break;
                default:
                    Bash(writer, root);
                    break;
            }

            return ExitCode.Done;
        });
        return command;
    }

    private static IEnumerable<string> WordsOf(Command command) => command.Subcommands.Select(static sub => sub.Name)
        .Concat(command.Options.Where(static option => !option.Hidden).Select(static option => option.Name));

    private static void Bash(TextWriter writer, Command root)
    {
        writer.Write("_radicalsites() {\n    local word=${COMP_WORDS[COMP_CWORD]} words\n    case ${COMP_WORDS[1]} in\n");
        foreach (Command command in root.Subcommands)
        {
            writer.Write($"        {command.Name}) words='{string.Join(' ', WordsOf(command))}' ;;\n");
        }

        writer.Write($"        *) words='{string.Join(' ', WordsOf(root))}' ;;\n    esac\n");
        writer.Write("    if [ \"$COMP_CWORD\" -eq 1 ]; then words='" + string.Join(' ', WordsOf(root)) + "'; fi\n");
        writer.Write("    COMPREPLY=($(compgen -W \"$words\" -- \"$word\") $(compgen -f -- \"$word\"))\n}\n");
        writer.Write("complete -o filenames -F _radicalsites radicalsites\n");
    }

    private static void Fish(TextWriter writer, Command root)
    {
        foreach (Command command in root.Subcommands)
        {
            writer.Write($"complete -c radicalsites -n __fish_use_subcommand -a {command.Name} -d '{Quote(command.Description)}'\n");
            foreach (Option option in command.Options.Where(static option => !option.Hidden))
            {
                writer.Write($"complete -c radicalsites -n '__fish_seen_subcommand_from {command.Name}' -l {option.Name.TrimStart('-')} -d '{Quote(option.Description)}'\n");
            }
        }
    }

    private static void PowerShell(TextWriter writer, Command root)
    {
        writer.Write("Register-ArgumentCompleter -Native -CommandName radicalsites -ScriptBlock {\n    param($word, $ast, $position)\n");
        writer.Write("    $words = switch ([string]$ast.CommandElements[1]) {\n");
        foreach (Command command in root.Subcommands)
        {
            writer.Write($"        '{command.Name}' {{ '{string.Join("', '", WordsOf(command))}' }}\n");
        }

        writer.Write($"        default {{ '{string.Join("', '", WordsOf(root))}' }}\n    }}\n");
        writer.Write("    $words | Where-Object { $_ -like \"$word*\" } | ForEach-Object { [System.Management.Automation.CompletionResult]::new($_) }\n}\n");
    }

    private static string Quote(string? text) => (text ?? "").Replace("'", "\\'", System.StringComparison.Ordinal);
}
