using System.Collections.Generic;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>All that is known of one site: what it is, how strong its bond is, how it reacts.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record SitePrediction
{
    /// <summary>The site.</summary>
    public required Site Site { get; init; }

    /// <summary>Bond dissociation enthalpy with evidence.</summary>
    public required BdeAssignment Bde { get; init; }

    /// <summary>Rate, share and step enthalpies, or <see langword="null"/> when no reagent was given.</summary>
    public SiteSelectivity? Selectivity { get; init; }

    /// <summary>Numbers of the products that the site gives, 1-based; empty when no reagent was given.</summary>
    public IReadOnlyList<int> Products { get; init; } = [];
}
