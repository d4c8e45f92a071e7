namespace RadicalSites;

/// <summary>Figures over one group of bench entries.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Group">Name of the group, for example <c>test, measured</c> or <c>test, carrier Cl</c>.</param>
/// <param name="Entries">Number of distributions.</param>
/// <param name="Products">Number of products.</param>
/// <param name="MeanAbsoluteError">Mean absolute error per product [percentage points].</param>
/// <param name="Coverage">Part of the products whose measured value lies in the 90 % interval, 0 to 1.</param>
public sealed record BenchSummary(string Group, int Entries, int Products, double MeanAbsoluteError, double Coverage);
