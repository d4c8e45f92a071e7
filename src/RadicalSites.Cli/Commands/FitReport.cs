using System.Globalization;
using System.IO;
using RadicalSites.Reporting;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Cli.Commands;

/// <summary>Prints the fit of increments: coefficients, then every row predicted without itself.</summary>
internal static class FitReport
{
    internal static void Write(TextWriter writer)
    {
        IncrementFit fit = IncrementRegression.Fit();
        var coefficients = new TextTable("term", ">kJ/mol", ">standard error", ">rows");
        foreach (IncrementCoefficient coefficient in fit.Coefficients)
        {
            coefficients.Add(
                coefficient.Term, One(coefficient.KilojoulesPerMole), One(coefficient.StandardErrorKilojoulesPerMole),
                coefficient.Rows.ToString(CultureInfo.InvariantCulture));
        }

        coefficients.Write(writer);
        writer.Write('\n');
        var rows = new TextTable("row", "bond of", ">table", ">sigma", ">without it", ">error");
        int alone = 0;
        foreach (LeaveOneOutRow row in fit.LeaveOneOut)
        {
            alone += row.PredictedKilojoulesPerMole is null ? 1 : 0;
            rows.Add(
                row.Entry.Id, row.Entry.Substance, One(row.Entry.KilojoulesPerMole), One(row.Entry.SigmaKilojoulesPerMole),
                row.PredictedKilojoulesPerMole is { } value ? One(value) : "sole member",
                row.ErrorKilojoulesPerMole is { } error ? One(error) : "");
        }

        rows.Write(writer);
        writer.Write(string.Create(
            CultureInfo.InvariantCulture,
            $"\n{fit.LeaveOneOut.Count} rows, {alone} of them the sole member of a class and not predictable\nmean absolute error without the row {fit.MeanAbsoluteError:F1} kJ/mol, hydrocarbons {fit.MeanAbsoluteErrorHydrocarbons:F1} kJ/mol; scatter beyond sigma {fit.ScatterKilojoulesPerMole:F1} kJ/mol\n"));
    }

    private static string One(double value) => value.ToString("F1", CultureInfo.InvariantCulture);
}
