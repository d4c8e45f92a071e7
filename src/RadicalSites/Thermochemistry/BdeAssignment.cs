using System.Collections.Generic;

namespace RadicalSites.Thermochemistry;

/// <summary>Bond dissociation enthalpy of a site at 298.15 K with its uncertainty and evidence.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record BdeAssignment
{
    /// <summary>Number of the site, 1-based.</summary>
    public required int SiteNumber { get; init; }

    /// <summary>C-H bond dissociation enthalpy at 298.15 K [kJ/mol], or <see langword="null"/> when there is no data.</summary>
    public required double? KilojoulesPerMole { get; init; }

    /// <summary>Standard uncertainty, 1 sigma [kJ/mol]; <see langword="null"/> when there is no value.</summary>
    public required double? SigmaKilojoulesPerMole { get; init; }

    /// <summary>What the value rests on.</summary>
    public required BdeBasis Basis { get; init; }

    /// <summary>The rows used, strongest first; empty when there is no value.</summary>
    public required IReadOnlyList<BdeEvidence> Evidence { get; init; }

    /// <summary>Why there is no value, in words; <see langword="null"/> when there is one.</summary>
    public string? Reason { get; init; }

    /// <summary>Whether a row of the evidence is an analogy rather than a class with published members.</summary>
    public bool IsAnalogy { get; init; }

    /// <summary>
    /// Id of the row whose error is common to every site that rests on it: between two such sites it cancels.
    /// </summary>
    public string CommonErrorRow => Evidence.Count == 0 ? "" : Evidence[0].Entry;
}
