using System;
using System.Collections.Generic;
using System.Linq;
using System.Threading;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;

namespace RadicalSites.Course;

/// <summary>Follows a substrate through mono-, di- and higher halogenation.</summary>
/// <remarks>
/// Every species is an independent target of the chain carrier: rate of a species = sum over its sites, products by the
/// shares of the sites. Rates of all species are on one scale, so the curve depends on their ratios only. Stateless and
/// safe for use by many threads.
/// </remarks>
public static partial class CourseCalculator
{
    /// <summary>Follows the course with rates from any source.</summary>
    /// <param name="substrate">The substrate.</param>
    /// <param name="carrier">Id of the chain carrier, for published ratios.</param>
    /// <param name="kelvin">Temperature [K].</param>
    /// <param name="react">Products and rates of a molecule.</param>
    /// <param name="options">Bounds.</param>
    /// <param name="cancellation">Ends the calculation.</param>
    internal static HalogenationCourse Follow(
        Molecule substrate, string carrier, double kelvin, Func<Molecule, SpeciesReactions> react,
        CourseOptions options, CancellationToken cancellation)
    {
        Check(options);
        var builder = new CourseNetworkBuilder(
            react, (smiles, known) => ConsecutiveRates.Default.Find(carrier, smiles, kelvin, known), options);
        CourseNetwork network = builder.Build(substrate, ProductIdentity.SmilesOf(substrate), cancellation);
        var diagnostics = new List<Diagnostic>();
        if (network.Steps.Count == 0)
        {
            diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Course.NoReaction, []));
        }

        (IReadOnlyList<CoursePoint> points, CourseOptimum? best) = CourseSolver.Solve(network, options);
        Remark(network, options, points, diagnostics);
        return new HalogenationCourse
        {
            Species = network.Species,
            Points = points,
            BestMono = best,
            ByProducts = ByProducts(network, options, points, best),
            TruncatedAtEnd = points[^1].Truncated,
            Diagnostics = diagnostics.AsReadOnly(),
        };
    }

    private static void Check(CourseOptions options)
    {
        ArgumentNullException.ThrowIfNull(options);
        Within(options.MaximumEquivalents, 1e-6, 1000, nameof(CourseOptions.MaximumEquivalents));
        Within(options.PointCount, 2, 10_001, nameof(CourseOptions.PointCount));
        Within(options.MaximumHalogens ?? 1, 1, 64, nameof(CourseOptions.MaximumHalogens));
        Within(options.SpeciesLimit, 2, 1000, nameof(CourseOptions.SpeciesLimit));
        Within(options.FollowThreshold, 0, 0.1, nameof(CourseOptions.FollowThreshold));
        Within(options.ByProductThreshold, 0, 1, nameof(CourseOptions.ByProductThreshold));
    }

    private static void Within(double value, double least, double most, string name)
    {
        if (!(value >= least && value <= most))
        {
            throw new ArgumentOutOfRangeException(name, value, $"The option is {least} to {most}.");
        }
    }

    private static void Remark(
        CourseNetwork network, CourseOptions options, IReadOnlyList<CoursePoint> points, List<Diagnostic> diagnostics)
    {
        if (network.LimitReached)
        {
            diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Course.SpeciesLimit, [], network.Species.Count));
        }

        if (points[^1].Truncated > 1e-4)
        {
            diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Course.Truncated, [], points[^1].Truncated));
        }

        if (network.Steps.Count > 0 && points.Count < options.PointCount)
        {
            diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Course.EndsEarly, [], points[^1].Equivalents));
        }

        string[] rows = [.. network.Species.SelectMany(static one => one.Evidence).Distinct().Order(StringComparer.Ordinal)];
        if (rows.Length > 0)
        {
            int measured = network.Species.Count(static one => one.RateBasis == CourseRateBasis.MeasuredRatio);
            diagnostics.Add(Diagnostic.Create(
                ProblemCatalogue.Course.MeasuredRatios, [], measured, string.Join(", ", rows)));
        }
    }

    private static CourseByProduct[] ByProducts(
        CourseNetwork network, CourseOptions options, IReadOnlyList<CoursePoint> points, CourseOptimum? best)
    {
        var found = new List<CourseByProduct>();
        for (int i = 1; i < network.Species.Count; i++)
        {
            CoursePoint largest = points[0];
            foreach (CoursePoint point in points)
            {
                if (point.Amounts[i] > largest.Amounts[i])
                {
                    largest = point;
                }
            }

            double atBest = best?.Point.Amounts[i] ?? 0;
            if (Math.Max(largest.Amounts[i], atBest) > options.ByProductThreshold)
            {
                found.Add(new CourseByProduct(
                    network.Species[i], atBest, Math.Max(largest.Amounts[i], atBest),
                    largest.Amounts[i] >= atBest ? largest.Equivalents : best!.Equivalents));
            }
        }

        found.Sort(static (left, right) =>
        {
            int byAmount = right.LargestAmount.CompareTo(left.LargestAmount);
            return byAmount != 0 ? byAmount : left.Species.Number.CompareTo(right.Species.Number);
        });
        return [.. found];
    }
}
