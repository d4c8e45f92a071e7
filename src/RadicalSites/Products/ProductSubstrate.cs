using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>A substrate ready to be substituted: its meaningful stereo elements and what its products have in common.</summary>
internal sealed class ProductSubstrate
{
    private readonly SiteAnalysis analysis;
    private readonly Molecule molecule;
    private readonly StereoElement[] stereo;
    private int[]? plainMap;
    private IReadOnlyList<StereoUnit>? units;

    private ProductSubstrate(SiteAnalysis analysis, StereoElement[] stereo)
    {
        this.analysis = analysis;
        molecule = analysis.Molecule;
        this.stereo = stereo;
    }

    internal static ProductSubstrate Prepare(SiteAnalysis analysis, ProductOptions options) =>
        new(analysis, options.Stereo == ProductStereoMode.None ? [] : StereoUnits.Meaningful(analysis.Molecule));

    /// <summary>The product of substitution at a site, in the one of two mirror images whose SMILES sorts first.</summary>
    /// <param name="site">The site.</param>
    /// <param name="halogen">Atomic number of the halogen.</param>
    /// <param name="smiles">Canonical SMILES.</param>
    /// <param name="hasMirrorImage">Whether the site has enantiotopic carbons, so that the mirror image forms as well.</param>
    internal Molecule ReplaceAt(Site site, int halogen, out string smiles, out bool hasMirrorImage)
    {
        Molecule product = ReplaceAt(site, site.Carbons[0], halogen);
        smiles = ProductIdentity.SmilesOf(ref product);
        hasMirrorImage = false;
        if (stereo.Length == 0 || site.Carbons.Count == 1 || analysis.Symmetry is not { } symmetry)
        {
            return product;
        }

        // Enantiotopic carbons give mirror images; which one stands for the racemate must not depend on the numbering.
        int orbit = symmetry.OrbitOf(site.Carbons[0], EquivalenceLevel.Homotopic);
        foreach (int carbon in site.Carbons)
        {
            if (symmetry.OrbitOf(carbon, EquivalenceLevel.Homotopic) == orbit)
            {
                continue;
            }

            hasMirrorImage = true;
            Molecule other = ReplaceAt(site, carbon, halogen);
            string otherSmiles = ProductIdentity.SmilesOf(ref other);
            if (string.CompareOrdinal(otherSmiles, smiles) < 0)
            {
                (product, smiles) = (other, otherSmiles);
            }

            break;
        }

        return product;
    }

    /// <summary>The product of a delocalised radical at the far end of a path.</summary>
    internal Molecule Transpose(int[] path, int halogen, out string smiles)
    {
        Molecule product = Transposition.Build(molecule, path, halogen, stereo);
        smiles = ProductIdentity.SmilesOf(ref product);
        return product;
    }

    /// <summary>Stereo outcome of direct substitution, by the replacement principle.</summary>
    internal StereoOutcome Outcome(Site site, int halogen, Molecule product)
    {
        int carbon = site.Carbons[0];
        if (site.HydrogensPerCarbon == 1 && site.HeavyHydrogensPerCarbon == 0 && !RingStrain.HoldsShape(site)
            && analysis.Symmetry is { } symmetry && StereoUnits.IsStereocentre(symmetry, carbon, ref units))
        {
            return site.Topicity == Topicity.Enantiotopic ? StereoOutcome.Racemic
                : CarriesHalogen(carbon, halogen) ? StereoOutcome.Lost : StereoOutcome.Epimerised;
        }

        switch (site.Topicity)
        {
            case Topicity.Diastereotopic:
                return StereoOutcome.Diastereomers;
            case Topicity.Enantiotopic:
                return StereoOutcome.Racemic;
        }

        if (stereo.Length == 0)
        {
            return StereoOutcome.None;
        }

        // Only a halogen of the same kind elsewhere can make two ligands of a centre alike.
        return ContainsHalogen(halogen) && product.StereoElements.Count < stereo.Length
            ? StereoOutcome.Lost
            : StereoOutcome.Retained;
    }

