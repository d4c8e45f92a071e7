using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Ring sizes and bridgeheads of a molecule.</summary>
/// <remarks>
/// <para>The smallest ring through an atom is found by a breadth-first search bounded by that ring.</para>
/// <para>A bridgehead is an atom where two smallest rings that share more than one bond branch (norbornane C1, adamantane
/// CH); fused rings share exactly one bond and make none (decalin, cubane, phenalene).</para>
/// Immutable and safe for use by many threads.
/// </remarks>
public sealed partial class RingAnalysis
{
    private readonly Molecule molecule;

    private RingAnalysis(Molecule molecule) => this.molecule = molecule;

    /// <summary>Prepares the analysis; the work is done by the questions, each bounded by the rings at its atom.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <returns>The analysis.</returns>
    public static RingAnalysis Perceive(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        return new RingAnalysis(molecule);
    }

    /// <summary>Size of the smallest ring through an atom.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>Number of ring atoms, 3 or more; 0 when the atom lies on no ring.</returns>
    public int SmallestRingSize(int atom)
    {
        if (!molecule.AtomSpan[atom].IsInRing)
        {
            return 0;
        }

        int best = 0;
        ReadOnlySpan<Neighbor> neighbors = molecule.NeighborsOf(atom);
        using var search = new RingSearch(molecule);
        for (int i = 0; i < neighbors.Length; i++)
        {
            for (int j = i + 1; j < neighbors.Length; j++)
            {
                if (IsRing(neighbors[i]) && IsRing(neighbors[j]))
                {
                    int size = search.Through(atom, neighbors[i].Atom, neighbors[j].Atom, best == 0 ? int.MaxValue : best);
                    best = size > 0 && (best == 0 || size < best) ? size : best;
                }
            }
        }

        return best;
    }

    /// <summary>Whether an atom is a bridgehead.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>Whether two smallest rings at the atom share more than one bond.</returns>
    public bool IsBridgehead(int atom)
    {
        Span<int> arms = stackalloc int[8];
        int count = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (IsRing(neighbor) && count < arms.Length)
            {
                arms[count++] = neighbor.Atom;
            }
        }

        for (int i = 0; i < count; i++)
        {
            for (int j = i + 1; j < count; j++)
            {
                for (int k = j + 1; k < count; k++)
                {
                    if (BranchesBridged(atom, arms[i], arms[j], arms[k]))
                    {
                        return true;
                    }
                }
            }
        }

        return false;
    }

    private bool IsRing(Neighbor neighbor) => molecule.BondSpan[neighbor.Bond].IsInRing;

    // Three rings run through the three pairs of arms. The one that is larger than both others is their envelope and no
    // smallest ring; the remaining pairs are compared.
    private bool BranchesBridged(int atom, int a, int b, int c)
    {
        using var search = new RingSearch(molecule);
        int[] ab = search.RingThrough(atom, a, b);
        int[] ac = search.RingThrough(atom, a, c);
        int[] bc = search.RingThrough(atom, b, c);
        int largest = Math.Max(ab.Length, Math.Max(ac.Length, bc.Length));
        return (IsPair(ab, ac, bc.Length, largest) && SharesPath(atom, ab, ac))
            || (IsPair(ab, bc, ac.Length, largest) && SharesPath(atom, ab, bc))
            || (IsPair(ac, bc, ab.Length, largest) && SharesPath(atom, ac, bc));
    }

    // A pair counts unless one of its rings alone is the largest of the three.
    private static bool IsPair(int[] left, int[] right, int third, int largest) =>
        left.Length > 0 && right.Length > 0
        && !(left.Length == largest && right.Length < largest && third > 0 && third < largest)
        && !(right.Length == largest && left.Length < largest && third > 0 && third < largest);

    // Both rings start at the atom; the shared arm is followed from there.
    private static bool SharesPath(int atom, int[] left, int[] right)
    {
        int shared = 0;
        foreach (int member in left)
        {
            shared += member != atom && Array.IndexOf(right, member) >= 0 ? 1 : 0;
        }

        return shared >= 2;
    }
}
