using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

internal sealed partial class SymmetryGraph
{
    /// <summary>Kind of a stereo element as the symmetry code sees it.</summary>
    internal const byte Center = 0;

    /// <summary>Axis of an even cumulene: chiral like a centre, but its two ends may exchange.</summary>
    internal const byte Allene = 1;

    /// <summary>Double bond or odd cumulene: not chiral.</summary>
    internal const byte Axis = 2;

    /// <summary>Carrier that stands for an implicit hydrogen or a lone pair.</summary>
    internal const int NoAtom = -1;

    internal int ElementCount;
    internal byte[] Kind = new byte[16];
    internal int[] Focus = new int[16];
    internal int[] FocusEnd = new int[16];

    /// <summary>+1 = clockwise or same side, -1 = anticlockwise or opposite sides, in the order of the carriers.</summary>
    internal sbyte[] Configuration = new sbyte[16];

    /// <summary>Four to an element. An axis has (carrier, other ligand) of one end, then of the other.</summary>
    internal int[] Carriers = new int[64];

    /// <summary>1 + index of the centre or allene element at an atom, 0 = none.</summary>
    internal int[] CenterAt = new int[64];

    /// <summary>1 + index of an axis element that ends at an atom, 0 = none.</summary>
    internal int[] AxisAt = new int[64];

    /// <summary>Takes over the stereo elements that the molecule states.</summary>
    internal void AddStatedElements(Molecule molecule)
    {
        foreach (StereoElement element in molecule.StereoSpan)
        {
            AddStated(element);
        }
    }

    /// <summary>Makes atoms with a stereo element differ in their keys from those without.</summary>
    internal void MarkElements()
    {
        for (int e = 0; e < ElementCount; e++)
        {
            ulong mark = Kind[e] == Axis ? 2UL : 1UL;
            Key[Focus[e]] |= mark;
            Key[FocusEnd[e]] |= mark;
        }

        for (int body = 0; body < BodyCount; body++)
        {
            Key[BodyFocus[body]] |= 3UL;
        }
    }

    /// <summary>Whether refinement and search handle the geometry of an element.</summary>
    internal static bool IsHandled(StereoElement element) =>
        element.Kind <= StereoKind.CisTrans
        && element.CarrierSpan.Length == (element.Kind == StereoKind.CisTrans ? 2 : 4);

    /// <summary>Removes all elements.</summary>
    internal void ClearElements()
    {
        ElementCount = 0;
        Array.Clear(CenterAt, 0, AtomCount);
        Array.Clear(AxisAt, 0, AtomCount);
    }

    /// <summary>Takes out the centres that <see cref="CenterAt"/> no longer names; the order of the others stays.</summary>
    internal void Compact()
    {
        int count = ElementCount;
        ElementCount = 0;
        for (int e = 0; e < count; e++)
        {
            if (Kind[e] == Axis || CenterAt[Focus[e]] == e + 1)
            {
                Add(
                    Kind[e], Focus[e], FocusEnd[e], Carriers[4 * e], Carriers[(4 * e) + 1], Carriers[(4 * e) + 2],
                    Carriers[(4 * e) + 3], Configuration[e]);
            }
        }
    }

    /// <summary>Takes over one stated element; geometries other than tetrahedral, allene and cis-trans are left out.</summary>
    internal void AddStated(StereoElement element)
    {
        ReadOnlySpan<int> carriers = element.CarrierSpan;
        sbyte configuration = element.Configuration == 2 ? (sbyte)1 : (sbyte)-1;
        switch (element.Kind)
        {
            case StereoKind.Tetrahedral when carriers.Length == 4:
                Add(Center, element.Focus, element.Focus, carriers[0], carriers[1], carriers[2], carriers[3], configuration);
                break;
            case StereoKind.Allene when carriers.Length == 4:
                Add(Allene, element.Focus, element.Focus, carriers[0], carriers[1], carriers[2], carriers[3], configuration);
                break;
            case StereoKind.CisTrans when carriers.Length == 2:
                AddAxis(element.Focus, element.FocusEnd, carriers[0], carriers[1], configuration);
                break;
        }
    }

    internal void AddAxis(int begin, int end, int beginCarrier, int endCarrier, sbyte configuration) =>
        Add(
            Axis, begin, end, beginCarrier, OtherLigand(begin, beginCarrier), endCarrier, OtherLigand(end, endCarrier),
            configuration);

    internal void Add(byte kind, int focus, int focusEnd, int c0, int c1, int c2, int c3, sbyte configuration)
    {
        int e = ElementCount++;
        if (e == Kind.Length)
        {
            int size = 2 * e;
            Array.Resize(ref Kind, size);
            Array.Resize(ref Focus, size);
            Array.Resize(ref FocusEnd, size);
            Array.Resize(ref Configuration, size);
            Array.Resize(ref Carriers, 4 * size);
        }

        Kind[e] = kind;
        Focus[e] = focus;
        FocusEnd[e] = focusEnd;
        Configuration[e] = configuration;
        Carriers[4 * e] = c0;
        Carriers[(4 * e) + 1] = c1;
        Carriers[(4 * e) + 2] = c2;
        Carriers[(4 * e) + 3] = c3;
        if (kind == Axis)
        {
            AxisAt[focus] = e + 1;
            AxisAt[focusEnd] = e + 1;
        }
        else
        {
            CenterAt[focus] = e + 1;
        }
    }

    /// <summary>
    /// Configuration seen through the colours: +1 or -1 when the colours tell all carriers apart that matter, otherwise 0.
    /// </summary>
    internal int ResolvedSign(int element, int[] cellOf, sbyte[] configuration)
    {
        int at = 4 * element;
        int a = Color(Carriers[at], cellOf);
        int b = Color(Carriers[at + 1], cellOf);
        int c = Color(Carriers[at + 2], cellOf);
        int d = Color(Carriers[at + 3], cellOf);
        int sign = configuration[element];
        if (a == b || c == d)
        {
            return 0;
        }

        if (a > b)
        {
            sign = -sign;
        }

        if (c > d)
        {
            sign = -sign;
        }

        if (Kind[element] != Center)
        {
            return sign;
        }

        if (a == c || a == d || b == c || b == d)
        {
            return 0;
        }

        // Inversions across the two pairs; those within the pairs are counted above.
        if ((a > c) ^ (a > d) ^ (b > c) ^ (b > d))
        {
            sign = -sign;
        }

        return sign;
    }

    /// <summary>Configurations of the mirror image: chiral elements inverted, axes as they are.</summary>
    internal void Mirror(ref sbyte[] mirrored)
    {
        if (mirrored.Length < ElementCount)
        {
            mirrored = new sbyte[Configuration.Length];
        }

        for (int e = 0; e < ElementCount; e++)
        {
            mirrored[e] = Kind[e] == Axis ? Configuration[e] : (sbyte)-Configuration[e];
        }
    }

    private static int Color(int carrier, int[] cellOf) => carrier < 0 ? -1 : cellOf[carrier];

    internal int OtherLigand(int end, int carrier)
    {
        for (int i = Offset[end]; i < Offset[end + 1]; i++)
        {
            if (Adjacent[i] != carrier && Weight[i] != DoubleWeight)
            {
                return Adjacent[i];
            }
        }

        return NoAtom;
    }
}
