using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;
using Bde = RadicalSites.Diagnostics.ProblemCatalogue.Thermochemistry;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Selectivity;

namespace RadicalSites.Selectivity;

/// <summary>What a reader of the shares has to know besides the numbers.</summary>
internal static class SelectivityRemarks
{
    // Rates per hydrogen within this factor of each other count as statistical.
    private const double StatisticalSpread = 2;

    internal static IReadOnlyList<Diagnostic> Of(
        ReactionConditions conditions, SiteAnalysis analysis, IReadOnlyList<BdeAssignment> assignments,
        SelectivityResult result, double[] bounds)
    {
        IReadOnlyList<SiteSelectivity> sites = result.Sites;
        var remarks = new List<Diagnostic>();
        Reagent reagent = conditions.Reagent;
        for (int i = 0; i < assignments.Count; i++)
        {
            if (assignments[i].Reason is { } reason)
            {
                remarks.Add(Diagnostic.Create(Bde.NoValue, analysis.Sites[i].Carbons, assignments[i].SiteNumber, reason));
            }
        }

        if (!result.Propagates)
        {
            Refused(remarks, reagent, sites);
            return remarks;
        }

        if (conditions.Temperature < reagent.Minimum || conditions.Temperature > reagent.Maximum)
        {
            remarks.Add(Diagnostic.Create(
                Entry.TemperatureRange, [], conditions.Temperature.Celsius, reagent.Id, reagent.Minimum.Celsius, reagent.Maximum.Celsius));
        }

        if (conditions.Solvent is { } solvent && !MediumEffect.Of(solvent, reagent.Carrier).IsKnown)
        {
            remarks.Add(Diagnostic.Create(Entry.SolventWithoutEffect, [], solvent, reagent.Carrier.Name));
        }

        Chain(remarks, sites);
        Unrated(remarks, analysis, bounds);
        if (result.DeuteriumShare > 0)
        {
            remarks.Add(Diagnostic.Create(
                Entry.DeuteriumCompetes, [], reagent.Carrier.Name, 100 * result.DeuteriumShare, reagent.Carrier.IsotopeEffect));
        }

        Addition(remarks, analysis, reagent);
        Spread(remarks, analysis, sites);
        return remarks;
    }

    private static void Refused(List<Diagnostic> remarks, Reagent reagent, IReadOnlyList<SiteSelectivity> sites)
    {
        SiteSelectivity? best = null;
        foreach (SiteSelectivity site in sites)
        {
            if (site.Steps.AbstractionKilojoulesPerMole is { } value
                && (best is null || value < best.Steps.AbstractionKilojoulesPerMole))
            {
                best = site;
            }
        }

        if (best is not null)
        {
            remarks.Add(Diagnostic.Create(
                Entry.ChainRefused, [], reagent.Id, best.SiteNumber, best.Steps.AbstractionKilojoulesPerMole!,
                best.Steps.OverallKilojoulesPerMole ?? double.NaN));
        }
    }

    private static void Chain(List<Diagnostic> remarks, IReadOnlyList<SiteSelectivity> sites)
    {
        bool slow = sites.Count > 0;
        foreach (SiteSelectivity site in sites)
        {
            slow &= site.Steps.Verdict is ChainVerdict.Slow or ChainVerdict.Refused;
        }

        if (slow)
        {
            remarks.Add(Diagnostic.Create(Entry.SlowChain, []));
        }
    }

    private static void Unrated(List<Diagnostic> remarks, SiteAnalysis analysis, double[] bounds)
    {
        for (int i = 0; i < bounds.Length; i++)
        {
            if (!double.IsNaN(bounds[i]))
            {
                remarks.Add(Diagnostic.Create(
                    Entry.ShareBound, analysis.Sites[i].Carbons, analysis.Sites[i].Number, 100 * bounds[i]));
            }
        }
    }

    private static void Addition(List<Diagnostic> remarks, SiteAnalysis analysis, Reagent reagent)
    {
        if (reagent.Kind == "NitrogenHalogen")
        {
            return;
        }

        foreach (Site site in analysis.Sites)
        {
            foreach (ConjugatedNeighbor neighbor in site.Conjugation)
            {
                if (neighbor.Kind is ConjugationKind.Allylic or ConjugationKind.Propargylic)
                {
                    remarks.Add(Diagnostic.Create(Entry.AdditionCompetes, neighbor.PiAtoms, reagent.Id));
                    return;
                }
            }
        }
    }

    private static void Spread(List<Diagnostic> remarks, SiteAnalysis analysis, IReadOnlyList<SiteSelectivity> sites)
    {
        double least = double.PositiveInfinity;
        double most = 0;
        int rated = 0;
        int first = -1;
        int second = -1;
        for (int i = 0; i < sites.Count; i++)
        {
            if (sites[i].RelativeRatePerHydrogen is not { } rate)
            {
                continue;
            }

            rated++;
            least = Math.Min(least, rate);
            most = Math.Max(most, rate);
            if (first < 0 || sites[i].Share > sites[first].Share)
            {
                second = first;
                first = i;
            }
            else if (second < 0 || sites[i].Share > sites[second].Share)
            {
                second = i;
            }
        }

        if (rated > 1 && most <= StatisticalSpread * least)
        {
            remarks.Add(Diagnostic.Create(Entry.Statistical, []));
        }

        if (second >= 0 && sites[second].ShareHigh >= sites[first].ShareLow && sites[second].Share > 0.05)
        {
            remarks.Add(Diagnostic.Create(
                Entry.Undecided, [], analysis.Sites[first].Number, analysis.Sites[second].Number));
        }
    }
}
