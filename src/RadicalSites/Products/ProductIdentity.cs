using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>The text that makes two products one.</summary>
internal static class ProductIdentity
{
    internal static string SmilesOf(Molecule molecule)
    {
        Molecule real = StereoPerception.WithoutPhantoms(molecule);
        return SmilesWriter.Write(real, CanonicalRanking.Rank(real).RankSpan);
    }
}
