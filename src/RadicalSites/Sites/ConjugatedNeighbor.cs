using System.Collections.Generic;

namespace RadicalSites.Sites;

/// <summary>One neighbouring pi group of a carbon, with the atoms that made it so.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Kind">Kind of the pi group.</param>
/// <param name="Atom">0-based index of the neighbouring atom.</param>
/// <param name="PiAtoms">
/// 0-based indices of the atoms of the pi group: both ends of the double or triple bond, or the atoms of the aromatic
/// ring with the neighbour first.
/// </param>
public sealed record ConjugatedNeighbor(ConjugationKind Kind, int Atom, IReadOnlyList<int> PiAtoms);
