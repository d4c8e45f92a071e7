using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>A canonical order of the atoms of a molecule: the same for every numbering of the same molecule.</summary>
/// <remarks>
/// Two atoms that no symmetry of the labelled graph relates always stand in the same order; atoms that one relates may
/// exchange, which changes nothing that is written in this order. Element, isotope, charge, hydrogen count, unpaired
/// electrons, bonds (aromatic ones without regard to the Kekule form), real stereo elements and atom classes take part. Fragments are ordered one by one, then among each other. Immutable and safe for use by many threads.
/// </remarks>
public sealed class CanonicalRanking
{
    private readonly int[] ranks;

    private CanonicalRanking(int[] ranks, IReadOnlyList<Diagnostic> diagnostics)
    {
        this.ranks = ranks;
        Diagnostics = diagnostics;
    }

    /// <summary>0-based rank by atom index, each value once.</summary>
    public IReadOnlyList<int> Ranks => ranks;

    /// <summary>Whether the order is proven canonical; otherwise <see cref="Diagnostics"/> says why.</summary>
    public bool IsComplete => Diagnostics.Count == 0;

    /// <summary>Empty, or <c>limit-reached</c> when the search used up its limit.</summary>
    public IReadOnlyList<Diagnostic> Diagnostics { get; }

    internal ReadOnlySpan<int> RankSpan => ranks;

    /// <summary>Ranks the atoms of a molecule.</summary>
    /// <param name="molecule">Any molecule; may be empty or have several fragments.</param>
    /// <param name="options">Options, or <see langword="null"/> for the defaults.</param>
    /// <returns>The order with its ranks.</returns>
    public static CanonicalRanking Rank(Molecule molecule, CanonicalRankingOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        options ??= CanonicalRankingOptions.Default;
        int[] ranks = new int[molecule.AtomCount];
        bool complete = Fill(molecule, options, ranks);
        return new CanonicalRanking(
            ranks,
            complete
                ? []
                : [LimitReached(options)]);
    }

    internal static Diagnostic LimitReached(CanonicalRankingOptions options) =>
        Diagnostic.Create(ProblemCatalogue.General.LimitReached, [], options.SearchLimit, "refinement steps");

    /// <summary>Writes the ranks to a span; returns whether the order is proven canonical.</summary>
    internal static bool Fill(Molecule molecule, CanonicalRankingOptions options, Span<int> ranks) =>
        Fill(molecule, options, ranks, out _);

    /// <summary>As above; also gives the molecule without the stereo elements that mean nothing.</summary>
    internal static bool Fill(Molecule molecule, CanonicalRankingOptions options, Span<int> ranks, out Molecule real)
    {
        SymmetryWorkspace workspace = SymmetryWorkspace.Own;
        SymmetryGraph graph = workspace.Graph;
        real = Load(workspace, molecule, options);
        if (graph.FragmentCount > 1)
        {
            return FillFragments(workspace, options, ranks);
        }

        workspace.Canonical.Run(graph, options.SearchLimit);
        for (int i = 0; i < ranks.Length; i++)
        {
            ranks[i] = workspace.Canonical.RankOf(i);
        }

        bool complete = !workspace.Canonical.IsExhausted;
        SymmetryWorkspace.Release(ranks.Length);
        return complete;
    }

    /// <summary>The molecule written down in canonical order, or its mirror image.</summary>
    internal static LabelledGraph FormOf(Molecule molecule, bool mirrored)
    {
        SymmetryWorkspace workspace = SymmetryWorkspace.Own;
        SymmetryGraph graph = workspace.Graph;
        Load(workspace, molecule, CanonicalRankingOptions.Default);
        if (mirrored)
        {
            graph.Mirror(ref workspace.MirroredConfiguration);
            Array.Copy(workspace.MirroredConfiguration, graph.Configuration, graph.ElementCount);
        }

        LabelledGraph[] forms = new LabelledGraph[graph.FragmentCount];
        int[] places = workspace.PlacesFor(graph.AtomCount);
        for (int f = 0; f < forms.Length; f++)
        {
            workspace.FragmentGraph.LoadFragment(graph, f, places);
            workspace.Canonical.Run(workspace.FragmentGraph, CanonicalRankingOptions.Default.SearchLimit);
            forms[f] = workspace.Canonical.LabelledForm(workspace.FragmentGraph);
        }

        Array.Sort(forms, static (a, b) => a.CompareTo(b));
        LabelledGraph whole = new();
        foreach (LabelledGraph form in forms)
        {
            whole.Append(form);
        }

        return whole;
    }

    private static Molecule Load(SymmetryWorkspace workspace, Molecule molecule, CanonicalRankingOptions options)
    {
        SymmetryGraph graph = workspace.Graph;
        if (options.IncludeStereo && molecule.StereoSpan.Length > 0)
        {
            workspace.Isomorphism.Begin(options.SearchLimit);
            Molecule real = StereoPerception.Prepare(workspace, molecule, options.IncludeAtomClasses);
            graph.AddBodies(real);
            graph.MarkElements();
            return real;
        }

        graph.Load(molecule, options.IncludeAtomClasses);
        graph.FindFragments();
        return molecule;
    }

    private static bool FillFragments(SymmetryWorkspace workspace, CanonicalRankingOptions options, Span<int> ranks)
    {
        SymmetryGraph graph = workspace.Graph;
        int count = graph.FragmentCount;
        int[] places = workspace.PlacesFor(graph.AtomCount);
        LabelledGraph[] forms = new LabelledGraph[count];
        int[] order = new int[count];
        bool complete = true;
        for (int f = 0; f < count; f++)
        {
            workspace.FragmentGraph.LoadFragment(graph, f, places);
            workspace.Canonical.Run(workspace.FragmentGraph, options.SearchLimit);
            complete &= !workspace.Canonical.IsExhausted;
            forms[f] = workspace.Canonical.LabelledForm(workspace.FragmentGraph);
            order[f] = f;
            foreach (int atom in graph.Fragment(f))
            {
                ranks[atom] = workspace.Canonical.RankOf(places[atom]);
            }
        }

        Array.Sort(forms, order, Comparer<LabelledGraph>.Create(static (a, b) => a.CompareTo(b)));
        int before = 0;
        foreach (int f in order)
        {
            ReadOnlySpan<int> atoms = graph.Fragment(f);
            foreach (int atom in atoms)
            {
                ranks[atom] += before;
            }

            before += atoms.Length;
        }

        SymmetryWorkspace.Release(ranks.Length);
        return complete;
    }
}
