using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using System.Text;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Conformance;

/// <summary>
/// The 4,999 molecules of the NCI file against RDKit 2022.09.3. A disagreement passes only when
/// nci_disagreements.tsv lists it with who is right and why; a listed one that no longer occurs fails.
/// </summary>
public class NciFileTests
{
    [Fact]
    public void Parse_and_find_sites_agree_with_the_reference_toolkit()
    {
        var smiles = ReferenceTable.NciFile().ToDictionary(static entry => entry.Number, static entry => entry.Smiles);
        var found = new HashSet<(string, string)>();
        var details = new StringBuilder();
        int compared = 0;
        foreach (string[] row in ReferenceTable.Read("nci_facts.tsv"))
        {
            foreach ((string aspect, string expected, string actual) in Compare(smiles[row[0]], row))
            {
                compared++;
                if (expected != actual && found.Add((row[0], aspect)))
                {
                    details.AppendLine(
                        CultureInfo.InvariantCulture,
                        $"{row[0]}\t{aspect}\t{smiles[row[0]]}\t{expected}\t{actual}");
                }
            }
        }

        Assert.True(compared > 40_000);
        HashSet<(string, string)> known = ReferenceTable.Disagreements("nci_disagreements.tsv");
        Assert.True(known.SetEquals(found), string.Join('\n', known.Except(found)) + "\n" + details);
    }

    private static IEnumerable<(string Aspect, string Expected, string Actual)> Compare(string smiles, string[] row)
    {
        if (!SmilesReader.TryParse(smiles, out Molecule? molecule, out _))
        {
            yield return ("read", row[1] == "error" ? "error" : "molecule", "error");
            yield break;
        }

        yield return ("read", row[1] == "error" ? "error" : "molecule", "molecule");
        if (row[1] == "error")
        {
            yield break;
        }

        MolecularFormula formula = MolecularFormula.Of(molecule);
        yield return ("charge", row[2], formula.Charge.ToString(CultureInfo.InvariantCulture));
        yield return ("hydrogens", row[3], string.Join(' ', molecule.Atoms.Select(static atom => atom.HydrogenCount)));
        yield return ("aromatic", row[4], string.Concat(molecule.Atoms.Select(static atom => atom.IsAromatic ? 'a' : '-')));
        int[] carbons = [.. Enumerable.Range(0, molecule.AtomCount).Where(atom => SiteFinder.IsSiteCarbon(molecule, atom))];
        yield return ("siteCarbons", row[5], carbons.Length.ToString(CultureInfo.InvariantCulture));
        yield return ("siteHydrogens", row[6], carbons.Sum(atom => molecule.Atoms[atom].HydrogenCount)
            .ToString(CultureInfo.InvariantCulture));
        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);
        int[] orbits = [.. Enumerable.Range(0, molecule.AtomCount)
            .Select(atom => symmetry.OrbitOf(atom, EquivalenceLevel.Constitutional))];
        yield return ("classCount", row[7], orbits.Distinct().Count().ToString(CultureInfo.InvariantCulture));
        yield return ("classSizes", row[8], ClassSizes.Of(orbits));
        yield return ("siteClassSizes", row[9], ClassSizes.Of(carbons.Select(atom => orbits[atom])));
    }
}
