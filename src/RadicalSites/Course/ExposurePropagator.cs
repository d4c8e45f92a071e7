using System;
using System.Collections.Generic;

namespace RadicalSites.Course;

/// <summary>Exact solution of a network of first-order steps in the integrated exposure to the chain carrier.</summary>
/// <remarks>
/// With x = integral of the carrier concentration over time every abstraction is of first order in x, so the amounts obey
/// dN/dx = A N with a triangular A (a step always adds a halogen). exp(A x) is built from the shifted matrix
/// A + qI, which has no negative element, so nothing cancels; doubling gives exp(A x) for x = 2^m / q, with the diagonal
/// set to exp(-K x) and the columns held to the conserved sum. Equal rates (a defective matrix) need no special case.
/// Immutable results, but an instance caches its matrices and belongs to one thread.
/// </remarks>
internal sealed class ExposurePropagator
{
    private const int MaximumDoublings = 900;
    private readonly int count;
    private readonly int[] offsets;
    private readonly int[] targets;
    private readonly double[] rates;
    private readonly double[] losses;
    private readonly double shift;
    private readonly List<double[]> powers = [];

    /// <summary>Takes a network in topological order.</summary>
    /// <param name="count">Number of species.</param>
    /// <param name="steps">Steps (from, to, rate); to is greater than from, rate is positive.</param>
    internal ExposurePropagator(int count, IReadOnlyList<(int From, int To, double Rate)> steps)
    {
        this.count = count;
        offsets = new int[count + 1];
        targets = new int[steps.Count];
        rates = new double[steps.Count];
        losses = new double[count];
        foreach ((int from, int to, double rate) in steps)
        {
            if (to <= from || !(rate > 0) || !double.IsFinite(rate))
            {
                throw new ArgumentException("Steps lead forward and have positive, finite rates.", nameof(steps));
            }

            offsets[from + 1]++;
            losses[from] += rate;
        }

        for (int i = 0; i < count; i++)
        {
            offsets[i + 1] += offsets[i];
        }

        int[] next = offsets[..^1];
        foreach ((int from, int to, double rate) in steps)
        {
            targets[next[from]] = to;
            rates[next[from]++] = rate;
        }

        foreach (double loss in losses)
        {
            shift = Math.Max(shift, loss);
        }
    }

    /// <summary>Total rate at which a species reacts.</summary>
    internal double LossOf(int species) => losses[species];

    /// <summary>Exposure unit: the inverse of the largest loss rate; 0 when nothing reacts.</summary>
    internal double Unit => shift == 0 ? 0 : 1 / shift;

    /// <summary>Amounts after a further exposure.</summary>
    /// <param name="start">Amounts at the start.</param>
    /// <param name="exposure">Further exposure, 0 or more.</param>
    /// <returns>A new array of amounts.</returns>
    internal double[] Advance(double[] start, double exposure)
    {
        double[] amounts = (double[])start.Clone();
        if (shift == 0 || exposure == 0)
        {
            return amounts;
        }

        double units = exposure * shift;
        double whole = Math.Floor(units);
        for (int bit = 0; whole > 0 && bit < MaximumDoublings; bit++)
        {
            double half = Math.Floor(whole / 2);
            if (whole - (2 * half) > 0)
            {
                amounts = Multiply(Power(bit), amounts);
            }

            whole = half;
        }

        return Short(amounts, (units - Math.Floor(units)) / shift);
    }

