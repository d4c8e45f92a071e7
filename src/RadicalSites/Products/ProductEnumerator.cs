using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>Lists the products of mono-halogenation with shares, degeneracy, origin and stereo outcome.</summary>
/// <remarks>
/// One product is built for each site, and one more for each further end of a delocalised radical; products of the same
/// canonical SMILES are one. The share of a product is the sum of the shares of its sites with their common errors
/// treated as common. Where one radical has several ends, a published capture ratio divides the share, or the split is
/// left open: the share is then unknown and bounded. Stateless and safe for use by many threads.
/// </remarks>
public static partial class ProductEnumerator
{
    /// <summary>Lists the products without shares.</summary>
    /// <param name="analysis">The sites of the substrate.</param>
    /// <param name="halogen">Atomic number of the halogen: 9, 17, 35 or 53.</param>
    /// <param name="options">What to list, or <see langword="null"/> for the defaults.</param>
    /// <returns>The products by canonical SMILES, shares <see langword="null"/>.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The halogen is none of F, Cl, Br, I.</exception>
    public static ProductSet Enumerate(SiteAnalysis analysis, int halogen, ProductOptions? options = null) =>
        Enumerate(analysis, halogen, (ISiteShares?)null, options);

    /// <summary>Lists the products with the shares of the selectivity model.</summary>
    /// <param name="analysis">The sites of the substrate.</param>
    /// <param name="halogen">Atomic number of the halogen: 9, 17, 35 or 53.</param>
    /// <param name="selectivity">Rates and shares of the same sites.</param>
    /// <param name="options">What to list, or <see langword="null"/> for the defaults.</param>
    /// <returns>
    /// The products by falling share. A share is <see langword="null"/> with bounds where the split between the ends of a
    /// radical is unknown, and <see langword="null"/> without bounds where a site has no rate.
    /// </returns>
    /// <exception cref="ArgumentOutOfRangeException">The halogen is none of F, Cl, Br, I.</exception>
    /// <exception cref="ArgumentException">The selectivity belongs to another number of sites.</exception>
    public static ProductSet Enumerate(
        SiteAnalysis analysis, int halogen, SelectivityResult selectivity, ProductOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(analysis);
        ArgumentNullException.ThrowIfNull(selectivity);
        return selectivity.Sites.Count == analysis.Sites.Count
            ? Enumerate(analysis, halogen, new SelectivityShares(selectivity), options)
            : throw new ArgumentException("The selectivity belongs to another molecule.", nameof(selectivity));
    }

    /// <summary>Lists the products with shares from any source.</summary>
    internal static ProductSet Enumerate(
        SiteAnalysis analysis, int halogen, ISiteShares? shares, ProductOptions? options)
    {
        ArgumentNullException.ThrowIfNull(analysis);
        if (halogen is not (9 or 17 or 35 or 53))
        {
            throw new ArgumentOutOfRangeException(
                nameof(halogen), halogen, "The halogen is 9 (F), 17 (Cl), 35 (Br) or 53 (I).");
        }

        options ??= ProductOptions.Default;
        var work = new Work(analysis, halogen, options, shares);
        foreach (Site site in analysis.Sites)
        {
            if (!work.AddSite(site))
            {
                break;
            }
        }

        return work.Finish();
    }

    /// <summary>The products of one substrate while they are collected.</summary>
    private sealed partial class Work(SiteAnalysis analysis, int halogen, ProductOptions options, ISiteShares? shares)
    {
        private readonly ProductSubstrate substrate = ProductSubstrate.Prepare(analysis, options);
        private readonly List<ProductDraft> drafts = new(analysis.Sites.Count);
        private readonly List<Diagnostic> diagnostics = [];
        private Dictionary<string, ProductDraft>? index;

        // Returns false when the products together grow beyond the limit.
        internal bool AddSite(Site site)
        {
            if ((long)(drafts.Count + 1) * analysis.Molecule.AtomCount > options.AtomLimit && drafts.Count > 0)
            {
                diagnostics.Add(Diagnostic.Create(
                    ProblemCatalogue.Products.TooManyAtoms, site.Carbons, site.Number, options.AtomLimit));
                return false;
            }

            if (shares is not null && shares.ShareOf(site.Number) is null)
            {
                diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Products.SiteShareMissing, site.Carbons, site.Number));
            }

            if (!HasDiastereotopicCarbons(site))
            {
                AddGroup(site, 1);
                return true;
            }

            // A site of merged diastereotopic carbons has one product, or two that differ by stereo, for each kind of carbon.
            var rest = new List<int>(site.Carbons);
            while (rest.Count > 0)
            {
                int first = rest[0];
                int[] members = [.. rest.FindAll(carbon => AreMirrored(first, carbon))];
                rest.RemoveAll(carbon => AreMirrored(first, carbon));
                AddGroup(site with { Carbons = members }, (double)members.Length / site.Carbons.Count);
            }

