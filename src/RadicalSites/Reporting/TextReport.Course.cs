using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites.Course;
using RadicalSites.Heat;
using RadicalSites.Selectivity;

namespace RadicalSites.Reporting;

public static partial class TextReport
{
    private static readonly string[] Multiples = ["left", "mono", "di", "tri", "tetra"];

    /// <summary>Writes an over-halogenation course: best stopping point, composition, by-products.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="conditions">Reagent, temperature, solvent.</param>
    /// <param name="dataVersion">Version of the data in use.</param>
    /// <param name="course">The course.</param>
    public static void Write(
        TextWriter writer, RecordSource source, ReactionConditions conditions, string dataVersion, HalogenationCourse course)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(conditions);
        ArgumentNullException.ThrowIfNull(course);
        Head(writer, source, course.Species[0].CanonicalSmiles, course.Species[0].Molecule);
        Job(writer, conditions, dataVersion);
        writer.Write(course.BestMono is { } best
            ? string.Create(
                CultureInfo.InvariantCulture,
                $"Mono yield is highest, {Percent(best.MonoYield)}, at {best.Equivalents:0.00} equivalents ({Percent(best.Conversion)} conversion){(best.IsLimit ? "; it still rises towards the end" : "")}.\n\n")
            : "No site reacts.\n\n");
        Composition(writer, course);
        if (course.ByProducts.Count > 0)
        {
            writer.Write('\n');
            var table = new TextTable("species", ">halogens", ">at best mono", ">at most", ">at equivalents");
            foreach (CourseByProduct one in course.ByProducts)
            {
                table.Add(
                    one.Species.CanonicalSmiles, Count(one.Species.HalogenCount), Percent(one.AmountAtBestMono),
                    Percent(one.LargestAmount), one.EquivalentsAtLargest.ToString("0.00", CultureInfo.InvariantCulture));
            }

            table.Write(writer);
        }

        Remarks(writer, [.. source.Remarks, .. course.Diagnostics]);
    }

    /// <summary>Writes a heat balance.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="prediction">The prediction on which the balance rests.</param>
    /// <param name="report">The balance.</param>
    public static void Write(TextWriter writer, RecordSource source, Prediction prediction, HeatReport report)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(prediction);
        ArgumentNullException.ThrowIfNull(report);
        Head(writer, source, prediction.CanonicalSmiles, prediction.Molecule);
        Job(writer, prediction.Conditions, prediction.DataVersion);
        var materials = new TextTable("material", "name", ">mol", ">g", ">mL", ">equiv.");
        foreach (Material one in report.Materials)
        {
            materials.Add(
                one.Role, one.Name, Three(one.Moles), Three(one.Grams), Three(one.Milliliters), Three(one.Equivalents));
        }

        materials.Write(writer);
        writer.Write('\n');
        var figures = new TextTable("quantity", ">value", "unit");
        figures.Add("reaction enthalpy", Bde(report.KilojoulesPerMole, report.SigmaKilojoulesPerMole), "kJ/mol C-H replaced");
        figures.Add("heat of the batch", Three(report.HeatKilojoules), "kJ");
        figures.Add("mass of the mixture", Three(report.MixtureGrams), "g");
        figures.Add("heat capacity", Three(report.JoulesPerGramKelvin), "J/(g K)");
        figures.Add("adiabatic rise", Three(report.AdiabaticRiseKelvin), "K");
        figures.Add("adiabatic end", Three(report.EndCelsius), "C");
        figures.Add("solvent boils", Three(report.SolventBoilingPointCelsius), "C");
        figures.Write(writer);
        Remarks(writer, [.. source.Remarks, .. report.Diagnostics]);
    }

    /// <summary>Writes a ranking of conditions.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="ranking">The ranking.</param>
    public static void Write(TextWriter writer, RecordSource source, ConditionRanking ranking)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(ranking);
        Head(writer, source, Canonical.CanonicalSmiles.Write(ranking.Substrate), ranking.Substrate);
        writer.Write($"wanted: {ranking.Wanted} (data {ranking.DataVersion})\n\n");
        var table = new TextTable(">rank", "reagent", ">C", ">share", ">90 %", "largest other product", "chain");
        for (int i = 0; i < ranking.Conditions.Count; i++)
        {
            RankedConditions one = ranking.Conditions[i];
            string rival = one.Rival is { } other ? $"{other.CanonicalSmiles} {Percent(other.Share)}" : "none";
            table.Add(
                Count(i + 1), one.Conditions.Reagent.Id, one.Conditions.Temperature.Celsius.ToString("0", CultureInfo.InvariantCulture),
                Percent(one.Wanted.Share), Interval(one.Wanted.ShareLow, one.Wanted.ShareHigh), rival,
                (one.Propagates ? "runs" : "does not run") + (one.IsInRange ? "" : ", outside the range of the parameters"));
        }

        if (ranking.Conditions.Count > 0)
        {
            table.Write(writer);
        }

        Remarks(writer, [.. source.Remarks, .. ranking.Diagnostics]);
    }

    private static void Composition(TextWriter writer, HalogenationCourse course)
    {
        int columns = course.Points.Max(static point => point.AmountsByHalogenCount.Count);
        var table = new TextTable(
        [
            ">equivalents", ">conversion",
            .. Enumerable.Range(0, columns).Select(static n => ">" + (n < Multiples.Length ? Multiples[n] : Count(n) + " halogens")),
            ">not followed",
        ]);

        // A person reads a dozen rows; the machine formats hold every point.
        int step = Math.Max(1, (course.Points.Count - 1) / 12);
        for (int i = 0; i < course.Points.Count; i += step)
        {
            CoursePoint point = course.Points[i];
            IReadOnlyList<double> amounts = point.AmountsByHalogenCount;
            table.Add(
            [
                point.Equivalents.ToString("0.00", CultureInfo.InvariantCulture), Percent(point.Conversion),
                .. Enumerable.Range(0, columns).Select(n => n < amounts.Count ? Percent(amounts[n]) : "-"),
                Percent(point.Truncated),
            ]);
        }

        table.Write(writer);
    }

    private static void Job(TextWriter writer, ReactionConditions conditions, string dataVersion) => writer.Write(string.Create(
        CultureInfo.InvariantCulture,
        $"{conditions.Reagent.Name} ({conditions.Reagent.Id}), {conditions.Temperature.Celsius:F0} C, carrier: {conditions.Reagent.Carrier.Name}{(conditions.Solvent is null ? "" : ", solvent " + conditions.Solvent)} (data {dataVersion})\n\n"));

    private static string Bde(double? value, double? sigma) => value is null
        ? "-"
        : string.Create(CultureInfo.InvariantCulture, $"{value:F1} +- {sigma ?? 0:F1}");

    private static string Three(double? value) => value is { } number
        ? number.ToString(Math.Abs(number) is >= 0.1 and < 100_000 ? "0.###" : "G3", CultureInfo.InvariantCulture)
        : "-";
}
