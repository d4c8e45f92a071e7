using System;
using System.Buffers;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Smiles;

/// <summary>Writes molecules as SMILES.</summary>
/// <remarks>
/// Aromatic atoms are written in lower case, so the text does not depend on the Kekule form. Reading the text back gives
/// the same molecule, stereo included. Linear in the size of the molecule apart from sorting neighbours; no recursion.
/// Stateless to the outside and safe for use by many threads.
/// </remarks>
public static class SmilesWriter
{
    [ThreadStatic]
    private static SmilesOutput? outputOfThread;

    /// <summary>Writes a molecule with its atoms in input order as far as the graph allows.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <returns>SMILES; an empty text for an empty molecule.</returns>
    public static string Write(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        int[] order = ArrayPool<int>.Shared.Rent(molecule.AtomCount);
        for (int i = 0; i < molecule.AtomCount; i++)
        {
            order[i] = i;
        }

        string text = Write(molecule, order.AsSpan(0, molecule.AtomCount), byInput: true);
        ArrayPool<int>.Shared.Return(order);
        return text;
    }

    /// <summary>Writes a molecule in a given order; with canonical ranks the text is canonical.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="ranks">A different rank for each atom; lower ranks are written first.</param>
    /// <returns>SMILES; an empty text for an empty molecule.</returns>
    /// <exception cref="ArgumentException">There is not one rank for each atom.</exception>
    public static string Write(Molecule molecule, ReadOnlySpan<int> ranks) => Write(molecule, ranks, byInput: false);

    private static string Write(Molecule molecule, ReadOnlySpan<int> ranks, bool byInput)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        if (ranks.Length != molecule.AtomCount)
        {
            throw new ArgumentException("One rank is needed for each atom.", nameof(ranks));
        }

        SmilesOutput output = outputOfThread ??= new SmilesOutput();
        return output.Write(molecule, ranks, byInput);
    }
}
