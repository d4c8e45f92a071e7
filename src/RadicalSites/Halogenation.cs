using System;
using System.Collections.Generic;
using RadicalSites.Canonical;
using RadicalSites.Diagnostics;
using RadicalSites.Interference;
using RadicalSites.Molecules;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>The front door: sites of a molecule, and what a radical halogenation makes of them.</summary>
/// <remarks>Stateless and safe for use by many threads.</remarks>
/// <example>
/// <code>
/// Molecule molecule = SmilesReader.Parse("CC(C)C");
/// var conditions = new ReactionConditions(ReagentCatalogue.Get("Br2"), Temperature.FromCelsius(127));
/// Prediction prediction = Halogenation.Predict(molecule, conditions);
/// </code>
/// </example>
public static class Halogenation
{
    /// <summary>Finds the C(sp3)-H sites of a molecule with their bond dissociation enthalpies.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="options">Options, or <see langword="null"/> for the defaults.</param>
    /// <returns>The sites; none when there is no C(sp3)-H bond, which a remark then says.</returns>
    public static SiteReport FindSites(Molecule molecule, HalogenationOptions? options = null)
    {
        options ??= HalogenationOptions.Default;
        SiteAnalysis analysis = SiteFinder.Find(molecule, options.MergeDiastereotopic);
        IReadOnlyList<BdeAssignment> bdes = new BdeAssigner(options.Table).Assign(analysis);
        var sites = new SitePrediction[bdes.Count];
        var remarks = new List<Diagnostic>();
        for (int i = 0; i < sites.Length; i++)
        {
            sites[i] = new SitePrediction { Site = analysis.Sites[i], Bde = bdes[i] };
            if (bdes[i].Reason is { } reason)
            {
                remarks.Add(Diagnostic.Create(
                    ProblemCatalogue.Thermochemistry.NoValue, analysis.Sites[i].Carbons, bdes[i].SiteNumber, reason));
            }
        }

        return new SiteReport
        {
            Molecule = molecule,
            CanonicalSmiles = CanonicalSmiles.Write(molecule),
            Analysis = analysis,
            Sites = sites,
            DataVersion = options.Table.Version,
            Diagnostics = HalogenationRemarks.Common(analysis, bdes, remarks),
        };
    }

    /// <summary>Predicts mono-halogenation: shares of the sites, products, remarks.</summary>
    /// <param name="molecule">The substrate; may have several fragments.</param>
    /// <param name="conditions">Reagent, temperature, solvent.</param>
    /// <param name="options">Options, or <see langword="null"/> for the defaults.</param>
    /// <returns>The prediction.</returns>
    /// <remarks>For many molecules under the same conditions make one <see cref="HalogenationPredictor"/>.</remarks>
    public static Prediction Predict(
        Molecule molecule, ReactionConditions conditions, HalogenationOptions? options = null) =>
        new HalogenationPredictor(conditions, options).Predict(molecule);

    /// <summary>Finds the groups that divert, poison or endanger a radical halogenation.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="reagent">The halogen source, or <see langword="null"/> for all kinds.</param>
    /// <returns>Hits by falling severity; may be empty, which is no statement of safety.</returns>
    public static IReadOnlyList<InterferenceHit> FindInterference(Molecule molecule, Reagent? reagent = null) =>
        InterferenceFinder.Find(molecule, SourcesOf(reagent));

    internal static HalogenSources SourcesOf(Reagent? reagent) =>
        reagent is not null && Enum.TryParse(reagent.Kind, out HalogenSources sources) ? sources : HalogenSources.All;
}
