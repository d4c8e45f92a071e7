using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>Remarks that every report of sites carries.</summary>
internal static class HalogenationRemarks
{
    internal static IReadOnlyList<Diagnostic> Common(
        SiteAnalysis analysis, IReadOnlyList<BdeAssignment> bdes, List<Diagnostic> remarks)
    {
        if (analysis.Sites.Count == 0)
        {
            remarks.Add(Diagnostic.Create(ProblemCatalogue.General.NoSites, []));
        }

        for (int i = 0; i < bdes.Count; i++)
        {
            if (bdes[i].IsAnalogy)
            {
                remarks.Add(Diagnostic.Create(
                    ProblemCatalogue.Thermochemistry.Analogy, analysis.Sites[i].Carbons, bdes[i].SiteNumber,
                    Rows(bdes[i])));
            }
        }

        if (analysis.Symmetry is { } symmetry)
        {
            remarks.AddRange(symmetry.Diagnostics);
        }

        return remarks.AsReadOnly();
    }

    private static string Rows(BdeAssignment bde)
    {
        var rows = new List<string>();
        foreach (BdeEvidence evidence in bde.Evidence)
        {
            if (evidence.Role.EndsWith("analogy", System.StringComparison.Ordinal))
            {
                rows.Add(evidence.Entry);
            }
        }

        return string.Join(", ", rows);
    }
}
