using System.Collections.Generic;

namespace RadicalSites.Symmetry;

internal sealed partial class FlexibleFrames
{
    private bool HasLikeBranches(int element)
    {
        bool paired = graph.Kind[element] != SymmetryGraph.Center;
        for (int i = 0; i < 4; i++)
        {
            int one = graph.Carriers[(4 * element) + i];
            for (int j = i + 1; j < 4 && one >= 0; j++)
            {
                int two = graph.Carriers[(4 * element) + j];
                if (two >= 0 && orbits[one] == orbits[two] && (!paired || i / 2 == j / 2) && TurnsOver(element, one, two))
                {
                    return true;
                }
            }
        }

        return false;
    }

    private bool TurnsOver(int element, int one, int two)
    {
        int stem = StemOf(element, one, two);
        if (stem < 0)
        {
            return false;
        }

        if (!IsRingBond(stem, one))
        {
            return MarkBranches(element, one, stem);
        }

        return graph.Kind[element] == SymmetryGraph.Center && MarkRing(one, two, stem);
    }

    /// <summary>The atom that carries both ligands.</summary>
    private int StemOf(int element, int one, int two)
    {
        if (graph.Kind[element] == SymmetryGraph.Center)
        {
            return graph.Focus[element];
        }

        for (int i = graph.Offset[one]; i < graph.Offset[one + 1]; i++)
        {
            if (graph.WeightBetween(graph.Adjacent[i], two) != 0)
            {
                return graph.Adjacent[i];
            }
        }

        return -1;
    }

    private bool IsRingBond(int first, int second)
    {
        for (int i = graph.Offset[first]; i < graph.Offset[first + 1]; i++)
        {
            if (graph.Adjacent[i] == second)
            {
                return graph.InRing[i];
            }
        }

        return false;
    }

    /// <summary>
    /// Counts all like branches of a stem as movable when the first holds no rigid frame. Three of them take up any
    /// exchange without the one in question, so that the frame asks for nothing.
    /// </summary>
    private bool MarkBranches(int element, int root, int stem)
    {
        int start = branch.Count;
        Walk(root, stem);
        bool free = HoldsNoRigidFrame(start);
        Truncate(start);
        int weight = graph.Kind[element] == SymmetryGraph.Axis ? 2 : 1;
        if (free && CountLike(root, stem) > 2)
        {
            State[element] = Idle;
            return true;
        }

        for (int i = graph.Offset[stem]; i < graph.Offset[stem + 1] && free; i++)
        {
            int other = graph.Adjacent[i];
            if (orbits[other] != orbits[root] || graph.InRing[i])
            {
                continue;
            }

            Walk(other, stem);
            for (int k = start; k < branch.Count; k++)
            {
                Depth[branch[k]] += weight;
            }

            Truncate(start);
        }

        return free;
    }

    private int CountLike(int root, int stem)
    {
        int count = 0;
        for (int i = graph.Offset[stem]; i < graph.Offset[stem + 1]; i++)
        {
            count += orbits[graph.Adjacent[i]] == orbits[root] && !graph.InRing[i] ? 1 : 0;
        }

        return count;
    }

    /// <summary>
    /// Counts the atoms of the rings between two ligands as movable when they hold no rigid frame, touch the stem nowhere
    /// else, and an automorphism exchanges the two ligands while all the rest stays.
    /// </summary>
    private bool MarkRing(int one, int two, int stem)
    {
        int start = branch.Count;
        Walk(one, stem);
        bool free = HoldsNoRigidFrame(start);
        int own = ++mark;
        for (int k = start; k < branch.Count && free; k++)
        {
            int atom = branch[k];
            seen[atom] = own;
            free = atom == one || atom == two || graph.WeightBetween(atom, stem) == 0;
        }

        Truncate(start);
        if (!free || seen[two] != own)
        {
            return false;
        }

        int count = graph.ElementCount;
        graph.ElementCount = 0;
        AutomorphismProbe probe = workspace.Probe;
        bool found = probe.TryMap(graph, cells, one, two);
        graph.ElementCount = count;
        for (int i = 0; i < probe.AssignedCount && found; i++)
        {
            int atom = probe.Assigned[i];
            found = probe.Image[atom] == atom || seen[atom] == own;
        }

        return found && !TurnsOthers(probe, own) && CountRing(one, stem);
    }

    /// <summary>Whether a centre of the ring that stays in place has ligands that move, so that it would turn over too.</summary>
    private bool TurnsOthers(AutomorphismProbe probe, int own)
    {
        for (int i = 0; i < probe.AssignedCount; i++)
        {
            int atom = probe.Assigned[i];
            if (probe.Image[atom] == atom)
            {
                continue;
            }

            for (int k = graph.Offset[atom]; k < graph.Offset[atom + 1]; k++)
            {
                int other = graph.Adjacent[k];
                if (seen[other] == own && graph.CenterAt[other] > 0 && probe.ImageOf(other) == other)
                {
                    return true;
                }
            }
        }

        return false;
    }

    private bool CountRing(int one, int stem)
    {
        int start = branch.Count;
        Walk(one, stem);
        for (int k = start; k < branch.Count; k++)
        {
            Depth[branch[k]]++;
        }

        Truncate(start);
        return true;
    }

    /// <summary>Collects what hangs on the stem through an atom.</summary>
    private void Walk(int root, int stem)
    {
        int own = ++mark;
        seen[root] = own;
        seen[stem] = own;
        int done = branch.Count;
        branch.Add(root);
        while (done < branch.Count)
        {
            int atom = branch[done++];
            for (int i = graph.Offset[atom]; i < graph.Offset[atom + 1]; i++)
            {
                int next = graph.Adjacent[i];
                if (seen[next] != own)
                {
                    seen[next] = own;
                    branch.Add(next);
                }
            }
        }
    }

    /// <summary>Whether the atoms collected from an index on hold no rigid frame; frames inside are looked at on the way.</summary>
    private bool HoldsNoRigidFrame(int start)
    {
        int end = branch.Count;
        for (int k = start; k < end; k++)
        {
            int center = graph.CenterAt[branch[k]] - 1;
            int axis = graph.AxisAt[branch[k]] - 1;
            if ((center >= 0 && !IsFlexible(center)) || (axis >= 0 && !IsFlexible(axis)))
            {
                return false;
            }
        }

        return true;
    }

    private void Truncate(int start) => branch.RemoveRange(start, branch.Count - start);
}