            return true;
        }

        private bool AreMirrored(int first, int second) =>
            analysis.Symmetry!.Between(first, second) <= Topicity.Enantiotopic;

        private bool HasDiastereotopicCarbons(Site site)
        {
            for (int i = 1; i < site.Carbons.Count && analysis.Symmetry is not null; i++)
            {
                if (!AreMirrored(site.Carbons[0], site.Carbons[i]))
                {
                    return true;
                }
            }

            return false;
        }

        private void AddGroup(Site site, double part)
        {
            Molecule direct = substrate.ReplaceAt(site, halogen, out string smiles, out bool hasMirrorImage);
            if (site.Conjugation.Count == 0 || !options.IncludeTransposed)
            {
                ProductDraft draft = Find(smiles, direct);
                Classify(draft, site, ProductRoute.Direct, substrate.Outcome(site, halogen, direct));
                draft.Route = ProductRoute.Direct;
                draft.HasMirrorImage |= hasMirrorImage;
                draft.Add(site.Number, site.HydrogenCount, part, part, part);
            }
            else
            {
                AddDelocalised(site, part, direct, smiles, hasMirrorImage);
            }
        }

        private ProductDraft Find(string smiles, Molecule molecule)
        {
            if (index is null)
            {
                foreach (ProductDraft draft in drafts)
                {
                    if (draft.Smiles == smiles)
                    {
                        return draft;
                    }
                }

                var added = new ProductDraft(smiles, molecule);
                drafts.Add(added);
                if (drafts.Count > 24)
                {
                    index = new Dictionary<string, ProductDraft>(StringComparer.Ordinal);
                    foreach (ProductDraft draft in drafts)
                    {
                        index.Add(draft.Smiles, draft);
                    }
                }

                return added;
            }

            if (!index.TryGetValue(smiles, out ProductDraft? found))
            {
                found = new ProductDraft(smiles, molecule);
                index.Add(smiles, found);
                drafts.Add(found);
            }

            return found;
        }

        // Sites of one constitution differ by stereo alone, so a product they share is a mixture of diastereomers.
        private void Classify(ProductDraft draft, Site site, ProductRoute route, StereoOutcome outcome)
        {
            if (draft.Origins.Count == 0)
            {
                draft.Stereo = outcome;
                return;
            }

            Site other = analysis.Sites[draft.Origins[0].Site - 1];
            bool sameConstitution = route == ProductRoute.Direct && draft.Route == ProductRoute.Direct
                && analysis.Symmetry is { } symmetry
                && symmetry.OrbitOf(other.Carbons[0], EquivalenceLevel.Constitutional)
                    == symmetry.OrbitOf(site.Carbons[0], EquivalenceLevel.Constitutional);
            if (sameConstitution && outcome is not (StereoOutcome.Lost or StereoOutcome.Epimerised))
            {
                draft.Stereo = StereoOutcome.Diastereomers;
            }
            else if (outcome == StereoOutcome.Diastereomers
                || (outcome == StereoOutcome.Racemic && draft.Stereo is StereoOutcome.None or StereoOutcome.Retained))
            {
                draft.Stereo = outcome;
            }
        }

        internal ProductSet Finish()
        {
            var products = new List<HalogenationProduct>(drafts.Count);
            foreach (ProductDraft draft in drafts)
            {
                products.Add(Make(draft));
            }

            products.Sort(static (left, right) =>
            {
                int byShare = SortKey(right).CompareTo(SortKey(left));
                return byShare != 0 ? byShare : string.CompareOrdinal(left.CanonicalSmiles, right.CanonicalSmiles);
            });
            for (int i = 0; i < products.Count; i++)
            {
                products[i] = products[i] with { Number = i + 1 };
            }

            return new ProductSet(products.AsReadOnly(), diagnostics.AsReadOnly());
        }

        private static double SortKey(HalogenationProduct product) =>
            product.Share ?? (product.ShareLow + product.ShareHigh) / 2 ?? -1;

        private HalogenationProduct Make(ProductDraft draft)
        {
            int[] sites = new int[draft.Origins.Count];
            int degeneracy = 0;
            for (int i = 0; i < sites.Length; i++)
            {
                sites[i] = draft.Origins[i].Site;
                degeneracy += draft.Origins[i].Hydrogens;
            }

            Array.Sort(sites);
            (double? share, double? low, double? high) = ShareOf(draft);
            return new HalogenationProduct
            {
                Number = 0,
                CanonicalSmiles = draft.Smiles,
                Molecule = draft.Molecule,
                SubstrateAtoms = substrate.AtomMap(draft.Molecule),
                Degeneracy = degeneracy,
                Sites = sites,
                Route = draft.Route,
                Stereo = draft.Stereo,
                Share = share,
                ShareLow = low,
                ShareHigh = high,
                Stereoisomers = options.Stereo == ProductStereoMode.Expand
                    ? StereoUnits.Expand(draft.Molecule, draft.HasMirrorImage, options.StereoisomerLimit, diagnostics)
                    : null,
            };
        }

        private (double? Share, double? Low, double? High) ShareOf(ProductDraft draft)
        {
            if (shares is null)
            {
                return default;
            }

            double sum = 0;
            double low = 0;
            double high = 0;
            bool rated = false;
            var whole = new List<int>();
            foreach ((int site, _, double part, double partLow, double partHigh) in draft.Origins)
            {
                if (shares.ShareOf(site) is not { } share)
                {
                    continue;
                }

                rated = true;
                sum += share * part;
                if (part == 1)
                {
                    whole.Add(site);
                    continue;
                }

                (double siteLow, double siteHigh) = shares.IntervalOf([site]);
                low += siteLow * partLow;
                high += siteHigh * partHigh;
            }

            if (!rated)
            {
                return default;
            }

            if (whole.Count > 0)
            {
                (double wholeLow, double wholeHigh) = shares.IntervalOf([.. whole]);
                low += wholeLow;
                high += wholeHigh;
            }

            return (double.IsNaN(sum) ? null : sum, low, Math.Min(1, high));
        }
    }
}
