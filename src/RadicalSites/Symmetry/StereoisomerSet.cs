using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites.Symmetry;

/// <summary>Distinct stereoisomers of a molecule.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Stereoisomers">Distinct stereoisomers in an order that does not depend on the numbering of the input; never empty.</param>
/// <param name="Diagnostics">Empty, or <c>limit-reached</c> when not all could be listed.</param>
public sealed record StereoisomerSet(IReadOnlyList<Stereoisomer> Stereoisomers, IReadOnlyList<Diagnostic> Diagnostics)
{
    /// <summary>Whether all stereoisomers are listed.</summary>
    public bool IsComplete => Diagnostics.Count == 0;
}
