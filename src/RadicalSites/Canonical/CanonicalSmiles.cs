using System;
using System.Buffers;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Canonical;

/// <summary>Canonical isomeric SMILES: the same text for every atom order and spelling of a molecule.</summary>
/// <remarks>
/// Stateless and safe for use by many threads. The text is canonical for this version of the library; other programs
/// have canonical forms of their own.
/// </remarks>
public static class CanonicalSmiles
{
    /// <summary>Writes the canonical SMILES.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <returns>The text; empty for an empty molecule.</returns>
    public static string Write(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        int[] ranks = ArrayPool<int>.Shared.Rent(Math.Max(1, molecule.AtomCount));
        Span<int> used = ranks.AsSpan(0, molecule.AtomCount);
        CanonicalRanking.Fill(molecule, CanonicalRankingOptions.Default, used, out Molecule real);
        string text = SmilesWriter.Write(real, used);
        ArrayPool<int>.Shared.Return(ranks);
        return text;
    }
}
