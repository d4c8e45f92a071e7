using RadicalSites.Quantities;

namespace RadicalSites.Selectivity;

/// <summary>A halogen source: which carrier it makes, what it delivers, what is left.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record Reagent
{
    /// <summary>Id in trade notation, for example <c>Br2</c>.</summary>
    public required string Id { get; init; }

    /// <summary>Name of the reagent.</summary>
    public required string Name { get; init; }

    /// <summary>The chain carrier.</summary>
    public required Carrier Carrier { get; init; }

    /// <summary>Atomic number of the halogen delivered.</summary>
    public required int Halogen { get; init; }

    /// <summary>Bond that the carrier forms to hydrogen, a key of the bond table.</summary>
    public required string HydrogenBond { get; init; }

    /// <summary>Bond that the carbon radical breaks in step 2, a key of the bond table.</summary>
    public required string TransferBond { get; init; }

    /// <summary>By-product in words or formula.</summary>
    public required string ByProduct { get; init; }

    /// <summary>Lowest temperature for which the parameters hold.</summary>
    public required Temperature Minimum { get; init; }

    /// <summary>Highest temperature for which the parameters hold.</summary>
    public required Temperature Maximum { get; init; }

    /// <summary>Usual temperature, taken when none is given.</summary>
    public required Temperature Default { get; init; }

    /// <summary>Kind of halogen source: Molecular, NitrogenHalogen, OxygenHalogen, SulfurylHalide or Polyhalomethane.</summary>
    public required string Kind { get; init; }

    /// <summary>Key in the bibliography.</summary>
    public required string Source { get; init; }
}
