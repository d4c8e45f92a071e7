namespace RadicalSites.Selectivity;

/// <summary>Rate and share of one site.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="SiteNumber">Number of the site, 1-based.</param>
/// <param name="RelativeRatePerHydrogen">Rate per hydrogen relative to a primary alkane C-H, or <see langword="null"/> without a value.</param>
/// <param name="Share">Share of the mono-halogenation, 0 to 1, or <see langword="null"/>.</param>
/// <param name="ShareLow">Lower end of the 90 % interval.</param>
/// <param name="ShareHigh">Upper end of the 90 % interval.</param>
/// <param name="Steps">Enthalpies of the propagation steps.</param>
public sealed record SiteSelectivity(
    int SiteNumber, double? RelativeRatePerHydrogen, double? Share, double? ShareLow, double? ShareHigh,
    StepEnthalpies Steps);
