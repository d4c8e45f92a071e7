using System;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.Thermochemistry;

/// <summary>Increments fitted to the C-H table.</summary>
public sealed class IncrementRegressionTests
{
    private static readonly IncrementFit Fit = IncrementRegression.Fit();

    [Fact]
    public void Leave_one_out_errors_stay_within_the_aim()
    {
        Assert.True(Fit.MeanAbsoluteError <= 6, $"{Fit.MeanAbsoluteError:F2}");
        Assert.True(Fit.MeanAbsoluteErrorHydrocarbons <= 6.5, $"{Fit.MeanAbsoluteErrorHydrocarbons:F2}");
        Assert.True(Fit.LeaveOneOut.Count(static row => row.PredictedKilojoulesPerMole is not null) > 90);
    }

    [Fact]
    public void Base_terms_are_those_of_the_alkanes()
    {
        // Published hydrogen-bond increments of alkanes [LAY1995]: primary 423.0, secondary 411.9, tertiary 403.8.
        Assert.Equal(423.0, Term("base-1"), 3.0);
        Assert.Equal(411.9, Term("base-2"), 3.0);
        Assert.Equal(403.8, Term("base-3"), 4.0);
    }

    [Fact]
    public void Stabilising_groups_weaken_the_bond_and_repeats_weaken_it_less()
    {
        Assert.All(new[] { "aryl", "alkenyl", "alkynyl", "amine", "oxygen", "acyl", "nitrile" }, static group => Assert.True(Term("group-" + group) < -10));
        Assert.True(Term("group-aryl") < Term("repeat-aryl"));
        Assert.True(Term("group-alkenyl") < Term("repeat-alkenyl"));
        Assert.True(Term("unlike-pair") > 0);
        Assert.True(Term("ring-3") > 30);
        Assert.True(Term("bridgehead-5") > Term("bridgehead-6"));
    }

    [Fact]
    public void Published_hydrogen_bond_increments_agree_with_the_fit()
    {
        CsvTable published = CsvTable.ReadEmbedded(
            "hydrogen_bond_increments.csv", "id", "class", "smiles", "kilojoules_per_mole", "source", "locator");
        double[] errors = [.. published.Rows.Select(Error).OfType<double>()];

        Assert.True(errors.Length >= 15);
        Assert.True(errors.Average(Math.Abs) < 6, $"{errors.Average(Math.Abs):F2}");
    }

    [Theory]
    [InlineData("CH004")]
    [InlineData("CH018")]
    [InlineData("CH131")]
    public void Leave_one_out_equals_a_fit_without_the_row(string id)
    {
        LeaveOneOutRow row = Fit.LeaveOneOut.Single(row => row.Entry.Id == id);
        var text = new StringBuilder("id,bond,structure,kilojoules_per_mole,sigma,source,locator\n");
        foreach (BdeEntry entry in Fit.LeaveOneOut.Select(static other => other.Entry).Where(entry => entry.Id != id))
        {
            text.Append(string.Create(
                CultureInfo.InvariantCulture,
                $"{entry.Id},C-H,{entry.Smiles},{entry.KilojoulesPerMole},{entry.SigmaKilojoulesPerMole},{entry.Source},row\n"));
        }

        IncrementFit without = IncrementRegression.Fit(BdeTable.Parse("without.csv", text.ToString()));
        Site site = SiteFinder.Find(row.Entry.Molecule).SiteOf(row.Entry.Carbon)!;
        double predicted = IncrementTerms.Of(row.Entry.Molecule, site)
            .Sum(term => term.Value * without.Coefficients.Single(coefficient => coefficient.Term == term.Key).KilojoulesPerMole);

        // The refit finds a scatter of its own, so its weights differ a little.
        Assert.Equal(predicted, row.PredictedKilojoulesPerMole!.Value, 1.5);
    }

