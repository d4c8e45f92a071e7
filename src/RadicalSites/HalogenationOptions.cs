using RadicalSites.Products;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>How molecules are analysed and products listed.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record HalogenationOptions
{
    /// <summary>Options used when none are given.</summary>
    public static HalogenationOptions Default { get; } = new();

    /// <summary>Whether carbons that only existing stereo tells apart share a site; off by default.</summary>
    public bool MergeDiastereotopic { get; init; }

    /// <summary>Table of bond dissociation enthalpies; the shipped one by default.</summary>
    public BdeTable Table { get; init; } = BdeTable.Default;

    /// <summary>Fitted shifts of the selectivity parameters; the shipped fit by default.</summary>
    public SelectivityCalibration Calibration { get; init; } = SelectivityCalibration.Default;

    /// <summary>How product stereo is written; existing centres kept and new ones unmarked by default.</summary>
    public ProductStereoMode Stereo { get; init; } = ProductStereoMode.Mark;

    /// <summary>Version of the data in use: that of the table, and the name of a calibration that is not the shipped one.</summary>
    public string DataVersion => ReferenceEquals(Calibration, SelectivityCalibration.Default)
        ? Table.Version
        : Table.Version + "+" + Calibration.Name;
}
