using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites.Products;

/// <summary>The products of mono-halogenation of one molecule with remarks.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Products">By falling share, then by canonical SMILES; each constitution once; may be empty.</param>
/// <param name="Diagnostics">What was left out and why, unknown splits, sites without a rate.</param>
public sealed record ProductSet(IReadOnlyList<HalogenationProduct> Products, IReadOnlyList<Diagnostic> Diagnostics);
