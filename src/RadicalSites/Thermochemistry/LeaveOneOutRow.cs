namespace RadicalSites.Thermochemistry;

/// <summary>One row of the leave-one-out test: a bond predicted by a fit that did not see it.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Entry">Row of the C-H table.</param>
/// <param name="PredictedKilojoulesPerMole">
/// Prediction [kJ/mol], or <see langword="null"/> when the row is the only one that carries one of its terms: without it
/// the term has no value, so nothing is predicted.
/// </param>
/// <param name="IsHydrocarbon">Whether the molecule holds carbon and hydrogen only.</param>
public sealed record LeaveOneOutRow(BdeEntry Entry, double? PredictedKilojoulesPerMole, bool IsHydrocarbon)
{
    /// <summary>Prediction minus table value [kJ/mol]; <see langword="null"/> without a prediction.</summary>
    public double? ErrorKilojoulesPerMole => PredictedKilojoulesPerMole - Entry.KilojoulesPerMole;
}
