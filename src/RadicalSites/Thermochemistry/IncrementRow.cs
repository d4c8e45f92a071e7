namespace RadicalSites.Thermochemistry;

/// <summary>One row of the C-H table against the increment model.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Entry">The row.</param>
/// <param name="IsHydrocarbon">Whether its molecule holds carbon and hydrogen only.</param>
/// <param name="FittedKilojoulesPerMole">Value of the model fitted to all rows [kJ/mol].</param>
/// <param name="LeftOutKilojoulesPerMole">
/// Value of the model fitted to all other rows [kJ/mol]; <see langword="null"/> when a term occurs in this row alone.
/// </param>
public sealed record IncrementRow(
    BdeEntry Entry, bool IsHydrocarbon, double FittedKilojoulesPerMole, double? LeftOutKilojoulesPerMole);
