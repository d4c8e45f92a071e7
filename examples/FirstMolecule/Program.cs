using System;
using System.Globalization;
using RadicalSites;
using RadicalSites.Formats.Smiles;
using RadicalSites.Products;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;

// Isobutane with chlorine in light at 25 C.
var molecule = SmilesReader.Parse("CC(C)C");
var conditions = new ReactionConditions(ReagentCatalogue.Get("Cl2"), Temperature.FromCelsius(25));
Prediction prediction = Halogenation.Predict(molecule, conditions);

foreach (SitePrediction site in prediction.Sites)
{
    Console.WriteLine($"site {site.Site.Number}: {site.Site.Degree}, {site.Site.HydrogenCount} H, share {site.Selectivity!.Share:P0}");
    BdeEvidence evidence = site.Bde.Evidence[0];
    Console.WriteLine($"  {site.Bde.KilojoulesPerMole:F1} kJ/mol, row {evidence.Entry}, {Bibliography.Find(evidence.Source)!.Citation.Split(';')[0]}");
}

foreach (HalogenationProduct product in prediction.Products)
{
    Console.WriteLine($"{product.CanonicalSmiles}: {product.Share:P0} ({product.ShareLow:P0} to {product.ShareHigh:P0})");
}
