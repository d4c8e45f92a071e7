using System.CommandLine;

namespace RadicalSites.Cli.Commands;

/// <summary>All commands with their options.</summary>
internal static class CommandTree
{
    internal static RootCommand Build(ToolHost host)
    {
        var root = new RootCommand(
            "Where a radical halogenation goes: C(sp3)-H sites, bond dissociation enthalpies, shares, products.\n\n"
            + "Examples:\n"
            + "  radicalsites predict 'CC(C)C' --reagent Br2 --temperature 127C\n"
            + "  radicalsites predict molecules.smi --reagent Cl2 --format ndjson --threads 2 --output result.ndjson\n\n"
            + "Estimates only. Halogens, hypohalites and peroxides are dangerous: local rules, safety data sheets and "
            + "licensed, qualified people decide. 'radicalsites explain CODE' explains any code.");
        root.Subcommands.Add(SitesCommand.Build(host));
        root.Subcommands.Add(PredictCommand.Build(host));
        root.Subcommands.Add(IsomersCommand.Build(host));
        root.Subcommands.Add(CourseCommand.Build(host));
        root.Subcommands.Add(ConditionsCommand.Build(host));
        root.Subcommands.Add(HeatCommand.Build(host));
        root.Subcommands.Add(ConvertCommand.Build(host));
        root.Subcommands.Add(DataCommand.Build(host));
        root.Subcommands.Add(ExplainCommand.Build(host));
        root.Subcommands.Add(CompletionCommand.Build());
        return root;
    }
}
