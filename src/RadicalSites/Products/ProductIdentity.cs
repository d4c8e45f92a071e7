using System;
using System.Buffers;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>The text that makes two products one.</summary>
internal static class ProductIdentity
{
    /// <summary>Canonical SMILES.</summary>
    internal static string SmilesOf(Molecule molecule) => CanonicalSmiles.Write(molecule);

    /// <summary>Canonical SMILES; the molecule loses the stereo marks that mean nothing, as the text does.</summary>
    internal static string SmilesOf(ref Molecule molecule)
    {
        int[] ranks = ArrayPool<int>.Shared.Rent(molecule.AtomCount);
        Span<int> used = ranks.AsSpan(0, molecule.AtomCount);
        CanonicalRanking.Fill(molecule, CanonicalRankingOptions.Default, used, out molecule);
        string text = SmilesWriter.Write(molecule, used);
        ArrayPool<int>.Shared.Return(ranks);
        return text;
    }
}
