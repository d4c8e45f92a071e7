using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Course;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Sites;

namespace RadicalSites.Tests.Course;

/// <summary>Courses with given rates against closed forms and published product curves.</summary>
public class CourseCalculatorTests
{
    [Fact]
    public void Follow_methane_keeps_mass_and_halogen()
    {
        HalogenationCourse course = Follow("C", 713.15, new CourseOptions { MaximumEquivalents = 3.9 });

        Assert.Equal(5, course.Species.Count);
        foreach (CoursePoint point in course.Points)
        {
            Assert.Equal(1, point.Amounts.Sum() + point.Truncated, 12);
            Assert.Equal(point.Equivalents, point.Amounts.Select(static (amount, i) => i * amount).Sum(), 10);
            Assert.Equal(0, point.Truncated, 12);
        }
    }

    [Fact]
    public void Follow_methane_equals_the_Bateman_solution_with_the_measured_ratios()
    {
        // Ratios at 440 C from the rate constants of Bryukov, Slagle and Knyazev, J. Phys. Chem. A 2002, 106, 10532.
        double[] rates = [1, 1.81, 0.939, 0.355];
        HalogenationCourse course = Follow("C", 713.15, new CourseOptions());

        foreach (CoursePoint point in course.Points)
        {
            for (int n = 0; n < 4; n++)
            {
                Assert.Equal(Bateman(rates, n, point.Exposure), point.Amounts[n], 11);
            }
        }
    }

    [Fact]
    public void Follow_methane_near_440_C_gives_the_industrial_product_ratio()
    {
        // Thermal chlorination of methane near 440 C: CH3Cl 37, CH2Cl2 41, CHCl3 19, CCl4 3 mol % of the chloromethanes
        // (Weissermel and Arpe, Industrial Organic Chemistry, chapter on halogen derivatives of methane; from memory).
        // The same mean chlorine content, 1.88 per molecule, marks the point of the curve to compare.
        HalogenationCourse course = Follow("C", 713.15, new CourseOptions { MaximumEquivalents = 2, PointCount = 401 });
        CoursePoint point = course.Points.Skip(1).MinBy(
            static point => Math.Abs((point.Equivalents / point.Conversion) - 1.88))!;
        double[] percent = [.. point.Amounts.Skip(1).Select(amount => 100 * amount / point.Conversion)];

        Assert.InRange(percent[0], 37 - 3, 37 + 3);
        Assert.InRange(percent[1], 41 - 3, 41 + 3);
        Assert.InRange(percent[2], 19 - 3, 19 + 3);
        Assert.InRange(percent[3], 3 - 3, 3 + 3);
    }

    [Fact]
    public void Follow_toluene_one_equivalent_gives_mainly_benzyl_chloride()
    {
        // 100 g of boiling toluene that has gained 37 g: benzyl chloride "forms the greater part of the product", then come
        // unchanged toluene and some benzal chloride (Cohen, Practical Organic Chemistry, preparation of benzyl chloride).
        double equivalents = 37 / (35.45 - 1.008) / (100 / 92.14);
        HalogenationCourse course = Follow(
            "Cc1ccccc1", 383.15, new CourseOptions { MaximumEquivalents = equivalents, PointCount = 2 });

        IReadOnlyList<double> amounts = course.Points[^1].Amounts;
        Assert.True(amounts[1] > 0.5);
        Assert.True(amounts[1] > amounts[0] && amounts[0] > amounts[2] && amounts[2] > amounts[3]);
    }

    [Theory]
    [InlineData(0.167, 0.0278)]
    public void Follow_toluene_reaches_the_known_yield_of_benzyl_chloride(double second, double third)
    {
        // Best benzyl chloride for A -> B -> C with ratio r = k2 / k1 is r^(r / (1 - r)); about 70 mol % near 1.1 mol Cl2
        // is the content reported for side-chain chlorination of toluene (Ullmann's Encyclopedia, from memory).
        HalogenationCourse course = Follow("Cc1ccccc1", 373.15, new CourseOptions());

        Assert.Equal(Math.Pow(second, second / (1 - second)), course.BestMono!.MonoYield, 10);
        Assert.InRange(course.BestMono.MonoYield, 0.65, 0.75);
        Assert.InRange(course.BestMono.Equivalents, 1.0, 1.2);
        Assert.Equal([1, second, third, 0], course.Species.Select(static one => Math.Round(one.RelativeRate, 6)));
        Assert.Equal(
            ["Cc1ccccc1", "ClCc1ccccc1", "ClC(Cl)c1ccccc1", "ClC(Cl)(Cl)c1ccccc1"],
            course.Species.Select(static one => one.CanonicalSmiles).Select(Plain));
        CoursePoint atTwo = course.Points.Single(static point => Math.Abs(point.Equivalents - 2) < 1e-9);
        Assert.Equal(3, atTwo.Amounts.ToList().IndexOf(atTwo.Amounts.Max()) + 1);
    }

