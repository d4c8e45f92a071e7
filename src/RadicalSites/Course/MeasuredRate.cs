using System.Collections.Generic;

namespace RadicalSites.Course;

/// <summary>A published rate of a whole molecule, brought to the scale of the network.</summary>
/// <param name="Rate">Rate on the scale of the reference species.</param>
/// <param name="Evidence">Ids of the rows used.</param>
internal sealed record MeasuredRate(double Rate, IReadOnlyList<string> Evidence);
