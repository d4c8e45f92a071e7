using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Remarks on heat, gas and safe handling.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Heat
    {
        /// <summary>The standing note under every heat balance.</summary>
        public static readonly ProblemDescriptor StandingNote = new(
            "heat-standing-note", Severity.Caution, "No go-ahead",
            "This balance is an estimate from bond energies and never a go-ahead: local rules, reaction calorimetry and the judgement of licensed, qualified people decide.",
            "Kinetics, accumulation, side reactions and equipment are outside the calculation.",
            "Measure the heat flow at small scale, follow the safety data sheets and the rules of your site.");

        /// <summary>The adiabatic end temperature passes the boiling point of the solvent.</summary>
        public static readonly ProblemDescriptor PassesBoilingPoint = new(
            "heat-passes-boiling-point", Severity.Danger, "Adiabatic end temperature above the boiling point",
            "If all halogen reacted at once without cooling, the mixture would reach about {0:F0} C, above the boiling point of {1} ({2:F0} C).",
            "The heat of the whole batch exceeds what the solvent takes up.",
            "Dilute, feed the halogen at the rate of consumption, and size cooling and venting for the feed rate.");

        /// <summary>Large adiabatic rise.</summary>
        public static readonly ProblemDescriptor LargeRise = new(
            "heat-large-rise", Severity.Caution, "Large adiabatic rise",
            "Adiabatic rise of about {0:F0} K: accumulated halogen can run away.",
            "Rises above some 50 K are commonly taken as the point where dosing control becomes essential (common practice, no source).",
            "Do not charge all halogen at the start; confirm consumption before adding more.");

        /// <summary>Gas is evolved.</summary>
        public static readonly ProblemDescriptor Gas = new(
            "heat-gas", Severity.Caution, "Gas evolution",
            "{0} {1:G3} mol is formed, about {2:G3} L at {3:F0} C and 1 bar.",
            "The by-product of the chain is a corrosive gas at the reaction temperature.",
            "Provide an open path to a scrubber sized for the peak rate; guard against suck-back.");

        /// <summary>Induction period.</summary>
        public static readonly ProblemDescriptor Induction = new(
            "heat-induction", Severity.Caution, "Induction period and accumulation",
            "Radical chains may start late (oxygen, inhibitor, weak light); halogen added meanwhile reacts all at once.",
            "Inhibitors are consumed before the chain begins.",
            "Confirm the start (colour, heat) on a small part of the charge before adding the rest.");

        /// <summary>Initiator.</summary>
        public static readonly ProblemDescriptor Initiator = new(
            "heat-initiator", Severity.Caution, "Initiators decompose with heat and gas",
            "Peroxide and azo initiators release heat and gas of their own; the 10 h half-life temperatures are near 65 C (azobisisobutyronitrile) and 73 C (dibenzoyl peroxide).",
            "They are chosen to decompose at the reaction temperature.",
            "Use catalytic amounts, store cold, never dry or grind peroxides; follow their safety data sheets.");

        /// <summary>Hazard of the reagent.</summary>
        public static readonly ProblemDescriptor Reagent = new(
            "heat-reagent-hazard", Severity.Danger, "Hazard of the halogen source",
            "{0}: {1}. Exposure limits: {2}.",
            "Halogen sources are toxic, corrosive or unstable.",
            "Work in a hood with the protection and the limits that your local rules name.");

        /// <summary>Hazard of the solvent.</summary>
        public static readonly ProblemDescriptor Solvent = new(
            "heat-solvent-hazard", Severity.Caution, "Hazard of the solvent",
            "{0}: {1}.",
            "The solvent is hazardous or takes part in the reaction.",
            "Check whether a safer inert solvent serves, for example (trifluoromethyl)benzene.");

        /// <summary>No enthalpy for a part of the reaction.</summary>
        public static readonly ProblemDescriptor NoEnthalpy = new(
            "heat-no-enthalpy", Severity.Caution, "Heat not known for every site",
            "No reaction enthalpy for site(s) {0}; the heat given covers the rest.",
            "A bond energy is missing from the tables.",
            "Supply the missing bond in a table of your own, or measure the heat.");

        /// <summary>Neat reaction.</summary>
        public static readonly ProblemDescriptor Neat = new(
            "heat-neat", Severity.Caution, "Neat reaction",
            "No solvent given: the rise assumes {0:F1} J/(g K) for substrate and reagent, the low end for organic liquids (common practice, no source).",
            "Without a solvent the reacting mass alone takes up the heat.",
            "Give a solvent and its volume, or the measured heat capacity of the mixture.");

        /// <summary>More halogen than substrate.</summary>
        public static readonly ProblemDescriptor ExcessHalogen = new(
            "heat-excess-halogen", Severity.Caution, "More than one equivalent",
            "With {0:G3} equivalents of halogen the product is halogenated again; the heat counts every equivalent at the enthalpy of the first.",
            "The enthalpies of later steps differ by some 10 kJ/mol.",
            "See the course of the halogenation for the composition.");

        /// <summary>The exchange between an N-halogen imide and HX is not counted.</summary>
        public static readonly ProblemDescriptor ExchangeNotCounted = new(
            "heat-exchange-not-counted", Severity.Danger, "More heat than counted",
            "The balance counts the chain through {1} only; the exchange of {0} with HX, which makes that halogen, releases further heat that is not in it.",
            "No bond enthalpy of the imide with a source is in the tables, and none is guessed.",
            "Take the figures as a lower bound and measure the heat of the batch by calorimetry.");

        /// <summary>The substrate has no molar mass.</summary>
        public static readonly ProblemDescriptor NoMolarMass = new(
            "heat-no-molar-mass", Severity.Error, "No molar mass",
            "The substrate has no molar mass, so no batch of it can be reckoned.",
            "It is empty, or holds an atom without a standard atomic weight such as the wildcard.",
            "Give a complete molecule of elements with a standard atomic weight.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
        [
            NoMolarMass,
            ExchangeNotCounted,
            StandingNote, PassesBoilingPoint, LargeRise, Gas, Induction, Initiator, Reagent, Solvent, NoEnthalpy, Neat,
            ExcessHalogen,
        ];
    }
}
