using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>
/// Adds to a graph every place whose geometry a symmetry operation must respect, whether or not a configuration is
/// stated there: tetrahedral atoms with four distinct ligand positions, allene axes, double bonds.
/// </summary>
/// <remarks>
/// A double bond in a ring of fewer than eight atoms has no choice and is left out. So is a centre with three or more
/// like terminal ligands, which take up any exchange. Odd cumulenes longer than a double bond count only when stated.
/// </remarks>
internal static class StereoFrames
{
    /// <summary>Smallest ring in which a double bond may be cis or trans.</summary>
    internal const int SmallestStereoRing = 8;

    /// <summary>Adds the frames that have no element yet.</summary>
    internal static void AddFree(SymmetryGraph graph, Molecule molecule)
    {
        ReadOnlySpan<Atom> atoms = molecule.AtomSpan;
        for (int i = 0; i < atoms.Length; i++)
        {
            int degree = graph.Offset[i + 1] - graph.Offset[i];
            if (degree is 3 or 4 && graph.CenterAt[i] == 0 && IsCenter(graph, atoms, i))
            {
                AddCenter(graph, i);
            }
            else if (degree == 2 && graph.CenterAt[i] == 0)
            {
                AddAllene(graph, atoms, i);
            }
        }

        foreach (Bond bond in molecule.BondSpan)
        {
            if (bond.Order == BondOrder.Double && !bond.IsAromatic
                && (!bond.IsInRing || graph.ShortestRing(bond.Begin, bond.End, SmallestStereoRing) >= SmallestStereoRing))
            {
                AddDoubleBond(graph, atoms, bond);
            }
        }
    }

    /// <summary>Whether an atom holds four ligand positions in a fixed tetrahedral arrangement.</summary>
    internal static bool IsCenter(SymmetryGraph graph, ReadOnlySpan<Atom> atoms, int index)
    {
        Atom atom = atoms[index];
        int degree = graph.DegreeOf(index);
        if (degree is < 3 or > 4 || atom.IsAromatic || atom.HydrogenCount > 1)
        {
            return false;
        }

        int ligands = degree + atom.HydrogenCount;
        int doubles = 0;
        for (int i = graph.Offset[index]; i < graph.Offset[index + 1]; i++)
        {
            if (graph.Weight[i] != SymmetryGraph.SingleWeight)
            {
                doubles++;
            }
        }

        return atom.AtomicNumber switch
        {
            6 or 14 or 32 or 50 => ligands == 4 && doubles == 0 && atom.FormalCharge == 0,
            5 => degree == 4 && doubles == 0 && atom.FormalCharge == -1,
            7 => doubles == 0 && ((degree == 4 && atom.FormalCharge == 1) || (ligands == 3 && graph.IsHeldByRings(index))),
            15 or 33 when HasMobileHydrogen(graph, atoms, index) => false,
            16 or 34 or 52 when HasMobileHydrogen(graph, atoms, index) => false,
            15 or 33 => (ligands == 4 && doubles <= 1) || (ligands == 3 && doubles == 0 && atom.FormalCharge == 0),
            16 or 34 or 52 => atom.HydrogenCount == 0
                && (degree == 4 ? doubles is 0 or 2 : atom.FormalCharge is 0 or 1 && doubles <= 1),
            _ => false,
        };
    }

    /// <summary>Whether the double bond and the hydrogen (or charge) of an acid can trade places, as in P(=O)OH.</summary>
    private static bool HasMobileHydrogen(SymmetryGraph graph, ReadOnlySpan<Atom> atoms, int index)
    {
        int doubly = 0;
        int acidic = 0;
        for (int i = graph.Offset[index]; i < graph.Offset[index + 1]; i++)
        {
            int other = graph.Adjacent[i];
            Atom atom = atoms[other];
            if (graph.DegreeOf(other) != 1 || atom.AtomicNumber is not (8 or 16 or 34))
            {
                continue;
            }

            int bit = 1 << (atom.AtomicNumber / 8);
            doubly |= graph.Weight[i] == SymmetryGraph.DoubleWeight ? bit : 0;
            acidic |= graph.Weight[i] == SymmetryGraph.SingleWeight && (atom.HydrogenCount > 0 || atom.FormalCharge < 0) ? bit : 0;
        }

        return (doubly & acidic) != 0;
    }

