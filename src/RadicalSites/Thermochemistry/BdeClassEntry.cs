using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

/// <summary>One class value: what a carbon of a given degree with given groups has in general.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Id">Id of the row.</param>
/// <param name="Kind">base, ring, bridgehead or group; see the table's header.</param>
/// <param name="Group">Names of the groups joined by <c>+</c>, or the ring size; empty for a base row.</param>
/// <param name="Degree">Degree of the carbon.</param>
/// <param name="KilojoulesPerMole">Enthalpy [kJ/mol]; for ring rows the difference to the base.</param>
/// <param name="SigmaKilojoulesPerMole">Standard deviation of a new member of the class [kJ/mol].</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Members of the class.</param>
/// <param name="IsAnalogy">Whether the value is carried over from other classes instead of having members.</param>
public sealed record BdeClassEntry(
    string Id, string Kind, string Group, SiteDegree Degree, double KilojoulesPerMole, double SigmaKilojoulesPerMole,
    string Source, string Locator, bool IsAnalogy);
