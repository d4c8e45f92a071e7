namespace RadicalSites;

/// <summary>One product of a bench entry: predicted against measured.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Smiles">SMILES as in the table, or <c>*</c> for all products not listed.</param>
/// <param name="Measured">Measured percentage [%].</param>
/// <param name="Predicted">Predicted percentage of the products listed [%].</param>
/// <param name="Low">Lower end of the 90 % interval [%].</param>
/// <param name="High">Upper end of the 90 % interval [%].</param>
/// <param name="SiteClass">Degree and conjugation of the leading site, or <c>rest</c>.</param>
public sealed record BenchProduct(
    string Smiles, double Measured, double Predicted, double Low, double High, string SiteClass)
{
    // Published percentages are rounded; half a point either way is no miss.
    private const double Rounding = 0.5;

    /// <summary>Predicted less measured [percentage points].</summary>
    public double Error => Predicted - Measured;

    /// <summary>Whether the measured value, within half a point of rounding, lies in the interval.</summary>
    public bool IsCovered => Measured >= Low - Rounding && Measured <= High + Rounding;
}