    [Fact]
    public void Follow_limit_of_species_is_kept_and_said()
    {
        HalogenationCourse course = Follow(
            "CCCCCCCC", 298.15, new CourseOptions { SpeciesLimit = 20, FollowThreshold = 0 });

        Assert.Equal(20, course.Species.Count);
        Assert.Contains(course.Diagnostics, static diagnostic => diagnostic.Code == "course-species-limit");
        Assert.Contains(course.Diagnostics, static diagnostic => diagnostic.Code == "course-truncated");
        Assert.All(course.Points, static point => Assert.Equal(1, point.Amounts.Sum() + point.Truncated, 11));
    }

    [Fact]
    public void Follow_lower_threshold_only_moves_truncated_amounts()
    {
        HalogenationCourse fine = Follow("CCC", 298.15, new CourseOptions { FollowThreshold = 0, MaximumHalogens = 8 });
        HalogenationCourse coarse = Follow("CCC", 298.15, new CourseOptions { FollowThreshold = 0.05, MaximumHalogens = 8 });

        Assert.Equal(30, fine.Species.Count);
        Assert.Equal(0, fine.TruncatedAtEnd, 12);
        Assert.True(coarse.TruncatedAtEnd > 0);
        Assert.Equal(fine.BestMono!.MonoYield, coarse.BestMono!.MonoYield, 10);
    }

    [Theory]
    [InlineData("C", 4)]
    [InlineData("CC", 6)]
    [InlineData("Cc1ccccc1", 3)]
    public void Follow_curve_reaches_the_end_where_no_hydrogen_is_left(string smiles, int hydrogens)
    {
        HalogenationCourse course = Follow(
            smiles, 298.15, new CourseOptions { MaximumEquivalents = hydrogens, FollowThreshold = 0 });

        Assert.Equal(61, course.Points.Count);
        Assert.Equal(1, course.Points[^1].Amounts[^1], 8);
        Assert.DoesNotContain(course.Diagnostics, static diagnostic => diagnostic.Code == "course-ends-early");
    }

    [Fact]
    public void Follow_curve_ends_early_where_more_halogen_is_asked_for_than_there_is_hydrogen()
    {
        HalogenationCourse course = Follow("C", 298.15, new CourseOptions { MaximumEquivalents = 8, PointCount = 9 });

        Assert.Equal(5, course.Points.Count);
        Assert.Contains(course.Diagnostics, static diagnostic => diagnostic.Code == "course-ends-early");
    }

    [Fact]
    public void Follow_no_hydrogen_has_no_course()
    {
        HalogenationCourse course = Follow("ClC(Cl)(Cl)Cl", 298.15, new CourseOptions());

        Assert.Null(course.BestMono);
        Assert.Single(course.Points);
        Assert.Contains(course.Diagnostics, static diagnostic => diagnostic.Code == "course-no-reaction");
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(double.NaN)]
    [InlineData(1001.0)]
    public void Follow_option_out_of_range_is_refused(double equivalents) => Assert.Throws<ArgumentOutOfRangeException>(
        () => Follow("C", 298.15, new CourseOptions { MaximumEquivalents = equivalents }));

    // Every hydrogen at the same rate, so that only published ratios make a difference.
    private static HalogenationCourse Follow(string smiles, double kelvin, CourseOptions options) =>
        CourseCalculator.Follow(
            SmilesReader.Parse(smiles), "Cl", kelvin,
            static molecule => new SpeciesReactions(
            [
                .. ProductEnumerator.Enumerate(SiteFinder.Find(molecule), 17).Products
                    .Select(static product => new SpeciesReaction(product.CanonicalSmiles, product.Molecule, product.Degeneracy)),
            ]),
            options, default);

    private static string Plain(string smiles) => ProductIdentity.SmilesOf(SmilesReader.Parse(smiles));

    private static double Bateman(double[] rates, int n, double exposure)
    {
        double product = 1;
        for (int i = 0; i < n; i++)
        {
            product *= rates[i];
        }

        double sum = 0;
        for (int i = 0; i <= n; i++)
        {
            double denominator = 1;
            for (int j = 0; j <= n; j++)
            {
                denominator *= i == j ? 1 : rates[j] - rates[i];
            }

            sum += Math.Exp(-rates[i] * exposure) / denominator;
        }

        return product * sum;
    }
}
