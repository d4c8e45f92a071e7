using RadicalSites.Diagnostics;
using RadicalSites.Selectivity;

namespace RadicalSites.Tests.Selectivity;

/// <summary>Calibration files.</summary>
public sealed class SelectivityCalibrationTests
{
    [Fact]
    public void Parse_what_ToText_wrote_gives_the_same_shifts()
    {
        SelectivityCalibration read = SelectivityCalibration.Parse("again", SelectivityCalibration.Default.ToText("first line\nsecond"));
        foreach (SelectivityParameter parameter in SelectivityCalibration.Parameters)
        {
            (double shift, double sigma) = SelectivityCalibration.Default.ShiftOf(parameter.Name);
            (double readShift, double readSigma) = read.ShiftOf(parameter.Name);
            Assert.Equal(shift, readShift, 3);
            Assert.Equal(sigma, readSigma, 3);
        }
    }

    [Theory]
    [InlineData("parameter,shift,sigma\nCl/Quaternary,0.1,0.1\n", 2, "parameter")]
    [InlineData("parameter,shift,sigma\nCl/Secondary,0.1,0.1\nCl/Secondary,0.2,0.1\n", 3, "parameter")]
    [InlineData("parameter,shift,sigma\nCl/Secondary,NaN,0.1\n", 2, "shift")]
    [InlineData("parameter,shift,sigma\nCl/Secondary,0.1,-1\n", 2, "sigma")]
    [InlineData("parameter,move,sigma\nCl/Secondary,0.1,0.1\n", 1, "shift")]
    public void Parse_nonsense_is_refused_with_line_and_column(string text, int line, string column)
    {
        TableFormatException exception = Assert.Throws<TableFormatException>(() => SelectivityCalibration.Parse("file", text));
        Assert.Equal(line, exception.Line);
        Assert.Equal(column, exception.Column);
    }

    [Fact]
    public void Evaluate_with_a_shift_moves_the_share_as_it_should()
    {
        SelectivityCalibration shifted = SelectivityCalibration.Parse("file", "parameter,shift,sigma\nCl/Secondary,0.693147,0.1\n");
        double before = Secondary(SelectivityCalibration.None);
        double after = Secondary(shifted);
        Assert.Equal(2, after / (1 - after) / (before / (1 - before)), 3);
    }

    private static double Secondary(SelectivityCalibration calibration)
    {
        var conditions = new ReactionConditions(ReagentCatalogue.Get("Cl2"), null, "gas");
        RadicalSites.Sites.SiteAnalysis analysis =
            RadicalSites.Sites.SiteFinder.Find(RadicalSites.Formats.Smiles.SmilesReader.Parse("CCC"));
        return new SelectivityModel(conditions, null, calibration)
            .Evaluate(analysis, new RadicalSites.Thermochemistry.BdeAssigner().Assign(analysis)).Sites[1].Share!.Value;
    }
}
