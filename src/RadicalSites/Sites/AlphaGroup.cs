using System.Collections.Generic;

namespace RadicalSites.Sites;

/// <summary>One functional group attached directly to a carbon, with the atoms that made it so.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Kind">Kind of the group.</param>
/// <param name="Atom">0-based index of the atom of the group that is bonded to the carbon.</param>
/// <param name="GroupAtoms">0-based indices of the atoms that decided the kind, the attached atom first.</param>
public sealed record AlphaGroup(AlphaGroupKind Kind, int Atom, IReadOnlyList<int> GroupAtoms);
