using System;

namespace RadicalSites.Symmetry;

/// <summary>An ordered partition of the atoms into cells, refined until it is equitable.</summary>
/// <remarks>
/// A cell is named by the position of its first member, so names do not depend on the numbering of the atoms. Splitting
/// and the order of the worklist use positions and counts only; that makes every state an invariant of the graph.
/// The worklist follows Hopcroft: of the pieces of a split cell the largest need not be used again. Not thread-safe.
/// </remarks>
internal sealed partial class ColorPartition
{
    internal int Count;
    internal int CellCount;

    /// <summary>Hash of all splits made; equal for equal graphs whatever their numbering.</summary>
    internal ulong Trace;

    internal int[] Members = [];
    internal int[] Position = [];
    internal int[] CellOf = [];
    internal int[] Length = [];

    private int[] queue = [];
    private bool[] queued = [];
    private int[] sums = [];
    private int[] touched = [];
    private int[] touchedCells = [];
    private int[] touchedCount = [];
    private int[] sortKeys = [];
    private ulong[] initialKeys = [];
    private int queueHead;
    private int queueCount;

    internal bool IsDiscrete => CellCount == Count;

    /// <summary>Cells by equal atom keys in ascending order, all on the worklist.</summary>
    internal void Start(SymmetryGraph graph)
    {
        int n = graph.AtomCount;
        Reserve(n);
        Count = n;
        Trace = 17;
        SplitsTies = false;
        ulong[] keys = graph.Key;
        int[] members = Members;
        if (n <= 40)
        {
            for (int i = 0; i < n; i++)
            {
                ulong key = keys[i];
                int at = i;
                while (at > 0 && keys[members[at - 1]] > key)
                {
                    members[at] = members[at - 1];
                    at--;
                }

                members[at] = i;
            }
        }
        else
        {
            for (int i = 0; i < n; i++)
            {
                members[i] = i;
                initialKeys[i] = keys[i];
            }

            Array.Sort(initialKeys, members, 0, n);
        }

        queueHead = 0;
        queueCount = 0;
        CellCount = 0;
        for (int start = 0; start < n;)
        {
            ulong key = keys[members[start]];
            int end = start;
            while (end < n && keys[members[end]] == key)
            {
                CellOf[members[end]] = start;
                Position[members[end]] = end;
                end++;
            }

            Length[start] = end - start;
            CellCount++;
            Push(start);
            start = end;
        }
    }

    /// <summary>Gives an atom a cell of its own in front of the rest of its cell.</summary>
    internal void Individualise(int atom)
    {
        int cell = CellOf[atom];
        int length = Length[cell];
        if (length == 1)
        {
            return;
        }

        int first = Members[cell];
        int at = Position[atom];
        Members[at] = first;
        Position[first] = at;
        Members[cell] = atom;
        Position[atom] = cell;
        Length[cell] = 1;
        Length[cell + 1] = length - 1;
        for (int i = cell + 1; i < cell + length; i++)
        {
            CellOf[Members[i]] = cell + 1;
        }

        CellCount++;
        Push(cell);
    }

    /// <summary>Takes over a partition that has nothing on its worklist.</summary>
    internal void CopyFrom(ColorPartition other)
    {
        int n = other.Count;
        Reserve(n);
        Count = n;
        CellCount = other.CellCount;
        Trace = other.Trace;
        SplitsTies = other.SplitsTies;
        Array.Copy(other.Members, Members, n);
        Array.Copy(other.Position, Position, n);
        Array.Copy(other.CellOf, CellOf, n);
        Array.Copy(other.Length, Length, n);
        queueHead = 0;
        queueCount = 0;
    }

    private void Push(int cell)
    {
        if (queued[cell])
        {
            return;
        }

        queued[cell] = true;
        int at = queueHead + queueCount;
        queue[at >= Count ? at - Count : at] = cell;
        queueCount++;
    }

    private void Reserve(int n)
    {
        if (Members.Length >= n)
        {
            return;
        }

        int size = Math.Max(64, Math.Max(n, 2 * Members.Length));
        Members = new int[size];
        Position = new int[size];
        CellOf = new int[size];
        Length = new int[size];
        queue = new int[size];
        queued = new bool[size];
        sums = new int[size];
        touched = new int[size];
        touchedCells = new int[size];
        touchedCount = new int[size];
        sortKeys = new int[size];
        initialKeys = new ulong[size];
    }
}
