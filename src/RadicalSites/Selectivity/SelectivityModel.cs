using System;
using System.Collections.Generic;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Selectivity;

/// <summary>Rates and shares of the sites of molecules for one reagent, temperature and solvent.</summary>
/// <remarks>
/// <para>Share of site i = n_i k_i / sum over sites of n_j k_j, with n the number of hydrogens.</para>
/// <para>Rates rest on published class Arrhenius parameters, corrected for the deviation of the bond from its class
/// (Evans-Polanyi), for polar groups, ring substituents (Hammett) and crowding. Intervals are 90 %, in closed form; the
/// error of a class that two sites share cancels between them.</para>
/// Everything that depends on the conditions alone is computed once. Immutable and safe for use by many threads.
/// </remarks>
public sealed class SelectivityModel
{
    private readonly RateModel rates;
    private readonly PropagationModel propagation;

    /// <summary>Prepares the model.</summary>
    /// <param name="conditions">Reagent, temperature and solvent.</param>
    /// <param name="table">Table with the bond enthalpies of the reagent's bonds; the shipped one when not given.</param>
    /// <param name="calibration">Fitted shifts of the parameters; the shipped fit when not given.</param>
    public SelectivityModel(ReactionConditions conditions, BdeTable? table = null, SelectivityCalibration? calibration = null)
    {
        ArgumentNullException.ThrowIfNull(conditions);
        Conditions = conditions;
        Calibration = calibration ?? SelectivityCalibration.Default;
        rates = new RateModel(conditions, Calibration);
        propagation = new PropagationModel(conditions.Reagent, table ?? BdeTable.Default);
    }

    /// <summary>The conditions.</summary>
    public ReactionConditions Conditions { get; }

    /// <summary>The fitted shifts in use.</summary>
    public SelectivityCalibration Calibration { get; }

    /// <summary>Evaluates all sites of a molecule.</summary>
    /// <param name="analysis">The molecule with its sites.</param>
    /// <param name="assignments">Bond enthalpies of the sites, in the order of the sites.</param>
    /// <returns>Rates, shares and remarks.</returns>
    /// <exception cref="ArgumentException">There is not one assignment for each site.</exception>
    public SelectivityResult Evaluate(SiteAnalysis analysis, IReadOnlyList<BdeAssignment> assignments)
    {
        ArgumentNullException.ThrowIfNull(analysis);
        ArgumentNullException.ThrowIfNull(assignments);
        IReadOnlyList<Site> sites = analysis.Sites;
        if (assignments.Count != sites.Count)
        {
            throw new ArgumentException("One assignment is needed for each site.", nameof(assignments));
        }

        var steps = new StepEnthalpies[sites.Count];
        bool propagates = sites.Count == 0;
        for (int i = 0; i < steps.Length; i++)
        {
            steps[i] = propagation.Steps(sites[i], assignments[i]);
            propagates |= steps[i].Verdict != ChainVerdict.Refused;
        }

        var lnRates = new LnRate[sites.Count];
        double[] weights = Weights(analysis, assignments, propagates, lnRates, out double largest);
        double deuterium = propagates && sites.Count > 0
            ? DeuteriumCompetition.WeightOf(rates, analysis, lnRates, largest)
            : 0;
        double sum = 0;
        foreach (double weight in weights)
        {
            sum += double.IsNaN(weight) ? 0 : weight;
        }

        for (int i = 0; i < weights.Length; i++)
        {
            weights[i] /= sum;
        }

        double[] bounds = propagates && sum > 0 ? Bounds(analysis, assignments, largest, sum) : [];
        double deuteriumShare = sum > 0 && deuterium > 0 ? deuterium / (deuterium + sum) : 0;
        return new SelectivityResult(Conditions, analysis, assignments, steps, lnRates, weights, propagates, deuteriumShare, bounds);
    }

    // Share that a site without a bond enthalpy would take if its bond were that of its class; NaN for the others.
    private double[] Bounds(SiteAnalysis analysis, IReadOnlyList<BdeAssignment> assignments, double largest, double sum)
    {
        var bounds = new double[assignments.Count];
        for (int i = 0; i < bounds.Length; i++)
        {
            bounds[i] = double.NaN;
            if (assignments[i].KilojoulesPerMole is null)
            {
                Site site = analysis.Sites[i];
                double value = rates.Rate(analysis.Molecule, site, rates.AnchorOf(site), 0).Value;
                double weight = site.HydrogenCount * Math.Exp(value - largest);
                bounds[i] = weight / (weight + sum);
            }
        }

        return bounds;
    }

    /// <summary>Shares alone, for fitting: no steps, intervals or remarks.</summary>
    internal double[] Shares(SiteAnalysis analysis, IReadOnlyList<BdeAssignment> assignments)
    {
        double[] weights = Weights(analysis, assignments, true, new LnRate[assignments.Count], out _);
        double sum = 0;
        foreach (double weight in weights)
        {
            sum += double.IsNaN(weight) ? 0 : weight;
        }

        for (int i = 0; i < weights.Length; i++)
        {
            weights[i] /= sum;
        }

        return weights;
    }

    private double[] Weights(
        SiteAnalysis analysis, IReadOnlyList<BdeAssignment> assignments, bool propagates, LnRate[] lnRates, out double largest)
    {
        IReadOnlyList<Site> sites = analysis.Sites;
        var weights = new double[sites.Count];
        largest = double.NegativeInfinity;
        for (int i = 0; i < lnRates.Length; i++)
        {
            BdeAssignment bde = assignments[i];
            if (bde.KilojoulesPerMole is { } value && propagates)
            {
                lnRates[i] = rates.Rate(analysis.Molecule, sites[i], value, bde.SigmaKilojoulesPerMole ?? 0);
                largest = Math.Max(largest, lnRates[i].Value);
            }
        }

        for (int i = 0; i < weights.Length; i++)
        {
            weights[i] = assignments[i].KilojoulesPerMole is null || !propagates
                ? double.NaN
                : sites[i].HydrogenCount * Math.Exp(lnRates[i].Value - largest);
        }

        return weights;
    }
}
