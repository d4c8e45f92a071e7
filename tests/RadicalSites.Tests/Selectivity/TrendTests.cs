using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.Selectivity;

/// <summary>Trends that a chemist looks at first; the source stands beside each.</summary>
public sealed class TrendTests
{
    // Walling, Free Radicals in Solution, 1957: bromine atoms discriminate far more than chlorine atoms.
    [Theory]
    [InlineData("CCC", 1)]
    [InlineData("CC(C)C", 1)]
    [InlineData("CCC(C)C", 2)]
    public void Bromine_is_more_selective_than_chlorine(string substrate, int weakest) =>
        Assert.True(Share(substrate, weakest, "Br2", 127) > Share(substrate, weakest, "Cl2", 127) + 0.15);

    // Hass, McBee & Weber 1936 for chlorine; textbook figures at 127 and 330 C for bromine: ratios fall as it gets hotter.
    [Theory]
    [InlineData("Cl2", 25, 300)]
    [InlineData("Br2", 127, 330)]
    public void Selectivity_falls_as_temperature_rises(string reagent, double cold, double hot)
    {
        Assert.True(Share("CCC", 1, reagent, cold) > Share("CCC", 1, reagent, hot));
        Assert.True(Share("CC(C)C", 1, reagent, cold) > Share("CC(C)C", 1, reagent, hot));
    }

    // Russell, J. Am. Chem. Soc. 1958, 80, 4987: benzene and carbon disulfide, the more of them the more selective.
    [Fact]
    public void Chlorine_in_benzene_or_carbon_disulfide_is_more_selective()
    {
        double inert = Share("CC(C)C(C)C", 1, "Cl2", 25, "CCl4");
        double dilute = Share("CC(C)C(C)C", 1, "Cl2", 25, "PhH@4M");
        double benzene = Share("CC(C)C(C)C", 1, "Cl2", 25, "PhH");
        double disulfide = Share("CC(C)C(C)C", 1, "Cl2", 25, "CS2");
        Assert.True(inert + 0.2 < dilute && dilute < benzene && benzene < disulfide);
    }

    // Fettis, Knox & Trotman-Dickenson, J. Chem. Soc. 1960, 1064: 1 : 1.2 : 1.4 per hydrogen.
    [Fact]
    public void Fluorine_is_nearly_statistical()
    {
        SelectivityResult result = Evaluate("CCC(C)C", "F2", 25);
        double[] rates = [.. result.Sites.Select(static site => site.RelativeRatePerHydrogen!.Value)];
        Assert.InRange(rates.Max() / rates.Min(), 1, 1.6);
    }

    // Russell & DeBoer, J. Am. Chem. Soc. 1963, 85, 3136: per hydrogen toluene beats a tertiary alkane with bromine.
    [Theory]
    [InlineData("CC(C)C.Cc1ccccc1")]
    [InlineData("CC(C)C.CC=C")]
    public void Bromine_prefers_benzylic_and_allylic_hydrogen(string pair)
    {
        SelectivityResult result = Evaluate(pair, "Br2", 60);
        Assert.Equal(result.Sites[2].RelativeRatePerHydrogen, result.Sites.Max(static site => site.RelativeRatePerHydrogen));
    }

    // Pearson & Martin, J. Am. Chem. Soc. 1963, 85, 354: rho -1.46 with sigma-plus for N-bromosuccinimide at 80 C.
    [Theory]
    [InlineData("Cc1ccc(C#N)cc1", 0.109)]
    [InlineData("Cc1cccc([N+](=O)[O-])c1", 0.092)]
    [InlineData("Cc1ccc(OC)cc1", 13.8)]
    public void Electron_poor_benzylic_sites_are_slower_with_bromine(string toluene, double againstToluene)
    {
        double rate = Evaluate(toluene, "NBS", 80).Sites[0].RelativeRatePerHydrogen!.Value;
        double parent = Evaluate("Cc1ccccc1", "NBS", 80).Sites[0].RelativeRatePerHydrogen!.Value;
        Assert.InRange(rate / parent / againstToluene, 1 / 1.4, 1.4);
    }

