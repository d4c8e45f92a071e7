using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using RadicalSites.Symmetry;

namespace RadicalSites.Sites;

/// <summary>Finds the C(sp3)-H sites of a molecule: perception of each carbon, equivalence of the hydrogens.</summary>
/// <remarks>
/// A carbon counts when it carries hydrogen, has single bonds only, belongs to no aromatic ring and has a full octet:
/// neutral with four partners, or a carbanion with three. Carbocations, radicals and carbenes are not C(sp3)-H.
/// Stateless and safe for use by many threads.
/// </remarks>
public static class SiteFinder
{
    /// <summary>Finds all sites.</summary>
    /// <param name="molecule">Any molecule, with any number of fragments.</param>
    /// <param name="mergeDiastereotopic">
    /// Whether carbons that differ only by existing stereo (diastereotopic) share a site; off by default.
    /// </param>
    /// <returns>The sites in order of their lowest carbon index; none when there is no C(sp3)-H bond.</returns>
    public static SiteAnalysis Find(Molecule molecule, bool mergeDiastereotopic = false)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        int[] siteOfAtom = new int[molecule.AtomCount];
        siteOfAtom.AsSpan().Fill(-1);
        int firstCarbon = FirstCarbon(molecule);
        if (firstCarbon < 0)
        {
            return new SiteAnalysis(molecule, [], siteOfAtom, symmetry: null);
        }

        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);
        EquivalenceLevel level =
            mergeDiastereotopic ? EquivalenceLevel.Constitutional : EquivalenceLevel.Enantiotopic;
        RingAnalysis rings = RingAnalysis.Perceive(molecule);
        Site[] sites = Collect(molecule, symmetry, level, rings, firstCarbon, siteOfAtom);
        return new SiteAnalysis(molecule, sites, siteOfAtom, symmetry);
    }

    /// <summary>Whether an atom is a carbon that carries at least one C(sp3)-H bond.</summary>
    /// <param name="molecule">A molecule.</param>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>Whether it is such a carbon.</returns>
    public static bool IsSiteCarbon(Molecule molecule, int atom)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        Atom data = molecule.AtomSpan[atom];
        if (data.AtomicNumber != 6 || data.IsAromatic || data.UnpairedElectrons != 0)
        {
            return false;
        }

        int partners = data.HydrogenCount;
        bool hasHydrogen = partners > 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order != BondOrder.Single)
            {
                return false;
            }

            hasHydrogen |= IsProtium(molecule, neighbor.Atom);
            partners++;
        }

        return hasHydrogen && (data.FormalCharge == 0 ? partners == 4 : data.FormalCharge == -1 && partners == 3);
    }

    /// <summary>Number of protium atoms on a carbon, counted ones and those that are atoms of the graph.</summary>
    /// <param name="molecule">A molecule.</param>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>The number of hydrogens that are neither deuterium nor tritium.</returns>
    public static int CountHydrogens(Molecule molecule, int atom)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        int count = molecule.AtomSpan[atom].HydrogenCount;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            count += IsProtium(molecule, neighbor.Atom) ? 1 : 0;
        }

        return count;
    }

    // A hydrogen stays an atom of the graph when it carries an isotope or an atom class; [1H] and [H:3] are protium.
    private static bool IsProtium(Molecule molecule, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        return data.AtomicNumber == 1 && data.MassNumber <= 1 && data.FormalCharge == 0 && molecule.DegreeOf(atom) == 1;
    }

    private static int FirstCarbon(Molecule molecule)
    {
        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            if (IsSiteCarbon(molecule, atom))
            {
                return atom;
            }
        }

        return -1;
    }

    private static Site[] Collect(
        Molecule molecule, SymmetryAnalysis symmetry, EquivalenceLevel level, RingAnalysis rings, int firstCarbon,
        int[] siteOfAtom)
    {
        int atomCount = molecule.AtomCount;
        using var scratch = new ScratchInts(2 * atomCount);
        Span<int> siteOfOrbit = scratch.Span[..atomCount];
        Span<int> sizes = scratch.Span[atomCount..];
        siteOfOrbit.Fill(-1);
        int count = 0;
        for (int atom = firstCarbon; atom < atomCount; atom++)
        {
            if (!IsSiteCarbon(molecule, atom))
            {
                continue;
            }

            int orbit = symmetry.OrbitOf(atom, level);
            if (siteOfOrbit[orbit] < 0)
            {
                sizes[count] = 0;
                siteOfOrbit[orbit] = count++;
            }

            siteOfAtom[atom] = siteOfOrbit[orbit];
            sizes[siteOfAtom[atom]]++;
        }

        var carbons = new int[count][];
        for (int site = 0; site < count; site++)
        {
            carbons[site] = new int[sizes[site]];
            sizes[site] = 0;
        }

        for (int atom = firstCarbon; atom < atomCount; atom++)
        {
            int site = siteOfAtom[atom];
            if (site >= 0)
            {
                carbons[site][sizes[site]++] = atom;
            }
        }

        var sites = new Site[count];
        for (int site = 0; site < count; site++)
        {
            sites[site] = Describe(molecule, symmetry, rings, site + 1, carbons[site]);
        }

        return sites;
    }

    private static Site Describe(
        Molecule molecule, SymmetryAnalysis symmetry, RingAnalysis rings, int number, int[] carbons)
    {
        int carbon = carbons[0];
        Atom data = molecule.AtomSpan[carbon];
        int carbonNeighbors = 0;
        int heavyHydrogens = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            Atom other = molecule.AtomSpan[neighbor.Atom];
            carbonNeighbors += other.AtomicNumber == 6 ? 1 : 0;
            heavyHydrogens += other.AtomicNumber == 1 && other.MassNumber > 1 ? 1 : 0;
        }

        return new Site
        {
            Number = number,
            Carbons = carbons,
            HydrogensPerCarbon = CountHydrogens(molecule, carbon),
            HeavyHydrogensPerCarbon = heavyHydrogens,
            Degree = (SiteDegree)Math.Min(carbonNeighbors, 3),
            Conjugation = ConjugationPerception.Find(molecule, carbon),
            AlphaGroups = AlphaGroupPerception.Find(molecule, carbon),
            RingSize = data.IsInRing ? rings.SmallestRingSize(carbon) : null,
            IsBridgehead = data.IsInRing && rings.IsBridgehead(carbon),
            Topicity = SiteTopicity(symmetry, carbons),
            FormalCharge = data.FormalCharge,
        };
    }

    // The weakest equivalence among the hydrogens of the site: within one carbon, or between its carbons.
    private static Topicity SiteTopicity(SymmetryAnalysis symmetry, int[] carbons)
    {
        Topicity within = symmetry.HydrogenTopicity(carbons[0]);
        if (within == Topicity.Diastereotopic || carbons.Length == 1)
        {
            return within;
        }

        int homotopicOrbit = symmetry.OrbitOf(carbons[0], EquivalenceLevel.Homotopic);
        for (int i = 1; i < carbons.Length; i++)
        {
            if (symmetry.OrbitOf(carbons[i], EquivalenceLevel.Homotopic) != homotopicOrbit)
            {
                return symmetry.OrbitOf(carbons[i], EquivalenceLevel.Enantiotopic)
                    == symmetry.OrbitOf(carbons[0], EquivalenceLevel.Enantiotopic)
                    ? Topicity.Enantiotopic
                    : Topicity.Diastereotopic;
            }
        }

        return within;
    }
}
