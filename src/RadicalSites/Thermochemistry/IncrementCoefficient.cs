namespace RadicalSites.Thermochemistry;

/// <summary>One coefficient of the increment model.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Name">base, group or ring term, for example <c>base:Secondary</c>, <c>group:Benzylic</c>, <c>ring:3</c>.</param>
/// <param name="KilojoulesPerMole">Value [kJ/mol].</param>
/// <param name="StandardErrorKilojoulesPerMole">Standard error [kJ/mol].</param>
/// <param name="RowCount">Number of table rows that carry the term.</param>
public sealed record IncrementCoefficient(
    string Name, double KilojoulesPerMole, double StandardErrorKilojoulesPerMole, int RowCount);
