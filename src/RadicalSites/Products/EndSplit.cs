using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Products;

/// <summary>How an allylic radical divides between its two ends, by a published ratio for the substitution pattern.</summary>
/// <remarks>
/// One pattern is known: an alkylated secondary end against a primary end, captured by bromine or N-bromosuccinimide,
/// 17 : 83 (1-octene, NBS in refluxing tetrachloromethane; Source: [MCMURRY9], chapter on alkyl halides, from memory).
/// Everything else is left open.
/// </remarks>
/// <param name="DirectPart">Part at the carbon that lost the hydrogen, 0 to 1.</param>
/// <param name="HalfWidth">Half width of the 90 % interval of the part.</param>
/// <param name="Analogue">The substrate measured.</param>
/// <param name="Source">Key in the bibliography.</param>
internal sealed record EndSplit(double DirectPart, double HalfWidth, string Analogue, string Source)
{
    private const double SecondaryPart = 0.17;
    private const double Width = 0.12;

    /// <summary>A split for two different ends, or <see langword="null"/> when none was published.</summary>
    internal static EndSplit? Find(Molecule molecule, Site site, int otherEnd, int ends, int halogen)
    {
        int direct = site.Carbons[0];
        if (ends != 2 || halogen != 35 || site.Conjugation.Count != 1
            || site.Conjugation[0].Kind != ConjugationKind.Allylic)
        {
            return null;
        }

        int middle = site.Conjugation[0].Atom;
        if (!IsPlain(molecule, direct, middle) || !IsPlain(molecule, otherEnd, middle)
            || molecule.AtomSpan[middle].HydrogenCount != 1)
        {
            return null;
        }

        // Carbon neighbours besides the middle one: none at a primary end, one at a secondary end.
        int directDegree = molecule.DegreeOf(direct);
        int otherDegree = molecule.DegreeOf(otherEnd);
        return (directDegree, otherDegree) switch
        {
            (2, 1) => new EndSplit(SecondaryPart, Width, "1-octene", "MCMURRY9"),
            (1, 2) => new EndSplit(1 - SecondaryPart, Width, "1-octene", "MCMURRY9"),
            _ => null,
        };
    }

    // An acyclic end with saturated carbon ligands only.
    private static bool IsPlain(Molecule molecule, int end, int middle)
    {
        if (molecule.AtomSpan[end].IsInRing)
        {
            return false;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(end))
        {
            if (neighbor.Atom == middle)
            {
                continue;
            }

            if (molecule.AtomSpan[neighbor.Atom].AtomicNumber != 6 || molecule.AtomSpan[neighbor.Atom].IsAromatic)
            {
                return false;
            }

            foreach (Neighbor second in molecule.NeighborsOf(neighbor.Atom))
            {
                if (molecule.BondSpan[second.Bond].Order != BondOrder.Single)
                {
                    return false;
                }
            }
        }

        return true;
    }
}
