namespace RadicalSites.Selectivity;

/// <summary>One adjustable parameter of the selectivity model.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Name">Name, for example <c>Cl/Secondary</c>, <c>Cl/polar-beta</c> or <c>early/alpha/Nitrile</c>.</param>
/// <param name="TableValue">Value in the tables; ln k at 298.15 K for a rate class.</param>
/// <param name="Spread">Standard deviation that a fit allows it to move by [unit of the value].</param>
/// <param name="Carrier">Carrier that it belongs to, or <see langword="null"/> when carriers share it.</param>
public sealed record SelectivityParameter(string Name, double TableValue, double Spread, string? Carrier);
