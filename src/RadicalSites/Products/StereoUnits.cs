using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>What the product lists ask about stereo units.</summary>
internal static class StereoUnits
{
    internal static StereoElement[] Meaningful(Molecule molecule) =>
        molecule.StereoElements.Count == 0 ? [] : StereoPerception.WithoutPhantoms(molecule).StereoSpan.ToArray();

    internal static bool IsStereocentre(SiteAnalysis analysis, int atom) => false;

    internal static int CountOpen(Molecule molecule, out int centres)
    {
        centres = 0;
        return 0;
    }

    internal static bool HasCentre(Molecule molecule) => false;

    internal static IReadOnlyList<string> Expand(Molecule molecule) => throw new NotImplementedException();
}
