using System.Globalization;
using System.Text;

namespace RadicalSites.Cli.Tests;

/// <summary>Input of the tests: common molecules, and numbered lists of them with a bad one now and then.</summary>
internal static class Molecules
{
    public static readonly string[] Common =
    [
        "CC(C)C", "Cc1ccccc1", "CCO", "C1CCCCC1", "CC=CCC", "CC(C)c1ccccc1", "OC(=O)CCC", "C1CC2CCC1C2", "CCN(CC)CC", "CC#C",
        "C[C@H](Cl)CC", "CC(C)(C)C", "Cn1cncc1", "CCOC(=O)C", "C1CCOC1", "ClC(Cl)Cl", "CCCCCCCC", "Cc1ccncc1", "[NH4+].[Cl-]", "CSC",
    ];

    /// <summary>A numbered list; every 17th record cannot be read.</summary>
    public static string List(int count)
    {
        var text = new StringBuilder();
        for (int i = 1; i <= count; i++)
        {
            text.Append(i % 17 == 0 ? "C1CC" : Common[i % Common.Length]);
            text.Append(CultureInfo.InvariantCulture, $" name-{i}\n");
        }

        return text.ToString();
    }
}
