namespace RadicalSites.Thermochemistry;

/// <summary>One row of the table of other bonds.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Id">Id of the row.</param>
/// <param name="Bond">The two parts joined, for example <c>H-Br</c> or <c>iPr-Br</c>.</param>
/// <param name="Substance">Name of the molecule.</param>
/// <param name="KilojoulesPerMole">Enthalpy at 298.15 K [kJ/mol].</param>
/// <param name="SigmaKilojoulesPerMole">Standard uncertainty [kJ/mol].</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Table, page or derivation.</param>
public sealed record BondEntry(
    string Id, string Bond, string Substance, double KilojoulesPerMole, double SigmaKilojoulesPerMole, string Source,
    string Locator);
