using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>How parameters are fitted to measured distributions.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record CalibrationOptions
{
    /// <summary>Values and standard deviations to start from; the shipped fit by default.</summary>
    public SelectivityCalibration Start { get; init; } = SelectivityCalibration.Default;

    /// <summary>Table of bond dissociation enthalpies; the shipped one by default.</summary>
    public BdeTable Table { get; init; } = BdeTable.Default;

    /// <summary>Name of the result in reports.</summary>
    public string Name { get; init; } = "calibration";

    /// <summary>
    /// Part of the starting standard deviation that a parameter keeps at least, 0 to 1; 0.5 by default. A parameter that
    /// fits the measured molecules exactly still differs from molecule to molecule.
    /// </summary>
    public double LeastSpread { get; init; } = 0.5;
}
