using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Interference;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Selectivity;
using RadicalSites.Sites;

namespace RadicalSites;

/// <summary>Mono-halogenation of one molecule under given conditions: sites with shares, products, remarks.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record Prediction
{
    /// <summary>The substrate.</summary>
    public required Molecule Molecule { get; init; }

    /// <summary>Its canonical SMILES.</summary>
    public required string CanonicalSmiles { get; init; }

    /// <summary>Reagent, temperature, solvent.</summary>
    public required ReactionConditions Conditions { get; init; }

    /// <summary>The analysis on which the prediction rests; leads from atoms to sites.</summary>
    public required SiteAnalysis Analysis { get; init; }

    /// <summary>Rates and shares with their joint uncertainty.</summary>
    public required SelectivityResult Selectivity { get; init; }

    /// <summary>One entry for each site, by site number.</summary>
    public required IReadOnlyList<SitePrediction> Sites { get; init; }

    /// <summary>The products, by falling share and then canonical SMILES.</summary>
    public required IReadOnlyList<HalogenationProduct> Products { get; init; }

    /// <summary>Groups that divert, poison or endanger the reaction.</summary>
    public required IReadOnlyList<InterferenceHit> Interference { get; init; }

    /// <summary>Version of the data used.</summary>
    public required string DataVersion { get; init; }

    /// <summary>All remarks: interference, missing data, chain, selectivity, products.</summary>
    public required IReadOnlyList<Diagnostic> Diagnostics { get; init; }
}
