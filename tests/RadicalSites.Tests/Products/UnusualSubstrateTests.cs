using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Sites;

namespace RadicalSites.Tests.Products;

/// <summary>Substrates off the beaten track: every product is the substrate less one hydrogen plus one halogen.</summary>
public class UnusualSubstrateTests
{
    [Theory]
    [InlineData("C([1H])([1H])([1H])[1H]", 1)]
    [InlineData("[CH3:7]C", 2)]
    [InlineData("[13CH3]C", 2)]
    [InlineData("C([2H])([1H])C", 2)]
    [InlineData("[1H]C([1H])([1H])C=C", 2)]
    [InlineData("[CH2-]C", 2)]
    [InlineData("C[N+](C)(C)C.[Cl-]", 1)]
    [InlineData("CC.[Na+].[Cl-]", 1)]
    [InlineData("[CH2]C", 1)]
    [InlineData("C[Mg]Br", 1)]
    [InlineData("C[Sn](C)(C)C", 1)]
    [InlineData("CB(C)C", 1)]
    [InlineData("C*", 1)]
    [InlineData("CC=[C@]=CC", 2)]
    [InlineData("C1CCCCCCCCCCC/C=C/1", 7)]
    [InlineData("C1CC1", 1)]
    [InlineData("C[Pt@SP1](Cl)(N)C", 2)]
    [InlineData("CC#CC#CC", 3)]
    [InlineData("C=CC=CC=CC", 4)]
    [InlineData("c1ccc2c(c1)C=CC2", 1)]
    [InlineData("C1=CC=CC=CC1", 4)]
    [InlineData("C=C1C=CC=CC1", 3)]
    public void Enumerate_products_have_one_hydrogen_less_and_one_halogen_more(string smiles, int atMost)
    {
        Molecule molecule = SmilesReader.Parse(smiles);

        ProductSet set = ProductEnumerator.Enumerate(
            SiteFinder.Find(molecule), 17, new ProductOptions { Stereo = ProductStereoMode.Expand });

        Assert.InRange(set.Products.Count, 1, atMost);
        foreach (HalogenationProduct product in set.Products)
        {
            Molecule read = SmilesReader.Parse(product.CanonicalSmiles);
            Assert.Equal(Hydrogens(molecule) - 1, Hydrogens(read));
            Assert.Equal(
                molecule.Atoms.Count(static atom => atom.AtomicNumber == 17) + 1,
                read.Atoms.Count(static atom => atom.AtomicNumber == 17));
            Assert.Equal(product.Molecule.AtomCount, product.SubstrateAtoms.Count);
            Assert.NotEmpty(product.Stereoisomers!);
            Assert.InRange(product.Degeneracy, 1, Hydrogens(molecule));
        }
    }

    [Fact]
    public void Enumerate_shift_that_makes_an_aromatic_ring_is_perceived()
    {
        // 5-methylidenecyclohexa-1,3-diene loses the CH2 hydrogen and takes the halogen outside: benzyl chloride.
        ProductSet set = ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse("C=C1C=CC=CC1")), 17);

        Assert.Contains(ProductIdentity.SmilesOf(SmilesReader.Parse("ClCc1ccccc1")), set.Products.Select(static one => one.CanonicalSmiles));
    }

    private static int Hydrogens(Molecule molecule) =>
        molecule.Atoms.Sum(static atom => atom.HydrogenCount) + molecule.Atoms.Count(static atom => atom.AtomicNumber == 1);
}
