using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

internal sealed partial class SymmetryGraph
{
    private const int LargestBody = 6;

    // Rotations of each body as the slot that moves to each slot; the slots are those of CoordinationCodes.
    private static readonly int[][] SquareRotations = Rotations([1, 2, 3, 0], [2, 1, 0, 3]);
    private static readonly int[][] BipyramidRotations = Rotations([0, 2, 3, 1, 4], [4, 1, 3, 2, 0]);
    private static readonly int[][] OctahedronRotations = Rotations([0, 2, 3, 4, 1, 5], [4, 1, 0, 3, 5, 2]);

    /// <summary>Number of square planar, trigonal bipyramidal and octahedral elements.</summary>
    internal int BodyCount;

    internal int[] BodyFocus = new int[2];

    /// <summary>Carriers by slot, six to a body.</summary>
    internal int[] BodyCarriers = new int[2 * LargestBody];

    /// <summary>1 + index of the body at an atom, 0 = none; filled only where there are bodies.</summary>
    internal int[] BodyAt = [];

    private StereoKind[] bodyKinds = new StereoKind[2];

    /// <summary>Takes over the stated square planar, trigonal bipyramidal and octahedral elements.</summary>
    internal void AddBodies(Molecule molecule)
    {
        Span<int> carriers = stackalloc int[LargestBody];
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind < StereoKind.SquarePlanar)
            {
                continue;
            }

            ReadOnlySpan<int> slots = CoordinationCodes.SlotsOf(element);
            if (slots.Length == element.CarrierSpan.Length)
            {
                carriers.Fill(NoAtom);
                for (int i = 0; i < slots.Length; i++)
                {
                    carriers[slots[i]] = element.CarrierSpan[i];
                }

                AddBody(element.Kind, element.Focus, carriers);
            }
        }
    }

    /// <summary>Writes the colours of the carriers in the one order that all rotations of the body share.</summary>
    /// <returns>Number of carriers.</returns>
    internal int BodySequence(int body, int[] colors, Span<int> sequence)
    {
        int[][] rotations = RotationsOf(body);
        int size = rotations[0].Length;
        ReadOnlySpan<int> carriers = BodyCarriers.AsSpan(LargestBody * body, size);
        Span<int> trial = stackalloc int[LargestBody];
        for (int r = 0; r < rotations.Length; r++)
        {
            for (int slot = 0; slot < size; slot++)
            {
                int carrier = carriers[rotations[r][slot]];
                trial[slot] = carrier < 0 ? carrier : colors[carrier];
            }

            if (r == 0 || trial[..size].SequenceCompareTo(sequence[..size]) < 0)
            {
                trial[..size].CopyTo(sequence);
            }
        }

        return size;
    }

    /// <summary>Whether a permutation carries a body onto the body that stands at its image.</summary>
    /// <param name="body">Index of the body.</param>
    /// <param name="image">Image of each atom, -1 = the atom stays.</param>
    internal bool BodyHolds(int body, int[] image)
    {
        int focus = image[BodyFocus[body]] < 0 ? BodyFocus[body] : image[BodyFocus[body]];
        int there = BodyAt[focus] - 1;
        if (there < 0 || bodyKinds[there] != bodyKinds[body])
        {
            return false;
        }

        foreach (int[] rotation in RotationsOf(body))
        {
            bool same = true;
            for (int slot = 0; slot < rotation.Length && same; slot++)
            {
                int carrier = BodyCarriers[(LargestBody * body) + rotation[slot]];
                int moved = carrier < 0 || image[carrier] < 0 ? carrier : image[carrier];
                same = moved == BodyCarriers[(LargestBody * there) + slot];
            }

            if (same)
            {
                return true;
            }
        }

        return false;
    }

    private void AddBody(StereoKind kind, int focus, ReadOnlySpan<int> carriers)
    {
        int body = BodyCount++;
        if (body == BodyFocus.Length)
        {
            Array.Resize(ref BodyFocus, 2 * body);
            Array.Resize(ref bodyKinds, 2 * body);
            Array.Resize(ref BodyCarriers, 2 * body * LargestBody);
        }

        if (BodyAt.Length < AtomCount)
        {
            BodyAt = new int[Key.Length];
        }

        if (body == 0)
        {
            Array.Clear(BodyAt, 0, AtomCount);
        }

        bodyKinds[body] = kind;
        BodyFocus[body] = focus;
        carriers.CopyTo(BodyCarriers.AsSpan(LargestBody * body));
        BodyAt[focus] = body + 1;
    }

    private void CopyBodies(SymmetryGraph whole, int fragment, int[] place)
    {
        Span<int> carriers = stackalloc int[LargestBody];
        for (int body = 0; body < whole.BodyCount; body++)
        {
            if (whole.FragmentIndexOf(whole.BodyFocus[body]) != fragment)
            {
                continue;
            }

            for (int slot = 0; slot < LargestBody; slot++)
            {
                carriers[slot] = Placed(whole.BodyCarriers[(LargestBody * body) + slot], place);
            }

            AddBody(whole.bodyKinds[body], place[whole.BodyFocus[body]], carriers);
        }
    }

    private int[][] RotationsOf(int body) => bodyKinds[body] switch
    {
        StereoKind.SquarePlanar => SquareRotations,
        StereoKind.TrigonalBipyramidal => BipyramidRotations,
        _ => OctahedronRotations,
    };

    private static int[][] Rotations(int[] first, int[] second)
    {
        int[] identity = new int[first.Length];
        for (int i = 0; i < identity.Length; i++)
        {
            identity[i] = i;
        }

        return [identity, .. PermutationGroup.Elements([first, second], 64)];
    }
}