    [Fact]
    public void Shipped_increments_are_those_of_the_fit()
    {
        string folder = Path.Combine(RepositoryRoot.Path, "src", "RadicalSites", "Data");
        string increments = Increments();
        string covariance = Covariance();
        if (Environment.GetEnvironmentVariable("RADICALSITES_WRITE_INCREMENTS") == "1")
        {
            File.WriteAllText(Path.Combine(folder, "increments.csv"), increments);
            File.WriteAllText(Path.Combine(folder, "increment_covariance.csv"), covariance);
        }

        Same(increments, File.ReadAllText(Path.Combine(folder, "increments.csv")), 0.02);
        Same(covariance, File.ReadAllText(Path.Combine(folder, "increment_covariance.csv")), 0.05);
    }

    // Last digits of a decomposition differ between processors, so numbers are compared, not letters.
    private static void Same(string expected, string actual, double tolerance)
    {
        string[] left = expected.Split('\n');
        string[] right = actual.ReplaceLineEndings("\n").Split('\n');
        Assert.Equal(left.Length, right.Length);
        for (int i = 0; i < left.Length; i++)
        {
            string[] wanted = left[i].Split(',');
            string[] found = right[i].Split(',');
            Assert.Equal(wanted.Length, found.Length);
            for (int j = 0; j < wanted.Length; j++)
            {
                if (double.TryParse(wanted[j], NumberStyles.Float, CultureInfo.InvariantCulture, out double number))
                {
                    Assert.Equal(number, double.Parse(found[j], CultureInfo.InvariantCulture), tolerance);
                }
                else
                {
                    Assert.Equal(wanted[j], found[j]);
                }
            }
        }
    }

    private static double? Error(CsvRow row)
    {
        RadicalSites.Molecules.Molecule molecule = SmilesReader.Parse(row.Required("smiles"));
        SiteAnalysis analysis = SiteFinder.Find(molecule);
        int carbon = Enumerable.Range(0, molecule.AtomCount).Single(i => molecule.Atoms[i].AtomClass == 1);
        return analysis.SiteOf(carbon) is { } site
            ? IncrementTerms.Of(molecule, site).Sum(static term => term.Value * Term(term.Key)) - row.Number("kilojoules_per_mole", 250, 600)
            : null;
    }

    private static double Term(string name) => Fit.Coefficients.Single(coefficient => coefficient.Term == name).KilojoulesPerMole;

    private static string Increments()
    {
        var text = new StringBuilder("""
            # table: increments
            # quantity: increments of C-H bond dissociation enthalpies, unit: kJ/mol, temperature: 298.15 K
            # derived: weighted least squares over the preferred rows of the table bde; not from another source
            # standard_error: 1 standard deviation of the estimate; rows: rows in which the term acts
            term,kilojoules_per_mole,standard_error,rows

            """.ReplaceLineEndings("\n"));
        foreach (IncrementCoefficient coefficient in Fit.Coefficients)
        {
            text.Append(string.Create(
                CultureInfo.InvariantCulture,
                $"{coefficient.Term},{coefficient.KilojoulesPerMole:F2},{coefficient.StandardErrorKilojoulesPerMole:F2},{coefficient.Rows}\n"));
        }

        return text.ToString();
    }

    private static string Covariance()
    {
        var text = new StringBuilder("""
            # table: increment_covariance
            # quantity: covariance of the increments, unit: (kJ/mol)^2; upper triangle, pairs in the order of the table increments
            term,other,covariance

            """.ReplaceLineEndings("\n"));
        for (int i = 0; i < Fit.Coefficients.Count; i++)
        {
            for (int j = i; j < Fit.Coefficients.Count; j++)
            {
                text.Append(string.Create(
                    CultureInfo.InvariantCulture,
                    $"{Fit.Coefficients[i].Term},{Fit.Coefficients[j].Term},{Fit.Covariance[i][j]:F2}\n").Replace(",-0.00\n", ",0.00\n", StringComparison.Ordinal));
            }
        }

        return text.ToString();
    }
}
