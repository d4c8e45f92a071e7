using RadicalSites.Molecules;
using RadicalSites.Perception;
using RadicalSites.Sites;

namespace RadicalSites.Products;

/// <summary>Rings that cannot hold a double bond where a shift would put it.</summary>
/// <remarks>
/// Bredt's rule: no double bond at the bridgehead of a bicycle whose ring through the bond has fewer than 8 atoms
/// (the smallest isolable bridgehead alkenes contain a trans-cyclooctene); no cumulated double bond in a ring of fewer
/// than 9 atoms (cyclonona-1,2-diene is the smallest that is stable at room temperature). Common practice, no source.
/// </remarks>
internal static class RingStrain
{
    private const int SmallestBridgeheadRing = 8;
    private const int SmallestCumulatedRing = 9;

    /// <summary>Whether a small cage keeps the radical centre from turning inside out.</summary>
    internal static bool HoldsShape(Site site) => site.IsBridgehead && site.RingSize < SmallestBridgeheadRing;

    /// <summary>Whether an atom is a bridgehead of a small cage.</summary>
    internal static bool HoldsShape(RingAnalysis rings, int atom) =>
        rings.IsBridgehead(atom) && rings.SmallestRingSize(atom) < SmallestBridgeheadRing;

    /// <summary>Whether the shift of a pi bond to the bond radical-first is impossible.</summary>
    internal static bool Forbids(Molecule molecule, int radical, Neighbor first, Bond pi)
    {
        Bond made = molecule.BondSpan[first.Bond];
        if (!made.IsInRing)
        {
            return false;
        }

        RingAnalysis rings = RingAnalysis.Perceive(molecule);
        if (pi.Order == BondOrder.Triple && pi.IsInRing && rings.SmallestRingSize(first.Atom) < SmallestCumulatedRing)
        {
            return true;
        }

        return HoldsShape(rings, radical) || HoldsShape(rings, first.Atom);
    }
}
