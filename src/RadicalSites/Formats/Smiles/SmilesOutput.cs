using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Smiles;

/// <summary>State of one writing pass; used again by its thread for the next molecule.</summary>
internal sealed partial class SmilesOutput
{
    private Molecule molecule = null!;
    private char[] text = new char[256];
    private int length;
    private int[] visited = [];
    private int[] parentBond = [];
    private int[] sorted = [];
    private int[] stack = [];
    private int[] cursor = [];
    private int[] ringHead = [];
    private int[] childCount = [];
    private int[] closureNext = new int[16];
    private int[] closureBond = new int[16];
    private int[] closureDigit = new int[16];
    private int[] fullOrder = [];
    private int closures;
    private int visitCounter;
    private ulong[] usedDigits = new ulong[16];

    internal string Write(Molecule target, ReadOnlySpan<int> ranks, bool byInput)
    {
        molecule = target;
        length = 0;
        int count = target.AtomCount;
        Reserve(count);
        SortNeighbors(ranks);
        visited.AsSpan(0, count).Clear();
        visitCounter = 0;
        PrepareStereo();
        int[] order = fullOrder;
        for (int i = 0; i < count; i++)
        {
            order[ranks[i]] = i;
        }

        // A terminal atom makes the more readable start; the choice depends on ranks alone, so it stays canonical.
        bool first = true;
        for (int pass = byInput ? 1 : 0; pass < 2; pass++)
        {
            for (int i = 0; i < count; i++)
            {
                int start = order[i];
                if (visited[start] != 0 || (pass == 0 && molecule.DegreeOf(start) > 1))
                {
                    continue;
                }

                if (!first)
                {
                    Append('.');
                }

                first = false;
                treeStart = visitCounter + 1;
                Explore(start);
                if (hasDirections)
                {
                    ChooseDirections();
                }

                Print(start);
            }
        }

        molecule = null!;
        return new string(text, 0, length);
    }

    private void Reserve(int count)
    {
        if (visited.Length < count)
        {
            int size = Math.Max(64, 2 * count);
            visited = new int[size];
            parentBond = new int[size];
            stack = new int[size];
            cursor = new int[size];
            ringHead = new int[size];
            childCount = new int[size];
            fullOrder = new int[size];
            stereoOfAtom = new int[size];
        }

        if (sorted.Length < 2 * molecule.BondCount)
        {
            sorted = new int[Math.Max(128, 4 * molecule.BondCount)];
        }
    }

    // Neighbour entries of each atom by rank; insertion sort, since atoms have few neighbours.
    private void SortNeighbors(ReadOnlySpan<int> ranks)
    {
        ReadOnlySpan<Neighbor> neighbors = molecule.NeighborSpan;
        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            int start = molecule.NeighborOffsets[atom];
            int end = molecule.NeighborOffsets[atom + 1];
            if (end - start > 32)
            {
                SortMany(ranks, start, end);
                continue;
            }

            for (int i = start; i < end; i++)
            {
                int rank = ranks[neighbors[i].Atom];
                int j = i;
                while (j > start && ranks[neighbors[sorted[j - 1]].Atom] > rank)
                {
                    sorted[j] = sorted[j - 1];
                    j--;
                }

                sorted[j] = i;
            }
        }
    }

    private void SortMany(ReadOnlySpan<int> ranks, int start, int end)
    {
        var keys = new int[end - start];
        for (int i = start; i < end; i++)
        {
            sorted[i] = i;
            keys[i - start] = ranks[molecule.NeighborSpan[i].Atom];
        }

        Span<int> part = sorted.AsSpan(start, end - start);
        keys.AsSpan().Sort(part);
    }

    // Depth-first walk that finds the ring bonds: those that lead back to an atom above in the tree.
    private void Explore(int root)
    {
        closures = 0;
        int depth = 0;
        stack[0] = root;
        Enter(root, -1);
        while (depth >= 0)
        {
            int atom = stack[depth];
            if (cursor[atom] >= molecule.NeighborOffsets[atom + 1])
            {
                depth--;
                continue;
            }

            Neighbor neighbor = molecule.NeighborSpan[sorted[cursor[atom]++]];
            if (neighbor.Bond == parentBond[atom])
            {
                continue;
            }

            if (visited[neighbor.Atom] == 0)
            {
                childCount[atom]++;
                Enter(neighbor.Atom, neighbor.Bond);
                stack[++depth] = neighbor.Atom;
            }
            else if (visited[neighbor.Atom] < visited[atom])
            {
                AddClosure(neighbor.Atom, neighbor.Bond);
                AddClosure(atom, neighbor.Bond);
            }
        }
    }

    private void Enter(int atom, int bond)
    {
        visited[atom] = ++visitCounter;
        parentBond[atom] = bond;
        cursor[atom] = molecule.NeighborOffsets[atom];
        ringHead[atom] = -1;
        childCount[atom] = 0;
    }

    // The closures of an atom form a list in the order in which the walk met them, which ranks decide.
    private void AddClosure(int atom, int bond)
    {
        if (closures == closureNext.Length)
        {
            Array.Resize(ref closureNext, 2 * closures);
            Array.Resize(ref closureBond, 2 * closures);
            Array.Resize(ref closureDigit, 2 * closures);
        }

        closureBond[closures] = bond;
        closureNext[closures] = -1;
        closureDigit[closures] = 0;
        if (ringHead[atom] < 0)
        {
            ringHead[atom] = closures++;
            return;
        }

        int at = ringHead[atom];
        while (closureNext[at] >= 0)
        {
            at = closureNext[at];
        }

        closureNext[at] = closures++;
    }

    private void Append(char c)
    {
        if (length == text.Length)
        {
            Array.Resize(ref text, 2 * length);
        }

        text[length++] = c;
    }

    private void Append(ReadOnlySpan<char> part)
    {
        foreach (char c in part)
        {
            Append(c);
        }
    }

    private void AppendNumber(int value)
    {
        if (value >= 10)
        {
            AppendNumber(value / 10);
        }

        Append((char)('0' + (value % 10)));
    }
}
