using System;
using System.CommandLine;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Heat;
using RadicalSites.Reporting;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>data</c>: tables, versions, sources.</summary>
internal static partial class DataCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("data", "Tables, versions and sources.");
        command.Subcommands.Add(Simple("reagents", "Halogen sources with carrier, by-product and range.", Reagents));
        command.Subcommands.Add(Simple("solvents", "Solvents with density, heat capacity, boiling point.", Solvents));
        command.Subcommands.Add(Simple("parameters", "Parameters of the selectivity model with their fitted shifts.", Parameters));
        command.Subcommands.Add(Bench());
        command.Subcommands.Add(Simple("schema", "The JSON Schema of the records.", static writer => writer.Write(ReportSchema.Text)));
        command.Subcommands.Add(Bde());
        command.Subcommands.Add(Sources());
        command.Subcommands.Add(Check());
        command.Subcommands.Add(Simple("fit", "Group increments fitted to the C-H table, and their leave-one-out test.", FitReport.Write));
        command.SetAction(parsed =>
        {
            TextWriter writer = parsed.InvocationConfiguration.Output;
            BdeTable table = BdeTable.Default;
            writer.Write($"data {table.Version}\n");
            writer.Write(string.Create(
                CultureInfo.InvariantCulture,
                $"{table.Entries.Count} C-H bonds, {table.ClassEntries.Count} class values, {table.BondEntries.Count} other bonds, {ReagentCatalogue.All.Count} reagents, {Bibliography.All.Count} sources\n"));
            return ExitCode.Done;
        });
        return command;
    }

    private static Command Simple(string name, string description, Action<TextWriter> write)
    {
        var command = new Command(name, description);
        command.SetAction(parsed =>
        {
            write(parsed.InvocationConfiguration.Output);
            return ExitCode.Done;
        });
        return command;
    }

    private static void Reagents(TextWriter writer)
    {
        var table = new TextTable("id", "name", "carrier", "delivers", "by-product", ">usual C", ">range C");
        foreach (Reagent reagent in ReagentCatalogue.All)
        {
            table.Add(
                reagent.Id, reagent.Name, reagent.Carrier.Name, Molecules.Elements.SymbolOf(reagent.Halogen), reagent.ByProduct,
                Whole(reagent.Default.Celsius), Whole(reagent.Minimum.Celsius) + " to " + Whole(reagent.Maximum.Celsius));
        }

        table.Write(writer);
    }

    private static void Solvents(TextWriter writer)
    {
        var table = new TextTable("id", "name", ">g/mL", ">J/(g K)", ">boils C", "role", "caution");
        foreach (Solvent solvent in HeatTables.Solvents)
        {
            table.Add(
                solvent.Id, solvent.Name, solvent.GramsPerMilliliter.ToString("F3", CultureInfo.InvariantCulture),
                solvent.JoulesPerGramKelvin.ToString("F3", CultureInfo.InvariantCulture), Whole(solvent.BoilingPointCelsius),
                solvent.Role, solvent.Caution);
        }

        table.Write(writer);
    }

    private static Command Bde()
    {
        var command = new Command("bde", "Bond enthalpies: all rows, those of one molecule (SMILES), or those that contain a word.");
        var what = new Argument<string?>("SMILES|WORD") { Arity = ArgumentArity.ZeroOrOne, Description = "A molecule, or a word such as benzylic." };
        command.Arguments.Add(what);
        command.SetAction(parsed =>
        {
            TextWriter writer = parsed.InvocationConfiguration.Output;
            if (parsed.GetValue(what) is { } text && SmilesReader.TryParse(text, out Molecules.Molecule? molecule, out _))
            {
                SiteReport report = Halogenation.FindSites(molecule);
                TextReport.Write(writer, new RecordSource(1, text, null), report);
                writer.Write('\n');
                WriteRows(writer, [.. report.Sites.SelectMany(site => BdeTable.Default.FindEntries(report.Analysis, site.Site)).Distinct()], "");
                return ExitCode.Done;
            }

            WriteRows(writer, [.. BdeTable.Default.Entries], parsed.GetValue(what) ?? "");
            WriteClasses(writer, parsed.GetValue(what) ?? "");
            return ExitCode.Done;
        });
        return command;
    }

    private static void WriteRows(TextWriter writer, BdeEntry[] entries, string word)
    {
        var table = new TextTable("row", "bond of", "SMILES", ">kJ/mol", ">sigma", "kind", "source", "locator");
        bool any = false;
        foreach (BdeEntry entry in entries.Where(entry => Matches(word, entry.Substance, entry.Smiles, entry.Source)))
        {
            any = true;
            table.Add(
                (entry.IsPreferred ? "" : "(") + entry.Id + (entry.IsPreferred ? "" : ")"), entry.Substance, entry.Smiles,
                One(entry.KilojoulesPerMole), One(entry.SigmaKilojoulesPerMole), entry.Kind.ToString().ToLowerInvariant(),
                entry.Source, entry.Locator.Length > 60 ? entry.Locator[..57] + "..." : entry.Locator);
        }

        if (any)
        {
            table.Write(writer);
            writer.Write("Rows in parentheses are further readings of a bond; the others answer.\n");
        }
    }

    private static void WriteClasses(TextWriter writer, string word)
    {
        var table = new TextTable("class", "group", "degree", ">kJ/mol", ">sigma", "source", "members");
        bool any = false;
        foreach (BdeClassEntry entry in BdeTable.Default.ClassEntries.Where(entry => Matches(word, entry.Id, entry.Group, entry.Source)))
        {
            any = true;
            table.Add(
                entry.Id, entry.Group, SiteWords.Of(entry.Degree), One(entry.KilojoulesPerMole),
                One(entry.SigmaKilojoulesPerMole), entry.Source, entry.Locator);
        }

        if (any)
        {
            writer.Write('\n');
            table.Write(writer);
        }
    }

    private static Command Sources()
    {
        var command = new Command("sources", "The bibliography, or one entry.");
        var key = new Argument<string?>("KEY") { Arity = ArgumentArity.ZeroOrOne, Description = "Key of a publication." };
        command.Arguments.Add(key);
        command.SetAction(parsed =>
        {
            TextWriter writer = parsed.InvocationConfiguration.Output;
            if (parsed.GetValue(key) is { } text)
            {
                BibliographyEntry entry = Bibliography.Find(text)
                    ?? throw new ToolException(ExitCode.WrongUsage, $"there is no source '{text}'; 'data sources' lists them.");
                WriteSource(writer, entry);
                return ExitCode.Done;
            }

            foreach (BibliographyEntry entry in Bibliography.All)
            {
                WriteSource(writer, entry);
            }

            return ExitCode.Done;
        });
        return command;
    }

    private static void WriteSource(TextWriter writer, BibliographyEntry entry) =>
        writer.Write($"{entry.Key}: {entry.Citation}{(entry.Doi is null ? "" : " doi:" + entry.Doi)}\n");

    private static Command Check()
    {
        var command = new Command("check", "Checks a table of your own; see 'radicalsites explain' and the README for the columns.");
        var file = new Argument<string>("FILE") { Description = "CSV file." };
        command.Arguments.Add(file);
        command.SetAction(parsed =>
        {
            BdeTable table = ChemistryOptions.ReadTable(parsed.GetValue(file)!);
            parsed.InvocationConfiguration.Output.Write(string.Create(
                CultureInfo.InvariantCulture,
                $"{table.Name}: {table.Entries.Count} C-H bonds, {table.ClassEntries.Count} class values, {table.BondEntries.Count} other bonds, checksum {table.Version}: valid\n"));
            return ExitCode.Done;
        });
        return command;
    }

    private static bool Matches(string word, params string[] texts) =>
        word.Length == 0 || texts.Any(text => text.Contains(word, StringComparison.OrdinalIgnoreCase));

    private static string Whole(double value) => value.ToString("F0", CultureInfo.InvariantCulture);

    private static string One(double value) => value.ToString("F1", CultureInfo.InvariantCulture);
}
