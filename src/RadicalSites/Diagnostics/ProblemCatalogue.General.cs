using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Entries that belong to no single room.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class General
    {
        /// <summary>The molecule has no C(sp3)-H bond.</summary>
        public static readonly ProblemDescriptor NoSites = new(
            "sites-none", Severity.Info, "No C(sp3)-H bond",
            "The molecule has no hydrogen on a saturated carbon, so there is no site for the radical route.",
            "Every carbon is unsaturated or fully substituted.",
            "Nothing to correct: an empty list of sites is the answer.");

        /// <summary>The input is larger than the limit of the caller.</summary>
        public static readonly ProblemDescriptor LimitReached = new(
            "limit-reached", Severity.Error, "Limit reached",
            "The limit of {0} {1} was reached.",
            "The input or the enumeration is larger than the options allow.",
            "Raise the limit in the options, or split the work.");

        /// <summary>A record could not be handled because of a mistake in the program.</summary>
        public static readonly ProblemDescriptor Internal = new(
            "internal-error", Severity.Error, "Mistake in the program",
            "The record could not be handled: {0}.",
            "A mistake in the program, not in the input.",
            "Report it with the input; the other records are not affected.");

        /// <summary>The wanted product does not come from the substrate by one halogenation.</summary>
        public static readonly ProblemDescriptor NotAProduct = new(
            "wanted-not-a-product", Severity.Error, "Not a product of this substrate",
            "{0} is no product of one halogenation of {1} with any reagent of the table.",
            "It differs in more than one halogen, or the halogen stands on a carbon that is no site.",
            "Compare with the list that the command isomers gives.");

        internal static IReadOnlyList<ProblemDescriptor> Entries => [NoSites, LimitReached, Internal, NotAProduct];
    }
}
