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

    /// <summary>Whether the transition state is late (bond energies rule) rather than early (polarity rules).</summary>
    public required bool HasLateTransitionState { get; init; }

    /// <summary>Change of ln k per unit of sigma-I on the neighbouring carbon at 298.15 K.</summary>
    public required double PolarBeta { get; init; }

    /// <summary>Factor of the inductive term for each further carbon in the gas phase.</summary>
    public required double AttenuationInGas { get; init; }

    /// <summary>Factor of the inductive term for each further carbon in a liquid.</summary>
    public required double AttenuationInLiquid { get; init; }

    /// <summary>Scale of the terms of groups on the carbon itself and beside it, relative to the table.</summary>
    public required double PolarScale { get; init; }

    /// <summary>Hammett rho for benzylic sites at 353 K.</summary>
    public required double HammettRho { get; init; }

    /// <summary>Whether rho goes with sigma-plus instead of sigma.</summary>
    public required bool UsesSigmaPlus { get; init; }

    /// <summary>Decrease of ln k for each heavy atom beyond the first that stands two bonds from the attacked carbon.</summary>
    public required double Steric { get; init; }

    /// <summary>Factor on the inductive term of a neighbouring group where the attacked carbon is primary.</summary>
    public required double PrimarySensitivity { get; init; }

    /// <summary>Whether it works in strong acid, where amines, alcohols, ethers and carbonyl groups are protonated.</summary>
    public required bool ActsInStrongAcid { get; init; }

    /// <summary>Highest rate per hydrogen relative to primary that collision or diffusion allows; 0 without a bound.</summary>
    public required double Ceiling { get; init; }

    /// <summary>Primary kinetic isotope effect kH/kD at 298.15 K; ln of it goes with 1/T.</summary>
    public required double IsotopeEffect { get; init; }

    /// <summary>Relative standard deviation of a polar term.</summary>
    public required double PolarSigma { get; init; }

    /// <summary>Key in the bibliography.</summary>
    public required string Source { get; init; }
}
