using System;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>Refines the colours of two copies of one molecular graph side by side until they are stable.</summary>
/// <remarks>
/// The two copies share the names of their colours, so a map of one copy to the other can exist only where every
/// colour occurs equally often in both. Hashes may collide; that only weakens a refinement, and every map found is
/// checked bond by bond. Belongs to one thread.
/// </remarks>
internal sealed class ColorRefinement
{
    private readonly Molecule molecule;
    private readonly int atomCount;
    private readonly ulong[] keys;
    private readonly int[] order;
    private readonly int[] firstColor;

    internal ColorRefinement(Molecule molecule)
    {
        this.molecule = molecule;
        atomCount = molecule.AtomCount;
        keys = new ulong[2 * atomCount];
        order = new int[2 * atomCount];
        firstColor = new int[2 * atomCount];
        for (int i = 0; i < 2 * atomCount; i++)
        {
            keys[i] = AtomKey(i < atomCount ? i : i - atomCount);
        }

        Rename(firstColor);
        Refine(firstColor);
    }

    /// <summary>Colours of both copies from the atoms and bonds alone.</summary>
    internal ReadOnlySpan<int> Start => firstColor;

    /// <summary>Gives one atom of each copy a colour of its own and refines.</summary>
    /// <returns>Whether every colour still occurs equally often in both copies.</returns>
    internal bool Individualise(int[] colors, int atom, int image)
    {
        for (int i = 0; i < colors.Length; i++)
        {
            colors[i] *= 2;
        }

        colors[atom]++;
        colors[atomCount + image]++;
        Array.Clear(keys);
        Rename(colors);
        Refine(colors);
        return IsBalanced(colors);
    }

    /// <summary>Bond order with aromatic bonds as one kind, so that Kekule forms do not break symmetry.</summary>
    internal static int BondCode(Bond bond) => bond.IsAromatic ? 5 : (int)bond.Order;

    private void Refine(int[] colors)
    {
        int classes = CountClasses(colors);
        while (true)
        {
            for (int i = 0; i < colors.Length; i++)
            {
                int copy = i < atomCount ? 0 : atomCount;
                ulong sum = 0;
                foreach (Neighbor neighbor in molecule.NeighborsOf(i - copy))
                {
                    ulong code = (ulong)BondCode(molecule.BondSpan[neighbor.Bond]);
                    sum += Mix(((ulong)(uint)colors[copy + neighbor.Atom] << 3) | code);
                }

                keys[i] = Mix(sum ^ Mix((ulong)(uint)colors[i] + 0x9E3779B97F4A7C15));
            }

            Rename(colors);
            int refined = CountClasses(colors);
            if (refined <= classes)
            {
                return;
            }

            classes = refined;
        }
    }

    // New colours follow the old ones first, so that a class is only ever split and names agree in both copies.
    private void Rename(int[] colors)
    {
        for (int i = 0; i < order.Length; i++)
        {
            order[i] = i;
        }

        int[] old = (int[])colors.Clone();
        Array.Sort(order, (left, right) =>
        {
            int byColor = old[left].CompareTo(old[right]);
            return byColor != 0 ? byColor : keys[left].CompareTo(keys[right]);
        });
        int color = 0;
        for (int i = 0; i < order.Length; i++)
        {
            if (i > 0 && (old[order[i]] != old[order[i - 1]] || keys[order[i]] != keys[order[i - 1]]))
            {
                color++;
            }

            colors[order[i]] = color;
        }
    }

    private static int CountClasses(ReadOnlySpan<int> colors)
    {
        int largest = -1;
        foreach (int color in colors)
        {
            largest = Math.Max(largest, color);
        }

        return largest + 1;
    }

    private bool IsBalanced(ReadOnlySpan<int> colors)
    {
        Span<int> balance = colors.Length <= 512 ? stackalloc int[colors.Length] : new int[colors.Length];
        balance.Clear();
        for (int i = 0; i < atomCount; i++)
        {
            balance[colors[i]]++;
            balance[colors[atomCount + i]]--;
        }

        return !balance.ContainsAnyExcept(0);
    }

    private ulong AtomKey(int index)
    {
        Atom atom = molecule.AtomSpan[index];
        ulong key = ((ulong)(uint)atom.AtomicNumber << 40) ^ ((ulong)(byte)atom.FormalCharge << 32)
            ^ ((ulong)(uint)atom.MassNumber << 16) ^ ((ulong)(uint)atom.HydrogenCount << 8)
            ^ ((ulong)(uint)atom.UnpairedElectrons << 4) ^ (atom.IsAromatic ? 1UL : 0);
        return Mix(key) + Mix((ulong)(uint)atom.AtomClass + 77);
    }

    private static ulong Mix(ulong value)
    {
        value ^= value >> 30;
        value *= 0xBF58476D1CE4E5B9;
        value ^= value >> 27;
        value *= 0x94D049BB133111EB;
        return value ^ (value >> 31);
    }
}
