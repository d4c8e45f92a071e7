using System;
using RadicalSites.Selectivity;

namespace RadicalSites.Products;

/// <summary>Shares of the sites as the selectivity model gives them.</summary>
internal sealed class SelectivityShares(SelectivityResult result) : ISiteShares
{
    /// <inheritdoc/>
    public double? ShareOf(int site) => result.Sites[site - 1].Share;

    /// <inheritdoc/>
    public (double Low, double High) IntervalOf(ReadOnlySpan<int> sites) => result.IntervalOf(sites);
}
