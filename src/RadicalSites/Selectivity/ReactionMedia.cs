using System;
using System.Collections.Generic;

namespace RadicalSites.Selectivity;

/// <summary>Media whose effect on the selectivity is in the tables.</summary>
/// <remarks>Read once from the embedded table; immutable and safe for use by many threads.</remarks>
public static class ReactionMedia
{
    /// <summary>Ids of all media, ascending: <c>gas</c>, <c>neat</c> (the substrate is the solvent) and solvents.</summary>
    public static IReadOnlyList<string> Ids => SelectivityParameters.MediumIds;

    /// <summary>Finds a medium in the writing of the conditions.</summary>
    /// <param name="solvent">An id, case ignored, with or without a concentration: <c>PhH</c> or <c>PhH@4M</c>.</param>
    /// <returns>The id as the table writes it with the concentration as given, or <see langword="null"/>.</returns>
    public static string? Find(string solvent)
    {
        ArgumentNullException.ThrowIfNull(solvent);
        (string? id, double? molar) = MediumEffect.Split(solvent);
        if (id is null)
        {
            return null;
        }

        foreach (string known in Ids)
        {
            if (string.Equals(known, id, StringComparison.OrdinalIgnoreCase))
            {
                return molar is null ? known : string.Concat(known, solvent.AsSpan(id.Length));
            }
        }

        return null;
    }
}
