namespace RadicalSites.Molecules;

/// <summary>Element symbols by their letters, looked up without a search.</summary>
internal static class ElementSymbols
{
    private static readonly byte[] Table = Build();

    /// <summary>Atomic number of a symbol.</summary>
    /// <param name="first">Upper-case letter.</param>
    /// <param name="second">Lower-case letter, or NUL for a one-letter symbol.</param>
    /// <returns>The atomic number, or 0 when there is no such element.</returns>
    internal static int Find(char first, char second) =>
        Table[((first - 'A') * 27) + (second == '\0' ? 0 : second - 'a' + 1)];

    private static byte[] Build()
    {
        var table = new byte[26 * 27];
        for (int element = 1; element <= Elements.Last; element++)
        {
            string symbol = Elements.SymbolOf(element);
            table[((symbol[0] - 'A') * 27) + (symbol.Length == 1 ? 0 : symbol[1] - 'a' + 1)] = (byte)element;
        }

        return table;
    }
}
