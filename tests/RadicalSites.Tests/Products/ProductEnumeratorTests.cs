using System;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Sites;

namespace RadicalSites.Tests.Products;

/// <summary>Products, degeneracy, route and stereo outcome worked out by hand (common practice, no source).</summary>
public class ProductEnumeratorTests
{
    // One product: SMILES in any spelling, hydrogens, route (d, t), stereo outcome.
    [Theory]
    [InlineData("C", "CCl 4 d None")]
    [InlineData("CCC", "CCCCl 6 d None|CC(C)Cl 2 d None")]
    [InlineData("CCCC", "CCCCCl 6 d None|CCC(C)Cl 4 d Racemic")]
    [InlineData("CC(C)CC", "ClCC(C)CC 6 d Racemic|CC(C)(Cl)CC 1 d None|CC(C)C(C)Cl 2 d Racemic|CC(C)CCCl 3 d None")]
    [InlineData("Cc1ccccc1", "ClCc1ccccc1 3 d None")]
    [InlineData("CC1CCCCC1", "ClCC1CCCCC1 3 d None|CC1(Cl)CCCCC1 1 d None|CC1CCCCC1Cl 4 d Diastereomers|CC1CCCC(Cl)C1 4 d Diastereomers|CC1CCC(Cl)CC1 2 d Diastereomers")]
    [InlineData("C[C@@H](Cl)CC", "ClC[C@@H](Cl)CC 3 d Retained|CC(Cl)(Cl)CC 1 d Lost|C[C@@H](Cl)C(Cl)C 2 d Diastereomers|C[C@@H](Cl)CCCl 3 d Retained")]
    [InlineData("C[C@@H](O)CC", "ClC[C@@H](O)CC 3 d Retained|CC(Cl)(O)CC 1 d Epimerised|C[C@@H](O)C(Cl)C 2 d Diastereomers|C[C@@H](O)CCCl 3 d Retained")]
    [InlineData("C=CC", "C=CCCl 3 d None")]
    [InlineData("C1=CCCCC1", "ClC1C=CCCC1 4 d Racemic|ClC1CC=CCC1 4 d Racemic")]
    [InlineData("C=CCC", "C=CC(Cl)C 2 d Racemic|C=CCCCl 3 d None|CC=CCCl 2 t Diastereomers")]
    [InlineData("C/C=C/C", "ClC/C=C/C 6 d Retained|C=CC(Cl)C 6 t Racemic")]
    [InlineData("CC#CC", "ClCC#CC 6 d None|C=C=C(Cl)C 6 t None")]
    [InlineData("C=CCC=C", "C=CC(Cl)C=C 2 d None|C=CC=CCCl 2 t Diastereomers")]
    [InlineData("C=C1C=CCCC1", "C=C1C=CC(Cl)CC1 2 d Racemic|C=C1C=CCC(Cl)C1 2 d Racemic|C=C1C=CCCC1Cl 2 d Racemic|ClCC1=CC=CCC1 2 t None|ClCC1=CCCC=C1 2 t None|C=C1C(Cl)C=CCC1 2 t Racemic")]
    [InlineData("CC(=O)C", "ClCC(=O)C 6 d None")]
    [InlineData("C1C2CC3CC1CC(C2)C3", "ClC1C2CC3CC1CC(C2)C3 12 d None|C1C2(Cl)CC3CC1CC(C2)C3 4 d None")]
    [InlineData("C[C@H](Cl)[C@H](Cl)C", "ClC[C@H](Cl)[C@H](Cl)C 6 d Racemic|CC(Cl)(Cl)[C@H](Cl)C 2 d Racemic")]
    [InlineData("C[C@H](Cl)[C@@H](Cl)C", "ClC[C@H](Cl)[C@@H](Cl)C 6 d Retained|CC(Cl)(Cl)[C@@H](Cl)C 2 d Lost")]
    [InlineData("C[C@H](F)C(O)[C@@H](F)C", "ClC[C@H](F)C(O)[C@@H](F)C 6 d Diastereomers|CC(Cl)(F)C(O)[C@@H](F)C 2 d Epimerised|C[C@H](F)C(O)(Cl)[C@@H](F)C 1 d Retained")]
    [InlineData("OC(=O)[C@@H](N)C(C)C", "OC(=O)C(Cl)(N)C(C)C 1 d Epimerised|OC(=O)[C@@H](N)C(C)CCl 6 d Diastereomers|OC(=O)[C@@H](N)C(C)(C)Cl 1 d Retained")]
    [InlineData("[2H]C([2H])([2H])C", "[2H]C([2H])([2H])CCl 3 d None")]
    [InlineData("CC.CC", "CCCl.CC 12 d None")]
    [InlineData("c1ccccc1", "")]
    public void Enumerate_lists_the_products_worked_out_by_hand(string substrate, string expected)
    {
        string[] actual = Describe(substrate, 17);

        string[] wanted = expected.Length == 0 ? [] : [.. expected.Split('|').Select(Respell).Order(StringComparer.Ordinal)];
        Assert.Equal(wanted, actual);
    }

