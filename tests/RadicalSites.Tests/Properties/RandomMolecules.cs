using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Properties;

/// <summary>Invented molecules: random carbon skeletons with rings, heteroatoms, double bonds, charges and stereo marks.</summary>
internal static class RandomMolecules
{
    internal static Molecule Next(Random random)
    {
        MoleculeBuilder builder = new();
        int fragments = random.Next(6) == 0 ? 2 : 1;
        for (int fragment = 0; fragment < fragments; fragment++)
        {
            AddFragment(builder, random, 2 + random.Next(14));
        }

        return builder.ToMolecule();
    }

    private static void AddFragment(MoleculeBuilder builder, Random random, int size)
    {
        int start = builder.AtomCount;
        List<int>[] neighbors = new List<int>[size];
        int[] free = new int[size];
        for (int i = 0; i < size; i++)
        {
            // Few kinds of atoms make symmetry likely.
            int element = random.Next(8) switch { 0 => 8, 1 => 7, 2 => i > 1 ? 9 : 6, _ => 6 };
            builder.AddAtom(element, massNumber: element == 6 && random.Next(12) == 0 ? 13 : 0);
            free[i] = element switch { 8 => 2, 7 => 3, 9 => 1, _ => 4 };
            neighbors[i] = [];
        }

        for (int i = 1; i < size; i++)
        {
            int to = random.Next(i);
            for (int tries = 0; tries < size && free[to] == 0; tries++)
            {
                to = (to + 1) % i;
            }

            if (free[to] > 0)
            {
                Join(i, to, BondOrder.Single);
            }
        }

        int rings = random.Next(4);
        for (int r = 0; r < rings; r++)
        {
            int one = random.Next(size);
            int two = random.Next(size);
            if (one != two && free[one] > 0 && free[two] > 0 && !neighbors[one].Contains(two))
            {
                Join(one, two, BondOrder.Single);
            }
        }

        MarkCenters();

        void Join(int one, int two, BondOrder order)
        {
            bool isDouble = free[one] > 1 && free[two] > 1 && random.Next(7) == 0;
            builder.AddBond(start + one, start + two, isDouble ? BondOrder.Double : order);
            free[one] -= isDouble ? 2 : 1;
            free[two] -= isDouble ? 2 : 1;
            neighbors[one].Add(two);
            neighbors[two].Add(one);
        }

        void MarkCenters()
        {
            for (int i = 0; i < size; i++)
            {
                if (free[i] <= 1 && neighbors[i].Count + free[i] == 4 && random.Next(2) == 0)
                {
                    int[] carriers = new int[4];
                    carriers[3] = -1;
                    for (int k = 0; k < neighbors[i].Count; k++)
                    {
                        carriers[k] = start + neighbors[i][k];
                    }

                    builder.AddTetrahedralStereo(start + i, carriers, random.Next(2) == 0);
                }
            }
        }
    }
}
