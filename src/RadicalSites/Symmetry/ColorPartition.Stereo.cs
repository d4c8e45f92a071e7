using System;

namespace RadicalSites.Symmetry;

internal sealed partial class ColorPartition
{
    /// <summary>
    /// Whether two like ligands of an element are parted by their places against its two unlike ones, as the pro-R and
    /// pro-S methyl of an isopropyl group are. Right when the configurations of all places are given.
    /// </summary>
    internal bool SplitsTies;

    /// <summary>Splits the foci of the first elements of a graph from atoms without one.</summary>
    internal void SeparateFoci(SymmetryGraph graph, int elements)
    {
        int count = 0;
        for (int e = 0; e < elements; e++)
        {
            int mark = graph.Kind[e] == SymmetryGraph.Axis ? 16 : 1;
            count = Mark(graph.Focus[e], mark, count);
            if (graph.FocusEnd[e] != graph.Focus[e])
            {
                count = Mark(graph.FocusEnd[e], mark, count);
            }
        }

        if (count > 0)
        {
            SplitTouched(count);
        }
    }

    private bool SplitByStereo(SymmetryGraph graph, sbyte[] configuration)
    {
        int count = 0;
        for (int e = 0; e < graph.ElementCount; e++)
        {
            int focus = graph.Focus[e];
            int focusEnd = graph.FocusEnd[e];
            if (!SplitsTies && Length[CellOf[focus]] == 1 && Length[CellOf[focusEnd]] == 1)
            {
                continue;
            }

            int sign = graph.ResolvedSign(e, CellOf, configuration);
            if (sign == 0)
            {
                count = SplitsTies ? MarkTie(graph, e, configuration[e], count) : count;
                continue;
            }

            int mark = sign < 0 ? 1 : 2;
            count = Mark(focus, mark, count);
            if (focusEnd != focus)
            {
                count = Mark(focusEnd, mark, count);
            }
        }

        count = MarkBodies(graph, count);
        return count > 0 && SplitTouched(count);
    }

    private int MarkBodies(SymmetryGraph graph, int count)
    {
        Span<int> sequence = stackalloc int[6];
        for (int body = 0; body < graph.BodyCount; body++)
        {
            if (Length[CellOf[graph.BodyFocus[body]]] == 1)
            {
                continue;
            }

            int size = graph.BodySequence(body, CellOf, sequence);
            uint mark = 17;
            for (int i = 0; i < size; i++)
            {
                mark = (mark ^ (uint)sequence[i]) * 0x9E3779B1u;
            }

            // Bit 10 keeps the mark positive; the bits below belong to the other marks.
            count = Mark(graph.BodyFocus[body], (int)(((mark >> 12) << 11) & 0x3FFFF800) | 1024, count);
        }

        return count;
    }

    private int Mark(int atom, int mark, int count)
    {
        if (Length[CellOf[atom]] == 1)
        {
            return count;
        }

        if (sums[atom] == 0)
        {
            touched[count++] = atom;
        }

        sums[atom] += mark;
        return count;
    }

    /// <summary>Marks the two like ligands of an element of which the others are unlike.</summary>
    private int MarkTie(SymmetryGraph graph, int element, int sign, int count)
    {
        int at = 4 * element;
        if (!FindTie(graph, element, out int i, out int j))
        {
            return count;
        }

        int one = graph.Carriers[at + i];
        int two = graph.Carriers[at + j];
        if (Length[CellOf[one]] == 1)
        {
            return count;
        }

        // Parity of the order (lower unlike ligand, higher unlike ligand, one, two) against the order of the carriers.
        int low = -1;
        int high = -1;
        for (int k = 0; k < 4; k++)
        {
            if (k != i && k != j)
            {
                high = low < 0 ? -1 : k;
                low = low < 0 ? k : low;
            }
        }

        if (ColorOf(graph.Carriers[at + low]) > ColorOf(graph.Carriers[at + high]))
        {
            (low, high) = (high, low);
        }

        bool odd = (low > high) ^ (low > i) ^ (low > j) ^ (high > i) ^ (high > j) ^ (i > j);
        int mark = (sign > 0) == odd ? 32 : 64;
        count = Mark(one, mark, count);
        return Mark(two, 96 - mark, count);
    }

    private bool FindTie(SymmetryGraph graph, int element, out int first, out int second)
    {
        int at = 4 * element;
        bool paired = graph.Kind[element] != SymmetryGraph.Center;
        first = -1;
        second = -1;
        for (int i = 0; i < 4; i++)
        {
            for (int j = i + 1; j < 4; j++)
            {
                if ((paired && i / 2 != j / 2) || ColorOf(graph.Carriers[at + i]) != ColorOf(graph.Carriers[at + j]))
                {
                    continue;
                }

                if (first >= 0)
                {
                    return false;
                }

                first = i;
                second = j;
            }
        }

        return first >= 0 && graph.Carriers[at + first] >= 0;
    }

    private int ColorOf(int carrier) => carrier < 0 ? -1 : CellOf[carrier];
}
