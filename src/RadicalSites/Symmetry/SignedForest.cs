using System;

namespace RadicalSites.Symmetry;

/// <summary>Union-find in which every node has a sign against its root.</summary>
internal sealed class SignedForest : IEquatable<SignedForest>
{
    private readonly int[] parent;
    private readonly sbyte[] sign;

    internal SignedForest(int count)
    {
        parent = new int[count];
        sign = new sbyte[count];
        for (int i = 0; i < count; i++)
        {
            parent[i] = i;
            sign[i] = 1;
        }
    }

    internal SignedForest(SignedForest other)
    {
        parent = [.. other.parent];
        sign = [.. other.sign];
    }

    /// <summary>Ties the product of two nodes' values to a sign; fails when it is tied to the other already.</summary>
    internal bool TryJoin(int first, int second, int product)
    {
        int a = Root(first, out int signA);
        int b = Root(second, out int signB);
        if (a == b)
        {
            return signA * signB == product;
        }

        parent[Math.Min(a, b)] = Math.Max(a, b);
        sign[Math.Min(a, b)] = (sbyte)(signA * signB * product);
        return true;
    }

    /// <summary>Sign of a node when all roots, the reference's among them, take +1 against the reference.</summary>
    internal int SignAgainst(int node, int reference)
    {
        int root = Root(node, out int own);
        return root == Root(reference, out int other) ? own * other : own;
    }

    /// <inheritdoc/>
    public bool Equals(SignedForest? other)
    {
        if (other is null)
        {
            return false;
        }

        for (int i = 0; i < parent.Length; i++)
        {
            int here = Root(i, out int signHere);
            int there = other.Root(i, out int signThere);
            if (here != there || signHere != signThere)
            {
                return false;
            }
        }

        return true;
    }

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as SignedForest);

    /// <inheritdoc/>
    public override int GetHashCode() => parent.Length;

    /// <summary>Root of a node, and the product of the signs on the way.</summary>
    internal int Root(int node, out int total)
    {
        total = 1;
        while (parent[node] != node)
        {
            total *= sign[node];
            node = parent[node];
        }

        return node;
    }
}
