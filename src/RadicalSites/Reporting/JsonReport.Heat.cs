using System;
using System.Text.Json;
using RadicalSites.Heat;

namespace RadicalSites.Reporting;

public static partial class JsonReport
{
    /// <summary>Writes the record of a heat balance.</summary>
    /// <param name="writer">Writer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="prediction">The prediction on which the balance rests.</param>
    /// <param name="report">The balance.</param>
    public static void Write(Utf8JsonWriter writer, RecordSource source, Prediction prediction, HeatReport report)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(prediction);
        ArgumentNullException.ThrowIfNull(report);
        Begin(writer, source, isOk: true);
        writer.WriteString("canonicalSmiles"u8, prediction.CanonicalSmiles);
        writer.WriteString("dataVersion"u8, prediction.DataVersion);
        Conditions(writer, prediction.Conditions);
        writer.WriteStartObject("heat"u8);
        Number(writer, "kilojoulesPerMole"u8, report.KilojoulesPerMole);
        Number(writer, "sigma"u8, report.SigmaKilojoulesPerMole);
        Number(writer, "molesReacting"u8, report.MolesReacting);
        Number(writer, "heatKilojoules"u8, report.HeatKilojoules);
        Number(writer, "mixtureGrams"u8, report.MixtureGrams);
        Number(writer, "joulesPerGramKelvin"u8, report.JoulesPerGramKelvin);
        Number(writer, "adiabaticRiseKelvin"u8, report.AdiabaticRiseKelvin);
        Number(writer, "endCelsius"u8, report.EndCelsius);
        Number(writer, "solventBoilingPointCelsius"u8, report.SolventBoilingPointCelsius);
        Parts(writer, report);
        writer.WriteEndObject();
        End(writer, source, prediction.Molecule, report.Diagnostics);
    }

    private static void Parts(Utf8JsonWriter writer, HeatReport report)
    {
        writer.WriteStartArray("sites"u8);
        foreach (SiteEnthalpy site in report.Sites)
        {
            writer.WriteStartObject();
            writer.WriteNumber("site"u8, site.SiteNumber);
            Number(writer, "share"u8, site.Share);
            Number(writer, "kilojoulesPerMole"u8, site.KilojoulesPerMole);
            Number(writer, "sigma"u8, site.SigmaKilojoulesPerMole);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        writer.WriteStartArray("gases"u8);
        foreach (EvolvedGas gas in report.Gases)
        {
            writer.WriteStartObject();
            writer.WriteString("formula"u8, gas.Formula);
            Number(writer, "moles"u8, gas.Moles);
            Number(writer, "liters"u8, gas.Liters);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        writer.WriteStartArray("materials"u8);
        foreach (Material material in report.Materials)
        {
            writer.WriteStartObject();
            writer.WriteString("role"u8, material.Role);
            writer.WriteString("name"u8, material.Name);
            Number(writer, "moles"u8, material.Moles);
            Number(writer, "grams"u8, material.Grams);
            Number(writer, "milliliters"u8, material.Milliliters);
            Number(writer, "equivalents"u8, material.Equivalents);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }
}
