using System;
using System.Globalization;
using System.Text;

namespace RadicalSites.Molecules;

/// <summary>Elemental composition of a molecule: formula, charge and molar mass.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed class MolecularFormula
{
    private readonly int[] counts;

    private MolecularFormula(int[] counts, int charge, double? molarMass)
    {
        this.counts = counts;
        Charge = charge;
        GramsPerMole = molarMass;
    }

    /// <summary>Total formal charge [elementary charges].</summary>
    public int Charge { get; }

    /// <summary>Molar mass [g/mol], or <see langword="null"/> when an atom has no standard atomic weight.</summary>
    public double? GramsPerMole { get; }

    /// <summary>Counts the atoms of all fragments of a molecule.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <returns>Its composition; isotopes count as their element and enter the molar mass with their own mass.</returns>
    public static MolecularFormula Of(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        var counts = new int[Elements.Last + 1];
        int charge = 0;
        double? mass = 0;
        double hydrogen = AtomicWeights.Find(1)!.Value;
        foreach (Atom atom in molecule.AtomSpan)
        {
            counts[atom.AtomicNumber]++;
            counts[1] += atom.HydrogenCount;
            charge += atom.FormalCharge;
            mass += AtomicWeights.Find(atom.AtomicNumber, atom.MassNumber) + (atom.HydrogenCount * hydrogen);
        }

        return new MolecularFormula(counts, charge, mass);
    }

    /// <summary>Number of atoms of an element, hydrogens included.</summary>
    /// <param name="atomicNumber">Atomic number 0 (wildcard) to 118.</param>
    /// <returns>The number of atoms.</returns>
    public int CountOf(int atomicNumber) => counts[atomicNumber];

    /// <summary>The formula in the Hill order: C, H, then the other symbols by alphabet; all by alphabet without carbon.</summary>
    /// <returns>For example <c>C2H6O</c> or <c>C2H8N+</c>; an empty text for an empty molecule.</returns>
    public override string ToString()
    {
        var text = new StringBuilder();
        bool organic = counts[6] > 0;
        if (organic)
        {
            Append(text, 6);
            Append(text, 1);
        }

        var order = new int[Elements.Last + 1];
        var symbols = new string[order.Length];
        for (int i = 0; i < order.Length; i++)
        {
            order[i] = i;
            symbols[i] = Elements.SymbolOf(i);
        }

        Array.Sort(symbols, order, StringComparer.Ordinal);
        foreach (int element in order)
        {
            if (!organic || element is not (1 or 6))
            {
                Append(text, element);
            }
        }

        if (Charge != 0)
        {
            text.Append(Charge > 0 ? '+' : '-');
            if (Math.Abs(Charge) > 1)
            {
                text.Append(Math.Abs(Charge).ToString(CultureInfo.InvariantCulture));
            }
        }

        return text.ToString();
    }

    private void Append(StringBuilder text, int element)
    {
        if (counts[element] > 0)
        {
            text.Append(Elements.SymbolOf(element));
            if (counts[element] > 1)
            {
                text.Append(counts[element].ToString(CultureInfo.InvariantCulture));
            }
        }
    }
}
