using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>Which atoms and hydrogens of a molecule are equivalent, at three levels, as exact orbits.</summary>
/// <remarks>
/// Hydrogens that are no atoms of the graph follow from the atom that carries them. Atom classes play no part.
/// Mirror images are taken fragment by fragment, so that a counter-ion does not change what an ion is.
/// A centre or double bond that could have a configuration but states none is read in the most symmetric way between
/// equivalent places, yet it keeps its own geometry: the CH2 of butan-2-ol is diastereotopic with or without a mark.
/// Where like ligands of several places are told apart only by geometry (the methyls of two isopropyl groups in a chiral
/// molecule), a graph does not say which of one place goes with which of the other; number and size of the classes are
/// fixed, and the atoms of lower index go together as far as the input order decides.
/// Immutable and safe for use by many threads.
/// </remarks>
public sealed partial class SymmetryAnalysis
{
    private readonly int[] constitutional;
    private readonly int[] enantiotopic;
    private readonly int[] homotopic;
    private readonly Topicity[] hydrogens;

    private SymmetryAnalysis(
        Molecule molecule, int[] constitutional, int[] enantiotopic, int[] homotopic, Topicity[] hydrogens,
        IReadOnlyList<Diagnostic> diagnostics)
    {
        Molecule = molecule;
        this.constitutional = constitutional;
        this.enantiotopic = enantiotopic;
        this.homotopic = homotopic;
        this.hydrogens = hydrogens;
        Diagnostics = diagnostics;
    }

    /// <summary>The molecule analysed.</summary>
    public Molecule Molecule { get; }

    /// <summary>Empty, or <c>limit-reached</c> when a search was given up and orbits may be too fine.</summary>
    public IReadOnlyList<Diagnostic> Diagnostics { get; }

    /// <summary>The orbit of an atom, named by its lowest member.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <param name="level">How strictly atoms count as equivalent.</param>
    /// <returns>0-based index of the lowest atom that is equivalent to this one; equal for equivalent atoms.</returns>
    public int OrbitOf(int atom, EquivalenceLevel level) => Orbits(level)[atom];

    /// <summary>All atoms equivalent to an atom.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <param name="level">How strictly atoms count as equivalent.</param>
    /// <returns>0-based atom indices in ascending order, the atom itself included.</returns>
    public IReadOnlyList<int> MembersOf(int atom, EquivalenceLevel level)
    {
        int[] orbits = Orbits(level);
        int orbit = orbits[atom];
        List<int> members = [];
        for (int i = 0; i < orbits.Length; i++)
        {
            if (orbits[i] == orbit)
            {
                members.Add(i);
            }
        }

        return members;
    }

    /// <summary>Number of orbits.</summary>
    /// <param name="level">How strictly atoms count as equivalent.</param>
    /// <returns>Number of classes of equivalent atoms.</returns>
    public int OrbitCount(EquivalenceLevel level)
    {
        int[] orbits = Orbits(level);
        int count = 0;
        for (int i = 0; i < orbits.Length; i++)
        {
            count += orbits[i] == i ? 1 : 0;
        }

        return count;
    }

    /// <summary>How two atoms (and what they carry) relate by the replacement principle.</summary>
    /// <param name="first">0-based atom index.</param>
    /// <param name="second">0-based atom index.</param>
    /// <returns>The strongest equivalence that holds; homotopic for an atom and itself.</returns>
    public Topicity Between(int first, int second) =>
        homotopic[first] == homotopic[second] ? Topicity.Homotopic
        : enantiotopic[first] == enantiotopic[second] ? Topicity.Enantiotopic
        : constitutional[first] == constitutional[second] ? Topicity.Diastereotopic
        : Topicity.Constitutional;

    /// <summary>How the hydrogens on one atom relate to each other.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>
    /// Homotopic (also for a single hydrogen, none, or a freely turning methyl group), enantiotopic or diastereotopic.
    /// </returns>
    public Topicity HydrogenTopicity(int atom) => hydrogens[atom];

    internal ReadOnlySpan<int> OrbitSpan(EquivalenceLevel level) => Orbits(level);

    private int[] Orbits(EquivalenceLevel level) => level switch
    {
        EquivalenceLevel.Constitutional => constitutional,
        EquivalenceLevel.Enantiotopic => enantiotopic,
        EquivalenceLevel.Homotopic => homotopic,
        _ => throw new ArgumentOutOfRangeException(nameof(level), level, "There are three levels."),
    };
}
