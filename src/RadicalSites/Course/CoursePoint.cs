using System.Collections.Generic;

namespace RadicalSites.Course;

/// <summary>Composition at one amount of halogen consumed, per mole of substrate at the start.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record CoursePoint
{
    /// <summary>Halogen consumed [mol per mol substrate], counted as halogen atoms bound to carbon.</summary>
    public required double Equivalents { get; init; }

    /// <summary>Integrated exposure to the chain carrier in units of 1/k of the substrate [1].</summary>
    public required double Exposure { get; init; }

    /// <summary>Substrate consumed, 0 to 1.</summary>
    public required double Conversion { get; init; }

    /// <summary>Amount of each species [mol per mol substrate], in the order of the species.</summary>
    public required IReadOnlyList<double> Amounts { get; init; }

    /// <summary>Amounts summed by halogens added [mol per mol substrate]; index 0 is the substrate, 1 all mono products.</summary>
    public required IReadOnlyList<double> AmountsByHalogenCount { get; init; }

    /// <summary>Substrate turned into species that are not followed, 0 to 1; they carry at least as many halogens as counted.</summary>
    public required double Truncated { get; init; }
}
