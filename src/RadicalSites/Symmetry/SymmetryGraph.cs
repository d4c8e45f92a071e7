using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>A molecule flattened to integer arrays for refinement and search; reused from call to call.</summary>
/// <remarks>Not thread-safe: one belongs to each <see cref="SymmetryWorkspace"/>.</remarks>
internal sealed partial class SymmetryGraph
{
    /// <summary>Weights are summed over bonds, so each class of bond has its own bit field.</summary>
    internal const int SingleWeight = 1;

    internal const int AromaticWeight = 1 << 8;
    internal const int DoubleWeight = 1 << 16;
    private const int TripleWeight = 1 << 22;
    private const int QuadrupleWeight = 1 << 27;

    internal int AtomCount;

    /// <summary>Number of molecules loaded so far; tells scratch of an earlier one apart.</summary>
    internal int Generation;
    internal int[] Offset = new int[65];
    internal int[] Adjacent = new int[160];
    internal int[] Weight = new int[160];

    /// <summary>Whether the bond of each entry of <see cref="Adjacent"/> lies on a ring; filled for whole molecules.</summary>
    internal bool[] InRing = new bool[160];
    internal ulong[] Key = new ulong[64];

    /// <summary>Fills atoms and bonds; stereo elements are left empty.</summary>
    internal void Load(Molecule molecule, bool withAtomClasses)
    {
        int n = molecule.AtomCount;
        ReadOnlySpan<Neighbor> neighbors = molecule.NeighborSpan;
        Reserve(n, neighbors.Length);
        AtomCount = n;
        Generation++;
        molecule.NeighborOffsets.CopyTo(Offset);
        ReadOnlySpan<Bond> bonds = molecule.BondSpan;
        int[] adjacent = Adjacent;
        int[] weight = Weight;
        bool[] inRing = InRing;
        for (int i = 0; i < neighbors.Length; i++)
        {
            Neighbor neighbor = neighbors[i];
            adjacent[i] = neighbor.Atom;
            ref readonly Bond bond = ref bonds[neighbor.Bond];
            weight[i] = WeightOf(bond);
            inRing[i] = bond.IsInRing;
        }

        ReadOnlySpan<Atom> atoms = molecule.AtomSpan;
        for (int i = 0; i < atoms.Length; i++)
        {
            Key[i] = KeyOf(atoms[i], Offset[i + 1] - Offset[i], withAtomClasses);
        }

        ElementCount = 0;
        BodyCount = 0;
        Array.Clear(CenterAt, 0, n);
        Array.Clear(AxisAt, 0, n);
    }

    internal int DegreeOf(int atom) => Offset[atom + 1] - Offset[atom];

    /// <summary>Number of bonds of an atom that lie on rings.</summary>
    internal int RingBondsOf(int atom)
    {
        int count = 0;
        for (int i = Offset[atom]; i < Offset[atom + 1]; i++)
        {
            count += InRing[i] ? 1 : 0;
        }

        return count;
    }

    /// <summary>Weight of the bond between two atoms, or 0 when there is none.</summary>
    internal int WeightBetween(int first, int second)
    {
        int end = Offset[first + 1];
        for (int i = Offset[first]; i < end; i++)
        {
            if (Adjacent[i] == second)
            {
                return Weight[i];
            }
        }

        return 0;
    }

    private static int WeightOf(in Bond bond) => bond.IsAromatic
        ? AromaticWeight
        : bond.Order switch
        {
            BondOrder.Double => DoubleWeight,
            BondOrder.Triple => TripleWeight,
            BondOrder.Quadruple => QuadrupleWeight,
            _ => SingleWeight,
        };

    /// <summary>Everything of an atom that an equivalence respects; low degree and carbon come first.</summary>
    private static ulong KeyOf(in Atom atom, int degree, bool withAtomClasses)
    {
        int element = atom.AtomicNumber == 6 ? 0 : atom.AtomicNumber + 1;
        ulong key = (ulong)(uint)Math.Min(degree, 255);
        key = (key << 7) | (uint)element;
        key = (key << 1) | (atom.IsAromatic ? 1u : 0u);
        key = (key << 7) | (uint)Math.Min(atom.HydrogenCount, 127);
        key = (key << 6) | (uint)(Math.Clamp(atom.FormalCharge, -31, 31) + 32);
        key = (key << 10) | (uint)Math.Min(atom.MassNumber, 1023);
        key = (key << 2) | (uint)(atom.UnpairedElectrons & 3);

        // Classes above 2^20 fold; the exact comparison of labelled graphs looks at the whole key only.
        key = (key << 20) | (withAtomClasses ? (uint)atom.AtomClass & 0xFFFFF : 0u);
        return key << 2;
    }

    private void Reserve(int atoms, int ends)
    {
        if (Key.Length < atoms)
        {
            int size = Math.Max(atoms, 2 * Key.Length);
            Key = new ulong[size];
            Offset = new int[size + 1];
            CenterAt = new int[size];
            AxisAt = new int[size];
        }

        if (Adjacent.Length < ends)
        {
            int size = Math.Max(ends, 2 * Adjacent.Length);
            Adjacent = new int[size];
            Weight = new int[size];
            InRing = new bool[size];
        }
    }
}
