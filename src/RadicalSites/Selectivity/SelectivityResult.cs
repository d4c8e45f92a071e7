using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Selectivity;

/// <summary>Rates and shares of the sites of one molecule.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed class SelectivityResult
{
    // Two-sided 90 % of the normal distribution.
    private const double Quantile90 = 1.6448536269514722;

    private readonly LnRate[] lnRates;
    private readonly double[] shares;
    private readonly IReadOnlyList<BdeAssignment> assignments;

    internal SelectivityResult(
        ReactionConditions conditions, SiteAnalysis analysis, IReadOnlyList<BdeAssignment> assignments,
        StepEnthalpies[] steps, LnRate[] lnRates, double[] shares, bool propagates)
    {
        this.lnRates = lnRates;
        this.shares = shares;
        this.assignments = assignments;
        Propagates = propagates;
        var sites = new SiteSelectivity[steps.Length];
        Span<int> one = stackalloc int[1];
        for (int i = 0; i < sites.Length; i++)
        {
            int number = analysis.Sites[i].Number;
            if (double.IsNaN(shares[i]))
            {
                sites[i] = new SiteSelectivity(number, null, null, null, null, steps[i]);
                continue;
            }

            one[0] = number;
            (double low, double high) = IntervalOf(one);
            sites[i] = new SiteSelectivity(number, Math.Exp(lnRates[i].Value), shares[i], low, high, steps[i]);
        }

        Sites = sites;
        Diagnostics = SelectivityRemarks.Of(conditions, analysis, assignments, sites, propagates);
    }

    /// <summary>One entry for each site, in the order of the sites.</summary>
    public IReadOnlyList<SiteSelectivity> Sites { get; }

    /// <summary>Whether the chain propagates at any site; when not, no shares are given.</summary>
    public bool Propagates { get; }

    /// <summary>Remarks; may be empty.</summary>
    public IReadOnlyList<Diagnostic> Diagnostics { get; }

    /// <summary>90 % interval of the summed share of several sites, by linear propagation on the logit.</summary>
    /// <param name="sites">1-based numbers of sites with a share, each once.</param>
    /// <returns>Lower and upper end, 0 to 1, around the sum.</returns>
    /// <exception cref="ArgumentException">A site does not exist or has no share.</exception>
    public (double Low, double High) IntervalOf(ReadOnlySpan<int> sites)
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

        double outside = 1 - inside;
        if (inside <= 0 || outside <= 1e-15)
        {
            return (Math.Clamp(inside, 0, 1), Math.Clamp(inside, 0, 1));
        }

        double sigma = Math.Sqrt(LogitVariance(sites, inside, outside));
        double logit = Math.Log(inside / outside);
        return (Logistic(logit - (Quantile90 * sigma)), Logistic(logit + (Quantile90 * sigma)));
    }

    private static double Logistic(double value) => 1 / (1 + Math.Exp(-value));

    // Sensitivity of the logit to ln k of site i: its weight within the set, or minus its weight outside. Errors of one
    // class, and of one row of the bond table, are common to the sites that use it, so their sensitivities add first.
    private double LogitVariance(ReadOnlySpan<int> sites, double inside, double outside)
    {
        int count = shares.Length;
        double[]? rented = count > 128 ? new double[count] : null;
        Span<double> sensitivity = rented ?? stackalloc double[count];
        for (int i = 0; i < count; i++)
        {
            sensitivity[i] = double.IsNaN(shares[i]) ? 0 : -shares[i] / outside;
        }

        foreach (int number in sites)
        {
            sensitivity[number - 1] = shares[number - 1] / inside;
        }

        double variance = 0;
        Span<double> classSums = stackalloc double[SelectivityParameters.ClassNames.Length];
        Span<double> classSigmas = stackalloc double[classSums.Length];
        classSums.Clear();
        for (int i = 0; i < count; i++)
        {
            LnRate rate = lnRates[i];
            double own = sensitivity[i] * rate.OwnSigma;
            variance += own * own;
            classSums[(int)rate.Class] += sensitivity[i];
            classSigmas[(int)rate.Class] = rate.ClassSigma;
        }

        for (int c = 0; c < classSums.Length; c++)
        {
            double part = classSums[c] * classSigmas[c];
            variance += part * part;
        }

        return variance + BondVariance(sensitivity);
    }

    private double BondVariance(ReadOnlySpan<double> sensitivity)
    {
        double variance = 0;
        for (int i = 0; i < sensitivity.Length; i++)
        {
            string row = assignments[i].CommonErrorRow;
            if (row.Length == 0 || SeenBefore(row, i))
            {
                continue;
            }

            double sum = 0;
            for (int j = i; j < sensitivity.Length; j++)
            {
                if (assignments[j].CommonErrorRow == row)
                {
                    sum += sensitivity[j] * lnRates[j].BdeSigma;
                }
            }

            variance += sum * sum;
        }

        return variance;
    }

    private bool SeenBefore(string row, int index)
    {
        for (int i = 0; i < index; i++)
        {
            if (assignments[i].CommonErrorRow == row)
            {
                return true;
            }
        }

        return false;
    }
}
