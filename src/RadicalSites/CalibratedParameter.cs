namespace RadicalSites;

/// <summary>One parameter before and after a calibration.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Name">Name as in the list of parameters.</param>
/// <param name="Before">Value before [unit of the parameter].</param>
/// <param name="SigmaBefore">Standard deviation before.</param>
/// <param name="After">Value after.</param>
/// <param name="SigmaAfter">Standard deviation after.</param>
public sealed record CalibratedParameter(string Name, double Before, double SigmaBefore, double After, double SigmaAfter);
