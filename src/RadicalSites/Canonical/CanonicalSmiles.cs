using System;
using System.Buffers;
using RadicalSites.Diagnostics;
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
    /// <remarks>
    /// Marks of stereo that mean nothing are left out. A graph on which the search for the canonical order gives up gets a
    /// text that is right but may depend on the order of its atoms; the other overload says so.
    /// </remarks>
    public static string Write(Molecule molecule) => Write(molecule, CanonicalRankingOptions.Default, out _);

    /// <summary>Writes the canonical SMILES by the given options.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="options">What counts, and how long the search may take.</param>
    /// <param name="limitReached">The coded remark when the search gave up, otherwise <see langword="null"/>.</param>
    /// <returns>The text; empty for an empty molecule.</returns>
    public static string Write(Molecule molecule, CanonicalRankingOptions options, out Diagnostic? limitReached)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        ArgumentNullException.ThrowIfNull(options);
        int[] ranks = ArrayPool<int>.Shared.Rent(Math.Max(1, molecule.AtomCount));
        Span<int> used = ranks.AsSpan(0, molecule.AtomCount);
        bool complete = CanonicalRanking.Fill(molecule, options, used, out Molecule real);
        limitReached = complete ? null : CanonicalRanking.LimitReached(options);
        real = options.IncludeStereo || real.StereoSpan.IsEmpty ? real : real.WithStereo([]);
        real = options.IncludeAtomClasses ? real : real.WithoutAtomClasses();
        string text = SmilesWriter.Write(real, used);
        ArrayPool<int>.Shared.Return(ranks);
        return text;
    }
}
