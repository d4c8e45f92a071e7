using RadicalSites.Molecules;

namespace RadicalSites.Thermochemistry;

/// <summary>One row of the C-H table: the bond of one molecule by one source.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Id">Id of the row.</param>
/// <param name="Substance">Name of the molecule and bond.</param>
/// <param name="Smiles">Molecule with the carbon of the bond in atom class 1.</param>
/// <param name="KilojoulesPerMole">Enthalpy at 298.15 K [kJ/mol].</param>
/// <param name="SigmaKilojoulesPerMole">Standard uncertainty [kJ/mol].</param>
/// <param name="Kind">How the value came about.</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Table, page or derivation; starts with <c>from memory</c> where the publication was not re-read.</param>
/// <param name="IsPreferred">Whether this row answers for its bond.</param>
/// <param name="Checked">Other rows for the same bond with their difference.</param>
/// <param name="Note">Why it is preferred, or another remark.</param>
/// <param name="Table">Name of the table that holds the row.</param>
public sealed record BdeEntry(
    string Id, string Substance, string Smiles, double KilojoulesPerMole, double SigmaKilojoulesPerMole, BdeKind Kind,
    string Source, string Locator, bool IsPreferred, string Checked, string Note, string Table)
{
    internal Molecule Molecule { get; init; } = null!;

    internal int Carbon { get; init; }
}
