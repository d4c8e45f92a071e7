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

    /// <summary>
    /// Amounts summed by halogens added [mol per mol substrate], species that are not followed included; index 0 is the
    /// substrate, 1 all mono products; the last entry holds that many halogens or more.
    /// </summary>
    public required IReadOnlyList<double> AmountsByHalogenCount { get; init; }

    /// <summary>
    /// Substrate turned into species that are not followed one by one, 0 to 1. Such a species reacts on as the mean of the
    /// followed ones with as many halogens.
    /// </summary>
    public required double Truncated { get; init; }
}
