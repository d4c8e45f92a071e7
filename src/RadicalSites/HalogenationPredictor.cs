using System;
using System.Collections.Generic;
using RadicalSites.Canonical;
using RadicalSites.Diagnostics;
using RadicalSites.Interference;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>Predicts many molecules under the same conditions.</summary>
/// <remarks>What depends on the conditions alone is computed once. Immutable and safe for use by many threads.</remarks>
public sealed class HalogenationPredictor
{
    private readonly SelectivityModel model;
    private readonly BdeAssigner assigner;
    private readonly ProductOptions productOptions;
    private readonly HalogenSources sources;

    /// <summary>Prepares a predictor.</summary>
    /// <param name="conditions">Reagent, temperature, solvent.</param>
    /// <param name="options">Options, or <see langword="null"/> for the defaults.</param>
    public HalogenationPredictor(ReactionConditions conditions, HalogenationOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(conditions);
        Conditions = conditions;
        Options = options ?? HalogenationOptions.Default;
        model = new SelectivityModel(conditions, Options.Table, Options.Calibration);
        assigner = new BdeAssigner(Options.Table);
        productOptions = new ProductOptions { Stereo = Options.Stereo };
        sources = Halogenation.SourcesOf(conditions.Reagent);
    }

    /// <summary>The conditions.</summary>
    public ReactionConditions Conditions { get; }

    /// <summary>The options.</summary>
    public HalogenationOptions Options { get; }

    /// <summary>Predicts one molecule.</summary>
    /// <param name="molecule">The substrate; may have several fragments.</param>
    /// <returns>The prediction.</returns>
    public Prediction Predict(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        SiteAnalysis analysis = SiteFinder.Find(molecule, Options.MergeDiastereotopic);
        IReadOnlyList<BdeAssignment> bdes = assigner.Assign(analysis);
        SelectivityResult selectivity = model.Evaluate(analysis, bdes);
        ProductSet products = ProductEnumerator.Enumerate(
            analysis, Conditions.Reagent.Halogen, selectivity.Propagates ? new SelectivityShares(selectivity) : null,
            productOptions);
        IReadOnlyList<InterferenceHit> interference = InterferenceFinder.Find(molecule, sources);
        var remarks = new List<Diagnostic>(interference.Count + 4);
        foreach (InterferenceHit hit in interference)
        {
            remarks.Add(hit.ToDiagnostic());
        }

        remarks.AddRange(selectivity.Diagnostics);
        foreach (Diagnostic remark in products.Diagnostics)
        {
            // A site without a bond enthalpy has been reported with its reason already.
            if (remark.Code != ProblemCatalogue.Products.SiteShareMissing.Code)
            {
                remarks.Add(remark);
            }
        }

        return new Prediction
        {
            Molecule = molecule,
            CanonicalSmiles = CanonicalSmiles.Write(molecule),
            Conditions = Conditions,
            Analysis = analysis,
            Selectivity = selectivity,
            Sites = Join(analysis, bdes, selectivity, products.Products),
            Products = products.Products,
            Interference = interference,
            DataVersion = Options.DataVersion,
            Diagnostics = HalogenationRemarks.Common(analysis, bdes, remarks),
        };
    }

    private static SitePrediction[] Join(
        SiteAnalysis analysis, IReadOnlyList<BdeAssignment> bdes, SelectivityResult selectivity,
        IReadOnlyList<HalogenationProduct> products)
    {
        var sites = new SitePrediction[bdes.Count];
        for (int i = 0; i < sites.Length; i++)
        {
            int number = analysis.Sites[i].Number;
            var given = new List<int>(1);
            foreach (HalogenationProduct product in products)
            {
                foreach (int site in product.Sites)
                {
                    if (site == number)
                    {
                        given.Add(product.Number);
                        break;
                    }
                }
            }

            sites[i] = new SitePrediction
            {
                Site = analysis.Sites[i],
                Bde = bdes[i],
                Selectivity = selectivity.Sites[i],
                Products = given,
            };
        }

        return sites;
    }
}
