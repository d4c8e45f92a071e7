namespace RadicalSites;

/// <summary>One product of a measured distribution.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Smiles">SMILES of the product, <c>*</c> for all products not listed, or empty when a site is named.</param>
/// <param name="Percent">Percent of the products listed [%].</param>
public sealed record MeasuredProduct(string Smiles, double Percent)
{
    /// <summary>1-based number of the site that was attacked, when the product is named by its site.</summary>
    public int? Site { get; init; }

    /// <summary>Standard uncertainty [percentage points], or <see langword="null"/> to take the usual one.</summary>
    public double? SigmaPercent { get; init; }
}
