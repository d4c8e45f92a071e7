using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Remarks on rates, shares and chains.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Selectivity
    {
        /// <summary>No site propagates.</summary>
        public static readonly ProblemDescriptor ChainRefused = new(
            "chain-refused", Severity.Caution, "The chain does not propagate",
            "With {0} the chain does not propagate: at the best site ({1}) abstraction costs {2:F0} kJ/mol and both steps together {3:+0;-0} kJ/mol.",
            "The carrier forms too weak a bond to hydrogen.",
            "Choose a reagent with a stronger H-X bond; iodides are made from bromides or chlorides.");

        /// <summary>Some sites do not propagate.</summary>
        public static readonly ProblemDescriptor SlowChain = new(
            "chain-slow", Severity.Info, "Endothermic abstraction",
            "Abstraction at every site costs more than 20 kJ/mol: the chain is slow and selective and needs light or heat throughout.",
            "The carrier's bond to hydrogen is weaker than the C-H bonds.",
            "Keep light or initiator on; expect an end of the reaction when they stop.");

        /// <summary>Temperature outside the range of the parameters.</summary>
        public static readonly ProblemDescriptor TemperatureRange = new(
            "temperature-outside-range", Severity.Caution, "Temperature outside the range",
            "{0:F0} C is outside the range of the parameters for {1} ({2:F0} to {3:F0} C); the shares are extrapolated.",
            "The published data end there.",
            "Read the intervals as too narrow, or choose a temperature within the range.");

        /// <summary>Nearly statistical attack.</summary>
        public static readonly ProblemDescriptor Statistical = new(
            "selectivity-statistical", Severity.Caution, "Statistical mixture",
            "The sites react nearly in proportion to their hydrogens: expect a mixture of all isomers.",
            "The carrier is unselective at this temperature, or the sites are of one kind.",
            "A more selective reagent or a lower temperature may help; otherwise plan the separation.");

        /// <summary>Two leading sites cannot be told apart.</summary>
        public static readonly ProblemDescriptor Undecided = new(
            "selectivity-undecided", Severity.Info, "Leading sites within their intervals",
            "Sites {0} and {1} have shares within each other's interval: which of them leads is not decided.",
            "The difference is smaller than the uncertainty of the model.",
            "Look for both isomers; calibrate with a measured ratio.");

        /// <summary>Unknown solvent effect.</summary>
        public static readonly ProblemDescriptor SolventWithoutEffect = new(
            "solvent-not-in-table", Severity.Info, "No medium effect known",
            "No medium effect of the solvent {0} on the {1} is in the tables; the shares are those of an inert solvent.",
            "Only complexing solvents with published selectivities are listed.",
            "Nothing to do for inert solvents; see 'data reagents' for the solvents with an effect.");

        /// <summary>Addition competes.</summary>
        public static readonly ProblemDescriptor AdditionCompetes = new(
            "selectivity-addition", Severity.Caution, "Addition to the multiple bond",
            "{0} adds to the C=C or C-C triple bond; the shares hold only for the part that reacts by hydrogen abstraction.",
            "Substitution at the allylic site wins only at a very low halogen concentration.",
            "Use N-bromosuccinimide in a non-polar solvent, or add the halogen very slowly.");

        /// <summary>Bound for a site without a rate.</summary>
        public static readonly ProblemDescriptor ShareBound = new(
            "share-bound", Severity.Info, "Bound for a site without data",
            "Site {0} has no bond enthalpy and no share; with a bond as strong as usual in its class it would take {1:F1} % and the other shares would shrink in proportion.",
            "The table has no value for its bond.",
            "Load a table with this bond, or read the shares as those of the rated sites alone.");

        /// <summary>Deuterium competes.</summary>
        public static readonly ProblemDescriptor DeuteriumCompetes = new(
            "deuterium-competes", Severity.Info, "C-D bonds compete",
            "The {0} takes deuterium or tritium in {1:F1} % of the abstractions (kH/kD = {2:F1} at 25 C); the shares are those of the hydrogens.",
            "Bonds to heavy hydrogen break more slowly but not never.",
            "Expect that part of the product to have lost its label.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
        [
            ChainRefused, SlowChain, TemperatureRange, Statistical, Undecided, SolventWithoutEffect, AdditionCompetes,
            ShareBound, DeuteriumCompetes,
        ];
    }
}
