using System;

namespace RadicalSites.Symmetry;

internal sealed partial class ColorPartition
{
    /// <summary>
    /// Splits cells until all members of a cell see every other cell alike, bonds by kind, and agree in every stereo
    /// element that the colours resolve.
    /// </summary>
    /// <param name="graph">The graph the partition was started on.</param>
    /// <param name="configuration">Configurations to read the stereo elements by.</param>
    internal void Refine(SymmetryGraph graph, sbyte[] configuration)
    {
        do
        {
            while (queueCount > 0)
            {
                if (CellCount == Count)
                {
                    ClearQueue();
                    return;
                }

                int cell = queue[queueHead];
                queueHead = queueHead + 1 == Count ? 0 : queueHead + 1;
                queueCount--;
                queued[cell] = false;
                SplitBy(graph, cell);
            }
        }
        while (graph.ElementCount + graph.BodyCount > 0 && CellCount < Count && SplitByStereo(graph, configuration));
    }

    private void SplitBy(SymmetryGraph graph, int cell)
    {
        int[] offset = graph.Offset;
        int[] adjacent = graph.Adjacent;
        int[] weight = graph.Weight;
        int[] sum = sums;
        int[] cellOf = CellOf;
        int count = 0;
        int end = cell + Length[cell];
        for (int i = cell; i < end; i++)
        {
            int member = Members[i];
            int last = offset[member + 1];
            for (int j = offset[member]; j < last; j++)
            {
                int atom = adjacent[j];
                if (Length[cellOf[atom]] == 1)
                {
                    continue;
                }

                if (sum[atom] == 0)
                {
                    touched[count++] = atom;
                }

                sum[atom] += weight[j];
            }
        }

        if (count > 0)
        {
            SplitTouched(count);
        }
    }

    /// <summary>Splits every cell with touched members by their sums; untouched members come first.</summary>
    private bool SplitTouched(int count)
    {
        int cells = 0;
        for (int i = 0; i < count; i++)
        {
            int atom = touched[i];
            int cell = CellOf[atom];
            int nth = touchedCount[cell]++;
            if (nth == 0)
            {
                touchedCells[cells++] = cell;
            }

            int target = cell + Length[cell] - 1 - nth;
            int from = Position[atom];
            int other = Members[target];
            Members[from] = other;
            Position[other] = from;
            Members[target] = atom;
            Position[atom] = target;
        }

        if (cells > 1)
        {
            SortAscending(touchedCells, cells);
        }

        bool any = false;
        for (int i = 0; i < cells; i++)
        {
            any |= SplitCell(touchedCells[i]);
        }

        return any;
    }

    private bool SplitCell(int cell)
    {
        int length = Length[cell];
        int marked = touchedCount[cell];
        touchedCount[cell] = 0;
        int end = cell + length;
        int start = end - marked;
        int firstSum = sums[Members[start]];
        bool same = true;
        for (int i = start + 1; i < end && same; i++)
        {
            same = sums[Members[i]] == firstSum;
        }

        Trace = ((Trace ^ (uint)cell) * 0x9E3779B97F4A7C15UL) + (uint)marked;
        if (same)
        {
            Trace = ((Trace ^ (uint)firstSum) * 0xD6E8FEB86659FD93UL) ^ (Trace >> 29);
            for (int i = start; i < end; i++)
            {
                sums[Members[i]] = 0;
            }

            if (marked == length)
            {
                return false;
            }

            Length[cell] = length - marked;
            MakeCell(start, marked);
            QueuePieces(cell, end);
            return true;
        }

        SortBySum(start, marked);
        if (start > cell)
        {
            Length[cell] = start - cell;
        }

        for (int i = start; i < end;)
        {
            int value = sums[Members[i]];
            int from = i;
            while (i < end && sums[Members[i]] == value)
            {
                i++;
            }

            Trace = ((Trace ^ (uint)value) * 0xD6E8FEB86659FD93UL) + (uint)i;
            if (from == cell)
            {
                Length[cell] = i - from;
            }
            else
            {
                MakeCell(from, i - from);
            }
        }

        for (int i = start; i < end; i++)
        {
            sums[Members[i]] = 0;
        }

        QueuePieces(cell, end);
        return true;
    }

    private void MakeCell(int start, int length)
    {
        Length[start] = length;
        for (int i = start; i < start + length; i++)
        {
            CellOf[Members[i]] = start;
        }

        CellCount++;
    }

    private void QueuePieces(int cell, int end)
    {
        int spared = -1;
        if (!queued[cell])
        {
            int largest = 0;
            for (int at = cell; at < end; at += Length[at])
            {
                if (Length[at] > largest)
                {
                    largest = Length[at];
                    spared = at;
                }
            }
        }

        for (int at = cell; at < end; at += Length[at])
        {
            if (at != spared)
            {
                Push(at);
            }
        }
    }

    private void SortBySum(int start, int length)
    {
        if (length <= 24)
        {
            for (int i = start + 1; i < start + length; i++)
            {
                int atom = Members[i];
                int key = sums[atom];
                int at = i;
                while (at > start && sums[Members[at - 1]] > key)
                {
                    Members[at] = Members[at - 1];
                    at--;
                }

                Members[at] = atom;
            }
        }
        else
        {
            for (int i = start; i < start + length; i++)
            {
                sortKeys[i] = sums[Members[i]];
            }

            Array.Sort(sortKeys, Members, start, length);
        }

        for (int i = start; i < start + length; i++)
        {
            Position[Members[i]] = i;
        }
    }

    private static void SortAscending(int[] values, int count)
    {
        if (count > 24)
        {
            Array.Sort(values, 0, count);
            return;
        }

        for (int i = 1; i < count; i++)
        {
            int value = values[i];
            int at = i;
            while (at > 0 && values[at - 1] > value)
            {
                values[at] = values[at - 1];
                at--;
            }

            values[at] = value;
        }
    }

    private void ClearQueue()
    {
        while (queueCount > 0)
        {
            queued[queue[queueHead]] = false;
            queueHead = queueHead + 1 == Count ? 0 : queueHead + 1;
            queueCount--;
        }
    }
}
