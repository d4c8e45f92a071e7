using RadicalSites.Diagnostics;

namespace RadicalSites.Interference;

/// <summary>Where a rule comes from and for which halogen sources it holds.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Problem">Catalogue entry of the rule.</param>
/// <param name="Sources">Kinds of halogen source for which it holds.</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Chapter or page in the source.</param>
public sealed record InterferenceRule(ProblemDescriptor Problem, HalogenSources Sources, string Source, string Locator);
