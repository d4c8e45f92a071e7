using RadicalSites.Canonical;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>The text that makes two products one.</summary>
internal static class ProductIdentity
{
    /// <summary>Canonical SMILES without stereo marks that mean nothing.</summary>
    internal static string SmilesOf(Molecule molecule) => CanonicalSmiles.Write(
        molecule.StereoElements.Count == 0 ? molecule : StereoPerception.WithoutPhantoms(molecule));

    /// <summary>As <see cref="SmilesOf(Molecule)"/>; the molecule itself loses the marks too.</summary>
    internal static string SmilesOf(ref Molecule molecule)
    {
        if (molecule.StereoElements.Count > 0)
        {
            molecule = StereoPerception.WithoutPhantoms(molecule);
        }

        return CanonicalSmiles.Write(molecule);
    }
}
