namespace RadicalSites.Thermochemistry;

/// <summary>One fitted increment.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Term">Name of the term, for example <c>base-2</c>, <c>group-aryl</c>, <c>repeat-chlorine</c>.</param>
/// <param name="KilojoulesPerMole">Estimate [kJ/mol].</param>
/// <param name="StandardErrorKilojoulesPerMole">Standard error [kJ/mol].</param>
/// <param name="Rows">Number of rows in which the term acts.</param>
public sealed record IncrementCoefficient(string Term, double KilojoulesPerMole, double StandardErrorKilojoulesPerMole, int Rows);
