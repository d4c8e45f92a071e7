using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>Atom symbols of connection tables: elements, D and T, and the symbols that stand for sets of atoms.</summary>
internal static class AtomSymbol
{
    private static readonly string[] Generic =
        ["A", "Q", "*", "X", "M", "AH", "QH", "XH", "MH", "R", "R#", "LP", "L", "Du", "Pol", "Mod", "Any", "Hal", "G", "Z"];

    /// <summary>Atomic number of a symbol.</summary>
    /// <param name="symbol">Symbol without blanks.</param>
    /// <param name="isotope">Mass number that D or T names, otherwise 0.</param>
    /// <returns>Atomic number 1 to 118, or 0 when the symbol is no element.</returns>
    internal static int Find(ReadOnlySpan<char> symbol, out int isotope)
    {
        isotope = 0;
        if (symbol.Length is < 1 or > 2 || !char.IsAsciiLetterUpper(symbol[0]) || (symbol.Length == 2 && !char.IsAsciiLetterLower(symbol[1])))
        {
            return 0;
        }

        if (symbol.Length == 1 && symbol[0] is ('D' or 'T'))
        {
            isotope = symbol[0] == 'D' ? 2 : 3;
            return 1;
        }

        return ElementSymbols.Find(symbol[0], symbol.Length == 1 ? '\0' : symbol[1]);
    }

    /// <summary>Whether a symbol is defined for queries or generic structures.</summary>
    internal static bool IsGeneric(ReadOnlySpan<char> symbol)
    {
        foreach (string known in Generic)
        {
            if (symbol.SequenceEqual(known))
            {
                return true;
            }
        }

        return symbol.Length > 1 && symbol[0] == 'R' && symbol[1..].IndexOfAnyExceptInRange('0', '9') < 0;
    }
}
