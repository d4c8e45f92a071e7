using System;
using System.Collections.Generic;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Thermochemistry;

/// <summary>A molecule of the table that is the molecule asked for; leads from its marked carbons to the sites.</summary>
internal sealed class BdeMatch(BdeMatcher.CanonicalForm form, BdeMatcher.Candidate[] candidates)
{
    /// <summary>Rows for a site: table rows whose marked carbon maps to a carbon of the site, the preferred first.</summary>
    internal IReadOnlyList<BdeEntry> Entries(SymmetryAnalysis symmetry, Site site)
    {
        List<BdeEntry>? found = null;
        foreach (BdeMatcher.Candidate candidate in candidates)
        {
            // Equal canonical forms: atoms of equal rank correspond.
            int carbon = Array.IndexOf(form.Ranks, candidate.Form.Ranks[candidate.Carbon]);
            if (symmetry.OrbitOf(carbon, EquivalenceLevel.Constitutional)
                == symmetry.OrbitOf(site.Carbons[0], EquivalenceLevel.Constitutional))
            {
                (found ??= []).Add(candidate.Entry);
            }
        }

        // A user's table stands before the shipped one, so the first preferred row is the strongest.
        int first = found?.FindIndex(static entry => entry.IsPreferred) ?? -1;
        if (first > 0)
        {
            BdeEntry preferred = found![first];
            found.RemoveAt(first);
            found.Insert(0, preferred);
        }

        return found is null ? [] : found;
    }
}
