using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>What the product lists ask about stereo units.</summary>
internal static class StereoUnits
{
    /// <summary>The stated elements that mean something.</summary>
    internal static StereoElement[] Meaningful(Molecule molecule) =>
        molecule.StereoElements.Count == 0 ? [] : StereoPerception.WithoutPhantoms(molecule).StereoSpan.ToArray();

    /// <summary>Whether a CH carbon is a stereocentre, stated or not.</summary>
    /// <param name="symmetry">Symmetry of the molecule.</param>
    /// <param name="atom">0-based index of the carbon.</param>
    /// <param name="units">Stereo units of the molecule, found when they are first needed.</param>
    internal static bool IsStereocentre(SymmetryAnalysis symmetry, int atom, ref IReadOnlyList<StereoUnit>? units)
    {
        Molecule molecule = symmetry.Molecule;
        ReadOnlySpan<Neighbor> neighbors = molecule.NeighborsOf(atom);
        if (neighbors.Length != 3)
        {
            return false;
        }

        // Three ligands of different constitution and a hydrogen make a centre; three bonds to leaves decide as quickly.
        bool unlike = true;
        for (int i = 0; i < 3; i++)
        {
            for (int j = i + 1; j < 3; j++)
            {
                bool like = symmetry.OrbitOf(neighbors[i].Atom, EquivalenceLevel.Constitutional)
                    == symmetry.OrbitOf(neighbors[j].Atom, EquivalenceLevel.Constitutional);
                unlike &= !like;
                if (like && molecule.DegreeOf(neighbors[i].Atom) == 1)
                {
                    return false;
                }
            }
        }

        if (unlike)
        {
            return true;
        }

        if (HasFaces(symmetry, atom) is { } decided)
        {
            return decided;
        }

        units ??= StereoPerception.FindUnits(molecule);
        foreach (StereoUnit unit in units)
        {
            if (unit.Focus == atom && unit.Kind == StereoKind.Tetrahedral)
            {
                return true;
            }
        }

        return false;
    }

    // A ring carbon with two like ring neighbours is a centre when the faces of its ring differ, which an atom with two
    // unlike ligands outside the ring sees to (4-methylcyclohexanol). Null where a further ring makes it less simple.
    private static bool? HasFaces(SymmetryAnalysis symmetry, int atom)
    {
        Molecule molecule = symmetry.Molecule;
        int first = -1;
        int second = -1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].IsInRing)
            {
                (first, second) = (second, neighbor.Atom);
            }
        }

        if (first < 0 || !AreLike(symmetry, first, second))
        {
            return null;
        }

        bool faces = false;
        int before = atom;
        int at = first;
        while (at != atom)
        {
            int next = -1;
            int outside = -1;
            bool unlike = molecule.AtomSpan[at].HydrogenCount == 1;
            foreach (Neighbor neighbor in molecule.NeighborsOf(at))
            {
                Bond bond = molecule.BondSpan[neighbor.Bond];
                if (bond.IsInRing)
                {
                    if (neighbor.Atom != before && next >= 0)
                    {
                        return null;
                    }

                    next = neighbor.Atom == before ? next : neighbor.Atom;
                }
                else if (bond.Order != BondOrder.Single)
                {
                    return null;
                }
                else
                {
                    unlike |= outside >= 0 && !AreLike(symmetry, outside, neighbor.Atom);
                    outside = neighbor.Atom;
                }
            }

            faces |= outside >= 0 && unlike;
            (before, at) = (at, next);
        }

        return faces;
    }

    private static bool AreLike(SymmetryAnalysis symmetry, int first, int second) =>
        symmetry.OrbitOf(first, EquivalenceLevel.Constitutional) == symmetry.OrbitOf(second, EquivalenceLevel.Constitutional);

    /// <summary>Whether a centre or axis is stated.</summary>
    internal static bool HasStatedCentre(Molecule molecule)
    {
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind != StereoKind.CisTrans)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>Canonical SMILES of the stereoisomers that the open units allow, ascending.</summary>
    /// <param name="molecule">A product.</param>
    /// <param name="withMirrorImages">Whether the mirror images of all of them are formed too.</param>
    /// <param name="limit">Most isomers to list.</param>
    /// <param name="diagnostics">Receives a remark when the limit cuts the list.</param>
    internal static string[] Expand(Molecule molecule, bool withMirrorImages, int limit, List<Diagnostic>? diagnostics)
    {
        StereoisomerSet set = StereoisomerEnumeration.Enumerate(molecule, onlyUnspecified: true, limit);
        diagnostics?.AddRange(set.Diagnostics);
        var texts = new SortedSet<string>(StringComparer.Ordinal);
        foreach (Stereoisomer isomer in set.Stereoisomers)
        {
            texts.Add(ProductIdentity.SmilesOf(isomer.Molecule));
            if (withMirrorImages)
            {
                texts.Add(ProductIdentity.SmilesOf(MirrorImage(isomer.Molecule)));
            }
        }

        return [.. texts];
    }

    private static Molecule MirrorImage(Molecule molecule)
    {
        StereoElement[] turned = molecule.StereoSpan.ToArray();
        for (int i = 0; i < turned.Length; i++)
        {
            if (turned[i].Kind is StereoKind.Tetrahedral or StereoKind.Allene)
            {
                turned[i] = new StereoElement(
                    turned[i].Kind, turned[i].Focus, turned[i].FocusEnd, turned[i].CarrierSpan.ToArray(),
                    3 - turned[i].Configuration);
            }
        }

        return molecule.WithStereo(turned);
    }
}
