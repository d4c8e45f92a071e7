using System.Globalization;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Conformance;

/// <summary>Exact orbits of named molecules and regular graphs against a plain listing of all automorphisms.</summary>
public class NamedOrbitsTests
{
    [Fact]
    public void Perceive_named_molecules_equal_the_orbits_of_all_automorphisms()
    {
        int cases = 0;
        foreach (string[] row in ReferenceTable.Read("named_orbits.tsv"))
        {
            Molecule molecule = SmilesReader.Parse(row[1]);
            SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);
            int[] orbits = [.. Enumerable.Range(0, molecule.AtomCount)
                .Select(atom => symmetry.OrbitOf(atom, EquivalenceLevel.Constitutional))];
            int[] carbons = [.. Enumerable.Range(0, molecule.AtomCount).Where(atom => SiteFinder.IsSiteCarbon(molecule, atom))];

            Assert.Equal((row[0], row[4]), (row[0], ClassSizes.Of(orbits)));
            Assert.Equal((row[0], row[5]), (row[0], ClassSizes.Of(carbons.Select(atom => orbits[atom]))));
            Assert.Equal(
                (row[0], row[6]),
                (row[0], SiteFinder.Find(molecule).Sites.Sum(static site => site.HydrogenCount).ToString(CultureInfo.InvariantCulture)));
            cases++;
        }

        Assert.True(cases >= 80);
    }

    [Fact]
    public void Table_holds_cases_where_a_ranking_merges_too_much() =>
        Assert.Contains(
            ReferenceTable.Read("named_orbits.tsv"),
            static row => int.Parse(row[7], CultureInfo.InvariantCulture) < int.Parse(row[3], CultureInfo.InvariantCulture));
}
