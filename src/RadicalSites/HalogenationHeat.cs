using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Heat;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>Heat of a batch from a prediction.</summary>
/// <remarks>
/// The enthalpy of a site is the sum of its two propagation steps. Sulfuryl chloride gives up its chlorine first, which
/// costs the difference between both S-Cl bonds and Cl-Cl. For N-halogen imides the exchange with HX is not in the tables
/// and the report says so. Stateless and safe for use by many threads.
/// </remarks>
public static class HalogenationHeat
{
    private const string SulfurylBonds = "sum of both S-Cl";
    private const string ChlorineBond = "Cl-Cl";

    /// <summary>Reckons heat, gas and materials.</summary>
    /// <param name="prediction">The prediction; its shares weigh the sites.</param>
    /// <param name="options">The batch.</param>
    /// <param name="table">Table of bond enthalpies; the shipped one when not given.</param>
    /// <returns>The balance with cautions; without enthalpies where the chain does not propagate.</returns>
    /// <exception cref="ArgumentException">
    /// There are no batch properties of the reagent, the substrate has no molar mass, or an option is out of range.
    /// </exception>
    public static HeatReport Reckon(Prediction prediction, HeatOptions options, BdeTable? table = null)
    {
        ArgumentNullException.ThrowIfNull(prediction);
        ArgumentNullException.ThrowIfNull(options);
        Reagent reagent = prediction.Conditions.Reagent;
        ReagentProperties properties = HeatTables.FindReagent(reagent.Id)
            ?? throw new ArgumentException($"There are no batch properties of the reagent {reagent.Id}.", nameof(prediction));
        (double release, double releaseSigma) = Release(reagent, table ?? BdeTable.Default);
        var sites = new List<SiteEnthalpy>(prediction.Sites.Count);
        foreach (SitePrediction site in prediction.Sites)
        {
            StepEnthalpies? steps = site.Selectivity?.Steps;
            double? overall = steps?.OverallKilojoulesPerMole + release;
            double? sigma = steps?.SigmaKilojoulesPerMole is { } own
                ? Math.Sqrt((own * own) + (releaseSigma * releaseSigma))
                : null;
            sites.Add(new SiteEnthalpy(site.Site.Number, site.Selectivity?.Share ?? 0, overall, sigma));
        }

        HeatReport report = HeatBalance.Compute(prediction.Molecule, properties, sites, options);
        return IsImide(reagent)
            ? report with
            {
                Diagnostics =
                [
                    Diagnostic.Create(ProblemCatalogue.Heat.ExchangeNotCounted, [], properties.Name, reagent.TransferBond),
                    .. report.Diagnostics,
                ],
            }
            : report;
    }

    // What the reagent takes up to set the halogen of the chain free [kJ/mol].
    private static (double Value, double Sigma) Release(Reagent reagent, BdeTable table)
    {
        if (reagent.Kind != "SulfurylHalide")
        {
            return (0, 0);
        }

        BondEntry both = table.FindBond(SulfurylBonds) ?? throw new InvalidOperationException("The S-Cl row is missing.");
        BondEntry chlorine = table.FindBond(ChlorineBond) ?? throw new InvalidOperationException("The Cl-Cl row is missing.");
        return (both.KilojoulesPerMole - chlorine.KilojoulesPerMole, both.SigmaKilojoulesPerMole);
    }

    private static bool IsImide(Reagent reagent) =>
        reagent.Kind == "NitrogenHalogen" && reagent.TransferBond is ("Br-Br" or "Cl-Cl");
}
