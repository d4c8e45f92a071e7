using System;
using System.Collections.Generic;
using System.Linq;

namespace RadicalSites.Thermochemistry;

/// <summary>Increments fitted to the preferred rows of a C-H table, with the test of that fit.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record IncrementFit
{
    /// <summary>The increments in order of their names.</summary>
    public required IReadOnlyList<IncrementCoefficient> Coefficients { get; init; }

    /// <summary>Covariance of the estimates [(kJ/mol)²], rows and columns in the order of <see cref="Coefficients"/>.</summary>
    public required IReadOnlyList<IReadOnlyList<double>> Covariance { get; init; }

    /// <summary>Every fitted row, predicted without itself; in table order.</summary>
    public required IReadOnlyList<LeaveOneOutRow> LeaveOneOut { get; init; }

    /// <summary>Scatter of the rows about the increments beyond their own sigma [kJ/mol].</summary>
    public required double ScatterKilojoulesPerMole { get; init; }

    /// <summary>Mean absolute leave-one-out error over all predictable rows [kJ/mol].</summary>
    public double MeanAbsoluteError => Mean(static _ => true);

    /// <summary>Mean absolute leave-one-out error over the predictable hydrocarbon rows [kJ/mol].</summary>
    public double MeanAbsoluteErrorHydrocarbons => Mean(static row => row.IsHydrocarbon);

    private double Mean(Func<LeaveOneOutRow, bool> chosen)
    {
        double[] errors =
        [
            .. LeaveOneOut.Where(row => chosen(row) && row.ErrorKilojoulesPerMole is not null)
                .Select(static row => Math.Abs(row.ErrorKilojoulesPerMole!.Value)),
        ];
        return errors.Length == 0 ? double.NaN : errors.Average();
    }
}
