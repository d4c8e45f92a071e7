namespace RadicalSites.Course;

/// <summary>Where the mono-halogenated products together reach their highest yield.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Equivalents">Halogen consumed there [mol per mol substrate].</param>
/// <param name="Conversion">Substrate consumed there, 0 to 1.</param>
/// <param name="MonoYield">Mono products there [mol per mol substrate], 0 to 1.</param>
/// <param name="IsLimit">
/// Whether the yield still rises towards the end that the network allows (mono products that react no further).
/// </param>
/// <param name="Point">The whole composition there.</param>
public sealed record CourseOptimum(
    double Equivalents, double Conversion, double MonoYield, bool IsLimit, CoursePoint Point);
