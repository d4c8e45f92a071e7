using System;

namespace RadicalSites.Symmetry;

/// <summary>Union-find over atoms; the root of a class is its lowest index.</summary>
internal sealed class OrbitForest
{
    private int[] parent = [];

    internal void Start(int n)
    {
        if (parent.Length < n)
        {
            parent = new int[Math.Max(64, Math.Max(n, 2 * parent.Length))];
        }

        for (int i = 0; i < n; i++)
        {
            parent[i] = i;
        }
    }

    internal void Reserve(int n)
    {
        if (parent.Length < n)
        {
            parent = new int[Math.Max(64, Math.Max(n, 2 * parent.Length))];
        }
    }

    internal void Reset(int atom) => parent[atom] = atom;

    internal int Find(int atom)
    {
        while (parent[atom] != atom)
        {
            parent[atom] = parent[parent[atom]];
            atom = parent[atom];
        }

        return atom;
    }

    internal bool Union(int first, int second)
    {
        int a = Find(first);
        int b = Find(second);
        if (a == b)
        {
            return false;
        }

        parent[Math.Max(a, b)] = Math.Min(a, b);
        return true;
    }
}