    /// <summary>Largest number of like terminal neighbours; from three on they take up any exchange among the ligands.</summary>
    internal static int LeafTwins(SymmetryGraph graph, int atom)
    {
        int best = 0;
        int from = graph.Offset[atom];
        int to = graph.Offset[atom + 1];
        for (int i = from; i < to; i++)
        {
            int leaf = graph.Adjacent[i];
            if (graph.DegreeOf(leaf) != 1)
            {
                continue;
            }

            int count = 0;
            for (int j = from; j < to; j++)
            {
                int other = graph.Adjacent[j];
                if (graph.Key[other] == graph.Key[leaf] && graph.Weight[i] == graph.Weight[j])
                {
                    count++;
                }
            }

            best = Math.Max(best, count);
        }

        return best;
    }

    private static void AddCenter(SymmetryGraph graph, int atom)
    {
        if (LeafTwins(graph, atom) >= 3)
        {
            return;
        }

        int at = graph.Offset[atom];
        int[] adjacent = graph.Adjacent;
        graph.Add(
            SymmetryGraph.Center, atom, atom, adjacent[at], adjacent[at + 1], adjacent[at + 2],
            graph.DegreeOf(atom) == 4 ? adjacent[at + 3] : SymmetryGraph.NoAtom, 1);
    }

    private static void AddAllene(SymmetryGraph graph, ReadOnlySpan<Atom> atoms, int middle)
    {
        int at = graph.Offset[middle];
        if (graph.Weight[at] != SymmetryGraph.DoubleWeight || graph.Weight[at + 1] != SymmetryGraph.DoubleWeight)
        {
            return;
        }

        int begin = graph.Adjacent[at];
        int end = graph.Adjacent[at + 1];
        int first = LigandOf(graph, atoms, begin, middle);
        int second = LigandOf(graph, atoms, end, middle);
        if (first >= 0 && second >= 0)
        {
            graph.Add(
                SymmetryGraph.Allene, middle, middle, first, graph.OtherLigand(begin, first), second,
                graph.OtherLigand(end, second), 1);
        }
    }

    private static void AddDoubleBond(SymmetryGraph graph, ReadOnlySpan<Atom> atoms, in Bond bond)
    {
        int begin = bond.Begin;
        int end = bond.End;
        if (graph.AxisAt[begin] > 0 || graph.AxisAt[end] > 0 || graph.CenterAt[begin] > 0 || graph.CenterAt[end] > 0)
        {
            return;
        }

        int first = LigandOf(graph, atoms, begin, end);
        int second = LigandOf(graph, atoms, end, begin);
        if (first >= 0 && second >= 0)
        {
            graph.AddAxis(begin, end, first, second, 1);
        }
    }

    /// <summary>A ligand that defines the geometry of one end of a double bond, or -1 when the end defines none.</summary>
    private static int LigandOf(SymmetryGraph graph, ReadOnlySpan<Atom> atoms, int end, int partner)
    {
        Atom atom = atoms[end];
        int degree = graph.DegreeOf(end);
        bool fits = atom.AtomicNumber switch
        {
            6 or 14 or 32 => degree + atom.HydrogenCount == 3 && atom.HydrogenCount <= 1,
            7 => degree is 2 or 3 && atom.HydrogenCount <= 1,
            _ => false,
        };
        if (!fits || degree < 2)
        {
            return -1;
        }

        int ligand = -1;
        for (int i = graph.Offset[end]; i < graph.Offset[end + 1]; i++)
        {
            int neighbor = graph.Adjacent[i];
            if (neighbor == partner)
            {
                continue;
            }

            if (graph.Weight[i] is not (SymmetryGraph.SingleWeight or SymmetryGraph.AromaticWeight))
            {
                return -1;
            }

            ligand = ligand < 0 ? neighbor : ligand;
        }

        return ligand;
    }
}
