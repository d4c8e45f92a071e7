using System.Collections.Generic;

namespace RadicalSites;

/// <summary>A published isomer distribution of one mono-halogenation.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record MeasuredDistribution
{
    /// <summary>Id of the entry.</summary>
    public required string Id { get; init; }

    /// <summary>SMILES of the substrate; two fragments are a competition of equal amounts.</summary>
    public required string Substrate { get; init; }

    /// <summary>Id of the reagent.</summary>
    public required string Reagent { get; init; }

    /// <summary>Temperature [C].</summary>
    public required double Celsius { get; init; }

    /// <summary>Solvent as in the conditions, or <see langword="null"/> when not stated.</summary>
    public string? Solvent { get; init; }

    /// <summary>Products with their percentages.</summary>
    public required IReadOnlyList<MeasuredProduct> Products { get; init; }

    /// <summary>Whether products were analysed, rather than the figures computed from published rates or ratios.</summary>
    public required bool IsMeasured { get; init; }

    /// <summary>Whether parameters may be fitted to this entry; the others only test.</summary>
    public required bool IsForFitting { get; init; }

    /// <summary>Key in the bibliography.</summary>
    public required string Source { get; init; }

    /// <summary>Place in the source.</summary>
    public required string Locator { get; init; }

    /// <summary>How sure the figures are: high, medium or low.</summary>
    public required string Confidence { get; init; }

    /// <summary>Remark, or empty.</summary>
    public string Note { get; init; } = "";
}
