namespace RadicalSites.Heat;

/// <summary>A gas formed by the reaction.</summary>
/// <remarks>Volume as an ideal gas at 1 bar. Immutable and safe for use by many threads.</remarks>
/// <param name="Formula">Formula in the usual notation, for example <c>HCl</c>.</param>
/// <param name="Moles">Amount of substance [mol].</param>
/// <param name="Liters">Volume at the start temperature and 1 bar [L].</param>
public sealed record EvolvedGas(string Formula, double Moles, double Liters);
