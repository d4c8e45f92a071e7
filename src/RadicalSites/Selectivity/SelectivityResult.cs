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
    private readonly ShareIntervals intervals;

    internal SelectivityResult(
        ReactionConditions conditions, SiteAnalysis analysis, IReadOnlyList<BdeAssignment> assignments,
        StepEnthalpies[] steps, LnRate[] lnRates, double[] shares, bool propagates, double deuteriumShare, double[] bounds)
    {
        intervals = new ShareIntervals(lnRates, shares, assignments);
        Propagates = propagates;
        DeuteriumShare = deuteriumShare;
        var sites = new SiteSelectivity[steps.Length];
        for (int i = 0; i < sites.Length; i++)
        {
            int number = analysis.Sites[i].Number;
            if (double.IsNaN(shares[i]))
            {
                sites[i] = new SiteSelectivity(number, null, null, null, null, steps[i]);
                continue;
            }

            (double low, double high) = intervals.Of(i);
            sites[i] = new SiteSelectivity(number, Math.Exp(lnRates[i].Value), shares[i], low, high, steps[i]);
        }

        Sites = sites;
        Diagnostics = SelectivityRemarks.Of(conditions, analysis, assignments, this, bounds);
    }

    /// <summary>One entry for each site, in the order of the sites.</summary>
    public IReadOnlyList<SiteSelectivity> Sites { get; }

    /// <summary>Whether the chain propagates at any site; when not, no shares are given.</summary>
    public bool Propagates { get; }

    /// <summary>
    /// Part of all abstraction that takes deuterium or tritium instead of a hydrogen, 0 to 1; the shares of the sites
    /// are those of the rest.
    /// </summary>
    public double DeuteriumShare { get; }

    /// <summary>Remarks; may be empty.</summary>
    public IReadOnlyList<Diagnostic> Diagnostics { get; }

    /// <summary>90 % interval of the summed share of several sites, by linear propagation on the logit.</summary>
    /// <param name="sites">1-based numbers of sites with a share, each once.</param>
    /// <returns>Lower and upper end, 0 to 1, around the sum.</returns>
    /// <exception cref="ArgumentException">A site does not exist or has no share.</exception>
    public (double Low, double High) IntervalOf(ReadOnlySpan<int> sites) => intervals.Of(sites);
}
