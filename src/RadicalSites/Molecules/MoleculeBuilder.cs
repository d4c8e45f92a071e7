using System;
using System.Collections.Generic;

namespace RadicalSites.Molecules;

/// <summary>Collects atoms, bonds and stereo marks of a graph that is not yet checked.</summary>
/// <remarks>
/// The readers fill one, and so can a program that holds a graph of another toolkit. The extension method
/// <c>ToMolecule</c> (in the root namespace) checks it, completes hydrogens, finds the Kekule form, perceives rings and
/// aromaticity, and returns the immutable molecule. Not thread-safe: a builder belongs to one thread.
/// </remarks>
public sealed partial class MoleculeBuilder
{
    internal readonly List<BuilderAtom> Atoms = [];
    internal readonly List<BuilderBond> Bonds = [];
    internal readonly List<StereoElement> Stereo = [];
    internal List<Point>? Coordinates;

    /// <summary>Number of atoms added so far.</summary>
    public int AtomCount => Atoms.Count;

    /// <summary>Adds an atom.</summary>
    /// <param name="atomicNumber">Atomic number 1 to 118, or 0 for a wildcard.</param>
    /// <param name="formalCharge">Formal charge [elementary charges], -15 to 15.</param>
    /// <param name="hydrogenCount">Hydrogens besides those added as atoms; <see langword="null"/> = by the normal valence.</param>
    /// <param name="massNumber">Mass number of a stated isotope, otherwise 0.</param>
    /// <param name="isAromatic">Whether the source marks the atom as aromatic.</param>
    /// <param name="atomClass">Atom class, otherwise 0.</param>
    /// <returns>0-based index of the atom.</returns>
    public int AddAtom(
        int atomicNumber, int formalCharge = 0, int? hydrogenCount = null, int massNumber = 0,
        bool isAromatic = false, int atomClass = 0)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(atomicNumber);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(atomicNumber, Elements.Last);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(Math.Abs(formalCharge), 15);
        ArgumentOutOfRangeException.ThrowIfNegative(massNumber);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(massNumber, 999);
        if (hydrogenCount is < 0 or > 99)
        {
            throw new ArgumentOutOfRangeException(nameof(hydrogenCount), hydrogenCount, "A hydrogen count is 0 to 99.");
        }

        Atoms.Add(new BuilderAtom
        {
            Element = (byte)atomicNumber,
            Charge = (sbyte)formalCharge,
            Hydrogens = (sbyte)(hydrogenCount ?? -1),
            Isotope = (ushort)massNumber,
            IsAromatic = isAromatic,
            AtomClass = atomClass,
            Position = -1,
        });
        return Atoms.Count - 1;
    }

    /// <summary>Adds a bond.</summary>
    /// <param name="begin">0-based index of one end.</param>
    /// <param name="end">0-based index of the other end.</param>
    /// <param name="order">Bond order; <see cref="BondOrder.Unknown"/> with <paramref name="isAromatic"/> leaves it to the Kekule form.</param>
    /// <param name="isAromatic">Whether the source marks the bond as aromatic.</param>
    /// <exception cref="ArgumentException">An end does not exist, both ends are equal, or the order is unknown and not aromatic.</exception>
    public void AddBond(int begin, int end, BondOrder order, bool isAromatic = false)
    {
        if ((uint)begin >= (uint)Atoms.Count || (uint)end >= (uint)Atoms.Count)
        {
            throw new ArgumentOutOfRangeException(nameof(begin), "Both ends of a bond are atoms that were added before.");
        }

        if (begin == end)
        {
            throw new ArgumentException("A bond joins two different atoms.", nameof(end));
        }

        if (order == BondOrder.Unknown && !isAromatic)
        {
            throw new ArgumentException("Only an aromatic bond may have an unknown order.", nameof(order));
        }

        Bonds.Add(new BuilderBond { Begin = begin, End = end, Order = order, IsAromatic = isAromatic, Position = -1 });
    }

    /// <summary>States the configuration of a tetrahedral centre.</summary>
    /// <param name="center">0-based index of the centre.</param>
    /// <param name="carriers">The four carriers; -1 for an implicit hydrogen or lone pair.</param>
    /// <param name="clockwise">Whether the last three run clockwise seen from the first.</param>
    public void AddTetrahedralStereo(int center, ReadOnlySpan<int> carriers, bool clockwise) =>
        Stereo.Add(new StereoElement(StereoKind.Tetrahedral, center, center, carriers.ToArray(), clockwise ? 2 : 1));

    /// <summary>States the configuration of a double bond.</summary>
    /// <param name="begin">0-based index of one end of the double bond.</param>
    /// <param name="end">0-based index of the other end.</param>
    /// <param name="beginCarrier">0-based index of a neighbour of <paramref name="begin"/>.</param>
    /// <param name="endCarrier">0-based index of a neighbour of <paramref name="end"/>.</param>
    /// <param name="sameSide">Whether the two carriers lie on the same side (cis).</param>
    public void AddDoubleBondStereo(int begin, int end, int beginCarrier, int endCarrier, bool sameSide) =>
        Stereo.Add(new StereoElement(StereoKind.CisTrans, begin, end, [beginCarrier, endCarrier], sameSide ? 2 : 1));

    /// <summary>Gives coordinates to the atom added last.</summary>
    /// <param name="point">Coordinates [angstrom or drawing units].</param>
    public void SetCoordinates(Point point)
    {
        Coordinates ??= [];
        while (Coordinates.Count < Atoms.Count - 1)
        {
            Coordinates.Add(default);
        }

        Coordinates.Add(point);
    }
}
