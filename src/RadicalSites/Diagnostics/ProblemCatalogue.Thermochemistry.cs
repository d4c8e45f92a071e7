using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Remarks on bond dissociation enthalpies.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Thermochemistry
    {
        /// <summary>A site has no value.</summary>
        public static readonly ProblemDescriptor NoValue = new(
            "bde-none", Severity.Caution, "No bond dissociation enthalpy",
            "Site {0} has no bond dissociation enthalpy: {1}. It takes no part in the shares; the shares of the others hold for the rest of the reaction.",
            "Neither this bond nor its class is in the tables.",
            "Supply the bond in a table of your own, or judge the site by hand.");

        /// <summary>A value rests on an analogy.</summary>
        public static readonly ProblemDescriptor Analogy = new(
            "bde-analogy", Severity.Info, "Value by analogy",
            "The value of site {0} is carried over from related classes ({1}); its uncertainty is larger.",
            "No member of this very class has been published in the sources used.",
            "Look at the evidence; supply a better value in a table of your own if you have one.");

        internal static IReadOnlyList<ProblemDescriptor> Entries => [NoValue, Analogy];
    }
}
