using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Heat;
using RadicalSites.Quantities;

namespace RadicalSites.Tests.Heat;

/// <summary>A batch reckoned by hand: 10 g of toluene, 1.1 equivalents of bromine in 100 mL of tetrachloromethane.</summary>
public sealed class HeatBalanceTests
{
    [Fact]
    public void Compute_toluene_batch_equals_the_hand_calculation()
    {
        HeatReport report = HeatBalance.Compute(
            SmilesReader.Parse("Cc1ccccc1"), HeatTables.FindReagent("Br2")!, [new SiteEnthalpy(1, 1, -32.6, 6)],
            new HeatOptions
            {
                Batch = Amount.FromGrams(10),
                Equivalents = 1.1,
                Solvent = HeatTables.FindSolvent("CCl4"),
                SolventMilliliters = 100,
                Start = Temperature.FromCelsius(70),
            });

        // 10 g / 92.141 g/mol = 0.10853 mol; x 1.1 = 0.11938 mol; x 32.6 kJ/mol = 3.892 kJ.
        Assert.Equal(0.11938, report.MolesReacting, 4);
        Assert.Equal(3.892, report.HeatKilojoules!.Value, 3);

        // Masses: 10 g + 19.08 g bromine + 158.4 g solvent; heat capacity 16 + 7.63 + 134.6 = 158.3 J/K; rise 24.6 K.
        Assert.Equal(187.5, report.MixtureGrams, 1);
        Assert.Equal(24.6, report.AdiabaticRiseKelvin!.Value, 1);

        // 70 C + 24.6 K is above 76.8 C.
        Assert.Contains(report.Diagnostics, static d => d.Code == "heat-passes-boiling-point");
        Assert.Equal("heat-standing-note", report.Diagnostics[^1].Code);
        Assert.Equal(3.41, report.Gases.Single().Liters, 2);
    }

    [Theory]
    [InlineData("5g", true, 5)]
    [InlineData("250 mg", true, 0.25)]
    [InlineData("2kg", true, 2000)]
    [InlineData("10mmol", false, 0.01)]
    public void TryParse_amount_with_unit_is_read(string text, bool isMass, double value)
    {
        Assert.True(Amount.TryParse(text, out Amount amount));
        Assert.Equal(isMass, amount.IsMass);
        Assert.Equal(value, amount.Value, 12);
    }

    [Theory]
    [InlineData("")]
    [InlineData("5")]
    [InlineData("-5g")]
    [InlineData("5 lb")]
    [InlineData("NaNg")]
    public void TryParse_amount_without_sense_is_refused(string text) => Assert.False(Amount.TryParse(text, out _));

    [Theory]
    [InlineData("O", 18.015)]
    [InlineData("CCO", 46.069)]
    [InlineData("[2H]O[2H]", 20.027)]
    public void Of_molar_mass_is_that_of_the_tables(string smiles, double mass) =>
        Assert.Equal(mass, RadicalSites.Molecules.MolecularFormula.Of(SmilesReader.Parse(smiles)).GramsPerMole!.Value, 2);
}
