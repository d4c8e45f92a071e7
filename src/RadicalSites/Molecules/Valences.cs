using System;

namespace RadicalSites.Molecules;

/// <summary>Normal valences by element and charge, for implied hydrogens, the Kekule form and open shells.</summary>
internal static class Valences
{
    // Valences of the neutral main-group elements; the SMILES organic subset follows the OpenSMILES list.
    private static readonly byte[][] Neutral = Build();

    /// <summary>Normal valences of an element with a charge, ascending; empty when none is defined.</summary>
    internal static ReadOnlySpan<byte> Of(int element, int charge)
    {
        if (charge == 0)
        {
            return Neutral[element];
        }

        // A charged atom has the valence of the element that has as many electrons: N+ bonds like C, O+ like N.
        // Boron and carbon cations, and anions right of carbon, lose one bond for each charge.
        int shifted = element - charge;
        bool mainGroup = element is (>= 5 and <= 9) or (>= 13 and <= 17) or (>= 31 and <= 35) or (>= 49 and <= 53);
        if (!mainGroup || shifted < 0 || shifted > Elements.Last)
        {
            return [];
        }

        return Neutral[shifted] is { Length: > 0 } list ? list : shifted is 10 or 18 or 36 or 54 ? Zero : [];
    }

    private static ReadOnlySpan<byte> Zero => [0];

    private static byte[][] Build()
    {
        var table = new byte[Elements.Last + 1][];
        Array.Fill(table, []);
        table[1] = [1];
        foreach (int element in (int[])[5, 13, 31, 49])
        {
            table[element] = [3];
        }

        foreach (int element in (int[])[6, 14, 32])
        {
            table[element] = [4];
        }

        table[50] = [2, 4];
        table[82] = [2, 4];
        table[7] = [3, 5];
        foreach (int element in (int[])[15, 33, 51])
        {
            table[element] = [3, 5];
        }

        table[8] = [2];
        foreach (int element in (int[])[16, 34, 52])
        {
            table[element] = [2, 4, 6];
        }

        table[9] = [1];
        foreach (int element in (int[])[17, 35, 53])
        {
            table[element] = [1, 3, 5, 7];
        }

        table[4] = [2];
        table[12] = [2];
        table[3] = [1];
        table[11] = [1];
        table[19] = [1];
        return table;
    }
}
