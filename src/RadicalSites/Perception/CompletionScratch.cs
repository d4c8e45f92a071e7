using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Working arrays for completion, kept by a thread and grown on demand.</summary>
internal sealed class CompletionScratch
{
    internal const byte AromaticBit = 1;
    internal const byte RingBit = 2;
    internal const byte CandidateBit = 4;

    internal int[] Offsets = [];
    internal Neighbor[] Neighbors = [];
    internal AtomFlags[] AtomFlags = [];
    internal byte[] BondFlags = [];
    internal int[] First = [];
    internal int[] Second = [];
    internal int[] Third = [];
    internal int[] Fourth = [];

    /// <summary>Sizes the arrays for a draft, clears the flags, and lists the neighbours of each atom in bond order.</summary>
    internal void Prepare(StructureDraft draft)
    {
        int atoms = draft.AtomCount;
        int bonds = draft.BondCount;
        if (Offsets.Length < atoms + 1)
        {
            int size = Math.Max(64, 2 * (atoms + 1));
            Offsets = new int[size];
            AtomFlags = new AtomFlags[size];
            First = new int[size];
            Second = new int[size];
            Third = new int[size];
            Fourth = new int[size];
        }

        if (BondFlags.Length < bonds)
        {
            BondFlags = new byte[Math.Max(64, 2 * bonds)];
            Neighbors = new Neighbor[2 * BondFlags.Length];
        }

        AtomFlags.AsSpan(0, atoms).Clear();
        BondFlags.AsSpan(0, bonds).Clear();
        Span<int> offsets = Offsets.AsSpan(0, atoms + 1);
        offsets.Clear();
        ReadOnlySpan<BuilderBond> list = draft.Bonds.AsSpan(0, bonds);
        foreach (ref readonly BuilderBond bond in list)
        {
            offsets[bond.Begin]++;
            offsets[bond.End]++;
        }

        int sum = 0;
        for (int i = 0; i <= atoms; i++)
        {
            int count = offsets[i];
            offsets[i] = sum;
            sum += count;
        }

        Span<int> fill = First.AsSpan(0, atoms);
        offsets[..atoms].CopyTo(fill);
        for (int i = 0; i < list.Length; i++)
        {
            ref readonly BuilderBond bond = ref list[i];
            Neighbors[fill[bond.Begin]++] = new Neighbor(bond.End, i);
            Neighbors[fill[bond.End]++] = new Neighbor(bond.Begin, i);
        }
    }

    internal ReadOnlySpan<Neighbor> NeighborsOf(int atom) => Neighbors.AsSpan(Offsets[atom], Offsets[atom + 1] - Offsets[atom]);
}
