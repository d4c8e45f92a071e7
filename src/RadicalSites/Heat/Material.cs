namespace RadicalSites.Heat;

/// <summary>One line of the stoichiometric table of a batch.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Role">substrate, halogen source, solvent or product (theory).</param>
/// <param name="Name">Name or formula.</param>
/// <param name="Moles">Amount of substance [mol], or <see langword="null"/> where it plays no part.</param>
/// <param name="Grams">Mass [g].</param>
/// <param name="Milliliters">Volume [mL] of a liquid with known density, otherwise <see langword="null"/>.</param>
/// <param name="Equivalents">Equivalents relative to the substrate, or <see langword="null"/>.</param>
public sealed record Material(
    string Role, string Name, double? Moles, double Grams, double? Milliliters, double? Equivalents);
