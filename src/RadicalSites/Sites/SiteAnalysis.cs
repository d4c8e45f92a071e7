using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Sites;

/// <summary>All C(sp3)-H sites of one molecule.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed class SiteAnalysis
{
    private readonly int[] siteOfAtom;

    internal SiteAnalysis(
        Molecule molecule, IReadOnlyList<Site> sites, int[] siteOfAtom, SymmetryAnalysis? symmetry)
    {
        Molecule = molecule;
        Sites = sites;
        this.siteOfAtom = siteOfAtom;
        Symmetry = symmetry;
    }

    /// <summary>The molecule analysed.</summary>
    public Molecule Molecule { get; }

    /// <summary>The sites in order of their lowest carbon index; empty when there is no C(sp3)-H bond.</summary>
    public IReadOnlyList<Site> Sites { get; }

    /// <summary>The symmetry on which the sites rest; <see langword="null"/> when there is no site.</summary>
    public SymmetryAnalysis? Symmetry { get; }

    /// <summary>The site that a carbon belongs to.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>The site, or <see langword="null"/> when the atom is no C(sp3)-H carbon.</returns>
    /// <exception cref="ArgumentOutOfRangeException">There is no such atom.</exception>
    public Site? SiteOf(int atom)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(atom);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(atom, siteOfAtom.Length);
        return siteOfAtom[atom] < 0 ? null : Sites[siteOfAtom[atom]];
    }
}
