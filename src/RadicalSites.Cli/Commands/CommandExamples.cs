using System.Collections.Generic;

namespace RadicalSites.Cli.Commands;

/// <summary>Two examples for each command, shown under its help.</summary>
internal static class CommandExamples
{
    internal static readonly Dictionary<string, string> ByCommand = new()
    {
        ["convert"] = "  radicalsites convert 'OCC'\n  radicalsites convert molecules.smi --order input",
        ["data"] = "  radicalsites data bde 'CC(C)C'\n  radicalsites data sources ATCT",
        ["explain"] = "  radicalsites explain smiles-ring-unclosed\n  radicalsites explain --all",
        ["isomers"] = "  radicalsites isomers CCC --halogen Cl --times 2\n  radicalsites isomers molecules.smi --format smi --stereo none",
        ["predict"] = "  radicalsites predict 'CC(C)C' --reagent Cl2 --temperature 25C\n  radicalsites predict molecules.smi --reagent NBS --format ndjson --threads 0",
        ["sites"] = "  radicalsites sites 'Cc1ccccc1'\n  radicalsites sites molecules.smi --format csv --output sites.csv",
    };
}
