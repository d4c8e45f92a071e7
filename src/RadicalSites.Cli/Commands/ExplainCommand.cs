using System.CommandLine;
using System.Linq;
using RadicalSites.Diagnostics;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>explain</c>: what a code means and what to do.</summary>
internal static class ExplainCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("explain", "What an error or caution code means and what to do.");
        var code = new Argument<string?>("CODE") { Arity = ArgumentArity.ZeroOrOne, Description = "A code as printed in brackets after a message." };
        var all = new Option<bool>("--all") { Description = "List all codes." };
        command.Arguments.Add(code);
        command.Options.Add(all);
        command.SetAction(parsed =>
        {
            System.IO.TextWriter writer = parsed.InvocationConfiguration.Output;
            if (parsed.GetValue(all))
            {
                foreach (ProblemDescriptor entry in ProblemCatalogue.All)
                {
                    writer.Write($"{entry.Code,-40} {entry.Severity.ToString().ToLowerInvariant(),-8} {entry.Title}\n");
                }

                return ExitCode.Done;
            }

            if (parsed.GetValue(code) is not { } text)
            {
                throw new ToolException(ExitCode.WrongUsage, "give a CODE, or --all for the list.");
            }

            if (ProblemCatalogue.Find(text) is not { } problem)
            {
                string[] near = [.. ProblemCatalogue.All.Select(static e => e.Code).Where(c => c.Contains(text, System.StringComparison.OrdinalIgnoreCase)).Take(5)];
                throw new ToolException(
                    ExitCode.WrongUsage,
                    $"there is no code '{text}'" + (near.Length > 0 ? "; did you mean " + string.Join(", ", near) + "?" : "; 'explain --all' lists them."));
            }

            writer.Write($"{problem.Code} ({problem.Severity.ToString().ToLowerInvariant()}): {problem.Title}\n\n");
            writer.Write($"message: {problem.MessageFormat}\ncause:   {problem.Cause}\nremedy:  {problem.Remedy}\n");
            return ExitCode.Done;
        });
        return command;
    }
}
