using System;
using System.Globalization;
using RadicalSites;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Thermochemistry;

CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;

// Invented values for demonstration.
const string Table = """
    id,bond,structure,kilojoules_per_mole,sigma,source,locator
    own-1,C-H,CC[CH2:1]c1ccccc1,360.0,3.0,NOTEBOOK,page 12 (invented)
    """;
BdeTable combined = BdeTable.Parse("own.csv", Table).Overlay(BdeTable.Default);
SiteReport report = Halogenation.FindSites(
    SmilesReader.Parse("CCCc1ccccc1"), new HalogenationOptions { Table = combined });
foreach (SitePrediction site in report.Sites)
{
    Console.WriteLine($"site {site.Site.Number}: {site.Bde.KilojoulesPerMole:F1} kJ/mol from {site.Bde.Evidence[0].Entry}");
}

// A wrong row names its place.
try
{
    BdeTable.Parse("own.csv", Table.Replace("360.0", "36o", StringComparison.Ordinal));
}
catch (TableFormatException error)
{
    Console.WriteLine(error.Message);
}
