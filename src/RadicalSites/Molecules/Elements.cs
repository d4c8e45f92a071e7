using System;

namespace RadicalSites.Molecules;

/// <summary>Symbols of the chemical elements by atomic number.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public static class Elements
{
    private static readonly string[] Symbols =
    [
        "*", "H", "He", "Li", "Be", "B", "C", "N", "O", "F", "Ne", "Na", "Mg", "Al", "Si", "P", "S", "Cl", "Ar",
        "K", "Ca", "Sc", "Ti", "V", "Cr", "Mn", "Fe", "Co", "Ni", "Cu", "Zn", "Ga", "Ge", "As", "Se", "Br", "Kr",
        "Rb", "Sr", "Y", "Zr", "Nb", "Mo", "Tc", "Ru", "Rh", "Pd", "Ag", "Cd", "In", "Sn", "Sb", "Te", "I", "Xe",
        "Cs", "Ba", "La", "Ce", "Pr", "Nd", "Pm", "Sm", "Eu", "Gd", "Tb", "Dy", "Ho", "Er", "Tm", "Yb", "Lu",
        "Hf", "Ta", "W", "Re", "Os", "Ir", "Pt", "Au", "Hg", "Tl", "Pb", "Bi", "Po", "At", "Rn",
        "Fr", "Ra", "Ac", "Th", "Pa", "U", "Np", "Pu", "Am", "Cm", "Bk", "Cf", "Es", "Fm", "Md", "No", "Lr",
        "Rf", "Db", "Sg", "Bh", "Hs", "Mt", "Ds", "Rg", "Cn", "Nh", "Fl", "Mc", "Lv", "Ts", "Og",
    ];

    /// <summary>Highest atomic number known.</summary>
    public const int Last = 118;

    /// <summary>Symbol of an element.</summary>
    /// <param name="atomicNumber">Atomic number 1 to 118, or 0 for the wildcard.</param>
    /// <returns>The symbol, or <c>*</c>.</returns>
    /// <exception cref="ArgumentOutOfRangeException">There is no such element.</exception>
    public static string SymbolOf(int atomicNumber)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(atomicNumber);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(atomicNumber, Last);
        return Symbols[atomicNumber];
    }

    /// <summary>Atomic number of a symbol.</summary>
    /// <param name="symbol">A symbol in its usual case, for example <c>Cl</c>.</param>
    /// <returns>Atomic number 1 to 118, 0 for <c>*</c>, or -1 when there is no such element.</returns>
    public static int Find(ReadOnlySpan<char> symbol)
    {
        if (symbol is "*")
        {
            return 0;
        }

        if (symbol.Length is 1 or 2 && char.IsAsciiLetterUpper(symbol[0])
            && (symbol.Length == 1 || char.IsAsciiLetterLower(symbol[1]))
            && ElementSymbols.Find(symbol[0], symbol.Length == 1 ? '\0' : symbol[1]) is > 0 and int element)
        {
            return element;
        }

        return -1;
    }
}
