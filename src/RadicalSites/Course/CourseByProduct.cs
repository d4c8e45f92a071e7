namespace RadicalSites.Course;

/// <summary>A species other than the substrate that passes the threshold somewhere on the curve.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Species">The species.</param>
/// <param name="AmountAtBestMono">Amount where the mono yield is best [mol per mol substrate].</param>
/// <param name="LargestAmount">Largest amount on the curve [mol per mol substrate].</param>
/// <param name="EquivalentsAtLargest">Halogen consumed at that point [mol per mol substrate].</param>
public sealed record CourseByProduct(
    CourseSpecies Species, double AmountAtBestMono, double LargestAmount, double EquivalentsAtLargest);
