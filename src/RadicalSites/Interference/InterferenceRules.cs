using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Diagnostics;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Interference;

namespace RadicalSites.Interference;

/// <summary>The rule set: each catalogue entry of interference with its source and scope.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public static class InterferenceRules
{
    private const HalogenSources Active = HalogenSources.NitrogenHalogen | HalogenSources.OxygenHalogen;

    /// <summary>All rules, in the order of the catalogue.</summary>
    public static IReadOnlyList<InterferenceRule> All { get; } =
    [
        Rule(Entry.Alkene, "MARCH8", "ch. 14, allylic halogenation; ch. 15, addition of halogen"),
        Rule(Entry.Alkyne, "MARCH8", "ch. 15, addition of halogen to triple bonds"),
        Rule(Entry.ElectronRichAlkene, "MARCH8", "ch. 12 and 15, halogenation of enols, enol ethers and enamines"),
        Rule(Entry.Quinone, "WALLING1957", "chapter on inhibition and retardation"),
        Rule(Entry.Aldehyde, "MARCH8", "ch. 14, conversion of aldehydes to acyl halides"),
        Rule(Entry.Ketone, "MARCH8", "ch. 12, halogenation of aldehydes and ketones"),
        Rule(Entry.ActiveMethylene, "MARCH8", "ch. 12, halogenation of aldehydes and ketones"),
        Rule(Entry.Epoxide, "MARCH8", "ch. 10, opening of epoxides by hydrogen halides"),
        Rule(Entry.Cyclopropane, "GRILLER1980", "table of radical clock rate constants"),
        Rule(Entry.Acetal, "MARCH8", "ch. 10, hydrolysis of acetals"),
        Rule(Entry.AcidLabile, "GREENE5", "chapters on alcohols, acids and amines"),
        Rule(Entry.Alcohol, "MARCH8", "ch. 19, oxidation of alcohols by halogen"),
        Rule(Entry.TertiaryAlcohol, "WALLING1957", "hypohalites; see also March ch. 14", HalogenSources.OxygenHalogen),
        Rule(Entry.Phenol, "INGOLD1961", "phenols as chain-breaking inhibitors"),
        Rule(Entry.CarboxylicAcid, "MARCH8", "ch. 14, decarboxylative halogenation", HalogenSources.OxygenHalogen),
        Rule(Entry.Ether, "BRETHERICK8", "entries on ethers and on N-bromosuccinimide"),
        Rule(Entry.Iodide, "MARCH8", "ch. 19, oxidation of iodides; bond energies in LUO2007"),
        Rule(Entry.ElectronRichArene, "MARCH8", "ch. 11, halogenation of arenes"),
        Rule(Entry.ElectronRichHeteroarene, "JOULE5", "chapters on pyrroles, thiophenes, furans and indoles"),
        Rule(Entry.BasicHeteroarene, "JOULE5", "chapter on pyridines, side-chain halogenation"),
        Rule(Entry.PolycyclicArene, "MARCH8", "ch. 11, halogenation of arenes"),
        Rule(Entry.Amine, "BRETHERICK8", "entries on N-bromosuccinimide and on N-halogen compounds"),
        Rule(Entry.Aniline, "INGOLD1961", "aromatic amines as chain-breaking inhibitors"),
        Rule(Entry.AmideHydrogen, "MARCH8", "ch. 12, halogenation of amides at nitrogen", Active),
        Rule(Entry.OxidisableNitrogen, "MARCH8", "ch. 19, oxidation of nitrogen compounds"),
        Rule(Entry.Azide, "BRETHERICK8", "entries on azides, halogen azides, diazo and diazonium compounds"),
        Rule(Entry.Azo, "BRETHERICK8", "entry on azo compounds"),
        Rule(Entry.Peroxide, "BRETHERICK8", "entry on organic peroxides"),
        Rule(Entry.Energetic, "BRETHERICK8", "entries on alkyl nitrates and polynitro compounds"),
        Rule(Entry.ActiveHalogen, "BRETHERICK8", "entries on N-halogen compounds and hypohalites"),
        Rule(Entry.NitroWithBase, "BRETHERICK8", "entries on nitroalkanes and aci-nitro salts"),
        Rule(Entry.Thiol, "MARCH8", "ch. 19, oxidation of thiols"),
        Rule(Entry.Sulfide, "MARCH8", "ch. 12 and 19, halogenation and oxidation of sulfides"),
        Rule(Entry.OxidisableSulfur, "MARCH8", "ch. 12, halogenation of sulfoxides"),
        Rule(Entry.Hydride, "LUO2007", "sections on Si-H, Ge-H, Sn-H, P-H and B-H bonds"),
        Rule(Entry.TrivalentPhosphorus, "MARCH8", "ch. 10, phosphorus reagents with halogen"),
        Rule(Entry.Organometallic, "MARCH8", "ch. 12, replacement of metals by halogen"),
        Rule(Entry.MetalIon, "WALLING1957", "redox chains and metal ions"),
        Rule(Entry.Inhibitor, "WALLING1957", "chapter on inhibition and retardation"),
        Rule(Entry.HalideIon, "MARCH8", "ch. 15 and 19, oxidation of halide ions"),
        Rule(Entry.Base, "MARCH8", "ch. 12, haloform and related reactions"),
        Rule(Entry.Heterocumulene, "MARCH8", "ch. 15 and 16, addition to heterocumulenes"),
    ];

    private static readonly FrozenDictionary<string, InterferenceRule> ByCode =
        All.ToFrozenDictionary(static rule => rule.Problem.Code);

    internal static InterferenceRule Of(ProblemDescriptor problem) => ByCode[problem.Code];

    private static InterferenceRule Rule(
        ProblemDescriptor problem, string source, string locator, HalogenSources sources = HalogenSources.All) =>
        new(problem, sources, source, locator);
}
