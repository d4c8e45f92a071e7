using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Thermochemistry;

/// <summary>Finds the rows of a table that describe the very bond asked for.</summary>
/// <remarks>
/// A cheap invariant (atoms, bonds, hydrogens, elements) decides whether any row can match; only then a canonical form is
/// made. Molecules larger than every row's are dismissed by one comparison.
/// </remarks>
internal sealed class BdeMatcher
{
    private static readonly CanonicalRankingOptions WithoutLabels = new() { IncludeAtomClasses = false, IncludeStereo = false };

    private readonly FrozenDictionary<long, Candidate[]> candidates;
    private readonly int largest;

    internal BdeMatcher(IReadOnlyList<BdeEntry> entries)
    {
        candidates = entries.Select(static entry => new Candidate(entry, CanonicalForm.Of(entry.Molecule), entry.Carbon))
            .GroupBy(static candidate => InvariantOf(candidate.Entry.Molecule))
            .ToFrozenDictionary(static group => group.Key, static group => group.ToArray());
        largest = entries.Count == 0 ? 0 : entries.Max(static entry => entry.Molecule.AtomCount);
    }

    /// <summary>Candidates of a molecule with its canonical form; null when no row can match.</summary>
    internal BdeMatch? Match(Molecule molecule)
    {
        if (molecule.AtomCount > largest || !candidates.TryGetValue(InvariantOf(molecule), out Candidate[]? list))
        {
            return null;
        }

        CanonicalForm form = CanonicalForm.Of(molecule);
        Candidate[] same = Array.FindAll(list, candidate => candidate.Form.Text == form.Text);
        return same.Length == 0 ? null : new BdeMatch(form, same);
    }

    internal IReadOnlyList<BdeEntry> Find(SiteAnalysis analysis, Site site) =>
        analysis.Symmetry is null ? [] : Match(analysis.Molecule)?.Entries(analysis.Symmetry, site) ?? [];

    private static long InvariantOf(Molecule molecule)
    {
        long elements = 0;
        int hydrogens = 0;
        foreach (Atom atom in molecule.AtomSpan)
        {
            elements += (atom.AtomicNumber * 7919L) + (atom.FormalCharge * 104729L) + (atom.MassNumber * 1299709L);
            hydrogens += atom.HydrogenCount;
        }

        return (elements * 1000003L) + (molecule.BondCount * 257L) + (hydrogens * 65537L);
    }

    internal sealed record Candidate(BdeEntry Entry, CanonicalForm Form, int Carbon);

    /// <summary>Canonical text without stereo and labels, and the rank of each atom in it.</summary>
    internal sealed record CanonicalForm(string Text, int[] Ranks)
    {
        internal static CanonicalForm Of(Molecule molecule)
        {
            Molecule plain = PlainGraph.Of(molecule);
            int[] ranks = [.. CanonicalRanking.Rank(plain, WithoutLabels).Ranks];
            return new CanonicalForm(Formats.Smiles.SmilesWriter.Write(plain, ranks), ranks);
        }
    }
}
