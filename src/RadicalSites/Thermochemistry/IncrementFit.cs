using System;
using System.Collections.Generic;
using System.Linq;

namespace RadicalSites.Thermochemistry;

/// <summary>The increment model fitted to the preferred C(sp3)-H rows of a table, with its leave-one-out errors.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Coefficients">Coefficients by name.</param>
/// <param name="Rows">The rows in table order.</param>
public sealed record IncrementFit(IReadOnlyList<IncrementCoefficient> Coefficients, IReadOnlyList<IncrementRow> Rows)
{
    /// <summary>Mean absolute leave-one-out error over all rows that can be left out [kJ/mol].</summary>
    public double LeaveOneOutError => Error(static _ => true);

    /// <summary>The same over hydrocarbons [kJ/mol].</summary>
    public double LeaveOneOutErrorHydrocarbons => Error(static row => row.IsHydrocarbon);

    /// <summary>Median absolute leave-one-out error over all rows that can be left out [kJ/mol].</summary>
    public double MedianLeaveOneOutError
    {
        get
        {
            double[] errors = [.. Errors(static _ => true).Order()];
            return errors.Length == 0 ? 0 : errors[errors.Length / 2];
        }
    }

    private double Error(Func<IncrementRow, bool> which) => Errors(which).DefaultIfEmpty(0).Average();

    private IEnumerable<double> Errors(Func<IncrementRow, bool> which) => Rows
        .Where(row => which(row) && row.LeftOutKilojoulesPerMole is not null)
        .Select(static row => Math.Abs(row.LeftOutKilojoulesPerMole!.Value - row.Entry.KilojoulesPerMole));
}
