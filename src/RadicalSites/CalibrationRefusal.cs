namespace RadicalSites;

/// <summary>A measurement that a calibration could not use.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Id">Id of the experiment.</param>
/// <param name="Reason">Why it was refused, in words.</param>
public sealed record CalibrationRefusal(string Id, string Reason);
