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

        internal static IReadOnlyList<ProblemDescriptor> Entries => [NoSites, LimitReached];
    }
}
