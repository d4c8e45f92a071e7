using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>Tells real stereo elements from phantom ones and finds the places that could have a configuration.</summary>
/// <remarks>
/// A stated configuration is real when turning it over gives another molecule. It is a phantom on an atom whose ligands
/// are alike (<c>C[C@H](C)O</c>), on a nitrogen that inverts freely, on a double bond in a ring of fewer than eight atoms
/// or with two like ligands at one end, on a ring atom whose only partner states nothing, and on the
/// bridgeheads of a small cage that could only be turned over together, to no effect (norbornane).
/// Square planar and higher geometries are kept as stated. Atropisomerism and helicity are not perceived.
/// Safe for use by many threads.
/// </remarks>
public static partial class StereoPerception
{
    /// <summary>The same molecule without phantom stereo elements.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <returns>The molecule itself when all its stereo elements are real, otherwise one that keeps the real ones.</returns>
    public static Molecule WithoutPhantoms(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        if (molecule.StereoSpan.Length == 0)
        {
            return molecule;
        }

        SymmetryWorkspace workspace = SymmetryWorkspace.Own;
        workspace.Isomorphism.Begin(SymmetryAnalysis.SearchLimit);
        return Prepare(workspace, molecule, true);
    }

    /// <summary>
    /// Loads the graph, refines it by constitution and adds the real stated elements; returns the molecule that has those.
    /// </summary>
    internal static Molecule Prepare(SymmetryWorkspace workspace, Molecule molecule, bool withAtomClasses)
    {
        SymmetryGraph graph = workspace.Graph;
        graph.Load(molecule, withAtomClasses);
        graph.FindFragments();
        workspace.Constitution.Start(graph);
        workspace.Constitution.Refine(graph, graph.Configuration);
        ReadOnlySpan<StereoElement> stated = molecule.StereoSpan;
        if (stated.Length == 0)
        {
            return molecule;
        }

        bool[]? phantom = null;
        for (int i = 0; i < stated.Length; i++)
        {
            if (IsSound(graph, molecule, stated[i]))
            {
                graph.AddStated(stated[i]);
            }
            else
            {
                (phantom ??= new bool[stated.Length])[i] = true;
            }
        }

        FindSymmetryPhantoms(workspace, molecule, stated, ref phantom);
        if (phantom is null)
        {
            return molecule;
        }

        List<StereoElement> kept = [];
        for (int i = 0; i < stated.Length; i++)
        {
            if (!phantom[i])
            {
                kept.Add(stated[i]);
            }
        }

        Molecule real = molecule.WithStereo([.. kept]);
        graph.ClearElements();
        graph.AddStatedElements(real);
        return real;
    }

    /// <summary>Whether the place can hold a configuration at all, symmetry apart.</summary>
    private static bool IsSound(SymmetryGraph graph, Molecule molecule, StereoElement element)
    {
        ReadOnlySpan<int> carriers = element.CarrierSpan;
        switch (element.Kind)
        {
            case StereoKind.Tetrahedral:
                return carriers.Length == 4 && CountMissing(carriers) <= 1 && graph.CenterAt[element.Focus] == 0
                    && IsSoundCenter(graph, molecule.AtomSpan, element.Focus);
            case StereoKind.Allene:
                return carriers.Length == 4 && graph.CenterAt[element.Focus] == 0
                    && CountMissing(carriers[..2]) <= 1 && CountMissing(carriers[2..]) <= 1;
            case StereoKind.CisTrans:
                return carriers.Length == 2 && (graph.WeightBetween(element.Focus, element.FocusEnd) == 0
                    || graph.ShortestRing(element.Focus, element.FocusEnd, StereoFrames.SmallestStereoRing)
                        >= StereoFrames.SmallestStereoRing);
            default:
                return true;
        }
    }

    private static bool IsSoundCenter(SymmetryGraph graph, ReadOnlySpan<Atom> atoms, int focus)
    {
        int degree = graph.DegreeOf(focus);
        Atom atom = atoms[focus];
        if (degree < 3 || atom.HydrogenCount > 1 || StereoFrames.LeafTwins(graph, focus) > 1)
        {
            return false;
        }

        // Three ligands and a lone pair hold their shape on the third row and below, not on carbon, nitrogen and oxygen.
        return degree + atom.HydrogenCount == 4 || atom.AtomicNumber > 9
            || (atom.AtomicNumber == 7 && graph.IsHeldByRings(focus));
    }

    private static int CountMissing(ReadOnlySpan<int> carriers)
    {
        int count = 0;
        foreach (int carrier in carriers)
        {
            count += carrier < 0 ? 1 : 0;
        }

        return count;
    }
}
