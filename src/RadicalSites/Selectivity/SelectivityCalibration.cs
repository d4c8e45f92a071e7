using System;
using System.Collections.Generic;
using System.Globalization;
using System.Text;
using RadicalSites.Diagnostics;

namespace RadicalSites.Selectivity;

/// <summary>Shifts of the parameters of the selectivity model that a fit found, with their standard deviations.</summary>
/// <remarks>
/// Shifts are added to the values of the tables. The shipped fit is one such set (the table selectivity_fit); a user's
/// calibration replaces it. Immutable and safe for use by many threads.
/// </remarks>
public sealed class SelectivityCalibration
{
    private static readonly string[] Columns = ["parameter", "shift", "sigma"];

    private readonly double[] shifts;
    private readonly double[] sigmas;

    internal SelectivityCalibration(string name, double[] shifts, double[] sigmas)
    {
        Name = name;
        this.shifts = shifts;
        this.sigmas = sigmas;
    }

    /// <summary>No shifts: the tables as published.</summary>
    public static SelectivityCalibration None { get; } = new("none", new double[ParameterIndex.All.Length], PriorSigmas());

    /// <summary>The shipped fit to the fit set of the literature distributions.</summary>
    public static SelectivityCalibration Default => Holder.Shipped;

    /// <summary>All adjustable parameters with their table values.</summary>
    public static IReadOnlyList<SelectivityParameter> Parameters => ParameterIndex.All;

    /// <summary>Name shown in reports: the file or <c>shipped</c>.</summary>
    public string Name { get; }

    internal ReadOnlySpan<double> Shifts => shifts;

    internal ReadOnlySpan<double> Sigmas => sigmas;

    /// <summary>Shift of a parameter.</summary>
    /// <param name="parameter">Name as in <see cref="Parameters"/>; case is ignored.</param>
    /// <returns>Shift and its standard deviation, in the unit of the parameter.</returns>
    /// <exception cref="ArgumentException">There is no such parameter.</exception>
    public (double Shift, double Sigma) ShiftOf(string parameter)
    {
        int index = ParameterIndex.Find(parameter);
        return index >= 0
            ? (shifts[index], sigmas[index])
            : throw new ArgumentException($"There is no parameter '{parameter}'.", nameof(parameter));
    }

    /// <summary>Reads a calibration file as <see cref="ToText"/> writes it.</summary>
    /// <param name="name">Name for reports and messages.</param>
    /// <param name="text">The text: CSV with the columns parameter, shift, sigma.</param>
    /// <returns>The calibration; parameters that are not named keep their table values.</returns>
    /// <exception cref="TableFormatException">The text is not of that form, names an unknown parameter, or one twice.</exception>
    public static SelectivityCalibration Parse(string name, string text)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(text);
        var shifts = new double[ParameterIndex.All.Length];
        double[] sigmas = PriorSigmas();
        var seen = new bool[shifts.Length];
        foreach (CsvRow row in CsvTable.Read(name, text, Columns, []).Rows)
        {
            int index = ParameterIndex.Find(row.Required("parameter"));
            if (index < 0)
            {
                throw row.Error("parameter", $"there is no parameter '{row.Text("parameter")}'.");
            }

            if (seen[index])
            {
                throw row.Error("parameter", $"the parameter '{row.Text("parameter")}' occurs twice.");
            }

            seen[index] = true;
            shifts[index] = row.Number("shift", -20, 20);
            sigmas[index] = row.Number("sigma", 0, 20);
        }

        return new SelectivityCalibration(name, shifts, sigmas);
    }

    /// <summary>Writes the parameters that moved, as CSV that <see cref="Parse"/> reads.</summary>
    /// <param name="comment">Lines for the head of the file, without the leading #; may be empty.</param>
    /// <returns>The text, lines ended by line feed.</returns>
    public string ToText(string comment = "")
    {
        ArgumentNullException.ThrowIfNull(comment);
        var text = new StringBuilder("# table: selectivity_fit\n");
        foreach (string line in comment.Split('\n', StringSplitOptions.RemoveEmptyEntries))
        {
            text.Append("# ").Append(line).Append('\n');
        }

        text.Append("parameter,shift,sigma\n");
        for (int i = 0; i < shifts.Length; i++)
        {
            SelectivityParameter parameter = ParameterIndex.All[i];
            if (Math.Abs(shifts[i]) >= 5e-4 || Math.Abs(sigmas[i] - parameter.Spread) >= 5e-4)
            {
                text.Append(CultureInfo.InvariantCulture, $"{parameter.Name},{shifts[i]:0.####},{sigmas[i]:0.####}\n");
            }
        }

        return text.ToString();
    }

    private static double[] PriorSigmas() => Array.ConvertAll(ParameterIndex.All, static parameter => parameter.Spread);

    private static class Holder
    {
        internal static readonly SelectivityCalibration Shipped = Parse("shipped", CsvTable.EmbeddedText("selectivity_fit.csv"));
    }
}
