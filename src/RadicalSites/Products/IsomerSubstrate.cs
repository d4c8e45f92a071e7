using System;
using System.Collections.Generic;
using System.Numerics;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>A substrate prepared for isomer enumeration: its carbons in canonical order, its meaningful stereo.</summary>
internal sealed class IsomerSubstrate
{
    private readonly int[] rigid;
    private readonly int[]? origins;

    private IsomerSubstrate(Molecule molecule, int[]? origins, int[] carbons, int[] rigid, int hydrogens)
    {
        this.rigid = rigid;
        this.origins = origins;
        Molecule = molecule;
        Carbons = carbons;
        HydrogenCount = hydrogens;
    }

    /// <summary>The substrate with meaningful stereo only, or with none when stereo is not wanted.</summary>
    internal Molecule Molecule { get; }

    /// <summary>Substitutable carbons in canonical order.</summary>
    internal int[] Carbons { get; }

    /// <summary>Hydrogens that can be replaced.</summary>
    internal int HydrogenCount { get; }

    internal static IsomerSubstrate Prepare(Molecule molecule, bool withStereo)
    {
        Molecule folded = LabelledHydrogens.Fold(molecule, out int[]? origins);
        Molecule prepared = withStereo ? StereoPerception.WithoutPhantoms(folded) : folded.WithStereo([]);
        CanonicalRanking ranking = CanonicalRanking.Rank(prepared);
        var carbons = new List<int>();
        int hydrogens = 0;
        for (int atom = 0; atom < prepared.AtomCount; atom++)
        {
            if (prepared.AtomSpan[atom].HydrogenCount > 0 && SiteFinder.IsSiteCarbon(prepared, atom))
            {
                carbons.Add(atom);
                hydrogens += prepared.AtomSpan[atom].HydrogenCount;
            }
        }

        carbons.Sort((left, right) => ranking.Ranks[left].CompareTo(ranking.Ranks[right]));
        int[] rigid = [];
        if (prepared.StereoElements.Count > 0)
        {
            RingAnalysis rings = RingAnalysis.Perceive(prepared);
            rigid = [.. carbons.FindAll(atom => prepared.AtomSpan[atom].IsInRing && RingStrain.HoldsShape(rings, atom))];
        }

        return new IsomerSubstrate(prepared, origins, [.. carbons], rigid, hydrogens);
    }

    /// <summary>Builds the product of one pattern.</summary>
    /// <param name="options">Halogen and stereo mode.</param>
    /// <param name="pattern">Number of halogens by carbon rank.</param>
    /// <param name="number">1-based number of the product.</param>
    /// <param name="degeneracy">Number of sets of hydrogens that lead to it.</param>
    /// <param name="lost">Whether a stated stereo element of the substrate is gone.</param>
    internal IsomerProduct Make(
        IsomerOptions options, ReadOnlySpan<byte> pattern, long number, BigInteger degeneracy, out bool lost)
    {
        var carbons = new List<int>();
        for (int rank = 0; rank < pattern.Length; rank++)
        {
            for (int i = 0; i < pattern[rank]; i++)
            {
                carbons.Add(Carbons[rank]);
            }
        }

        carbons.Sort();
        int[] positions = [.. carbons];
        Molecule product = HydrogenReplacement.Replace(Molecule, positions, options.Halogen, Molecule.StereoSpan, rigid);
        int[] map = new int[product.AtomCount];
        for (int i = 0; i < map.Length; i++)
        {
            map[i] = i >= Molecule.AtomCount ? -1 : origins is null ? i : origins[i];
        }

        string smiles = ProductIdentity.SmilesOf(ref product);
        lost = product.StereoElements.Count < Molecule.StereoElements.Count;
        return new IsomerProduct
        {
            Number = number,
            CanonicalSmiles = smiles,
            Molecule = product,
            SubstrateAtoms = map,
            HalogenCarbons = origins is null ? positions : Array.ConvertAll(positions, carbon => origins[carbon]),
            Degeneracy = degeneracy,
            Stereoisomers = options.Stereo == ProductStereoMode.Expand
                ? StereoUnits.Expand(product, withMirrorImages: false, options.StereoisomerLimit, null)
                : null,
        };
    }
}