    // Tedder, Angew. Chem. Int. Ed. Engl. 1982, 21, 401: 0.8 : 2.1 : 3.7 : 1 per hydrogen at 75 C in the gas.
    [Fact]
    public void Chlorine_attacks_1_chlorobutane_away_from_chlorine()
    {
        double[] rates = [.. Evaluate("CCCCCl", "Cl2", 75, "gas").Sites.Select(static site => site.RelativeRatePerHydrogen!.Value)];
        Assert.True(rates[1] > rates[2] && rates[2] > rates[3]);
        Assert.InRange(rates[1] / rates[0], 3.0, 4.2);
    }

    // Deno, Fishbein & Wyckoff, J. Am. Chem. Soc. 1971, 93, 2065: the penultimate carbon leads.
    [Theory]
    [InlineData("CCCCCCC(=O)OC", 1)]
    [InlineData("CCCCCC(=O)O", 1)]
    [InlineData("CCCCCCC", 1)]
    public void Aminium_radicals_attack_the_penultimate_carbon(string substrate, int penultimate)
    {
        SelectivityResult result = Evaluate(substrate, "R2NCl-acid", 20, "H2SO4");
        Assert.Equal(result.Sites.Max(static site => site.Share), result.Sites[penultimate].Share);
    }

    // Tanner and co-workers, around 1980: 1 : 80 : 2300 per hydrogen at 190 C.
    [Fact]
    public void Trichloromethyl_is_more_selective_than_chlorine() =>
        Assert.True(Share("CC(C)C", 1, "BrCCl3", 190) > 0.99 && Share("CC(C)C", 1, "Cl2", 190) < 0.4);

    // J. Chem. Soc. B 1967, 1093: chlorination of protonated amines moves to the far end of the chain.
    [Fact]
    public void Ammonium_deactivates_its_neighbours()
    {
        double[] rates = [.. Evaluate("CCCC[NH3+]", "Cl2", 25).Sites.Take(3).Select(static site => site.RelativeRatePerHydrogen!.Value)];
        Assert.True(rates[1] > 5 * rates[2] && rates[0] > rates[2]);
    }

    // IUPAC data sheet of ethanol: 92 % of the attack beside oxygen; free amine as drawn is activated too (common practice).
    [Theory]
    [InlineData("CCO", 1)]
    [InlineData("CCCCN", 3)]
    public void Oxygen_and_free_amine_activate_their_carbon(string substrate, int beside)
    {
        SelectivityResult result = Evaluate(substrate, "Cl2", 25);
        Assert.Equal(result.Sites.Max(static site => site.RelativeRatePerHydrogen), result.Sites[beside].RelativeRatePerHydrogen);
    }

    // Common practice, no source: acceptors beside a carbon slow the chlorine atom down.
    [Theory]
    [InlineData("CCC(F)(F)F")]
    [InlineData("CCS(=O)(=O)C")]
    [InlineData("CCC#N")]
    [InlineData("CC[N+](=O)[O-]")]
    public void Acceptors_deactivate_their_neighbour(string substrate)
    {
        SelectivityResult result = Evaluate(substrate, "Cl2", 25);
        Assert.True(result.Sites[0].RelativeRatePerHydrogen > 3 * result.Sites[1].RelativeRatePerHydrogen);
    }

    // Knox & Nelson, Trans. Faraday Soc. 1959, 55, 937: cyclopropane is slower than ethane by more than 100 with chlorine;
    // Kooyman & Vegter 1958: no bridgehead chloride from norbornane.
    [Theory]
    [InlineData("C1CC1.CC", 0, 1)]
    [InlineData("C1CC2CCC1C2", 1, 0)]
    public void Strained_and_bridgehead_bonds_hardly_react(string substrate, int slow, int fast)
    {
        SelectivityResult result = Evaluate(substrate, "Cl2", 25);
        Assert.True(100 * result.Sites[slow].RelativeRatePerHydrogen < result.Sites[fast].RelativeRatePerHydrogen);
    }

    private static double Share(string smiles, int site, string reagent, double celsius, string? solvent = null) =>
        Evaluate(smiles, reagent, celsius, solvent).Sites[site].Share!.Value;

    private static SelectivityResult Evaluate(string smiles, string reagent, double celsius, string? solvent = null)
    {
        var conditions = new ReactionConditions(ReagentCatalogue.Get(reagent), Temperature.FromCelsius(celsius), solvent);
        RadicalSites.Sites.SiteAnalysis analysis = RadicalSites.Sites.SiteFinder.Find(SmilesReader.Parse(smiles));
        return new SelectivityModel(conditions).Evaluate(analysis, new BdeAssigner().Assign(analysis));
    }
}
