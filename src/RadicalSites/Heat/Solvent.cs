namespace RadicalSites.Heat;

/// <summary>Physical properties of a solvent for the heat balance.</summary>
/// <remarks>Uncertainties stand in the header of the table. Immutable and safe for use by many threads.</remarks>
/// <param name="Id">Short id, for example <c>CCl4</c>.</param>
/// <param name="Name">Name of the substance.</param>
/// <param name="Smiles">Structure.</param>
/// <param name="GramsPerMilliliter">Density at 25 C [g/mL].</param>
/// <param name="JoulesPerGramKelvin">Specific heat capacity at 25 C [J/(g K)].</param>
/// <param name="BoilingPointCelsius">Normal boiling point [degree Celsius].</param>
/// <param name="Role">inert, complexing, reactive or acid; see the table.</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Table or page.</param>
/// <param name="Caution">What to mind, or empty.</param>
public sealed record Solvent(
    string Id, string Name, string Smiles, double GramsPerMilliliter, double JoulesPerGramKelvin,
    double BoilingPointCelsius, string Role, string Source, string Locator, string Caution);
