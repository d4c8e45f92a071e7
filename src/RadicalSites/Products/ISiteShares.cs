using System;

namespace RadicalSites.Products;

/// <summary>Shares of the sites with their joint uncertainty, as the product lists need them.</summary>
internal interface ISiteShares
{
    /// <summary>Share of a site, 0 to 1, or <see langword="null"/> when the site has no rate.</summary>
    /// <param name="site">1-based number of the site.</param>
    double? ShareOf(int site);

    /// <summary>90 % interval of the summed share of several sites, common errors treated as common.</summary>
    /// <param name="sites">1-based numbers of rated sites, each once.</param>
    (double Low, double High) IntervalOf(ReadOnlySpan<int> sites);
}