    /// <summary>Stereo outcome of a transposed product.</summary>
    internal StereoOutcome TransposedOutcome(int[] path, int halogen, Molecule product)
    {
        bool? bond = null;
        bool? centre = null;
        if (analysis.Symmetry is { } symmetry)
        {
            var made = new TranspositionStereo(symmetry, path, halogen);
            bond = made.MakesDoubleBond();
            centre = bond == true ? false : made.MakesCentre();
        }

        if (bond is null || centre is null)
        {
            (bond, centre) = NewUnits(path, product);
        }

        if (bond == true)
        {
            return StereoOutcome.Diastereomers;
        }

        if (centre == true)
        {
            return StereoUnits.HasStatedCentre(product) || HasOpenCentreOff(path)
                ? StereoOutcome.Diastereomers
                : StereoOutcome.Racemic;
        }

        int kept = product.StereoElements.Count;
        return kept < stereo.Length ? StereoOutcome.Lost : kept > 0 ? StereoOutcome.Retained : StereoOutcome.None;
    }

    // Units that the product has and the substrate has not; a double bond on the path is new wherever it stands.
    private (bool Bond, bool Centre) NewUnits(int[] path, Molecule product)
    {
        units ??= StereoPerception.FindUnits(molecule);
        bool bond = false;
        int centres = 0;
        foreach (StereoUnit unit in StereoPerception.FindUnits(product))
        {
            bool onPath = Array.IndexOf(path, unit.Focus) >= 0 && Array.IndexOf(path, unit.FocusEnd) >= 0;
            bool known = false;
            foreach (StereoUnit old in units)
            {
                known |= !onPath && old.Kind == unit.Kind && old.Focus == unit.Focus && old.FocusEnd == unit.FocusEnd;
            }

            if (!known && !unit.IsStated)
            {
                bond |= unit.Kind == StereoKind.CisTrans;
                centres += unit.Kind == StereoKind.CisTrans ? 0 : 1;
            }
        }

        // Two new centres at once stand to each other in two ways.
        return (bond || centres > 1, centres > 0);
    }

    private bool HasOpenCentreOff(int[] path)
    {
        units ??= StereoPerception.FindUnits(molecule);
        foreach (StereoUnit unit in units)
        {
            if (!unit.IsStated && unit.Kind != StereoKind.CisTrans && Array.IndexOf(path, unit.Focus) < 0)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>For each product atom the substrate atom, -1 for the halogen.</summary>
    internal IReadOnlyList<int> AtomMap(Molecule product)
    {
        int atomCount = molecule.AtomCount;
        if (plainMap is null)
        {
            plainMap = new int[atomCount + 1];
            for (int i = 0; i < atomCount; i++)
            {
                plainMap[i] = i;
            }

            plainMap[atomCount] = -1;
        }

        if (product.AtomCount == plainMap.Length)
        {
            return plainMap;
        }

        // The halogen took the place of a hydrogen that was an atom of the graph.
        int[] map = plainMap[..atomCount];
        for (int i = 0; i < atomCount; i++)
        {
            map[i] = product.AtomSpan[i].AtomicNumber == molecule.AtomSpan[i].AtomicNumber ? i : -1;
        }

        return map;
    }

    private Molecule ReplaceAt(Site site, int carbon, int halogen) =>
        molecule.AtomSpan[carbon].HydrogenCount > 0
            ? HydrogenReplacement.Replace(
                molecule, [carbon], halogen, stereo, stereo.Length > 0 && RingStrain.HoldsShape(site) ? [carbon] : [])
            : HydrogenReplacement.ReplaceGraphHydrogen(molecule, carbon, halogen, stereo);

    private bool CarriesHalogen(int carbon, int halogen)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            Atom atom = molecule.AtomSpan[neighbor.Atom];
            if (atom.AtomicNumber == halogen && atom.MassNumber == 0 && atom.AtomClass == 0
                && molecule.DegreeOf(neighbor.Atom) == 1)
            {
                return true;
            }
        }

        return false;
    }

    private bool ContainsHalogen(int halogen)
    {
        foreach (Atom atom in molecule.AtomSpan)
        {
            if (atom.AtomicNumber == halogen)
            {
                return true;
            }
        }

        return false;
    }
}
