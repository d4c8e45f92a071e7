using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
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
    public SelectivityModel(ReactionConditions conditions, BdeTable? table = null)
    {
        ArgumentNullException.ThrowIfNull(conditions);
        Conditions = conditions;
        rates = new RateModel(conditions);
        propagation = new PropagationModel(conditions.Reagent, table ?? BdeTable.Default);
    }

    /// <summary>The conditions.</summary>
    public ReactionConditions Conditions { get; }

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
        var weights = new double[sites.Count];
        double largest = double.NegativeInfinity;
        for (int i = 0; i < lnRates.Length; i++)
        {
            BdeAssignment bde = assignments[i];
            if (bde.KilojoulesPerMole is { } value && propagates)
            {
                lnRates[i] = rates.Rate(analysis.Molecule, sites[i], value, bde.SigmaKilojoulesPerMole ?? 0);
                largest = Math.Max(largest, lnRates[i].Value);
            }
        }

        double sum = 0;
        for (int i = 0; i < weights.Length; i++)
        {
            weights[i] = assignments[i].KilojoulesPerMole is null || !propagates
                ? double.NaN
                : sites[i].HydrogenCount * Math.Exp(lnRates[i].Value - largest);
            sum += double.IsNaN(weights[i]) ? 0 : weights[i];
        }

        for (int i = 0; i < weights.Length; i++)
        {
            weights[i] /= sum;
        }

        return new SelectivityResult(Conditions, analysis, assignments, steps, lnRates, weights, propagates);
    }
}
