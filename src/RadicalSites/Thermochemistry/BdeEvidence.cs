namespace RadicalSites.Thermochemistry;

/// <summary>One table row on which a bond dissociation enthalpy rests.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Entry">Id of the row in its table.</param>
/// <param name="KilojoulesPerMole">Value of the row [kJ/mol]: an enthalpy, or an increment that is added.</param>
/// <param name="Role">What the row does here, for example <c>this bond</c>, <c>class value</c>, <c>increment</c>.</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Table, page or record in the source.</param>
public sealed record BdeEvidence(string Entry, double KilojoulesPerMole, string Role, string Source, string Locator);
