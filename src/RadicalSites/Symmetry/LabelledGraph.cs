using System;

namespace RadicalSites.Symmetry;

/// <summary>A graph written down by the places of its atoms in an order; equal for two orders that an automorphism relates.</summary>
internal sealed class LabelledGraph : IEquatable<LabelledGraph>
{
    private ulong[] words = [];
    private int count;

    /// <summary>Writes the graph down.</summary>
    /// <param name="graph">Connected graph, stereo elements included.</param>
    /// <param name="order">A discrete partition.</param>
    internal void Fill(SymmetryGraph graph, ColorPartition order)
    {
        int n = graph.AtomCount;
        int size = (2 * n) + graph.Offset[n] + graph.ElementCount + (7 * graph.BodyCount) + 1;
        if (words.Length < size)
        {
            words = new ulong[Math.Max(size, 2 * words.Length)];
        }

        count = 0;
        words[count++] = (ulong)n;
        for (int place = 0; place < n; place++)
        {
            int atom = order.Members[place];
            words[count++] = graph.Key[atom];
            int first = count;
            for (int i = graph.Offset[atom]; i < graph.Offset[atom + 1]; i++)
            {
                int other = order.Position[graph.Adjacent[i]];
                if (other < place)
                {
                    words[count++] = ((ulong)other << 32) | (uint)graph.Weight[i];
                }
            }

            if (count - first > 1)
            {
                Array.Sort(words, first, count - first);
            }

            words[count++] = ulong.MaxValue;
        }

        int elements = count;
        for (int e = 0; e < graph.ElementCount; e++)
        {
            int begin = order.Position[graph.Focus[e]];
            int end = order.Position[graph.FocusEnd[e]];
            int sign = graph.ResolvedSign(e, order.CellOf, graph.Configuration) + 1;
            words[count++] = ((ulong)Math.Min(begin, end) << 34) | ((ulong)Math.Max(begin, end) << 4) | (uint)sign;
        }

        Array.Sort(words, elements, count - elements);
        if (graph.BodyCount > 0)
        {
            AddBodies(graph, order);
        }
    }

    private void AddBodies(SymmetryGraph graph, ColorPartition order)
    {
        Span<int> sequence = stackalloc int[6];
        for (int place = 0; place < order.Count; place++)
        {
            int body = graph.BodyAt[order.Members[place]] - 1;
            if (body < 0)
            {
                continue;
            }

            int size = graph.BodySequence(body, order.Position, sequence);
            words[count++] = ((ulong)place << 8) | (uint)size;
            for (int i = 0; i < size; i++)
            {
                words[count++] = (ulong)(sequence[i] + 1);
            }
        }
    }

    internal int CompareTo(LabelledGraph other) =>
        words.AsSpan(0, count).SequenceCompareTo(other.words.AsSpan(0, other.count));

    /// <inheritdoc/>
    public bool Equals(LabelledGraph? other) => other is not null && CompareTo(other) == 0;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as LabelledGraph);

    /// <inheritdoc/>
    public override int GetHashCode()
    {
        ulong hash = 17;
        for (int i = 0; i < count; i++)
        {
            hash = ((hash ^ words[i]) * 0x9E3779B97F4A7C15UL) ^ (hash >> 29);
        }

        return (int)(hash >> 32);
    }

    /// <summary>Appends another form, as the next fragment.</summary>
    internal void Append(LabelledGraph other)
    {
        if (words.Length < count + other.count)
        {
            Array.Resize(ref words, Math.Max(count + other.count, 2 * words.Length));
        }

        Array.Copy(other.words, 0, words, count, other.count);
        count += other.count;
    }

    internal void CopyFrom(LabelledGraph other)
    {
        if (words.Length < other.count)
        {
            words = new ulong[other.words.Length];
        }

        count = other.count;
        Array.Copy(other.words, words, count);
    }
}
