using System;
using System.Collections.Generic;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Selectivity;

/// <summary>90 % intervals of shares by linear propagation on the logit, in closed form.</summary>
/// <remarks>
/// Sensitivity of the logit of a set to ln k of site i: its weight within the set, or minus its weight outside. Errors of
/// one class, and of one row of the bond table, are common to the sites that use it, so their sensitivities add first.
/// For a single site all sums follow from totals over the molecule: constant time for each site.
/// </remarks>
internal sealed class ShareIntervals
{
    // Two-sided 90 % of the normal distribution.
    private const double Quantile90 = 1.6448536269514722;

    private const int MostOnStack = 128;

    private readonly LnRate[] rates;
    private readonly double[] shares;
    private readonly int[] bondGroups;
    private readonly double[] classTotals = new double[ClassCount];
    private readonly double[] bondTotals;
    private readonly double commonVariance;
    private readonly double ownVariance;

    internal ShareIntervals(LnRate[] rates, double[] shares, IReadOnlyList<BdeAssignment> assignments)
    {
        this.rates = rates;
        this.shares = shares;
        bondGroups = GroupBonds(assignments, out int groups);
        bondTotals = new double[groups];
        for (int i = 0; i < shares.Length; i++)
        {
            if (double.IsNaN(shares[i]))
            {
                continue;
            }

            classTotals[(int)rates[i].Class] += shares[i] * rates[i].ClassSigma;
            bondTotals[bondGroups[i]] += shares[i] * rates[i].BdeSigma;
            ownVariance += Square(shares[i] * rates[i].OwnSigma);
        }

        foreach (double total in classTotals)
        {
            commonVariance += total * total;
        }

        foreach (double total in bondTotals)
        {
            commonVariance += total * total;
        }
    }

    private static int ClassCount => SelectivityParameters.ClassNames.Length;

    /// <summary>Interval of the share of one site.</summary>
    /// <param name="index">0-based index of a site with a share.</param>
    internal (double Low, double High) Of(int index)
    {
        double inside = shares[index];
        double outside = 1 - inside;
        if (inside <= 0 || outside <= 1e-15)
        {
            return (Math.Clamp(inside, 0, 1), Math.Clamp(inside, 0, 1));
        }

        LnRate rate = rates[index];
        double ofClass = classTotals[(int)rate.Class];
        double ofBond = bondTotals[bondGroups[index]];
        double elsewhere = commonVariance - (ofClass * ofClass) - (ofBond * ofBond)
            + ownVariance - Square(inside * rate.OwnSigma);
        double variance = (Math.Max(0, elsewhere) / (outside * outside)) + Square(rate.OwnSigma)
            + Square(rate.ClassSigma - ((ofClass - (inside * rate.ClassSigma)) / outside))
            + Square(rate.BdeSigma - ((ofBond - (inside * rate.BdeSigma)) / outside));
        return Around(inside, outside, variance);
    }

    /// <summary>Interval of the summed share of several sites.</summary>
    /// <param name="sites">1-based numbers of sites with a share, each once.</param>
    internal (double Low, double High) Of(ReadOnlySpan<int> sites)
    {
        double inside = 0;
        foreach (int number in sites)
        {
            if (number < 1 || number > shares.Length || double.IsNaN(shares[number - 1]))
            {
                throw new ArgumentException("Only sites with a share have an interval.", nameof(sites));
            }

            inside += shares[number - 1];
        }

        if (sites.Length == 1)
        {
            return Of(sites[0] - 1);
        }

        double outside = 1 - inside;
        return inside <= 0 || outside <= 1e-15
            ? (Math.Clamp(inside, 0, 1), Math.Clamp(inside, 0, 1))
            : Around(inside, outside, Variance(sites, inside, outside));
    }

    private double Variance(ReadOnlySpan<int> sites, double inside, double outside)
    {
        int count = shares.Length;
        Span<double> sensitivity = count > MostOnStack ? new double[count] : stackalloc double[count];
        for (int i = 0; i < count; i++)
        {
            sensitivity[i] = double.IsNaN(shares[i]) ? 0 : -shares[i] / outside;
        }

        foreach (int number in sites)
        {
            sensitivity[number - 1] = shares[number - 1] / inside;
        }

        double variance = 0;
        Span<double> classSums = stackalloc double[ClassCount];
        Span<double> bondSums = count > MostOnStack ? new double[bondTotals.Length] : stackalloc double[bondTotals.Length];
        classSums.Clear();
        bondSums.Clear();
        for (int i = 0; i < count; i++)
        {
            variance += Square(sensitivity[i] * rates[i].OwnSigma);
            classSums[(int)rates[i].Class] += sensitivity[i] * rates[i].ClassSigma;
            bondSums[bondGroups[i]] += sensitivity[i] * rates[i].BdeSigma;
        }

        foreach (double sum in classSums)
        {
            variance += sum * sum;
        }

        foreach (double sum in bondSums)
        {
            variance += sum * sum;
        }

        return variance;
    }

    private static (double Low, double High) Around(double inside, double outside, double variance)
    {
        double odds = inside / outside;
        double width = Math.Exp(Quantile90 * Math.Sqrt(variance));
        return (odds / (odds + width), width == double.PositiveInfinity ? 1 : odds * width / (1 + (odds * width)));
    }

    // Sites that rest on one row of the bond table share a group; the first site of a row names it. Rows are few and
    // their names are the same object for one table, so the comparison is cheap.
    private static int[] GroupBonds(IReadOnlyList<BdeAssignment> assignments, out int groups)
    {
        var result = new int[assignments.Count];
        groups = 0;
        for (int i = 0; i < result.Length; i++)
        {
            string row = assignments[i].CommonErrorRow;
            int found = -1;
            for (int j = 0; j < i && row.Length > 0; j++)
            {
                if (assignments[j].CommonErrorRow == row)
                {
                    found = result[j];
                    break;
                }
            }

            result[i] = found >= 0 ? found : groups++;
        }

        return result;
    }

    private static double Square(double value) => value * value;
}
