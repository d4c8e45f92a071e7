using System;
using System.Collections.Generic;
using System.Text.Json;
using RadicalSites.Course;
using RadicalSites.Molecules;
using RadicalSites.Selectivity;

namespace RadicalSites.Reporting;

public static partial class JsonReport
{
    /// <summary>Writes the record of an over-halogenation course.</summary>
    /// <param name="writer">Writer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="conditions">Reagent, temperature, solvent.</param>
    /// <param name="dataVersion">Version of the data in use.</param>
    /// <param name="course">The course.</param>
    public static void Write(
        Utf8JsonWriter writer, RecordSource source, ReactionConditions conditions, string dataVersion,
        HalogenationCourse course)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(conditions);
        ArgumentNullException.ThrowIfNull(course);
        Molecule substrate = course.Species[0].Molecule;
        Begin(writer, source, isOk: true);
        writer.WriteString("canonicalSmiles"u8, course.Species[0].CanonicalSmiles);
        writer.WriteString("dataVersion"u8, dataVersion);
        Conditions(writer, conditions);
        writer.WriteStartObject("course"u8);
        writer.WritePropertyName("bestMono"u8);
        Best(writer, course.BestMono);
        Number(writer, "truncatedAtEnd"u8, course.TruncatedAtEnd);
        Species(writer, course.Species);
        Points(writer, course.Points);
        ByProducts(writer, course.ByProducts);
        writer.WriteEndObject();
        End(writer, source, substrate, course.Diagnostics);
    }

    private static void Best(Utf8JsonWriter writer, CourseOptimum? best)
    {
        if (best is null)
        {
            writer.WriteNullValue();
            return;
        }

        writer.WriteStartObject();
        Number(writer, "equivalents"u8, best.Equivalents);
        Number(writer, "conversion"u8, best.Conversion);
        Number(writer, "monoYield"u8, best.MonoYield);
        writer.WriteBoolean("isLimit"u8, best.IsLimit);
        writer.WriteEndObject();
    }

    private static void Species(Utf8JsonWriter writer, IReadOnlyList<CourseSpecies> species)
    {
        writer.WriteStartArray("species"u8);
        foreach (CourseSpecies one in species)
        {
            writer.WriteStartObject();
            writer.WriteNumber("species"u8, one.Number);
            writer.WriteString("smiles"u8, one.CanonicalSmiles);
            writer.WriteNumber("halogens"u8, one.HalogenCount);
            Number(writer, "relativeRate"u8, one.RelativeRate);
            writer.WriteString("rateBasis"u8, SiteWords.Of(one.RateBasis));
            Strings(writer, "evidence"u8, one.Evidence);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }

    private static void Points(Utf8JsonWriter writer, IReadOnlyList<CoursePoint> points)
    {
        writer.WriteStartArray("points"u8);
        foreach (CoursePoint point in points)
        {
            writer.WriteStartObject();
            Number(writer, "equivalents"u8, point.Equivalents);
            Number(writer, "conversion"u8, point.Conversion);
            Values(writer, "byHalogenCount"u8, point.AmountsByHalogenCount);
            Values(writer, "amounts"u8, point.Amounts);
            Number(writer, "truncated"u8, point.Truncated);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }

    private static void ByProducts(Utf8JsonWriter writer, IReadOnlyList<CourseByProduct> byProducts)
    {
        writer.WriteStartArray("byProducts"u8);
        foreach (CourseByProduct one in byProducts)
        {
            writer.WriteStartObject();
            writer.WriteNumber("species"u8, one.Species.Number);
            Number(writer, "amountAtBestMono"u8, one.AmountAtBestMono);
            Number(writer, "largestAmount"u8, one.LargestAmount);
            Number(writer, "equivalentsAtLargest"u8, one.EquivalentsAtLargest);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }

    private static void Values(Utf8JsonWriter writer, ReadOnlySpan<byte> name, IReadOnlyList<double> values)
    {
        writer.WriteStartArray(name);
        for (int i = 0; i < values.Count; i++)
        {
            writer.WriteNumberValue(values[i]);
        }

        writer.WriteEndArray();
    }
}
