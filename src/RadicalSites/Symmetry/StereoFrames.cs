using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>
/// Adds to a graph every place whose geometry a symmetry operation must respect, whether or not a configuration is
/// stated there: tetrahedral atoms with four distinct ligand positions, allene axes, double bonds.
/// </summary>
internal static class StereoFrames
{
    /// <summary>Adds the frames; the stated configurations come first.</summary>
    /// <returns>Number of frames whose configuration is stated.</returns>
    internal static int Add(SymmetryGraph graph, Molecule molecule)
    {
        graph.AddStatedElements(molecule);
        int stated = graph.ElementCount;
        ReadOnlySpan<Atom> atoms = molecule.AtomSpan;
        for (int i = 0; i < atoms.Length; i++)
        {
            if (graph.CenterAt[i] == 0 && IsCenter(graph, atoms, i))
            {
                AddCenter(graph, i);
            }
        }

        foreach (Bond bond in molecule.BondSpan)
        {
            if (bond.Order == BondOrder.Double && !bond.IsAromatic && !bond.IsInRing)
            {
                AddDoubleBond(graph, atoms, bond);
            }
        }

        return stated;
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
            7 => degree == 4 && doubles == 0 && atom.FormalCharge == 1,
            15 or 33 => (ligands == 4 && doubles <= 1) || (ligands == 3 && doubles == 0 && atom.FormalCharge == 0),
            16 or 34 or 52 => (degree == 4 && doubles is 0 or 2 && atom.HydrogenCount == 0)
                || (degree == 3 && atom.HydrogenCount == 0 && atom.FormalCharge is 0 or 1 && doubles <= 1),
            _ => false,
        };
    }

    private static void AddCenter(SymmetryGraph graph, int atom)
    {
        int at = graph.Offset[atom];
        int degree = graph.DegreeOf(atom);
        int[] adjacent = graph.Adjacent;
        if (LeafTwins(graph, atom) >= 3)
        {
            return;
        }

        graph.Add(
            SymmetryGraph.Center, atom, atom, adjacent[at], adjacent[at + 1], adjacent[at + 2],
            degree == 4 ? adjacent[at + 3] : SymmetryGraph.NoAtom, 1);
    }

    /// <summary>Largest number of like terminal neighbours; from three on they take up any exchange among the ligands.</summary>
    internal static int LeafTwins(SymmetryGraph graph, int atom)
    {
        int best = 0;
        for (int i = graph.Offset[atom]; i < graph.Offset[atom + 1]; i++)
        {
            int leaf = graph.Adjacent[i];
            if (graph.DegreeOf(leaf) != 1)
            {
                continue;
            }

            int count = 0;
            for (int j = graph.Offset[atom]; j < graph.Offset[atom + 1]; j++)
            {
                int other = graph.Adjacent[j];
                if (graph.DegreeOf(other) == 1 && graph.Key[other] == graph.Key[leaf] && graph.Weight[i] == graph.Weight[j])
                {
                    count++;
                }
            }

            best = Math.Max(best, count);
        }

        return best;
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
            6 or 14 => degree + atom.HydrogenCount == 3 && atom.HydrogenCount <= 1,
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

            if (graph.Weight[i] != SymmetryGraph.SingleWeight)
            {
                return -1;
            }

            if (ligand < 0)
            {
                ligand = neighbor;
            }
        }

        return ligand;
    }
}
