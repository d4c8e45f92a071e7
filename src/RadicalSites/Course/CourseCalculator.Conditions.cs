using System;
using System.Collections.Generic;
using System.Linq;
using System.Threading;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Course;

public static partial class CourseCalculator
{
    /// <summary>Follows the course under given conditions with the rates of the selectivity model.</summary>
    /// <param name="substrate">The substrate.</param>
    /// <param name="conditions">Reagent, temperature and solvent.</param>
    /// <param name="options">Bounds, or <see langword="null"/> for the defaults.</param>
    /// <param name="table">Table of bond enthalpies; the shipped one when not given.</param>
    /// <param name="calibration">Fitted parameters; the shipped fit when not given.</param>
    /// <param name="cancellation">Ends the calculation.</param>
    /// <returns>
    /// Species, curve, best mono yield and by-products; a single point and no optimum when no site of the substrate reacts.
    /// </returns>
    /// <exception cref="ArgumentOutOfRangeException">An option is out of its range.</exception>
    public static HalogenationCourse Follow(
        Molecule substrate, ReactionConditions conditions, CourseOptions? options = null, BdeTable? table = null,
        SelectivityCalibration? calibration = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(substrate);
        ArgumentNullException.ThrowIfNull(conditions);
        var rates = new ModelReactions(conditions, table ?? BdeTable.Default, calibration);
        HalogenationCourse course = Follow(
            substrate, conditions.Reagent.Carrier.Id, conditions.Temperature.Kelvin, rates.Of,
            options ?? new CourseOptions(), cancellation);
        return course with { Diagnostics = [.. course.Diagnostics, .. rates.Remarks()] };
    }

    /// <summary>Products and rates of any molecule by the selectivity model, with a count of what it could not tell.</summary>
    private sealed class ModelReactions(
        ReactionConditions conditions, BdeTable table, SelectivityCalibration? calibration)
    {
        private static readonly ProductOptions Options = new() { GivesUnknownSplitToDirect = true };

        private readonly SelectivityModel model = new(conditions, table, calibration);
        private readonly BdeAssigner assigner = new(table);
        private readonly SortedSet<string> unsplit = new(StringComparer.Ordinal);
        private int unrated;

        internal SpeciesReactions Of(Molecule molecule)
        {
            SiteAnalysis analysis = SiteFinder.Find(molecule);
            if (analysis.Sites.Count == 0)
            {
                return new SpeciesReactions([]);
            }

            SelectivityResult result = model.Evaluate(analysis, assigner.Assign(analysis));
            double total = 0;
            bool complete = true;
            for (int i = 0; i < analysis.Sites.Count; i++)
            {
                double? rate = result.Sites[i].Share is null ? null : result.Sites[i].RelativeRatePerHydrogen;
                complete &= rate is not null;
                total += analysis.Sites[i].HydrogenCount * (rate ?? 0);
            }

            unrated += complete ? 0 : 1;
            if (!(total > 0))
            {
                return new SpeciesReactions([]);
            }

            ProductSet set = ProductEnumerator.Enumerate(
                analysis, conditions.Reagent.Halogen, new SelectivityShares(result), Options);
            if (set.Diagnostics.Any(static one => one.Code == ProblemCatalogue.Products.EndSplitUnknown.Code))
            {
                unsplit.Add(ProductIdentity.SmilesOf(molecule));
            }

            return new SpeciesReactions(
            [
                .. set.Products.Where(static product => product.Share > 0)
                    .Select(product => new SpeciesReaction(
                        product.CanonicalSmiles, product.Molecule, total * product.Share!.Value)),
            ]);
        }

        internal IEnumerable<Diagnostic> Remarks()
        {
            if (unrated > 0)
            {
                yield return Diagnostic.Create(ProblemCatalogue.Course.SitesWithoutRate, [], unrated);
            }

            if (unsplit.Count > 0)
            {
                yield return Diagnostic.Create(
                    ProblemCatalogue.Course.SplitUnknown, [], string.Join(", ", unsplit.Take(5)));
            }
        }
    }
}
