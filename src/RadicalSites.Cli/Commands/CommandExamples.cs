using System.Collections.Generic;

namespace RadicalSites.Cli.Commands;

/// <summary>Two examples for each command, shown under its help.</summary>
internal static class CommandExamples
{
    internal static readonly Dictionary<string, string> ByCommand = new()
    {
        ["calibrate"] = "  radicalsites calibrate measured.csv --output own.csv\n  radicalsites predict 'CC(C)C' --reagent Cl2 --calibration own.csv",
        ["completion"] = "  radicalsites completion bash > ~/.local/share/bash-completion/completions/radicalsites\n  radicalsites completion fish | source",
        ["conditions"] = "  radicalsites conditions CCC --want 'CC(C)Br'\n  radicalsites conditions 'CC(C)C' --want 'CC(C)CCl' --temperature 25C --format json",
        ["course"] = "  radicalsites course 'Cc1ccccc1' --reagent Cl2 --temperature 100C\n  radicalsites course C --reagent Cl2 --equivalents 4 --format json",
        ["heat"] = "  radicalsites heat 'Cc1ccccc1' --reagent Br2 --batch 10g --solvent CCl4 --solvent-volume 100 --temperature 70C\n  radicalsites heat CCC --reagent Cl2 --batch 0.5mol --format json",
        ["convert"] = "  radicalsites convert 'OCC'\n  radicalsites convert molecules.smi --order input",
        ["data"] = "  radicalsites data bde 'CC(C)C'\n  radicalsites data sources ATCT",
        ["explain"] = "  radicalsites explain smiles-ring-unclosed\n  radicalsites explain --all",
        ["isomers"] = "  radicalsites isomers CCC --halogen Cl --times 2\n  radicalsites isomers molecules.smi --format smi --stereo none",
        ["predict"] = "  radicalsites predict 'CC(C)C' --reagent Cl2 --temperature 25C\n  radicalsites predict molecules.smi --reagent NBS --format ndjson --threads 0",
        ["sites"] = "  radicalsites sites 'Cc1ccccc1'\n  radicalsites sites molecules.smi --format csv --output sites.csv",
    };
}
