using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Remarks on the course of over-halogenation.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Course
    {
        /// <summary>No site reacts, so there is no course.</summary>
        public static readonly ProblemDescriptor NoReaction = new(
            "course-no-reaction", Severity.Caution, "No course",
            "No site of the substrate has a rate with this reagent, so there is no course to follow.",
            "The molecule has no C(sp3)-H bond, the sites have no data, or the chain does not propagate.",
            "Look at the sites and at the chain verdict of the prediction.");

        /// <summary>The network was cut.</summary>
        public static readonly ProblemDescriptor Truncated = new(
            "course-truncated", Severity.Caution, "Part of the mixture is not followed",
            "At the end of the curve {0:P2} of the substrate has become species that are not followed one by one; they react on as the mean of the followed ones with as many halogens.",
            "The limits on species, on halogens per molecule or on the passage cut the network.",
            "Raise the limits, or stop the curve at fewer equivalents.");

        /// <summary>The limit of species stopped the growth.</summary>
        public static readonly ProblemDescriptor SpeciesLimit = new(
            "course-species-limit", Severity.Caution, "Limit of species reached",
            "The network was stopped at {0} species.",
            "The number of isomers grows steeply with every halogen.",
            "Raise the limit if the truncated part matters; time grows with its cube.");

        /// <summary>The curve ends early.</summary>
        public static readonly ProblemDescriptor EndsEarly = new(
            "course-ends-early", Severity.Info, "The curve ends before the equivalents asked for",
            "The followed species take up at most {0:G4} equivalents; the curve ends there.",
            "No reactive hydrogen is left, or the species that could go on are not followed.",
            "Nothing if the molecule is exhausted; otherwise raise the number of halogens followed.");

        /// <summary>The split of transposed products was not known.</summary>
        public static readonly ProblemDescriptor SplitUnknown = new(
            "course-split-unknown", Severity.Caution, "Transposed products are not told apart",
            "Delocalised radicals give products whose split is unknown; the course carries them as the direct product. Species concerned: {0}.",
            "No published ratio applies to the ends of this radical.",
            "Read the amount of a direct product there as the sum over its transposed isomers.");

        /// <summary>Sites without a rate stay out of the course.</summary>
        public static readonly ProblemDescriptor SitesWithoutRate = new(
            "course-sites-without-rate", Severity.Caution, "Sites without a rate stay out of the course",
            "{0} of the species followed have sites without a rate; reaction there is left out.",
            "There is no bond dissociation enthalpy or rate for those sites.",
            "Supply values in a table of your own, or read the course as a lower bound of over-halogenation.");

        /// <summary>Published whole-molecule ratios were used.</summary>
        public static readonly ProblemDescriptor MeasuredRatios = new(
            "course-measured-ratios", Severity.Info, "Published ratios of whole-molecule rates are used",
            "The rates of {0} species relative to each other follow published ratios ({1}).",
            "For this series ratios of whole-molecule rates were published; they outrank the model.",
            "See the rows of the table for medium and temperature.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
            [NoReaction, Truncated, SpeciesLimit, EndsEarly, SplitUnknown, SitesWithoutRate, MeasuredRatios];
    }
}