    // CH carbons: whether both configurations of the product differ (Epimerised) or not, worked out by hand.
    [Theory]
    [InlineData("CC1CCC(C)CC1", "CC1(Cl)CCC(C)CC1", StereoOutcome.Epimerised)]
    [InlineData("CC1CCCCC1", "CC1(Cl)CCCCC1", StereoOutcome.None)]
    [InlineData("CC1CCC(C)(C)CC1", "CC1(Cl)CCC(C)(C)CC1", StereoOutcome.None)]
    [InlineData("CC1CCC(C)(CC)CC1", "CC1(Cl)CCC(C)(CC)CC1", StereoOutcome.Epimerised)]
    [InlineData("CC1CCC(=O)CC1", "CC1(Cl)CCC(=O)CC1", StereoOutcome.None)]
    [InlineData("CC1CC2CC2C1", "CC1(Cl)CC2CC2C1", StereoOutcome.Epimerised)]
    [InlineData("CC1C2CCC1CC2", "CC1(Cl)C2CCC1CC2", StereoOutcome.None)]
    [InlineData("CC1CCC2(CC1)CCCCC2", "CC1(Cl)CCC2(CC1)CCCCC2", StereoOutcome.None)]
    [InlineData("CC(C)C", "CC(C)(C)Cl", StereoOutcome.None)]
    [InlineData("CCC(C)O", "CCC(C)(O)Cl", StereoOutcome.Epimerised)]
    [InlineData("CC1COC1", "CC1(Cl)COC1", StereoOutcome.None)]
    public void Enumerate_CH_carbon_has_the_outcome_worked_out_by_hand(string substrate, string product, StereoOutcome expected)
    {
        string wanted = ProductIdentity.SmilesOf(SmilesReader.Parse(product));

        Assert.Equal(expected, ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse(substrate)), 17).Products
            .Single(one => one.CanonicalSmiles == wanted).Stereo);
    }

    // Stereo outcome of the transposed products alone, in the order of their SMILES.
    [Theory]
    [InlineData("CC=C", "")]
    [InlineData("CC(C)=CC", "Racemic None")]
    [InlineData("CCC=C(C)C", "Racemic Diastereomers")]
    [InlineData("CN(C)CCC=C1c2ccccc2CCc2ccccc12", "Diastereomers")]
    [InlineData("CC1=CCCCC1", "Racemic Racemic")]
    [InlineData("CC1=CC(C)CCC1", "Diastereomers Diastereomers")]
    [InlineData("C[C@H](O)CC=C", "Diastereomers")]
    [InlineData("CC=C(C)C", "Racemic None")]
    [InlineData("C=CC=CC", "None")]
    public void Enumerate_transposed_products_have_the_outcome_worked_out_by_hand(string smiles, string expected)
    {
        string actual = string.Join(' ', ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse(smiles)), 17).Products
            .Where(static product => product.Route == ProductRoute.Transposed)
            .OrderBy(static product => product.CanonicalSmiles, StringComparer.Ordinal)
            .Select(static product => product.Stereo));

        Assert.Equal(expected, actual);
    }

    [Theory]
    [InlineData("CC1CCC2(C)C(CCC3C2CC=C2CC(O)CCC32C)C1")]
    [InlineData("CC(=O)Oc1ccccc1C(=O)OCC=C")]
    [InlineData("C[C@H]1CC[C@@H](C(C)C)[C@H](O)C1")]
    [InlineData("CN1CCC[C@H]1c1cccnc1")]
    [InlineData("C/C(=C\\CO)/CCC=C(C)C")]
    public void Enumerate_random_renumbering_gives_the_same_products(string smiles)
    {
        Molecule molecule = SmilesReader.Parse(smiles);
        string[] expected = Describe(smiles, 35);
        var random = new Random(20240601);
        for (int round = 0; round < 20; round++)
        {
            int[] ranks = [.. Enumerable.Range(0, molecule.AtomCount)];
            random.Shuffle(ranks);

            Assert.Equal(expected, Describe(SmilesWriter.Write(molecule, ranks), 35));
        }
    }

    [Fact]
    public void Enumerate_atom_map_leads_back_to_the_substrate()
    {
        Molecule molecule = SmilesReader.Parse("CC(C)Cc1ccc(cc1)C(C)C(=O)O");

        foreach (HalogenationProduct product in ProductEnumerator.Enumerate(SiteFinder.Find(molecule), 35).Products)
        {
            Assert.Equal(product.Molecule.AtomCount, product.SubstrateAtoms.Count);
            for (int atom = 0; atom < product.SubstrateAtoms.Count; atom++)
            {
                int origin = product.SubstrateAtoms[atom];
                Assert.Equal(
                    origin < 0 ? 35 : molecule.Atoms[origin].AtomicNumber, product.Molecule.Atoms[atom].AtomicNumber);
            }

            Assert.Equal(1, product.SubstrateAtoms.Count(static origin => origin < 0));
        }
    }

    [Fact]
    public void Enumerate_product_molecule_equals_its_own_SMILES_read_back()
    {
        Molecule molecule = SmilesReader.Parse("C[C@H]1CC[C@@H](C(C)C)[C@H](O)C1CC=C");

        foreach (HalogenationProduct product in ProductEnumerator.Enumerate(SiteFinder.Find(molecule), 9).Products)
        {
            Molecule read = SmilesReader.Parse(product.CanonicalSmiles);
            Assert.Equal(product.CanonicalSmiles, ProductIdentity.SmilesOf(read));
            Assert.Equal(product.Molecule.AtomCount, read.AtomCount);
            Assert.Equal(
                product.Molecule.Atoms.Sum(static atom => atom.HydrogenCount),
                read.Atoms.Sum(static atom => atom.HydrogenCount));
        }
    }

    [Theory]
    [InlineData("CCc1ccccc1", "product-ring-position-excluded")]
    [InlineData("CCC(=O)C=CC", "product-heteroatom-end-excluded")]
    [InlineData("C1CC2C=CC1C2", "product-strained-end-excluded")]
    public void Enumerate_says_what_was_left_out(string smiles, string code)
    {
        ProductSet set = ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse(smiles)), 17);

        Assert.Contains(set.Diagnostics, diagnostic => diagnostic.Code == code);
    }

    [Fact]
    public void Enumerate_limit_of_atoms_is_kept_and_said()
    {
        SiteAnalysis sites = SiteFinder.Find(SmilesReader.Parse(new string('C', 100)));

        ProductSet set = ProductEnumerator.Enumerate(sites, 17, new ProductOptions { AtomLimit = 1000 });

        Assert.Equal(10, set.Products.Count);
        Assert.Equal("product-atom-limit", set.Diagnostics.Single().Code);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(85)]
    public void Enumerate_other_element_is_refused(int element) =>
        Assert.Throws<ArgumentOutOfRangeException>(
            () => ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse("C")), element));

    private static string[] Describe(string substrate, int halogen) =>
    [
        .. ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse(substrate)), halogen).Products
            .Select(static product =>
                $"{product.CanonicalSmiles} {product.Degeneracy} {(product.Route == ProductRoute.Direct ? 'd' : 't')} {product.Stereo}")
            .Order(StringComparer.Ordinal),
    ];

    private static string Respell(string expected)
    {
        string[] parts = expected.Split(' ', 2);
        return $"{ProductIdentity.SmilesOf(SmilesReader.Parse(parts[0]))} {parts[1]}";
    }
}
