using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using System.Text;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Conformance;

/// <summary>
/// SMILES of the OpenSMILES specification, by clause, and of the test suites of Beam, RDKit and CDK: charge, hydrogens on
/// each atom and formula as Beam 1.3.3 and RDKit 2022.09.3 agree on them, or their common refusal.
/// </summary>
public class SmilesFactsTests
{
    [Fact]
    public void Read_agrees_with_two_toolkits_or_the_disagreement_is_explained()
    {
        var found = new HashSet<(string, string)>();
        var details = new StringBuilder();
        IReadOnlyList<string[]> rows = ReferenceTable.Read("smiles_facts.tsv");
        foreach (string[] row in rows)
        {
            foreach ((string aspect, string expected, string actual) in Compare(row))
            {
                if (expected != actual && found.Add((row[0], aspect)))
                {
                    details.AppendLine(CultureInfo.InvariantCulture, $"{row[0]}\t{aspect}\t{expected}\t{actual}\t{row[4]}");
                }
            }
        }

        Assert.True(rows.Count(static row => row[4].StartsWith("OpenSMILES", StringComparison.Ordinal)) >= 120);
        Assert.True(rows.Count >= 420);
        HashSet<(string, string)> known = ReferenceTable.Disagreements("smiles_disagreements.tsv");
        Assert.True(known.SetEquals(found), string.Join('\n', known.Except(found)) + "\n" + details);
    }

    private static IEnumerable<(string Aspect, string Expected, string Actual)> Compare(string[] row)
    {
        bool read = SmilesReader.TryParse(row[0], out Molecule? molecule, out _);
        yield return ("read", row[1] == "error" ? "error" : "molecule", read ? "molecule" : "error");
        if (!read || row[1] == "error")
        {
            yield break;
        }

        MolecularFormula formula = MolecularFormula.Of(molecule!);
        yield return ("charge", row[1], formula.Charge.ToString(CultureInfo.InvariantCulture));
        yield return ("formula", row[3], FormulaOf(molecule!));
        if (!molecule!.HasFoldedHydrogens)
        {
            yield return ("hydrogens", row[2], string.Join(' ', molecule.Atoms.Select(static atom => atom.HydrogenCount)));
        }
    }

    // Hill order without charge; wildcards are not counted.
    private static string FormulaOf(Molecule molecule)
    {
        var counts = new SortedDictionary<string, int>(StringComparer.Ordinal);
        foreach (Atom atom in molecule.Atoms)
        {
            counts["H"] = counts.GetValueOrDefault("H") + atom.HydrogenCount;
            if (atom.AtomicNumber > 0)
            {
                string symbol = Elements.SymbolOf(atom.AtomicNumber);
                counts[symbol] = counts.GetValueOrDefault(symbol) + 1;
            }
        }

        IEnumerable<string> order = counts.Keys.Where(symbol => counts[symbol] > 0);
        if (counts.ContainsKey("C"))
        {
            order = order.OrderBy(static symbol => symbol == "C" ? 0 : symbol == "H" ? 1 : 2)
                .ThenBy(static symbol => symbol, StringComparer.Ordinal);
        }

        return string.Concat(order.Select(symbol =>
            symbol + (counts[symbol] > 1 ? counts[symbol].ToString(CultureInfo.InvariantCulture) : "")));
    }
}
