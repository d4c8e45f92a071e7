namespace RadicalSites.Tests.Formats.Molfile;

/// <summary>Small molfiles made for the tests.</summary>
internal static class Drawings
{
    /// <summary>C[C@H](N)C(=O)O or its mirror image, drawn with one wedge to the nitrogen above the centre.</summary>
    public const string Alanine =
        """
        alanine
          Test      0101000000 2D
        made for the tests
          6  5  0  0  1  0  0  0  0  0999 V2000
            0.0000    0.0000    0.0000 C   0  0  0  0  0  0
           -1.2990   -0.7500    0.0000 C   0  0  0  0  0  0
            0.0000    1.5000    0.0000 N   0  0  0  0  0  0
            1.2990   -0.7500    0.0000 C   0  0  0  0  0  0
            2.5981    0.0000    0.0000 O   0  0  0  0  0  0
            1.2990   -2.2500    0.0000 O   0  0  0  0  0  0
          1  2  1  0
          1  3  1  1
          1  4  1  0
          4  5  2  0
          4  6  1  0
        M  END

        """;

    /// <summary>A molfile of atoms in a row without bonds and coordinates, with given property lines.</summary>
    public static string Atoms(string[] symbols, params string[] properties) => Table(symbols, [], properties);

    /// <summary>A V2000 molfile without coordinates.</summary>
    public static string Table(string[] symbols, string[] bonds, params string[] properties)
    {
        var text = new System.Text.StringBuilder("test\n\n\n");
        text.Append(System.Globalization.CultureInfo.InvariantCulture, $"{symbols.Length,3}{bonds.Length,3}  0  0  0  0  0  0  0  0999 V2000\n");
        foreach (string symbol in symbols)
        {
            text.Append("    0.0000    0.0000    0.0000 ").Append(symbol).Append('\n');
        }

        foreach (string line in (string[])[.. bonds, .. properties])
        {
            text.Append(line).Append('\n');
        }

        return text.Append("M  END\n").ToString();
    }
}
