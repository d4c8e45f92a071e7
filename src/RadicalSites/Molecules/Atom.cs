using System;

namespace RadicalSites.Molecules;

/// <summary>One atom of a molecule: element, charge, isotope, hydrogen count and perceived flags.</summary>
/// <remarks>
/// Equality compares all fields. Hydrogen counts are always defined. Immutable and safe for use by many threads.
/// </remarks>
public readonly struct Atom : IEquatable<Atom>
{
    private readonly byte element;
    private readonly sbyte charge;
    private readonly ushort isotope;
    private readonly byte hydrogens;
    private readonly byte unpaired;
    private readonly AtomFlags flags;
    private readonly int atomClass;

    internal Atom(
        int element, int charge, int isotope, int hydrogens, int unpaired, AtomFlags flags, int atomClass)
    {
        this.element = checked((byte)element);
        this.charge = checked((sbyte)charge);
        this.isotope = checked((ushort)isotope);
        this.hydrogens = checked((byte)hydrogens);
        this.unpaired = checked((byte)unpaired);
        this.flags = flags;
        this.atomClass = atomClass;
    }

    /// <summary>Atomic number, 1 to 118; 0 is the wildcard <c>*</c>.</summary>
    public int AtomicNumber => element;

    /// <summary>Formal charge [elementary charges].</summary>
    public int FormalCharge => charge;

    /// <summary>Mass number when the isotope is stated, otherwise 0.</summary>
    public int MassNumber => isotope;

    /// <summary>Hydrogens on this atom that are not atoms of the graph of their own, 0 or more.</summary>
    public int HydrogenCount => hydrogens;

    /// <summary>Unpaired electrons implied by an open valence or stated by the input, 0 to 3.</summary>
    public int UnpairedElectrons => unpaired;

    /// <summary>Atom class (the number after the colon in SMILES, atom-atom map number in a molfile), otherwise 0.</summary>
    public int AtomClass => atomClass;

    /// <summary>Whether the atom belongs to an aromatic ring by the model of the Perception namespace.</summary>
    public bool IsAromatic => (flags & AtomFlags.Aromatic) != 0;

    /// <summary>Whether the atom lies on a ring.</summary>
    public bool IsInRing => (flags & AtomFlags.Ring) != 0;

    internal AtomFlags Flags => flags;

    internal Atom With(AtomFlags newFlags) => new(element, charge, isotope, hydrogens, unpaired, newFlags, atomClass);

    internal Atom WithHydrogens(int count, int unpairedElectrons) =>
        new(element, charge, isotope, count, unpairedElectrons, flags, atomClass);

    internal Atom WithAtomClass(int value) => new(element, charge, isotope, hydrogens, unpaired, flags, value);

    /// <inheritdoc/>
    public bool Equals(Atom other) =>
        element == other.element && charge == other.charge && isotope == other.isotope
        && hydrogens == other.hydrogens && unpaired == other.unpaired && flags == other.flags
        && atomClass == other.atomClass;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Atom other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(element, charge, isotope, hydrogens, unpaired, flags, atomClass);

    /// <summary>Whether two atoms have the same fields.</summary>
    /// <param name="left">First atom.</param>
    /// <param name="right">Second atom.</param>
    /// <returns>Whether all fields are equal.</returns>
    public static bool operator ==(Atom left, Atom right) => left.Equals(right);

    /// <summary>Whether two atoms differ in a field.</summary>
    /// <param name="left">First atom.</param>
    /// <param name="right">Second atom.</param>
    /// <returns>Whether a field differs.</returns>
    public static bool operator !=(Atom left, Atom right) => !left.Equals(right);
}
