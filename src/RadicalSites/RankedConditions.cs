using RadicalSites.Products;
using RadicalSites.Selectivity;

namespace RadicalSites;

/// <summary>One reagent at one temperature, judged by a wanted product.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Conditions">Reagent, temperature, solvent.</param>
/// <param name="Wanted">The wanted product with its share; <see langword="null"/> share when the chain does not propagate or a rate is missing.</param>
/// <param name="Rival">The largest other product, or <see langword="null"/> when there is none.</param>
/// <param name="Propagates">Whether the chain propagates.</param>
/// <param name="IsInRange">Whether the temperature lies in the range of the reagent's parameters.</param>
public sealed record RankedConditions(
    ReactionConditions Conditions, HalogenationProduct Wanted, HalogenationProduct? Rival, bool Propagates, bool IsInRange);
