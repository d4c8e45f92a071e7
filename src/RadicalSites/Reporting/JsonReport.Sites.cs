using System.Collections.Generic;
using System.Text.Json;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Symmetry;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Reporting;

public static partial class JsonReport
{
    private static void WriteSites(Utf8JsonWriter writer, Molecule molecule, IReadOnlyList<SitePrediction> sites)
    {
        writer.WriteStartArray("sites");
        foreach (SitePrediction prediction in sites)
        {
            WriteSite(writer, molecule, prediction);
        }

        writer.WriteEndArray();
    }

    private static void WriteSite(Utf8JsonWriter writer, Molecule molecule, SitePrediction prediction)
    {
        Site site = prediction.Site;
        writer.WriteStartObject();
        writer.WriteNumber("site", site.Number);
        WriteAtoms(writer, "carbons", molecule, site.Carbons);
        writer.WriteNumber("hydrogenCount", site.HydrogenCount);
        writer.WriteString("degree", SiteWords.Of(site.Degree));
        writer.WriteStartArray("conjugation");
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            writer.WriteStringValue(SiteWords.Of(neighbor.Kind));
        }

        writer.WriteEndArray();
        writer.WriteStartArray("alpha");
        foreach (AlphaGroup group in site.AlphaGroups)
        {
            writer.WriteStringValue(SiteWords.Of(group.Kind));
        }

        writer.WriteEndArray();
        if (site.RingSize is { } size)
        {
            writer.WriteNumber("ringSize", size);
        }
        else
        {
            writer.WriteNull("ringSize");
        }

        writer.WriteBoolean("bridgehead", site.IsBridgehead);
        writer.WriteString("topicity", site.Topicity switch
        {
            Topicity.Homotopic => "homotopic",
            Topicity.Enantiotopic => "enantiotopic",
            _ => "diastereotopic",
        });
        WriteBde(writer, prediction.Bde);
        if (prediction.Selectivity is { } selectivity)
        {
            writer.WriteStartObject("steps");
            WriteNumber(writer, "abstractionKilojoulesPerMole", selectivity.Steps.AbstractionKilojoulesPerMole);
            WriteNumber(writer, "transferKilojoulesPerMole", selectivity.Steps.TransferKilojoulesPerMole);
            writer.WriteString("verdict", selectivity.Steps.Verdict.ToString().ToLowerInvariant());
            writer.WriteEndObject();
            WriteNumber(writer, "relativeRatePerHydrogen", selectivity.RelativeRatePerHydrogen);
            WriteNumber(writer, "share", selectivity.Share);
            WriteNumber(writer, "shareLow", selectivity.ShareLow);
            WriteNumber(writer, "shareHigh", selectivity.ShareHigh);
            writer.WriteStartArray("products");
            foreach (int product in prediction.Products)
            {
                writer.WriteNumberValue(product);
            }

            writer.WriteEndArray();
        }

        writer.WriteEndObject();
    }

    private static void WriteBde(Utf8JsonWriter writer, BdeAssignment bde)
    {
        writer.WriteStartObject("bde");
        WriteNumber(writer, "kilojoulesPerMole", bde.KilojoulesPerMole);
        WriteNumber(writer, "sigma", bde.SigmaKilojoulesPerMole);
        writer.WriteString("basis", SiteWords.Of(bde.Basis));
        writer.WriteStartArray("evidence");
        foreach (BdeEvidence evidence in bde.Evidence)
        {
            writer.WriteStartObject();
            writer.WriteString("entry", evidence.Entry);
            writer.WriteNumber("kilojoulesPerMole", evidence.KilojoulesPerMole);
            writer.WriteString("role", evidence.Role);
            writer.WriteString("source", evidence.Source);
            writer.WriteString("locator", evidence.Locator);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        writer.WriteEndObject();
    }
}
