using System;
using System.CommandLine;
using System.IO;
using System.Linq;
using RadicalSites.Products;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Cli.Commands;

/// <summary>Options that say which reaction and which data.</summary>
internal sealed class ChemistryOptions
{
    private readonly Option<string> reagent = new("--reagent")
    {
        Description = "Halogen source: " + string.Join(", ", ReagentCatalogue.All.Select(static r => r.Id)) + ".",
        DefaultValueFactory = static _ => "Br2",
    };

    private readonly Option<string?> temperature = new("--temperature") { Description = "80C or 353K; a bare number is in C. Default: the usual one of the reagent." };
    private readonly Option<string?> solvent = new("--solvent") { Description = "Id of the solvent, see 'data solvents' (PhH@4M: diluted), gas or neat; default: not stated." };
    private readonly Option<string?> table = new("--bde-table") { Description = "Your own table of bond enthalpies, laid over the shipped one." };
    private readonly Option<string?> calibration = new("--calibration") { Description = "Parameters fitted to your own ratios, as written by 'calibrate'." };
    private readonly Option<bool> merge = new("--merge-diastereotopic") { Description = "One site for carbons that only existing stereo tells apart." };
    private readonly Option<string> stereo = new("--stereo")
    {
        Description = "Stereo of products: none, mark (keep existing centres) or expand (list stereoisomers).",
        DefaultValueFactory = static _ => "mark",
    };

    internal ChemistryOptions() => stereo.AcceptOnlyFromAmong("none", "mark", "expand");

    internal void AddReaction(Command command)
    {
        command.Options.Add(reagent);
        command.Options.Add(calibration);
        command.Options.Add(temperature);
        command.Options.Add(solvent);
    }

    internal void AddMedium(Command command)
    {
        command.Options.Add(temperature);
        command.Options.Add(solvent);
        command.Options.Add(calibration);
    }

    internal void AddTable(Command command) => command.Options.Add(table);

    internal void AddData(Command command)
    {
        command.Options.Add(table);
        command.Options.Add(merge);
    }

    internal void AddStereo(Command command) => command.Options.Add(stereo);

    internal ReactionConditions ReadConditions(ParseResult parsed)
    {
        string id = parsed.GetValue(reagent)!;
        Reagent found = ReagentCatalogue.Find(id) ?? throw new ToolException(
            ExitCode.WrongUsage, $"there is no reagent '{id}'; known are {string.Join(", ", ReagentCatalogue.All.Select(static r => r.Id))}.");
        return new ReactionConditions(found, ReadTemperature(parsed), ReadSolvent(parsed));
    }

    internal Temperature? ReadTemperature(ParseResult parsed)
    {
        if (parsed.GetValue(temperature) is not { } text)
        {
            return null;
        }

        return Temperature.TryParse(text, out Temperature value)
            ? value
            : throw new ToolException(ExitCode.WrongUsage, $"'{text}' is no temperature above absolute zero; write 80C or 353K.");
    }

    internal string? ReadSolvent(ParseResult parsed)
    {
        if (parsed.GetValue(solvent) is not { } id)
        {
            return null;
        }

        return Heat.HeatTables.FindSolvent(id)?.Id ?? ReactionMedia.Find(id) ?? throw new ToolException(
            ExitCode.WrongUsage,
            $"there is no solvent '{id}'; known are {string.Join(", ", Heat.HeatTables.Solvents.Select(static s => s.Id))}, "
            + "gas, neat (the substrate itself), and solvents diluted as in PhH@4M.");
    }

    internal HalogenationOptions ReadOptions(ParseResult parsed, bool withStereo)
    {
        BdeTable bdes = BdeTable.Default;
        if (parsed.GetValue(table) is { } file)
        {
            bdes = ReadTable(file).Overlay(bdes);
        }

        return new HalogenationOptions
        {
            Table = bdes,
            Calibration = ReadCalibration(parsed.GetValue(calibration)),
            MergeDiastereotopic = parsed.GetValue(merge),
            Stereo = withStereo ? ReadStereo(parsed) : ProductStereoMode.Mark,
        };
    }

    internal ProductStereoMode ReadStereo(ParseResult parsed) =>
        Enum.Parse<ProductStereoMode>(parsed.GetValue(stereo)!, ignoreCase: true);

    internal static BdeTable ReadTable(string file) => BdeTable.Parse(Path.GetFileName(file), ReadText(file));

    internal static SelectivityCalibration ReadCalibration(string? file) => file is null
        ? SelectivityCalibration.Default
        : SelectivityCalibration.Parse(Path.GetFileName(file), ReadText(file));

    /// <summary>What of the data decides the bytes of an output.</summary>
    internal static string IdentityOf(HalogenationOptions options) => options.DataVersion + "\n" + options.Calibration.ToText();

    internal static string ReadText(string file)
    {
        try
        {
            return File.ReadAllText(file);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            throw new ToolException(ExitCode.InputOutput, $"cannot read {file}: {error.Message}");
        }
    }
}
