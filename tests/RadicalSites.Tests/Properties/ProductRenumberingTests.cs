using System;
using System.Linq;
using System.Text;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Sites;

namespace RadicalSites.Tests.Properties;

/// <summary>Random molecules, unsaturated ones above all: any numbering gives the same products.</summary>
public class ProductRenumberingTests
{
    private static readonly string[] Bonds = ["", "", "", "=", "=", "#"];
    private static readonly string[] Atoms = ["C", "C", "C", "C", "C", "O", "N", "(F)", "(Cl)", "(c1ccccc1)"];

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(4)]
    public void Enumerate_random_molecules_renumbered_give_the_same_products(int seed)
    {
        var random = new Random(seed);
        int compared = 0;
        while (compared < 250)
        {
            string smiles = RandomSmiles(random);
            if (!SmilesReader.TryParse(smiles, out Molecule? molecule, out _))
            {
                continue;
            }

            compared++;
            int[] ranks = [.. Enumerable.Range(0, molecule.AtomCount)];
            random.Shuffle(ranks);
            Assert.Equal(
                (smiles, Describe(molecule)), (smiles, Describe(SmilesReader.Parse(SmilesWriter.Write(molecule, ranks)))));
        }
    }

    private static string Describe(Molecule molecule) => string.Join(
        ' ', ProductEnumerator.Enumerate(SiteFinder.Find(molecule), 17).Products
            .Select(static one => $"{one.CanonicalSmiles}:{one.Degeneracy}:{one.Route}:{one.Stereo}")
            .Order(StringComparer.Ordinal));

    // A chain with branches and at most one ring; texts that are no molecule are skipped by the caller.
    private static string RandomSmiles(Random random)
    {
        var text = new StringBuilder("C");
        bool ring = random.Next(3) == 0;
        text.Append(ring ? "9" : "");
        int open = 0;
        for (int length = random.Next(2, 12); length > 0; length--)
        {
            if (random.Next(6) == 0)
            {
                text.Append('(').Append(Bonds[random.Next(Bonds.Length)]).Append('C');
                open++;
            }
            else if (open > 0 && random.Next(3) == 0)
            {
                text.Append(')').Append(Bonds[random.Next(Bonds.Length)]).Append('C');
                open--;
            }
            else
            {
                string atom = Atoms[random.Next(Atoms.Length)];
                text.Append(atom[0] == '(' ? "" : Bonds[random.Next(Bonds.Length)]).Append(atom);
            }
        }

        return text.Append(ring ? "C9" : "").Append(')', open).ToString();
    }
}
