using System.Collections.Generic;
using RadicalSites.Selectivity;

namespace RadicalSites;

/// <summary>Outcome of a calibration.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record CalibrationReport
{
    /// <summary>The calibrated parameters; the starting ones when nothing could be used.</summary>
    public required SelectivityCalibration Calibration { get; init; }

    /// <summary>Number of experiments used.</summary>
    public required int Experiments { get; init; }

    /// <summary>Mean absolute error over the measured products before [percentage points].</summary>
    public required double ErrorBefore { get; init; }

    /// <summary>The same after.</summary>
    public required double ErrorAfter { get; init; }

    /// <summary>Parameters on which the measurements bear, largest move in standard deviations first.</summary>
    public required IReadOnlyList<CalibratedParameter> Parameters { get; init; }

    /// <summary>Experiments that were not used, with the reasons.</summary>
    public required IReadOnlyList<CalibrationRefusal> Refused { get; init; }

    /// <summary>Experiments that stay more than four standard deviations off and were weighted down.</summary>
    public required IReadOnlyList<string> Outliers { get; init; }
}
