using System;
using RadicalSites.Products;
using RadicalSites.Selectivity;

namespace RadicalSites;

/// <summary>Hands the shares of the sites to the product lists.</summary>
internal sealed class SelectivityShares(SelectivityResult selectivity) : ISiteShares
{
    public double? ShareOf(int site) => selectivity.Sites[site - 1].Share;

    public (double Low, double High) IntervalOf(ReadOnlySpan<int> sites) => selectivity.IntervalOf(sites);
}
