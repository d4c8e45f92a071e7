using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites.Course;

/// <summary>Composition of the mixture against halogen consumed: substrate, mono, di and higher products.</summary>
/// <remarks>
/// Competitive consecutive abstraction, N of every species linear in the integrated exposure to the chain carrier;
/// solved exactly (see <see cref="CourseSolver"/>), so only the rates carry uncertainty. Mixing is ideal, the halogen
/// goes to C-H substitution alone, and ionic or addition reactions are outside. Immutable and safe for use by many
/// threads.
/// </remarks>
public sealed record HalogenationCourse
{
    /// <summary>All species followed, the substrate first.</summary>
    public required IReadOnlyList<CourseSpecies> Species { get; init; }

    /// <summary>The curve, by rising equivalents; it ends early where no hydrogen is left.</summary>
    public required IReadOnlyList<CoursePoint> Points { get; init; }

    /// <summary>Where the mono yield is best, or <see langword="null"/> when no site reacts.</summary>
    public required CourseOptimum? BestMono { get; init; }

    /// <summary>Species above the threshold, largest first.</summary>
    public required IReadOnlyList<CourseByProduct> ByProducts { get; init; }

    /// <summary>Truncated part at the last point of the curve, 0 to 1.</summary>
    public required double TruncatedAtEnd { get; init; }

    /// <summary>Remarks on gaps, truncation and limits.</summary>
    public required IReadOnlyList<Diagnostic> Diagnostics { get; init; }
}
