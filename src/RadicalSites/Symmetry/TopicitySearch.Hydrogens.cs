using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

internal sealed partial class TopicitySearch
{
    /// <summary>Relates the hydrogens on each atom; a weaker relation found before stays.</summary>
    /// <param name="hydrogens">Relation by atom.</param>
    /// <param name="orbits">Classes of atoms that are enantiotopic or better.</param>
    internal void FindHydrogens(Span<Topicity> hydrogens, OrbitForest orbits)
    {
        ReadOnlySpan<Atom> atoms = molecule.AtomSpan;
        for (int i = 0; i < atoms.Length; i++)
        {
            if (atoms[i].HydrogenCount != 2)
            {
                continue;
            }

            // Equivalent atoms, mirrored or not, have the same answer; the root of a class has the lowest index.
            int root = orbits.Find(i);
            Topicity found = root != i ? hydrogens[root]
                : graph.DegreeOf(i) == 2 ? OfMethylene(i)
                : graph.DegreeOf(i) == 1 ? OfTerminal(i)
                : Topicity.Homotopic;
            hydrogens[i] = found > hydrogens[i] ? found : hydrogens[i];
        }
    }

    private Topicity OfMethylene(int atom)
    {
        int at = graph.Offset[atom];
        int first = graph.Adjacent[at];
        int second = graph.Adjacent[at + 1];
        int[] cellOf = stereo.CellOf;
        if (cellOf[first] == cellOf[second]
            && workspace.Isomorphism.TryFind(
                graph, stereo, stereo, [atom, first, second], [atom, second, first], graph.Configuration))
        {
            return Topicity.Homotopic;
        }

        if (graph.ElementCount == 0)
        {
            return Topicity.Enantiotopic;
        }

        MirrorState state = workspace.Flexible.Fragments[graph.FragmentIndexOf(atom)];
        if (state == MirrorState.Never)
        {
            return Topicity.Diastereotopic;
        }

        if (state == MirrorState.Always && workspace.Flexible.Depth[atom] == 0)
        {
            return Topicity.Enantiotopic;
        }

        RefineMirrored();
        int[] image = workspace.Mirrored.CellOf;
        return image[atom] == cellOf[atom] && image[first] == cellOf[first] && image[second] == cellOf[second]
            && workspace.Isomorphism.TryFind(
            graph, stereo, workspace.Mirrored, [atom, first, second], [atom, first, second], workspace.MirroredConfiguration)
            ? Topicity.Enantiotopic
            : Topicity.Diastereotopic;
    }

    /// <summary>A terminal CH2: free to turn on a single bond, else related through the two ligands of its partner.</summary>
    private Topicity OfTerminal(int atom)
    {
        int at = graph.Offset[atom];
        if (graph.Weight[at] == SymmetryGraph.SingleWeight)
        {
            return Topicity.Homotopic;
        }

        int partner = graph.Adjacent[at];
        int end = graph.Offset[partner + 1];
        int first = -1;
        int second = -1;
        for (int i = graph.Offset[partner]; i < end; i++)
        {
            int ligand = graph.Adjacent[i];
            if (ligand != atom)
            {
                second = first;
                first = ligand;
            }
        }

        if (first < 0)
        {
            return Topicity.Homotopic;
        }

        return second >= 0 && stereo.CellOf[first] == stereo.CellOf[second]
            && workspace.Isomorphism.TryFind(
                graph, stereo, stereo, [atom, first, second], [atom, second, first], graph.Configuration)
            ? Topicity.Homotopic
            : Topicity.Diastereotopic;
    }
}
