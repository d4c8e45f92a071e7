using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>Lists the distinct stereoisomers of a molecule.</summary>
/// <remarks>
/// Tetrahedral centres, allenes and double bonds take part, those of rings and pseudoasymmetric ones included. No isomer
/// comes twice (meso forms, like ends) and none carries a mark without meaning. Configurations that a small cage rules out,
/// such as an inside bridgehead of norbornane or a trans ring fusion of bicyclo[2.2.0], are left out; larger rings are
/// taken to allow every combination, however strained. Atropisomers are not enumerated. Safe for use by many threads.
/// </remarks>
public static class StereoisomerEnumeration
{
    /// <summary>Isomers listed when no limit is given.</summary>
    public const int DefaultLimit = 1024;

    /// <summary>Combinations of configurations tried for each isomer of the limit.</summary>
    private const int TrialsPerIsomer = 16;

    /// <summary>Enumerates.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="onlyUnspecified">
    /// Whether configurations that the molecule states are kept; otherwise all are varied.
    /// </param>
    /// <param name="limit">Most isomers to list, 1 or more.</param>
    /// <returns>The distinct stereoisomers; the molecule itself when there is nothing to vary.</returns>
    public static StereoisomerSet Enumerate(Molecule molecule, bool onlyUnspecified = true, int limit = DefaultLimit)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        ArgumentOutOfRangeException.ThrowIfLessThan(limit, 1);
        Molecule start = onlyUnspecified ? molecule : WithoutHandled(molecule);
        List<StereoElement[]> choices = StereoPerception.FindChoices(start, out start);
        List<Entry> found = [];
        HashSet<LabelledGraph> seen = [];
        long trials = 0;
        bool complete = true;
        int[] digits = new int[choices.Count];
        do
        {
            if (found.Count >= limit || ++trials > (long)limit * TrialsPerIsomer)
            {
                complete = false;
                break;
            }

            Molecule isomer = StereoPerception.WithoutPhantoms(Assign(start, choices, digits));
            LabelledGraph form = CanonicalRanking.FormOf(isomer, false);
            if (seen.Add(form))
            {
                found.Add(new Entry(isomer, form));
            }
        }
        while (Advance(digits, choices));

        found.Sort(static (a, b) => a.Form.CompareTo(b.Form));
        return new StereoisomerSet(
            Pair(found),
            complete ? [] : [Diagnostic.Create(ProblemCatalogue.General.LimitReached, [], limit, "stereoisomers")]);
    }

    private static Stereoisomer[] Pair(List<Entry> found)
    {
        Dictionary<LabelledGraph, int> places = [];
        for (int i = 0; i < found.Count; i++)
        {
            places.Add(found[i].Form, i);
        }

        Stereoisomer[] result = new Stereoisomer[found.Count];
        for (int i = 0; i < result.Length; i++)
        {
            LabelledGraph mirror = CanonicalRanking.FormOf(found[i].Molecule, true);
            bool chiral = !mirror.Equals(found[i].Form);
            result[i] = new Stereoisomer(
                found[i].Molecule, places.TryGetValue(mirror, out int there) ? there : null, chiral);
        }

        return result;
    }

    private static Molecule WithoutHandled(Molecule molecule)
    {
        List<StereoElement> kept = [];
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (!SymmetryGraph.IsHandled(element))
            {
                kept.Add(element);
            }
        }

        return kept.Count == molecule.StereoSpan.Length ? molecule : molecule.WithStereo([.. kept]);
    }

    /// <summary>One group of places tied together by a cage has two ways: as it stands, or all turned over.</summary>
    internal static Molecule Assign(Molecule start, List<StereoElement[]> choices, int[] digits)
    {
        List<StereoElement> elements = [.. start.StereoSpan];
        for (int i = 0; i < digits.Length; i++)
        {
            foreach (StereoElement element in choices[i])
            {
                elements.Add(digits[i] == 0 ? element : new StereoElement(
                    element.Kind, element.Focus, element.FocusEnd, [.. element.CarrierSpan], 3 - element.Configuration));
            }
        }

        return elements.Count == start.StereoSpan.Length ? start : start.WithStereo([.. elements]);
    }

    /// <summary>The next combination; false after the last.</summary>
    internal static bool Advance(int[] digits, List<StereoElement[]> choices)
    {
        for (int i = 0; i < choices.Count; i++)
        {
            if (digits[i] == 0)
            {
                digits[i] = 1;
                return true;
            }

            digits[i] = 0;
        }

        return false;
    }

    private sealed record Entry(Molecule Molecule, LabelledGraph Form);
}
