using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites.Interference;

/// <summary>One group of the molecule that diverts, poisons or endangers the radical halogenation.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Problem">Catalogue entry: what happens, why, and what chemists do about it.</param>
/// <param name="Atoms">0-based indices of the atoms of the group, the deciding atom first.</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Chapter or page in the source.</param>
public sealed record InterferenceHit(ProblemDescriptor Problem, IReadOnlyList<int> Atoms, string Source, string Locator)
{
    /// <summary>The hit as a diagnostic of a result.</summary>
    /// <returns>A diagnostic with the code, severity, message and atoms of the hit.</returns>
    public Diagnostic ToDiagnostic() => Diagnostic.Create(Problem, Atoms);
}
