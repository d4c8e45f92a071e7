using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>Hydrogens that a connection table leaves out: up to the next normal valence of the main-group elements.</summary>
/// <remarks>A bare sodium atom is read as NaH for that reason; a valence field of 15 states the free atom.</remarks>
internal static class ImpliedHydrogens
{
    /// <summary>Implied hydrogens of an atom with localised bonds.</summary>
    /// <param name="element">Atomic number.</param>
    /// <param name="charge">Formal charge.</param>
    /// <param name="bonds">Sum of its bond orders.</param>
    /// <param name="unpaired">Unpaired electrons that the radical field states.</param>
    internal static int Of(int element, int charge, int bonds, int unpaired)
    {
        if (element == 1)
        {
            return 0;
        }

        foreach (byte valence in NormalValences(element, charge))
        {
            if (valence >= bonds + unpaired)
            {
                return valence - bonds - unpaired;
            }
        }

        return 0;
    }

    /// <summary>Implied hydrogens of an atom with aromatic bonds, each counted once in <paramref name="bonds"/>.</summary>
    internal static int OfAromatic(int element, int charge, int bonds)
    {
        ReadOnlySpan<byte> valences = Valences.Of(element, charge);
        return valences.IsEmpty ? 0 : Math.Max(0, valences[0] - bonds - 1);
    }

    // Heavy main-group metals have a normal valence in connection tables, though no other reader implies hydrogens there.
    private static ReadOnlySpan<byte> NormalValences(int element, int charge) => (element, charge) switch
    {
        (37 or 55 or 87 or 81, 0) => [1],
        (20 or 38 or 56 or 88, 0) => [2],
        (83, 0) => [3, 5],
        _ => Valences.Of(element, charge),
    };
}
