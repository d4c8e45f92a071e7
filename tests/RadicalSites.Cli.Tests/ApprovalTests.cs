using System;
using System.IO;
using System.Linq;
using System.Runtime.CompilerServices;
using System.Text.RegularExpressions;

namespace RadicalSites.Cli.Tests;

/// <summary>Texts that people read, as approved. A changed text leaves a .received file beside the approved one.</summary>
public sealed partial class ApprovalTests
{
    [Theory]
    [InlineData("help", "--help")]
    [InlineData("help-sites", "sites", "--help")]
    [InlineData("help-predict", "predict", "--help")]
    [InlineData("help-isomers", "isomers", "--help")]
    [InlineData("help-course", "course", "--help")]
    [InlineData("help-conditions", "conditions", "--help")]
    [InlineData("help-heat", "heat", "--help")]
    [InlineData("help-calibrate", "calibrate", "--help")]
    [InlineData("help-convert", "convert", "--help")]
    [InlineData("help-data", "data", "--help")]
    [InlineData("help-explain", "explain", "--help")]
    [InlineData("help-completion", "completion", "--help")]
    [InlineData("error-no-command")]
    [InlineData("error-command", "predikt", "CCC")]
    [InlineData("error-option", "predict", "CCC", "--reagnt", "Br2")]
    [InlineData("error-reagent", "predict", "CCC", "--reagent", "Br3")]
    [InlineData("error-temperature", "predict", "CCC", "--temperature", "hot")]
    [InlineData("error-file", "predict", "missing.smi")]
    [InlineData("error-shard", "predict", "CCC", "--shard", "0/4")]
    [InlineData("error-ring", "predict", "C1CC")]
    [InlineData("error-element", "predict", "CC[Xx]C")]
    [InlineData("error-valence", "predict", "CC(C)(C)(C)C")]
    [InlineData("error-kekule", "predict", "c1cccc1")]
    [InlineData("sites-toluene", "sites", "Cc1ccccc1")]
    [InlineData("isomers-propane", "isomers", "CCC", "--times", "2", "--halogen", "Cl")]
    [InlineData("explain", "explain", "smiles-ring-unclosed")]
    [InlineData("completion-bash", "completion", "bash")]
    public void Text_is_as_approved(string name, params string[] arguments)
    {
        ToolRun run = ToolRun.Of(arguments);
        string text = $"exit code {run.ExitCode}\n--- standard output\n{run.Output}--- standard error\n{run.Error}";
        text = DataVersion().Replace(text, "data VERSION");

        string folder = Path.Combine(Path.GetDirectoryName(ThisFile())!, "Approved");
        string approved = Path.Combine(folder, name + ".txt");
        string received = Path.Combine(folder, name + ".received");
        if (!File.Exists(approved) || File.ReadAllText(approved).ReplaceLineEndings("\n") != text)
        {
            File.WriteAllText(received, text);
            Assert.Fail($"The text of '{string.Join(' ', arguments)}' is not as approved; see {Path.GetFileName(received)}.");
        }

        File.Delete(received);
    }

    [Theory]
    [InlineData("sites")]
    [InlineData("predict")]
    [InlineData("isomers")]
    [InlineData("course")]
    [InlineData("conditions")]
    [InlineData("heat")]
    [InlineData("calibrate")]
    [InlineData("convert")]
    [InlineData("data")]
    [InlineData("explain")]
    [InlineData("completion")]
    public void Help_of_every_command_has_two_examples(string command)
    {
        string[] examples = [.. ToolRun.Of(command, "--help").Lines.SkipWhile(static line => line != "Examples:").Skip(1)];

        Assert.Equal(2, examples.Length);
        Assert.All(examples, static line => Assert.StartsWith("  radicalsites ", line, StringComparison.Ordinal));
    }

    private static string ThisFile([CallerFilePath] string path = "") => path;

    [GeneratedRegex(@"data \d{4}\.\d+-[0-9a-f]{12}")]
    private static partial Regex DataVersion();
}
