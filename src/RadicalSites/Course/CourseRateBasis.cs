namespace RadicalSites.Course;

/// <summary>What the rate of a species relative to the others rests on.</summary>
public enum CourseRateBasis : byte
{
    /// <summary>The rate model of the Selectivity namespace, site by site.</summary>
    Model,

    /// <summary>A published ratio for the whole molecule; the model only divides it among the sites.</summary>
    MeasuredRatio,

    /// <summary>No hydrogen is left that the model can rate.</summary>
    None,
}
