namespace RadicalSites.Selectivity;

/// <summary>A chain carrier: the radical that abstracts hydrogen, with the parameters of its selectivity.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record Carrier
{
    /// <summary>Short id, for example <c>Br</c>.</summary>
    public required string Id { get; init; }

    /// <summary>Name in words, for example <c>bromine atom</c>.</summary>
    public required string Name { get; init; }

    /// <summary>Evans-Polanyi slope for bonds weaker than the class anchor [dimensionless].</summary>
    public required double SlopeWeak { get; init; }

    /// <summary>Evans-Polanyi slope for bonds stronger than the class anchor [dimensionless].</summary>
    public required double SlopeStrong { get; init; }

    /// <summary>Change of ln k per unit of sigma-I on the neighbouring carbon at 298.15 K.</summary>
    public required double PolarBeta { get; init; }

    /// <summary>Factor of the inductive term for each further carbon.</summary>
    public required double Attenuation { get; init; }

    /// <summary>Scale of the terms of groups on the carbon itself, relative to the chlorine atom.</summary>
    public required double PolarAlphaScale { get; init; }

    /// <summary>Hammett rho for benzylic sites at 353 K.</summary>
    public required double HammettRho { get; init; }

    /// <summary>Whether rho goes with sigma-plus instead of sigma.</summary>
    public required bool UsesSigmaPlus { get; init; }

    /// <summary>Decrease of ln k for each branched or quaternary carbon beside the site.</summary>
    public required double Steric { get; init; }

    /// <summary>Relative standard deviation of a polar term.</summary>
    public required double PolarSigma { get; init; }

    /// <summary>Key in the bibliography.</summary>
    public required string Source { get; init; }
}
