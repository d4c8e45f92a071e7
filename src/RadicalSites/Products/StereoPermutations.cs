using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>How permutations of the atoms act on the stated stereo elements of a molecule.</summary>
internal sealed class StereoPermutations
{
    private readonly Molecule molecule;
    private readonly Dictionary<(int Focus, int End), StereoElement> byFocus = [];

    internal StereoPermutations(Molecule molecule)
    {
        this.molecule = molecule;
        foreach (StereoElement element in molecule.StereoSpan)
        {
            byFocus[(element.Focus, element.FocusEnd)] = element;
            byFocus[(element.FocusEnd, element.Focus)] = element;
        }
    }

    /// <summary>Number of stated elements.</summary>
    internal int ElementCount => molecule.StereoElements.Count;

    /// <summary>Whether an automorphism maps every element onto one of the same configuration.</summary>
    internal bool Keeps(int[] image)
    {
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (!byFocus.TryGetValue((image[element.Focus], image[element.FocusEnd]), out StereoElement? there)
                || there.Kind != element.Kind || !IsSame(element, there, image))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>The elements that a map can turn over or move, as indices into the elements of the molecule.</summary>
    internal IEnumerable<int> Touched(int[] image)
    {
        for (int i = 0; i < molecule.StereoElements.Count; i++)
        {
            StereoElement element = molecule.StereoElements[i];
            bool touched = image[element.Focus] != element.Focus || image[element.FocusEnd] != element.FocusEnd;
            foreach (Neighbor neighbor in molecule.NeighborsOf(element.Focus))
            {
                touched |= image[neighbor.Atom] != neighbor.Atom;
            }

            foreach (Neighbor neighbor in molecule.NeighborsOf(element.FocusEnd))
            {
                touched |= image[neighbor.Atom] != neighbor.Atom;
            }

            foreach (int carrier in element.Carriers)
            {
                touched |= carrier >= 0 && image[carrier] != carrier;
            }

            if (touched)
            {
                yield return i;
            }
        }
    }

    private bool IsSame(StereoElement element, StereoElement there, int[] image) => element.Kind switch
    {
        StereoKind.Tetrahedral => element.Configuration == there.Configuration == IsEven(element, there, image),
        StereoKind.Allene => element.Configuration == there.Configuration == KeepsAxis(element, there, image),
        StereoKind.CisTrans => SameSide(element, there, image),
        _ => IsUnmoved(element, image),
    };

    // Parity of the permutation that brings the mapped carriers into the order of the other element.
    private static bool IsEven(StereoElement element, StereoElement there, int[] image)
    {
        ReadOnlySpan<int> from = element.CarrierSpan;
        ReadOnlySpan<int> to = there.CarrierSpan;
        Span<int> places = stackalloc int[from.Length];
        for (int i = 0; i < from.Length; i++)
        {
            places[i] = to.IndexOf(from[i] < 0 ? -1 : image[from[i]]);
        }

        bool even = true;
        for (int i = 0; i < places.Length; i++)
        {
            for (int j = i + 1; j < places.Length; j++)
            {
                even ^= places[i] > places[j];
            }
        }

        return even;
    }

    // The two ends of an allene may change places; what counts is whether an odd number of ends is turned.
    private static bool KeepsAxis(StereoElement element, StereoElement there, int[] image)
    {
        bool even = true;
        for (int end = 0; end < 4; end += 2)
        {
            int place = element.CarrierSpan[end] >= 0 ? end : end + 1;
            int carrier = element.CarrierSpan[place];
            even ^= carrier >= 0 && ((there.CarrierSpan.IndexOf(image[carrier]) ^ place) & 1) != 0;
        }

        return even;
    }

    private static bool SameSide(StereoElement element, StereoElement there, int[] image)
    {
        ReadOnlySpan<int> from = element.CarrierSpan;
        ReadOnlySpan<int> to = there.CarrierSpan;
        bool reversed = image[element.Focus] != there.Focus;
        bool same = element.Configuration == there.Configuration;
        same ^= image[from[0]] != to[reversed ? 1 : 0];
        same ^= image[from[1]] != to[reversed ? 0 : 1];
        return same;
    }

    // Higher geometries are kept only where nothing around them moves; that may list a product twice in other places
    // but never merges two that differ.
    private bool IsUnmoved(StereoElement element, int[] image)
    {
        if (image[element.Focus] != element.Focus)
        {
            return false;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(element.Focus))
        {
            if (image[neighbor.Atom] != neighbor.Atom)
            {
                return false;
            }
        }

        return true;
    }
}
