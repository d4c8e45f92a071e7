using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites;

/// <summary>The C(sp3)-H sites of a molecule with their bond dissociation enthalpies.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record SiteReport
{
    /// <summary>The molecule.</summary>
    public required Molecule Molecule { get; init; }

    /// <summary>Its canonical SMILES.</summary>
    public required string CanonicalSmiles { get; init; }

    /// <summary>The analysis on which the report rests; leads from atoms to sites.</summary>
    public required SiteAnalysis Analysis { get; init; }

    /// <summary>One entry for each site, by site number; empty when there is no C(sp3)-H bond.</summary>
    public required IReadOnlyList<SitePrediction> Sites { get; init; }

    /// <summary>Version of the data used.</summary>
    public required string DataVersion { get; init; }

    /// <summary>Remarks; may be empty.</summary>
    public required IReadOnlyList<Diagnostic> Diagnostics { get; init; }
}
