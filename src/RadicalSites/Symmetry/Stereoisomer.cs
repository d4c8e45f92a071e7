using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>One stereoisomer of an enumeration.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Molecule">The molecule with every configuration stated that matters.</param>
/// <param name="Enantiomer">
/// 0-based index of its mirror image in the enumeration; its own index when it is achiral (meso, for one);
/// <see langword="null"/> when the mirror image is not part of the enumeration.
/// </param>
/// <param name="IsChiral">Whether it differs from its mirror image.</param>
public sealed record Stereoisomer(Molecule Molecule, int? Enantiomer, bool IsChiral);
