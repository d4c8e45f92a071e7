using System;
using System.Collections.Generic;
using System.Text.Json;
using RadicalSites.Molecules;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Reporting;

public static partial class JsonReport
{
    /// <summary>Writes the record of a molecule without conditions: sites and bond dissociation enthalpies.</summary>
    /// <param name="writer">Writer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="report">The sites.</param>
    public static void Write(Utf8JsonWriter writer, RecordSource source, SiteReport report)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(report);
        Begin(writer, source, isOk: true);
        writer.WriteString("canonicalSmiles"u8, report.CanonicalSmiles);
        writer.WriteString("dataVersion"u8, report.DataVersion);
        Sites(writer, report.Molecule, report.Sites);
        End(writer, source, report.Molecule, report.Diagnostics);
    }

    private static void Sites(Utf8JsonWriter writer, Molecule molecule, IReadOnlyList<SitePrediction> sites)
    {
        writer.WriteStartArray("sites"u8);
        for (int i = 0; i < sites.Count; i++)
        {
            writer.WriteStartObject();
            Describe(writer, molecule, sites[i].Site);
            Enthalpy(writer, sites[i].Bde);
            if (sites[i].Selectivity is { } selectivity)
            {
                Rate(writer, selectivity);
                Numbers(writer, "products"u8, sites[i].Products);
            }

            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }

    private static void Describe(Utf8JsonWriter writer, Molecule molecule, Site site)
    {
        writer.WriteNumber("site"u8, site.Number);
        Atoms(writer, "carbons"u8, molecule, site.Carbons);
        writer.WriteNumber("hydrogenCount"u8, site.HydrogenCount);
        writer.WriteString("degree"u8, SiteWords.Encoded(site.Degree));
        writer.WriteStartArray("conjugation"u8);
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            writer.WriteStringValue(SiteWords.Encoded(neighbor.Kind));
        }

        writer.WriteEndArray();
        writer.WriteStartArray("alpha"u8);
        foreach (AlphaGroup group in site.AlphaGroups)
        {
            writer.WriteStringValue(SiteWords.Encoded(group.Kind));
        }

        writer.WriteEndArray();
        Grounds(writer, molecule, site);
        if (site.RingSize is { } size)
        {
            writer.WriteNumber("ringSize"u8, size);
        }
        else
        {
            writer.WriteNull("ringSize"u8);
        }

        writer.WriteBoolean("bridgehead"u8, site.IsBridgehead);
        writer.WriteString("topicity"u8, SiteWords.Encoded(site.Topicity));
    }

    // The atoms that made each class so, in the order of conjugation and then alpha.
    private static void Grounds(Utf8JsonWriter writer, Molecule molecule, Site site)
    {
        writer.WriteStartArray("grounds"u8);
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            writer.WriteStartObject();
            writer.WriteString("class"u8, SiteWords.Encoded(neighbor.Kind));
            Atoms(writer, "atoms"u8, molecule, neighbor.PiAtoms);
            writer.WriteEndObject();
        }

        foreach (AlphaGroup group in site.AlphaGroups)
        {
            writer.WriteStartObject();
            writer.WriteString("class"u8, SiteWords.Encoded(group.Kind));
            Atoms(writer, "atoms"u8, molecule, group.GroupAtoms);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }

    private static void Enthalpy(Utf8JsonWriter writer, BdeAssignment bde)
    {
        writer.WriteStartObject("bde"u8);
        Number(writer, "kilojoulesPerMole"u8, bde.KilojoulesPerMole);
        Number(writer, "sigma"u8, bde.SigmaKilojoulesPerMole);
        writer.WriteString("basis"u8, SiteWords.Encoded(bde.Basis));
        writer.WriteStartArray("evidence"u8);
        for (int i = 0; i < bde.Evidence.Count; i++)
        {
            BdeEvidence evidence = bde.Evidence[i];
            writer.WriteStartObject();
            writer.WriteString("entry"u8, evidence.Entry);
            writer.WriteString("role"u8, evidence.Role);
            Number(writer, "kilojoulesPerMole"u8, evidence.KilojoulesPerMole);
            writer.WriteString("source"u8, evidence.Source);
            writer.WriteString("locator"u8, evidence.Locator);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        if (bde.Reason is { } reason)
        {
            writer.WriteString("reason"u8, reason);
        }

        writer.WriteEndObject();
    }

    private static void Rate(Utf8JsonWriter writer, SiteSelectivity selectivity)
    {
        StepEnthalpies steps = selectivity.Steps;
        writer.WriteStartObject("steps"u8);
        Number(writer, "abstractionKilojoulesPerMole"u8, steps.AbstractionKilojoulesPerMole);
        Number(writer, "transferKilojoulesPerMole"u8, steps.TransferKilojoulesPerMole);
        Number(writer, "overallKilojoulesPerMole"u8, steps.OverallKilojoulesPerMole);
        Number(writer, "sigma"u8, steps.SigmaKilojoulesPerMole);
        writer.WriteString("verdict"u8, SiteWords.Encoded(steps.Verdict));
        writer.WriteEndObject();
        Number(writer, "relativeRatePerHydrogen"u8, selectivity.RelativeRatePerHydrogen);
        Share(writer, selectivity.Share, selectivity.ShareLow, selectivity.ShareHigh);
    }

    private static void Share(Utf8JsonWriter writer, double? share, double? low, double? high)
    {
        Number(writer, "share"u8, share);
        Number(writer, "shareLow"u8, low);
        Number(writer, "shareHigh"u8, high);
    }
}
