using System;
using System.Collections.Generic;

namespace RadicalSites.Molecules;

/// <summary>An immutable molecular graph: atoms, bonds, stereo elements, always with a Kekule form and hydrogen counts.</summary>
/// <remarks>
/// Atoms are indexed from 0 in input order. Hydrogens written as atoms are folded into the count of their neighbour
/// unless they carry an isotope, a charge, an atom class, or have no single heavy neighbour; where that shifts indices
/// <see cref="InputIndexOf"/> leads back to the input. A molecule may have several fragments or none at all.
/// Deeply immutable and safe for use by many threads. Made by the readers or by <see cref="MoleculeBuilder"/>.
/// </remarks>
public sealed class Molecule
{
    private readonly Atom[] atoms;
    private readonly Bond[] bonds;
    private readonly int[] offsets;
    private readonly Neighbor[] neighbors;
    private readonly StereoElement[] stereo;
    private readonly int[]? inputIndices;
    private readonly Point[]? coordinates;

    /// <summary>Takes over the arrays; the caller gives up its references.</summary>
    internal Molecule(
        Atom[] atoms, Bond[] bonds, int[] offsets, Neighbor[] neighbors, StereoElement[] stereo,
        int[]? inputIndices = null, Point[]? coordinates = null)
    {
        this.atoms = atoms;
        this.bonds = bonds;
        this.offsets = offsets;
        this.neighbors = neighbors;
        this.stereo = stereo;
        this.inputIndices = inputIndices;
        this.coordinates = coordinates;
    }

    /// <summary>Number of atoms, folded hydrogens not counted.</summary>
    public int AtomCount => atoms.Length;

    /// <summary>Number of bonds, those to folded hydrogens not counted.</summary>
    public int BondCount => bonds.Length;

    /// <summary>The atoms, by index.</summary>
    public IReadOnlyList<Atom> Atoms => atoms;

    /// <summary>The bonds, by index.</summary>
    public IReadOnlyList<Bond> Bonds => bonds;

    /// <summary>The stereo elements that the input states, in order of their focus.</summary>
    public IReadOnlyList<StereoElement> StereoElements => stereo;

    /// <summary>Coordinates by atom index, or <see langword="null"/> when the input had none.</summary>
    public IReadOnlyList<Point>? Coordinates => coordinates;

    /// <summary>Whether hydrogens of the input were folded, so that indices differ from the input.</summary>
    public bool HasFoldedHydrogens => inputIndices is not null;

    /// <summary>Index that an atom had in the input.</summary>
    /// <param name="atom">0-based atom index in this molecule.</param>
    /// <returns>0-based index in the input, hydrogens written as atoms counted.</returns>
    /// <exception cref="ArgumentOutOfRangeException">There is no such atom.</exception>
    public int InputIndexOf(int atom)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(atom);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(atom, atoms.Length);
        return inputIndices is null ? atom : inputIndices[atom];
    }

    /// <summary>Neighbours of an atom in the order in which the input states the bonds.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>One entry for each bond of the atom; may be empty.</returns>
    public ReadOnlySpan<Neighbor> NeighborsOf(int atom) => neighbors.AsSpan(offsets[atom], offsets[atom + 1] - offsets[atom]);

    /// <summary>Number of bonds of an atom to atoms of the graph.</summary>
    /// <param name="atom">0-based atom index.</param>
    /// <returns>Number of neighbours, folded hydrogens not counted.</returns>
    public int DegreeOf(int atom) => offsets[atom + 1] - offsets[atom];

    /// <summary>The same graph with other stereo elements.</summary>
    internal Molecule WithStereo(StereoElement[] elements) =>
        new(atoms, bonds, offsets, neighbors, elements, inputIndices, coordinates);

    /// <summary>The same graph with all atom classes 0.</summary>
    internal Molecule WithoutAtomClasses() =>
        new(Array.ConvertAll(atoms, static atom => atom.WithAtomClass(0)), bonds, offsets, neighbors, stereo, inputIndices, coordinates);

    internal ReadOnlySpan<Atom> AtomSpan => atoms;

    internal ReadOnlySpan<Bond> BondSpan => bonds;

    internal ReadOnlySpan<StereoElement> StereoSpan => stereo;

    internal ReadOnlySpan<int> NeighborOffsets => offsets;

    internal ReadOnlySpan<Neighbor> NeighborSpan => neighbors;

    internal ReadOnlySpan<int> InputIndices => inputIndices;

    internal ReadOnlySpan<Point> CoordinateSpan => coordinates;
}
