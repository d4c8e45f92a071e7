using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Groups that divert, poison or endanger a radical halogenation.</summary>
    /// <remarks>Severity is that for an unspecified reagent. Immutable and safe for use by many threads.</remarks>
    public static partial class Interference
    {
        /// <summary>Carbon-carbon double bond.</summary>
        public static readonly ProblemDescriptor Alkene = Caution(
            "interference-alkene", "C=C adds halogen",
            "C=C double bond: halogen and hydrogen halide add to it, in competition with substitution at the allylic C-H.",
            "Halogen atoms and molecules add to alkenes fast; allylic substitution wins only while the halogen concentration stays very low.",
            "Keep the halogen concentration low (N-bromosuccinimide, slow addition), use a non-polar solvent, exclude HX; or protect the alkene.");

        /// <summary>Carbon-carbon triple bond.</summary>
        public static readonly ProblemDescriptor Alkyne = Caution(
            "interference-alkyne", "C-C triple bond adds halogen",
            "C-C triple bond: halogen adds to it; a terminal alkyne is also halogenated at the C-H by basic N-halo reagents.",
            "Addition of halogen and hydrogen halide competes with propargylic substitution, and allenic products form.",
            "Keep the halogen concentration low and look for dihaloalkenes and haloallenes in the product.");

        /// <summary>Alkene with an electron-donating heteroatom.</summary>
        public static readonly ProblemDescriptor ElectronRichAlkene = Caution(
            "interference-electron-rich-alkene", "enol ether, enol ester or enamine",
            "C=C with an oxygen, nitrogen or sulfur donor: electrophilic halogen adds at once, without light.",
            "Enol ethers and enamines react with Br2, Cl2 and N-halo reagents by an ionic path much faster than any chain.",
            "Do not expect radical selectivity; mask or remove the group first.");

        /// <summary>Quinone.</summary>
        public static readonly ProblemDescriptor Quinone = Caution(
            "interference-quinone", "quinone stops the chain",
            "Quinone: it traps radicals and inhibits the chain.",
            "Carbon radicals add to quinones faster than they meet the halogen source.",
            "Remove the quinone, or choose a non-radical route.");

        /// <summary>Aldehyde.</summary>
        public static readonly ProblemDescriptor Aldehyde = Caution(
            "interference-aldehyde", "formyl C-H reacts first",
            "Aldehyde: the formyl C-H (about 373 kJ/mol) is abstracted first and gives the acyl halide; it is also oxidised.",
            "The formyl hydrogen is weaker and better polarity-matched than any alkyl C-H.",
            "Protect the aldehyde (acyl derivative) or install it after the halogenation.");

        /// <summary>Ketone with an alpha hydrogen.</summary>
        public static readonly ProblemDescriptor Ketone = Caution(
            "interference-ketone", "acid-catalysed alpha-halogenation of the ketone",
            "Ketone with alpha C-H: the hydrogen halide formed catalyses ionic alpha-halogenation through the enol.",
            "HBr and HCl are by-products of the chain; bromination of the enol is fast and needs no light.",
            "Bind the acid (epoxide, solid base) or use N-bromosuccinimide with exclusion of HBr; expect the alpha-halo ketone otherwise.");

        /// <summary>Methylene between two carbonyl groups.</summary>
        public static readonly ProblemDescriptor ActiveMethylene = Caution(
            "interference-active-methylene", "1,3-dicarbonyl is halogenated ionically",
            "C-H between two carbonyl-type groups: the enol is halogenated at once without light.",
            "The enol content is high enough that the ionic reaction outruns the radical chain.",
            "Plan for the ionic product, or introduce the second carbonyl group later.");

        /// <summary>Three-membered heterocycle.</summary>
        public static readonly ProblemDescriptor Epoxide = Caution(
            "interference-epoxide", "epoxide or aziridine is opened by HX",
            "Three-membered ring with O, N or S: hydrogen halide opens it to the halohydrin type product.",
            "The strained ring reacts with the acid that the chain produces.",
            "Scavenge the acid, or form the ring after the halogenation.");

        /// <summary>Cyclopropane.</summary>
        public static readonly ProblemDescriptor Cyclopropane = Caution(
            "interference-cyclopropane", "cyclopropane ring opens",
            "Cyclopropane: a radical beside the ring opens it within nanoseconds, and halogen atoms attack the ring itself.",
            "The cyclopropylmethyl radical rearranges to the 3-butenyl radical at about 1E8 per second at 25 C.",
            "Expect ring-opened halides; do not read the share of the site beside the ring as product with the ring intact.");

        /// <summary>Acetal.</summary>
        public static readonly ProblemDescriptor Acetal = Caution(
            "interference-acetal", "acetal: acid-labile and easily attacked",
            "Acetal, ketal or orthoester: the acid formed cleaves it, and its C-H next to two oxygens is abstracted readily.",
            "Acetal C-H bonds are weak and electron-rich; the radical fragments to an ester.",
            "Buffer the mixture or protect differently; expect ester by beta-scission.");

        /// <summary>Acid-labile protecting group.</summary>
        public static readonly ProblemDescriptor AcidLabile = Caution(
            "interference-acid-labile", "acid-labile group",
            "tert-Butyl ester or carbamate, trityl or silyl ether: the hydrogen halide formed can remove it.",
            "One mole of acid forms for each C-H replaced when X2 is used.",
            "Use a reagent without HX build-up, add a solid acid scavenger, or choose another protecting group.");

        /// <summary>Primary or secondary alcohol.</summary>
        public static readonly ProblemDescriptor Alcohol = Caution(
            "interference-alcohol", "alcohol is oxidised",
            "Alcohol: the C-H next to O is abstracted and the halohydrin falls to the carbonyl compound; hypohalites may form.",
            "Alpha-hydroxy radicals and alkyl hypohalites both lead to aldehyde or ketone, which reacts further.",
            "Protect as ester (electron-poor) before the halogenation.");

        /// <summary>Tertiary alcohol.</summary>
        public static readonly ProblemDescriptor TertiaryAlcohol = Info(
            "interference-tertiary-alcohol", "tertiary alcohol forms a hypohalite",
            "Tertiary alcohol: it can exchange to the hypohalite, whose alkoxyl radical breaks a C-C bond or abstracts 1,5-H.",
            "Alkyl hypohalites exchange with tertiary alcohols and are cleaved by light.",
            "Watch for ketone from beta-scission; protect the alcohol if this matters.");

        /// <summary>Phenol.</summary>
        public static readonly ProblemDescriptor Phenol = Caution(
            "interference-phenol", "phenol inhibits the chain and is ring-halogenated",
            "Phenol: its O-H (about 367 kJ/mol) stops radical chains, and the ring takes up halogen by electrophilic substitution.",
            "Phenols are chain-breaking antioxidants and among the most reactive arenes.",
            "Protect as an electron-poor ester before the halogenation.");

        /// <summary>Carboxylic acid with a hypohalite.</summary>
        public static readonly ProblemDescriptor CarboxylicAcid = Info(
            "interference-carboxylic-acid", "carboxylic acid can form an acyl hypohalite",
            "Carboxylic acid: with a hypohalite it can exchange to the acyl hypohalite, which loses CO2 in light.",
            "Acyl hypohalites decarboxylate to the halide with one carbon less.",
            "Use the methyl ester when the carbon has to stay.");

        /// <summary>Dialkyl ether.</summary>
        public static readonly ProblemDescriptor Ether = Caution(
            "interference-ether", "ether: attack next to oxygen",
            "Ether with C-H next to O: halogenated there first; the alpha-halo ether is labile, often toxic, and ethers form peroxides.",
            "The C-H next to ether oxygen is weak (about 390 to 402 kJ/mol) and electron-rich.",
            "Test for peroxides, keep N-halo reagents and ethers apart at scale, and expect cleavage products on work-up.");

        /// <summary>Iodide.</summary>
        public static readonly ProblemDescriptor Iodide = Caution(
            "interference-iodide", "C-I bond is attacked",
            "Organic iodide: Cl2 and Br2 oxidise or displace the iodine, and light breaks the C-I bond.",
            "The C-I bond (about 235 kJ/mol at sp3 carbon) is weaker than the C-H bonds; free iodine stops the chain.",
            "Introduce iodine after the radical step.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
        [
            Alkene, Alkyne, ElectronRichAlkene, Quinone, Aldehyde, Ketone, ActiveMethylene, Epoxide, Cyclopropane,
            Acetal, AcidLabile, Alcohol, TertiaryAlcohol, Phenol, CarboxylicAcid, Ether, Iodide,
            .. HeteroatomEntries,
        ];

        private static ProblemDescriptor Caution(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Caution, title, message, cause, remedy);

        private static ProblemDescriptor Danger(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Danger, title, message, cause, remedy);

        private static ProblemDescriptor Info(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Info, title, message, cause, remedy);
    }
}
