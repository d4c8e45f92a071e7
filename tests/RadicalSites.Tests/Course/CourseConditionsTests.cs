using System.Linq;
using RadicalSites.Course;
using RadicalSites.Formats.Smiles;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;

namespace RadicalSites.Tests.Course;

/// <summary>Courses with the rates of the selectivity model.</summary>
public class CourseConditionsTests
{
    [Fact]
    public void Follow_toluene_with_bromine_stops_well_at_benzyl_bromide()
    {
        // One equivalent gives mainly the monobromide; the gem-dibromide needs a second one (common practice, no source).
        HalogenationCourse course = CourseCalculator.Follow(
            SmilesReader.Parse("Cc1ccccc1"), Conditions("NBS", 77), new CourseOptions { MaximumEquivalents = 2 });

        Assert.InRange(course.BestMono!.MonoYield, 0.6, 0.9);
        Assert.InRange(course.BestMono.Equivalents, 0.9, 1.2);
        CoursePoint last = course.Points[^1];
        Assert.True(last.AmountsByHalogenCount[2] > last.AmountsByHalogenCount[1]);
    }

    [Fact]
    public void Follow_propane_with_chlorine_keeps_mass_and_halogen()
    {
        HalogenationCourse course = CourseCalculator.Follow(
            SmilesReader.Parse("CCC"), Conditions("Cl2", 25), new CourseOptions { MaximumHalogens = 8, FollowThreshold = 0 });

        Assert.Equal(30, course.Species.Count);
        Assert.All(course.Points, point =>
        {
            Assert.Equal(1, point.Amounts.Sum() + point.Truncated, 11);
            Assert.Equal(
                point.Equivalents,
                point.Amounts.Select((amount, i) => amount * course.Species[i].HalogenCount).Sum(), 9);
        });
    }

    [Fact]
    public void Follow_small_conversion_has_the_shares_of_the_prediction()
    {
        ReactionConditions conditions = Conditions("Cl2", 25);
        HalogenationCourse course = CourseCalculator.Follow(
            SmilesReader.Parse("CCCC"), conditions, new CourseOptions { MaximumEquivalents = 1e-5, PointCount = 2 });
        Prediction prediction = Halogenation.Predict(SmilesReader.Parse("CCCC"), conditions);

        foreach (CourseSpecies species in course.Species.Where(static one => one.HalogenCount == 1))
        {
            double share = course.Points[^1].Amounts[species.Number - 1] / course.Points[^1].AmountsByHalogenCount[1];
            double? predicted = prediction.Products.Single(product => product.CanonicalSmiles == species.CanonicalSmiles).Share;
            Assert.Equal(predicted!.Value, share, 4);
        }
    }

    [Fact]
    public void Follow_unknown_split_is_said()
    {
        HalogenationCourse course = CourseCalculator.Follow(SmilesReader.Parse("CC=CCC"), Conditions("Cl2", 25));

        Assert.Contains(course.Diagnostics, static diagnostic => diagnostic.Code == "course-split-unknown");
    }

    private static ReactionConditions Conditions(string reagent, double celsius) =>
        new(ReagentCatalogue.Get(reagent), Temperature.FromCelsius(celsius));
}
