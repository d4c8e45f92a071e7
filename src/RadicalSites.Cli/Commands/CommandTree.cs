using System.CommandLine;

namespace RadicalSites.Cli.Commands;

/// <summary>All commands with their options.</summary>
internal static class CommandTree
{
    /// <summary>What the help of the tool ends with.</summary>
    internal const string Closing = """

        INPUT is a SMILES, a file, or - for standard input. Data goes to standard output, messages go to
        standard error. 'radicalsites COMMAND --help' explains a command, 'radicalsites explain CODE' a code.

        Exit codes:
          0   every record done
          1   some records failed
          2   wrong usage
          3   input unreadable or output unwritable
          4   limit reached, or cancelled
          70  mistake in the program

        Examples:
          radicalsites predict 'CC(C)C' --reagent Br2 --temperature 127C
          radicalsites predict molecules.smi --reagent Cl2 --format ndjson --output result.ndjson

        Estimates only. Halogens, hypohalites and peroxides are dangerous: local rules, safety data sheets
        and licensed, qualified people decide.

        """;

    internal static RootCommand Build(ToolHost host)
    {
        var root = new RootCommand(
            "radicalsites: where a radical halogenation goes. C(sp3)-H sites, bond dissociation enthalpies, rates, shares, "
            + "products, over-halogenation, heat.");

        // A SMILES may start with a bracket, which must not be read as a directive of the parser.
        root.Directives.Clear();
        root.Subcommands.Add(SitesCommand.Build(host));
        root.Subcommands.Add(PredictCommand.Build(host));
        root.Subcommands.Add(IsomersCommand.Build(host));
        root.Subcommands.Add(CourseCommand.Build(host));
        root.Subcommands.Add(ConditionsCommand.Build(host));
        root.Subcommands.Add(HeatCommand.Build(host));
        root.Subcommands.Add(CalibrateCommand.Build(host));
        root.Subcommands.Add(ConvertCommand.Build(host));
        root.Subcommands.Add(DataCommand.Build(host));
        root.Subcommands.Add(ExplainCommand.Build(host));
        root.Subcommands.Add(CompletionCommand.Build());
        return root;
    }
}
