using System;

namespace RadicalSites.Symmetry;

/// <summary>
/// Builds an automorphism that carries one atom to another by a greedy walk, preferring exchanges of two atoms and
/// leaving alone what need not move, and proves it by comparing every moved bond and stereo element.
/// </summary>
/// <remarks>
/// Success is a proof; failure proves nothing and is left to the exact search. The cost is that of the moved part only,
/// so that the methyls of a tert-butyl group or the two sides of a phenyl ring are cheap in a molecule of any size.
/// Not thread-safe.
/// </remarks>
internal sealed class AutomorphismProbe
{
    private const int MaxDegree = 16;

    /// <summary>Image of each atom that was assigned, -1 = not assigned, which means it stays.</summary>
    internal int[] Image = [];

    /// <summary>Assigned atoms.</summary>
    internal int[] Assigned = [];

    internal int AssignedCount;

    private int[] source = [];

    /// <summary>Image of an atom under the automorphism found.</summary>
    internal int ImageOf(int atom) => Image[atom] < 0 ? atom : Image[atom];

    /// <summary>Tries to carry <paramref name="from"/> to <paramref name="to"/>, keeping the colours.</summary>
    internal bool TryMap(SymmetryGraph graph, ColorPartition partition, int from, int to)
    {
        Begin(graph.AtomCount);
        if (!Assign(partition, from, to))
        {
            return false;
        }

        Assign(partition, to, from);
        for (int i = 0; i < AssignedCount; i++)
        {
            int atom = Assigned[i];
            if (Image[atom] != atom && !Expand(graph, partition, atom, Image[atom]))
            {
                return false;
            }
        }

        return IsClosed() && BondsHold(graph) && (graph.ElementCount == 0 || ElementsHold(graph))
            && (graph.BodyCount == 0 || BodiesHold(graph));
    }

    private void Begin(int n)
    {
        if (Image.Length < n)
        {
            int size = Math.Max(64, Math.Max(n, 2 * Image.Length));
            Image = new int[size];
            source = new int[size];
            Assigned = new int[size];
            Array.Fill(Image, -1);
            Array.Fill(source, -1);
            AssignedCount = 0;
            return;
        }

        for (int i = 0; i < AssignedCount; i++)
        {
            int atom = Assigned[i];
            source[Image[atom]] = -1;
            Image[atom] = -1;
        }

        AssignedCount = 0;
    }

    private bool Assign(ColorPartition partition, int atom, int image)
    {
        if (Image[atom] == image)
        {
            return true;
        }

        if (Image[atom] >= 0 || source[image] >= 0 || partition.CellOf[atom] != partition.CellOf[image])
        {
            return false;
        }

        Image[atom] = image;
        source[image] = atom;
        Assigned[AssignedCount++] = atom;
        return true;
    }

    private bool Expand(SymmetryGraph graph, ColorPartition partition, int atom, int image)
    {
        int first = AssignedCount;
        int end = graph.Offset[atom + 1];
        for (int i = graph.Offset[atom]; i < end; i++)
        {
            int neighbor = graph.Adjacent[i];
            if (Image[neighbor] >= 0)
            {
                continue;
            }

            int choice = Choose(graph, partition, neighbor, graph.Weight[i], image);
            if (choice < 0 || !Assign(partition, neighbor, choice))
            {
                return false;
            }
        }

        int last = AssignedCount;
        if (last - first > 1 && graph.CenterAt[atom] > 0 && graph.CenterAt[image] > 0)
        {
            Repair(graph, partition, atom, first, last);
        }

        for (int i = first; i < last; i++)
        {
            // Prefer an exchange; where that is not open the walk itself must close the cycle.
            int moved = Assigned[i];
            int to = Image[moved];
            if (Image[to] < 0 && source[moved] < 0)
            {
                Assign(partition, to, moved);
            }
        }

        return true;
    }

    private int Choose(SymmetryGraph graph, ColorPartition partition, int neighbor, int weight, int image)
    {
        int cell = partition.CellOf[neighbor];
        int best = -1;
        bool bestIsOpen = false;
        int end = graph.Offset[image + 1];
        for (int i = graph.Offset[image]; i < end; i++)
        {
            int candidate = graph.Adjacent[i];
            if (source[candidate] >= 0 || graph.Weight[i] != weight || partition.CellOf[candidate] != cell)
            {
                continue;
            }

            if (candidate == neighbor)
            {
                return candidate;
            }

            bool open = Image[candidate] < 0;
            if (best < 0 || (open && !bestIsOpen))
            {
                best = candidate;
                bestIsOpen = open;
            }
        }

        return best;
    }

    /// <summary>Exchanges two images of like neighbours where the free choice gave a centre the wrong hand.</summary>
    private void Repair(SymmetryGraph graph, ColorPartition partition, int atom, int first, int last)
    {
        if (last - first > MaxDegree || CenterHolds(graph, graph.CenterAt[atom] - 1))
        {
            return;
        }

        for (int i = first; i < last; i++)
        {
            for (int j = i + 1; j < last; j++)
            {
                int one = Assigned[i];
                int two = Assigned[j];
                if (partition.CellOf[one] == partition.CellOf[two] && Image[one] != one && Image[two] != two)
                {
                    (Image[one], Image[two]) = (Image[two], Image[one]);
                    source[Image[one]] = one;
                    source[Image[two]] = two;
                    return;
                }
            }
        }
    }

    private bool IsClosed()
    {
        for (int i = 0; i < AssignedCount; i++)
        {
            if (Image[Image[Assigned[i]]] < 0)
            {
                return false;
            }
        }

        return true;
    }

    private bool BondsHold(SymmetryGraph graph)
    {
        for (int i = 0; i < AssignedCount; i++)
        {
            int atom = Assigned[i];
            int image = Image[atom];
            if (image == atom)
            {
                continue;
            }

            int end = graph.Offset[atom + 1];
            for (int j = graph.Offset[atom]; j < end; j++)
            {
                if (graph.WeightBetween(image, ImageOf(graph.Adjacent[j])) != graph.Weight[j])
                {
                    return false;
                }
            }
        }

        return true;
    }

    private bool ElementsHold(SymmetryGraph graph)
    {
        for (int e = 0; e < graph.ElementCount; e++)
        {
            if (!(graph.Kind[e] == SymmetryGraph.Axis ? AxisHolds(graph, e) : CenterHolds(graph, e)))
            {
                return false;
            }
        }

        return true;
    }

    private bool BodiesHold(SymmetryGraph graph)
    {
        for (int body = 0; body < graph.BodyCount; body++)
        {
            if (!graph.BodyHolds(body, Image))
            {
                return false;
            }
        }

        return true;
    }

    private bool CenterHolds(SymmetryGraph graph, int element) =>
        StereoImage.SignOfCenter(graph, element, Image, graph.Configuration) == 1;

    private bool AxisHolds(SymmetryGraph graph, int element) =>
        StereoImage.SignOfAxis(graph, element, Image, graph.Configuration) == 1;
}
