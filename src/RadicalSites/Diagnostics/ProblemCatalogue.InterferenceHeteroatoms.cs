using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    public static partial class Interference
    {
        /// <summary>Aryl ether, anilide or similar activated ring.</summary>
        public static readonly ProblemDescriptor ElectronRichArene = Caution(
            "interference-electron-rich-arene", "activated ring is halogenated by electrophilic substitution",
            "Aromatic ring with a strong donor: Br2, Cl2 and N-halo reagents substitute the ring without light.",
            "Electrophilic substitution of alkoxy- or acylamino-arenes needs no catalyst.",
            "Use N-bromosuccinimide in a non-polar solvent with light and without acid, or deactivate the ring (ester, sulfonate).");

        /// <summary>Furan, pyrrole, thiophene, indole.</summary>
        public static readonly ProblemDescriptor ElectronRichHeteroarene = Caution(
            "interference-electron-rich-heteroarene", "electron-rich heteroarene is halogenated or added to",
            "Furan, pyrrole, thiophene or indole type ring: halogen attacks the ring before the side chain.",
            "These rings react with electrophilic halogen far faster than benzene; furan also adds halogen.",
            "Deactivate the ring with an acyl group, or take an ionic side-chain route.");

        /// <summary>Pyridine-type nitrogen.</summary>
        public static readonly ProblemDescriptor BasicHeteroarene = Info(
            "interference-basic-heteroarene", "basic ring nitrogen",
            "Basic aromatic nitrogen: it binds the hydrogen halide and halogen, which slows and deactivates the side chain.",
            "The hydrohalide or N-halogen complex carries a positive charge beside the side chain.",
            "Use the N-oxide or protonated form knowingly, or add base; expect incomplete conversion.");

        /// <summary>Polycyclic arene.</summary>
        public static readonly ProblemDescriptor PolycyclicArene = Info(
            "interference-polycyclic-arene", "polycyclic or polyalkylated arene",
            "Fused or heavily alkylated arene: ring halogenation or addition competes with the side chain.",
            "Naphthalene, anthracene and rings with three or more alkyl groups react with halogen even without a catalyst.",
            "Keep the mixture free of acid and Lewis acid, use light and N-bromosuccinimide, and check for ring products.");

        /// <summary>Amine.</summary>
        public static readonly ProblemDescriptor Amine = Caution(
            "interference-amine", "amine forms N-halogen compounds or salts and is oxidised",
            "Amine: halogen and N-halo reagents give N-halo amines, imines or salts, violently in some cases, and the chain is inhibited.",
            "The nitrogen lone pair is the most reactive place of the molecule.",
            "Protonate it fully (strong acid), acylate it, or introduce it later; never add an N-halo reagent to a neat amine.");

        /// <summary>Aromatic amine.</summary>
        public static readonly ProblemDescriptor Aniline = Caution(
            "interference-aniline", "aromatic amine inhibits and is ring-halogenated",
            "Aromatic amine: a chain-breaking inhibitor whose ring takes up halogen by electrophilic substitution.",
            "Aromatic amines give up N-H or an electron to radicals, and their rings are highly activated.",
            "Use the nitro compound or a diacylated amine in the radical step.");

        /// <summary>Amide N-H with a halogen donor.</summary>
        public static readonly ProblemDescriptor AmideHydrogen = Caution(
            "interference-amide-nh", "N-H of the amide exchanges halogen",
            "Amide, carbamate or sulfonamide N-H: hypohalites and N-halo reagents give the N-halo amide, itself a radical source.",
            "Transfer of halogen between N-H and N-X or O-X is fast; amidyl radicals abstract 1,5-hydrogen.",
            "Use a tertiary amide or imide, or count on the N-halo amide as the real reagent.");

        /// <summary>Oxidisable nitrogen group.</summary>
        public static readonly ProblemDescriptor OxidisableNitrogen = Caution(
            "interference-oxidisable-nitrogen", "hydrazine, hydroxylamine, oxime, imine or nitroso group",
            "Easily oxidised or hydrolysed nitrogen group: it consumes the halogen source and may stop the chain.",
            "N-N and N-O compounds reduce halogens; imines are halogenated through the enamine; nitroso compounds trap radicals.",
            "Carry the nitrogen as nitro, nitrile or imide through the radical step.");

        /// <summary>Azide, diazo or diazonium.</summary>
        public static readonly ProblemDescriptor Azide = Danger(
            "interference-azide", "azide, diazo or diazonium compound: explosion hazard",
            "Azide, diazo or diazonium group: light, heat and halogen release nitrogen, possibly with explosion; halogen azides detonate.",
            "The group loses N2 exothermically under the conditions of a photohalogenation.",
            "Do not halogenate this compound by a radical chain; introduce the group afterwards.");

        /// <summary>Aliphatic azo compound.</summary>
        public static readonly ProblemDescriptor Azo = Caution(
            "interference-azo", "azo compound decomposes",
            "Azo group on saturated carbon: it is an initiator, loses N2 on heating or in light and gives off gas.",
            "The C-N bonds of azoalkanes break at the usual reaction temperatures.",
            "Treat it as initiator, keep below its decomposition temperature, and vent.");

        /// <summary>Peroxide.</summary>
        public static readonly ProblemDescriptor Peroxide = Danger(
            "interference-peroxide", "peroxide or hydroperoxide: explosion hazard",
            "O-O bond: heat, light, acid and metal salts decompose it violently.",
            "The O-O bond (about 150 to 190 kJ/mol) breaks under the conditions of the reaction.",
            "Destroy peroxides before the halogenation; use initiators in catalytic amounts only, by their safety data sheet.");

        /// <summary>Energetic nitro or nitrate compound.</summary>
        public static readonly ProblemDescriptor Energetic = Danger(
            "interference-energetic", "nitrate ester, nitramine or polynitro compound: explosion hazard",
            "Several nitro groups together, a nitrate ester or a nitramine: an explosive under heat or shock.",
            "Oxidiser and fuel are in one molecule.",
            "Do not run it without an energetic-materials assessment.");

        /// <summary>Halogen on nitrogen or oxygen.</summary>
        public static readonly ProblemDescriptor ActiveHalogen = Danger(
            "interference-active-halogen", "N-halogen or hypohalite in the substrate",
            "N-halogen or O-halogen bond in the substrate: it is itself a halogenating agent and may decompose violently when neat.",
            "Chloramines and hypohalites break down in light and heat.",
            "Handle in dilute solution only, away from light, by its safety data.");

        /// <summary>Nitro compound with a base.</summary>
        public static readonly ProblemDescriptor NitroWithBase = Danger(
            "interference-nitro-with-base", "nitroalkane with a base",
            "Nitroalkane together with an amine or other base: the nitronate salts are shock- and heat-sensitive, and halogen attacks them ionically.",
            "Bases deprotonate nitroalkanes; dry nitronates explode.",
            "Keep the mixture acidic and free of amines.");

        /// <summary>Thiol.</summary>
        public static readonly ProblemDescriptor Thiol = Caution(
            "interference-thiol", "thiol reacts first",
            "Thiol: S-H (about 365 kJ/mol for alkyl) is abstracted and oxidised first, to disulfide and sulfenyl halide.",
            "S-H is weaker and far more reactive than C-H; halogens oxidise it in the dark.",
            "Oxidise to the sulfonyl level or protect before the halogenation.");

        /// <summary>Sulfide, disulfide, selenide.</summary>
        public static readonly ProblemDescriptor Sulfide = Caution(
            "interference-sulfide", "sulfide or disulfide is oxidised",
            "Divalent sulfur, selenium or tellurium: halogen adds to it (halosulfonium) and gives alpha-halo sulfide or cleavage.",
            "The chalcogen lone pair takes up electrophilic halogen at once.",
            "Oxidise to the sulfone first if the group has to survive.");

        /// <summary>Sulfoxide, thiocarbonyl.</summary>
        public static readonly ProblemDescriptor OxidisableSulfur = Caution(
            "interference-oxidisable-sulfur", "sulfoxide, thiocarbonyl or sulfinyl group",
            "Sulfur group that halogen attacks (sulfoxide, thioamide, thioketone, sulfinic acid).",
            "Ionic halogenation next to the sulfoxide and oxidation of C=S run without light.",
            "Use the sulfone or the oxygen analogue in the radical step.");

        /// <summary>Hydride of Si, Ge, Sn, P or B.</summary>
        public static readonly ProblemDescriptor Hydride = Caution(
            "interference-hydride", "Si-H, Ge-H, Sn-H, P-H or B-H reacts first",
            "Element hydride: its hydrogen is abstracted first and it reduces halogen and organic halides.",
            "Sn-H (about 326) and tris(silyl)Si-H (about 350 kJ/mol) are weaker than C-H, and the radicals take halogen back from the product.",
            "Remove or block the hydride before the halogenation.");

        /// <summary>Trivalent phosphorus.</summary>
        public static readonly ProblemDescriptor TrivalentPhosphorus = Caution(
            "interference-phosphorus-iii", "trivalent phosphorus is oxidised",
            "Phosphine or phosphite: it takes up halogen to the halophosphonium salt, with heat.",
            "P(III) is a strong nucleophile toward halogen.",
            "Use the oxide, sulfide or borane complex instead.");

        /// <summary>Organometallic bond.</summary>
        public static readonly ProblemDescriptor Organometallic = Danger(
            "interference-organometallic", "carbon-metal bond is cleaved by halogen",
            "Carbon-metal bond: halogen cleaves it, violently for reactive metals.",
            "Halogenolysis of C-M bonds is faster than any radical chain.",
            "Do the halogenation before the metallation.");

        /// <summary>Metal atom or ion.</summary>
        public static readonly ProblemDescriptor MetalIon = Caution(
            "interference-metal", "metal ion or complex",
            "Transition metal: redox reactions with halogen, radicals and peroxides, and Lewis-acid ring halogenation.",
            "Metal ions start and stop chains and catalyse electrophilic substitution (FeBr3).",
            "Remove metal traces; treat a complex as outside the model.");

        /// <summary>Free radical or chain inhibitor.</summary>
        public static readonly ProblemDescriptor Inhibitor = Caution(
            "interference-inhibitor", "chain inhibitor",
            "Stable radical, oxygen, nitric oxide or iodine: it stops the chain and causes an induction period.",
            "The inhibitor combines with chain carriers; once used up, the accumulated reagent may react all at once.",
            "Purify and degas; do not answer an induction period by adding more initiator or heat.");

        /// <summary>Halide ion.</summary>
        public static readonly ProblemDescriptor HalideIon = Caution(
            "interference-halide-ion", "bromide or iodide ion",
            "Bromide or iodide ion: chlorine oxidises it (and halogen forms trihalide), which changes the chain carrier.",
            "Halogen exchange and trihalide formation are fast; iodine stops the chain.",
            "Exchange the counter-ion for sulfate, triflate or tetrafluoroborate; chloride with chlorine is harmless.");

        /// <summary>Base.</summary>
        public static readonly ProblemDescriptor Base = Caution(
            "interference-base", "strong base or nucleophilic anion",
            "Alkoxide, hydroxide, amide ion, carbanion or hydride: it reacts with halogen before the chain starts.",
            "Bases turn halogen into hypohalite; carbanions are halogenated directly.",
            "Neutralise first.");

        /// <summary>Isocyanate, isonitrile.</summary>
        public static readonly ProblemDescriptor Heterocumulene = Caution(
            "interference-heterocumulene", "isocyanate, isothiocyanate, ketene, carbodiimide or isonitrile",
            "Heterocumulene or isonitrile: hydrogen halide and halogen add to it.",
            "The cumulated carbon is a strong electrophile, the isonitrile carbon a nucleophile.",
            "Protect, or form the group after the halogenation.");

        private static IReadOnlyList<ProblemDescriptor> HeteroatomEntries =>
        [
            ElectronRichArene, ElectronRichHeteroarene, BasicHeteroarene, PolycyclicArene, Amine, Aniline,
            AmideHydrogen, OxidisableNitrogen, Azide, Azo, Peroxide, Energetic, ActiveHalogen, NitroWithBase, Thiol,
            Sulfide, OxidisableSulfur, Hydride, TrivalentPhosphorus, Organometallic, MetalIon, Inhibitor, HalideIon,
            Base, Heterocumulene,
        ];
    }
}
