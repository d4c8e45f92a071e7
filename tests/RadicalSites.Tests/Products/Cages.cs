using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Products;

/// <summary>Saturated hydrocarbons made from their carbon skeleton, for cages whose SMILES nobody can check by eye.</summary>
internal static class Cages
{
    /// <summary>A saturated hydrocarbon with four bonds at every carbon.</summary>
    internal static Molecule Hydrocarbon(int carbons, IReadOnlyList<(int, int)> bonds)
    {
        var neighbors = new List<Neighbor>[carbons];
        for (int i = 0; i < carbons; i++)
        {
            neighbors[i] = [];
        }

        for (int i = 0; i < bonds.Count; i++)
        {
            neighbors[bonds[i].Item1].Add(new Neighbor(bonds[i].Item2, i));
            neighbors[bonds[i].Item2].Add(new Neighbor(bonds[i].Item1, i));
        }

        int[] offsets = new int[carbons + 1];
        for (int i = 0; i < carbons; i++)
        {
            offsets[i + 1] = offsets[i] + neighbors[i].Count;
        }

        bool ring = bonds.Count >= carbons;
        AtomFlags flags = ring ? AtomFlags.Ring : AtomFlags.None;
        return new Molecule(
            [.. neighbors.Select(list => new Atom(6, 0, 0, 4 - list.Count, 0, flags, 0))],
            [.. bonds.Select(bond => new Bond(bond.Item1, bond.Item2, BondOrder.Single, false, ring))],
            offsets, [.. neighbors.SelectMany(static list => list)], []);
    }

    /// <summary>The vertices of the icosahedron with their neighbours.</summary>
    private static int[][] Icosahedron()
    {
        double golden = (1 + Math.Sqrt(5)) / 2;
        var points = new List<(double X, double Y, double Z)>();
        foreach (int one in new[] { -1, 1 })
        {
            foreach (int two in new[] { -1, 1 })
            {
                points.Add((0, one, two * golden));
                points.Add((one, two * golden, 0));
                points.Add((two * golden, 0, one));
            }
        }

        return [.. points.Select(a => Enumerable.Range(0, 12).Where(i =>
            Math.Abs(Distance(a, points[i]) - 2) < 1e-9).ToArray())];
    }

    private static double Distance((double X, double Y, double Z) a, (double X, double Y, double Z) b) =>
        Math.Sqrt(Math.Pow(a.X - b.X, 2) + Math.Pow(a.Y - b.Y, 2) + Math.Pow(a.Z - b.Z, 2));

    /// <summary>C20H20: one carbon for each face of the icosahedron.</summary>
    internal static Molecule Dodecahedrane()
    {
        int[][] around = Icosahedron();
        var faces = new List<(int A, int B, int C)>();
        for (int a = 0; a < 12; a++)
        {
            foreach (int b in around[a].Where(b => b > a))
            {
                faces.AddRange(around[a].Intersect(around[b]).Where(c => c > b).Select(c => (a, b, c)));
            }
        }

        int Shared((int A, int B, int C) f, (int A, int B, int C) g) =>
            new[] { f.A, f.B, f.C }.Intersect([g.A, g.B, g.C]).Count();
        var bonds = new List<(int, int)>();
        for (int i = 0; i < faces.Count; i++)
        {
            for (int j = i + 1; j < faces.Count; j++)
            {
                if (Shared(faces[i], faces[j]) == 2)
                {
                    bonds.Add((i, j));
                }
            }
        }

        return Hydrocarbon(faces.Count, bonds);
    }

    /// <summary>C60H60: one carbon for each directed edge of the icosahedron.</summary>
    internal static Molecule Fullerane()
    {
        int[][] around = Icosahedron();
        var edges = new List<(int From, int To)>();
        for (int a = 0; a < 12; a++)
        {
            edges.AddRange(around[a].Select(b => (a, b)));
        }

        var bonds = new List<(int, int)>();
        for (int i = 0; i < edges.Count; i++)
        {
            for (int j = i + 1; j < edges.Count; j++)
            {
                (int from, int to) = edges[i];
                bool reversed = edges[j] == (to, from);
                bool beside = edges[j].From == from && around[to].Contains(edges[j].To);
                if (reversed || beside)
                {
                    bonds.Add((i, j));
                }
            }
        }

        return Hydrocarbon(60, bonds);
    }
}
