using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>A place of a molecule whose configuration matters: turning it over can give another stereoisomer.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Kind">Tetrahedral, allene or cis-trans.</param>
/// <param name="Focus">0-based index of the centre, of the central atom of an allene, or of one end of the double bond.</param>
/// <param name="FocusEnd">0-based index of the other end of a double bond, otherwise equal to <paramref name="Focus"/>.</param>
/// <param name="IsStated">Whether the molecule states the configuration.</param>
/// <param name="IsDependent">
/// Whether its ligands differ only by the configuration of other places, as in 1,4-dimethylcyclohexane or at a
/// pseudoasymmetric centre.
/// </param>
public sealed record StereoUnit(StereoKind Kind, int Focus, int FocusEnd, bool IsStated, bool IsDependent);
