using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>Compares two statements about one centre, allene or double bond whose carriers stand in different order.</summary>
internal static class StereoComparison
{
    internal static bool IsSame(Molecule molecule, StereoElement left, StereoElement right) => left.Kind switch
    {
        StereoKind.CisTrans => IsSameSide(molecule, left, right),
        StereoKind.Allene => IsSameAllene(left, right),
        _ => (left.Configuration == right.Configuration) != IsOdd(left.CarrierSpan, right.CarrierSpan),
    };

    // Another carrier of an end lies on the other side.
    private static bool IsSameSide(Molecule molecule, StereoElement left, StereoElement right)
    {
        bool turned = left.Focus != right.Focus;
        int first = right.CarrierSpan[turned ? 1 : 0];
        int second = right.CarrierSpan[turned ? 0 : 1];
        bool flip = left.CarrierSpan[0] != first && molecule.AtomCount > 0;
        flip ^= left.CarrierSpan[1] != second;
        return (left.Configuration == right.Configuration) != flip;
    }

    private static bool IsSameAllene(StereoElement left, StereoElement right)
    {
        ReadOnlySpan<int> from = left.CarrierSpan;
        ReadOnlySpan<int> to = right.CarrierSpan;

        // Exchanging the ends is an even permutation, so only the order within each end counts.
        bool ends = to[..2].Contains(from[0] >= 0 ? from[0] : from[1]);
        ReadOnlySpan<int> near = ends ? to[..2] : to[2..];
        ReadOnlySpan<int> far = ends ? to[2..] : to[..2];
        bool flip = near[0] != from[0];
        flip ^= far[0] != from[2];
        return (left.Configuration == right.Configuration) != flip;
    }

    private static bool IsOdd(ReadOnlySpan<int> from, ReadOnlySpan<int> to)
    {
        Span<int> places = stackalloc int[4];
        for (int i = 0; i < 4; i++)
        {
            places[i] = from.IndexOf(to[i]);
        }

        bool odd = false;
        for (int i = 0; i < 4; i++)
        {
            for (int j = i + 1; j < 4; j++)
            {
                odd ^= places[j] < places[i];
            }
        }

        return odd;
    }
}
