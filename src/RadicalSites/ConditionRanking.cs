using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;

namespace RadicalSites;

/// <summary>Reagents and temperatures ranked for a wanted product.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record ConditionRanking
{
    /// <summary>The substrate.</summary>
    public required Molecule Substrate { get; init; }

    /// <summary>Canonical SMILES of the wanted product without stereo; stereo plays no part in the ranking.</summary>
    public required string Wanted { get; init; }

    /// <summary>
    /// Best first: chains that propagate by falling share of the wanted product, then the others; equal shares by the order
    /// of the reagent table and rising temperature. Empty when no reagent gives the product.
    /// </summary>
    public required IReadOnlyList<RankedConditions> Conditions { get; init; }

    /// <summary>Version of the data used.</summary>
    public required string DataVersion { get; init; }

    /// <summary>Remarks, those of the best conditions included.</summary>
    public required IReadOnlyList<Diagnostic> Diagnostics { get; init; }

    /// <summary>Ranks every reagent that delivers the halogen of the wanted product.</summary>
    /// <param name="substrate">The substrate.</param>
    /// <param name="wanted">The wanted mono-halogenation product.</param>
    /// <param name="temperature">
    /// The only temperature to judge; when not given, the lowest, the usual and the highest of each reagent.
    /// </param>
    /// <param name="solvent">Id of the only solvent when it matters, otherwise <see langword="null"/>.</param>
    /// <param name="options">Options, or <see langword="null"/> for the defaults.</param>
    /// <returns>The ranking.</returns>
    public static ConditionRanking Of(
        Molecule substrate, Molecule wanted, Temperature? temperature = null, string? solvent = null,
        HalogenationOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(substrate);
        ArgumentNullException.ThrowIfNull(wanted);
        options = (options ?? HalogenationOptions.Default) with { Stereo = ProductStereoMode.None };
        string target = CanonicalSmiles.Write(wanted.WithStereo([]));
        var found = new List<(RankedConditions Ranked, Prediction Prediction)>();
        foreach (Reagent reagent in ReagentCatalogue.All)
        {
            if (!wanted.Atoms.Any(atom => atom.AtomicNumber == reagent.Halogen))
            {
                continue;
            }

            foreach (Temperature one in Temperatures(reagent, temperature))
            {
                var conditions = new ReactionConditions(reagent, one, solvent);
                Prediction prediction = new HalogenationPredictor(conditions, options).Predict(substrate);
                if (prediction.Products.FirstOrDefault(product => product.CanonicalSmiles == target) is { } product)
                {
                    found.Add((Judge(prediction, product), prediction));
                }
            }
        }

        // A stable sort keeps the order of the table and of the temperatures.
        (RankedConditions Ranked, Prediction Prediction)[] ranked =
        [
            .. found.OrderByDescending(static one => one.Ranked.Propagates)
                .ThenByDescending(static one => one.Ranked.Wanted.Share ?? -1),
        ];
        return new ConditionRanking
        {
            Substrate = substrate,
            Wanted = target,
            Conditions = Array.ConvertAll(ranked, static one => one.Ranked),
            DataVersion = options.DataVersion,
            Diagnostics = ranked.Length > 0
                ? ranked[0].Prediction.Diagnostics
                : [Diagnostic.Create(ProblemCatalogue.General.NotAProduct, [], target, CanonicalSmiles.Write(substrate))],
        };
    }

    private static RankedConditions Judge(Prediction prediction, HalogenationProduct wanted)
    {
        Temperature temperature = prediction.Conditions.Temperature;
        Reagent reagent = prediction.Conditions.Reagent;
        return new RankedConditions(
            prediction.Conditions, wanted, prediction.Products.FirstOrDefault(product => product.Number != wanted.Number),
            prediction.Selectivity.Propagates, temperature >= reagent.Minimum && temperature <= reagent.Maximum);
    }

    private static IEnumerable<Temperature> Temperatures(Reagent reagent, Temperature? only) =>
        only is { } one ? [one] : new[] { reagent.Minimum, reagent.Default, reagent.Maximum }.Distinct().Order();
}
