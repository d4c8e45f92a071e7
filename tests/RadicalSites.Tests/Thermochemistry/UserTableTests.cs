using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.Thermochemistry;

/// <summary>Tables of users: overlay, evidence, errors with line and column.</summary>
public sealed class UserTableTests
{
    private const string Header = "id,bond,structure,kilojoules_per_mole,sigma,source,locator\n";

    [Fact]
    public void Overlay_own_bond_answers_before_the_shipped_one()
    {
        BdeTable table = BdeTable.Parse("own.csv", Header + "x1,C-H,C[CH2:1]C,409.0,1.5,OWN,page 3\n").Overlay(BdeTable.Default);

        SiteReport report = Halogenation.FindSites(SmilesReader.Parse("CCC"), new HalogenationOptions { Table = table });

        BdeAssignment secondary = report.Sites[1].Bde;
        Assert.Equal(409.0, secondary.KilojoulesPerMole);
        Assert.Equal("x1", secondary.Evidence[0].Entry);
        Assert.Equal(423.9, report.Sites[0].Bde.KilojoulesPerMole);
        Assert.StartsWith("own.csv+shipped", table.Name, System.StringComparison.Ordinal);
        Assert.Contains(table.Version, report.DataVersion, System.StringComparison.Ordinal);
    }

    [Fact]
    public void Table_alone_has_no_value_where_it_is_silent()
    {
        BdeTable table = BdeTable.Parse("own.csv", Header + "x1,C-H,[CH3:1]CC,430,1,OWN,page 3\n");

        SiteReport report = Halogenation.FindSites(SmilesReader.Parse("CCC"), new HalogenationOptions { Table = table });

        Assert.Equal(430, report.Sites[0].Bde.KilojoulesPerMole);
        Assert.Equal(BdeBasis.None, report.Sites[1].Bde.Basis);
        Assert.NotEmpty(report.Sites[1].Bde.Reason!);
    }

    [Fact]
    public void FindEntries_bond_with_several_sources_lists_the_preferred_first()
    {
        SiteReport report = Halogenation.FindSites(SmilesReader.Parse("Cc1ccccc1"));

        BdeEntry[] entries = [.. BdeTable.Default.FindEntries(report.Analysis, report.Sites[0].Site)];

        Assert.True(entries.Length >= 3);
        Assert.True(entries[0].IsPreferred);
        Assert.Equal(["CH018", "CH091", "CH112"], entries.Select(static e => e.Id).Order());
    }

    [Theory]
    [InlineData("a,C-H,CC,400,1,S,l", 2, "structure")]
    [InlineData("a,C-H,[CH3:1][CH3:1],400,1,S,l", 2, "structure")]
    [InlineData("a,C-H,C[CH2:1,400,1,S,l", 2, "structure")]
    [InlineData("a,C-H,[CH3:1]C,4000,1,S,l", 2, "kilojoules_per_mole")]
    [InlineData("a,C-H,[CH3:1]C,\"400,5\",1,S,l", 2, "kilojoules_per_mole")]
    [InlineData("a,C-H,[CH3:1]C,400,-1,S,l", 2, "sigma")]
    [InlineData("a,C-H,[CH3:1]C,400,1,,l", 2, "source")]
    [InlineData("a,foo,[CH3:1]C,400,1,S,l", 2, "bond")]
    [InlineData("a,class,quaternary,400,1,S,l", 2, "structure")]
    [InlineData("a,C-H,[CH3:1]C,400,1,S,l\na,C-H,[CH4:1],400,1,S,l", 3, "id")]
    [InlineData("a,C-H,[CH3:1]C,400,1,S,l\nb,C-H,[CH3:1]C,401,1,S,l", 3, "structure")]
    [InlineData("a,C-H,[CH3:1]C,400,1,S", 2, "")]
    public void Parse_wrong_row_names_line_and_column(string rows, int line, string column)
    {
        var error = Assert.Throws<TableFormatException>(() => BdeTable.Parse("own.csv", Header + rows));

        Assert.Equal(line, error.Line);
        Assert.Equal(column, error.Column);
        Assert.StartsWith("own.csv, line ", error.Message, System.StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("id,bond,structure\n")]
    [InlineData("")]
    [InlineData(Header + "extra")]
    public void Parse_wrong_columns_are_refused(string text) =>
        Assert.Throws<TableFormatException>(() => BdeTable.Parse("own.csv", text));

    [Theory]
    [InlineData("C[N+](C)(C)C")]
    [InlineData("CC(=O)[O-]")]
    [InlineData("CP(C)C")]
    public void FindSites_bond_outside_the_classes_has_no_value_and_a_reason(string smiles)
    {
        SiteReport report = Halogenation.FindSites(SmilesReader.Parse(smiles));

        Assert.All(report.Sites, static site => Assert.Equal(BdeBasis.None, site.Bde.Basis));
        Assert.Contains(report.Diagnostics, static d => d.Code == "bde-none");
    }
}