    /// <summary>Smallest exposure at which a rising quantity reaches its target.</summary>
    /// <param name="start">Amounts at the start.</param>
    /// <param name="quantity">A quantity of the amounts that never falls with exposure.</param>
    /// <param name="target">Value to reach.</param>
    /// <param name="maximumUnits">Exposure, in units, at which the search ends.</param>
    /// <returns>The exposure, or <see langword="null"/> when the target lies beyond the end.</returns>
    internal double? Find(double[] start, Func<double[], double> quantity, double target, double maximumUnits)
    {
        if (quantity(start) >= target)
        {
            return 0;
        }

        if (shift == 0)
        {
            return null;
        }

        int top = 0;
        while (quantity(Multiply(Power(top), start)) < target)
        {
            if (Math.ScaleB(1, ++top) > maximumUnits)
            {
                return null;
            }
        }

        // Binary digits of the exposure from the top: each doubling matrix is exact, so the digits are too.
        double[] amounts = start;
        double units = 0;
        for (int bit = top - 1; bit >= 0; bit--)
        {
            double[] trial = Multiply(Power(bit), amounts);
            if (quantity(trial) < target)
            {
                amounts = trial;
                units += Math.ScaleB(1, bit);
            }
        }

        double low = 0;
        double high = 1;
        for (int i = 0; i < 60 && high - low > 1e-16 * (units + high); i++)
        {
            double middle = 0.5 * (low + high);
            if (quantity(Short(amounts, middle / shift)) < target)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return (units + high) / shift;
    }

    // exp(A x) of a vector for x up to one unit: Taylor series of the shifted matrix, all terms of one sign.
    private double[] Short(double[] start, double exposure)
    {
        double[] sum = (double[])start.Clone();
        double[] term = (double[])start.Clone();
        double[] next = new double[count];
        for (int order = 1; order < 60; order++)
        {
            double largest = 0;
            double factor = exposure / order;
            Array.Clear(next);
            for (int i = 0; i < count; i++)
            {
                double amount = term[i];
                if (amount == 0)
                {
                    continue;
                }

                next[i] += amount * (shift - losses[i]) * factor;
                for (int k = offsets[i]; k < offsets[i + 1]; k++)
                {
                    next[targets[k]] += amount * rates[k] * factor;
                }
            }

            (term, next) = (next, term);
            for (int i = 0; i < count; i++)
            {
                sum[i] += term[i];
                largest = Math.Max(largest, sum[i] == 0 ? 0 : term[i] / sum[i]);
            }

            if (largest < 1e-18)
            {
                break;
            }
        }

        double scale = Math.Exp(-exposure * shift);
        for (int i = 0; i < count; i++)
        {
            sum[i] *= scale;
        }

        return sum;
    }

    // Column-major lower triangle: column j holds what one mole of j has become after 2^bit units.
    private double[] Power(int bit)
    {
        while (powers.Count <= bit)
        {
            powers.Add(powers.Count == 0 ? FirstPower() : Square(powers[^1], powers.Count));
        }

        return powers[bit];
    }

    private double[] FirstPower()
    {
        double[] matrix = new double[count * count];
        for (int column = 0; column < count; column++)
        {
            double[] unit = new double[count];
            unit[column] = 1;
            Short(unit, 1 / shift).CopyTo(matrix, column * count);
            Conserve(matrix.AsSpan(column * count, count), column, 1 / shift);
        }

        return matrix;
    }

    private double[] Square(double[] matrix, int bit)
    {
        double[] result = new double[count * count];
        for (int column = 0; column < count; column++)
        {
            Span<double> target = result.AsSpan(column * count, count);
            for (int middle = column; middle < count; middle++)
            {
                double weight = matrix[(column * count) + middle];
                if (weight == 0)
                {
                    continue;
                }

                ReadOnlySpan<double> source = matrix.AsSpan((middle * count) + middle, count - middle);
                Span<double> rest = target[middle..];
                for (int row = 0; row < rest.Length; row++)
                {
                    rest[row] += weight * source[row];
                }
            }

            Conserve(target, column, Math.ScaleB(1 / shift, bit));
        }

        return result;
    }

    // Repeated squaring would let rounding grow with the exposure; the exact diagonal and the conserved sum stop that.
    private void Conserve(Span<double> column, int index, double exposure)
    {
        double made = 0;
        for (int row = index + 1; row < count; row++)
        {
            made += column[row];
        }

        double kept = Math.Exp(-losses[index] * exposure);
        double reacted = Reacted(kept, losses[index] * exposure);
        column[index] = kept;
        if (made > 0)
        {
            double scale = reacted / made;
            for (int row = index + 1; row < count; row++)
            {
                column[row] *= scale;
            }
        }
    }

    // 1 - exp(-x) without cancellation for small x: the rounding of exp(-x) is undone by the ratio of logarithms.
    private static double Reacted(double kept, double exponent) =>
        kept == 1 ? exponent : kept == 0 ? 1 : (1 - kept) * exponent / -Math.Log(kept);

    private double[] Multiply(double[] matrix, double[] vector)
    {
        double[] result = new double[count];
        for (int column = 0; column < count; column++)
        {
            double amount = vector[column];
            if (amount == 0)
            {
                continue;
            }

            ReadOnlySpan<double> source = matrix.AsSpan(column * count, count);
            for (int row = column; row < count; row++)
            {
                result[row] += amount * source[row];
            }
        }

        return result;
    }
}
