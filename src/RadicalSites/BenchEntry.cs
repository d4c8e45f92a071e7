using System.Collections.Generic;

namespace RadicalSites;

/// <summary>One distribution of the bench with its prediction.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Distribution">The measured distribution.</param>
/// <param name="Carrier">Id of the chain carrier.</param>
/// <param name="Products">Predicted against measured, in table order; empty when the entry could not be predicted.</param>
/// <param name="Problem">Why there is no prediction, or <see langword="null"/>.</param>
public sealed record BenchEntry(
    MeasuredDistribution Distribution, string Carrier, IReadOnlyList<BenchProduct> Products, string? Problem)
{
    /// <summary>Mean absolute error over the products [percentage points]; 0 without a prediction.</summary>
    public double MeanAbsoluteError
    {
        get
        {
            double sum = 0;
            foreach (BenchProduct product in Products)
            {
                sum += double.Abs(product.Error);
            }

            return Products.Count == 0 ? 0 : sum / Products.Count;
        }
    }
}
