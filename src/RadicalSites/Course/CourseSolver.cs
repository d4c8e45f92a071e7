using System;
using System.Collections.Generic;
using System.Linq;

namespace RadicalSites.Course;

/// <summary>Turns a network of species and steps into the curve, the best mono yield and the by-products.</summary>
/// <remarks>Stateless and safe for use by many threads.</remarks>
internal static class CourseSolver
{
    // Beyond this exposure, in units of the fastest loss, nothing that matters is left to react.
    private const double MaximumUnits = 1e15;

    internal static (IReadOnlyList<CoursePoint> Points, CourseOptimum? Best) Solve(
        CourseNetwork network, CourseOptions options)
    {
        int speciesCount = network.Species.Count;
        int total = speciesCount + network.PoolHalogens.Count;
        int[] halogens =
            [.. network.Species.Select(static species => species.HalogenCount), .. network.PoolHalogens];
        var propagator = new ExposurePropagator(total, network.Steps);
        double[] start = new double[total];
        start[0] = 1;
        double Consumed(double[] amounts) => Weigh(amounts, halogens);

        var points = new List<CoursePoint>(options.PointCount);
        double exposure = 0;
        double[] state = start;
        for (int i = 0; i < options.PointCount; i++)
        {
            double target = options.MaximumEquivalents * i / (options.PointCount - 1);
            // The very end of the curve is only approached; a billionth before it stands for it.
            double? found = propagator.Find(start, Consumed, target, MaximumUnits)
                ?? propagator.Find(start, Consumed, target * (1 - 1e-9), MaximumUnits);
            if (found is null)
            {
                break;
            }

            exposure = found.Value;
            state = propagator.Advance(start, exposure);
            points.Add(Describe(network, halogens, state, exposure, i == 0 ? 0 : target));
        }

        return (points, FindBestMono(network, halogens, propagator, start));
    }

    private static double Weigh(double[] amounts, int[] halogens)
    {
        double sum = 0;
        for (int i = 0; i < amounts.Length; i++)
        {
            sum += amounts[i] * halogens[i];
        }

        return sum;
    }

    private static CoursePoint Describe(
        CourseNetwork network, int[] halogens, double[] state, double exposure, double equivalents)
    {
        int speciesCount = network.Species.Count;
        double[] byCount = new double[1 + halogens.Max()];
        double truncated = 0;
        for (int i = 0; i < state.Length; i++)
        {
            byCount[halogens[i]] += state[i];
            truncated += i < speciesCount ? 0 : state[i];
        }

        return new CoursePoint
        {
            Equivalents = equivalents,
            Exposure = exposure,
            Conversion = Math.Clamp(1 - state[0], 0, 1),
            Amounts = state[..speciesCount],
            AmountsByHalogenCount = byCount,
            Truncated = truncated,
        };
    }

    private static CourseOptimum? FindBestMono(
        CourseNetwork network, int[] halogens, ExposurePropagator propagator, double[] start)
    {
        int[] mono = [.. Enumerable.Range(0, network.Species.Count).Where(i => halogens[i] == 1)];
        if (mono.Length == 0 || propagator.Unit == 0)
        {
            return null;
        }

        double Mono(double[] amounts) => mono.Sum(i => amounts[i]);

        // d(mono)/dx = made from the substrate - lost to di products; its last change of sign bounds the maximum.
        double MonoSlope(double[] amounts) => (amounts[0] * network.Steps.Where(static step => step.From == 0)
            .Where(step => step.To < network.Species.Count).Sum(static step => step.Rate))
            - mono.Sum(i => amounts[i] * propagator.LossOf(i));

        double low = 0;
        double high = propagator.Unit / 64;
        while (MonoSlope(propagator.Advance(start, high)) > 0 && high < MaximumUnits * propagator.Unit)
        {
            if (propagator.Advance(start, high)[0] < 1e-14)
            {
                break;
            }

            low = high;
            high *= 1.5;
        }

        double[] end = propagator.Advance(start, high);
        bool isLimit = MonoSlope(end) > 0;
        for (int i = 0; i < 80 && !isLimit && high - low > 1e-15 * high; i++)
        {
            double middle = 0.5 * (low + high);
            if (MonoSlope(propagator.Advance(start, middle)) > 0)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        double[] state = propagator.Advance(start, high);
        CoursePoint point = Describe(network, halogens, state, high, Weigh(state, halogens));
        return new CourseOptimum(point.Equivalents, point.Conversion, Mono(state), isLimit, point);
    }
}
