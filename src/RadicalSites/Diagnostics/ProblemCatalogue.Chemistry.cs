using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Valid text, impossible chemistry.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Chemistry
    {
        /// <summary>More bonds than the element can carry.</summary>
        public static readonly ProblemDescriptor Valence = new(
            "chemistry-valence", Severity.Error, "Impossible valence",
            "Atom {0} ({1}) has a total of {2} bonds; this element and charge carry at most {3}.",
            "A bond order, a hydrogen count or a charge is wrong, or a ring bond was closed twice.",
            "Correct the bonds, or write the charge in brackets.");

        /// <summary>No Kekule form.</summary>
        public static readonly ProblemDescriptor NoKekuleForm = new(
            "chemistry-no-kekule-form", Severity.Error, "Aromatic system without Kekule form",
            "No arrangement of double bonds fits the aromatic atoms {0}.",
            "A ring nitrogen may need its hydrogen ([nH]), a charge may be missing, or the ring has an odd number of pi electrons.",
            "Write the pyrrole-type nitrogen as [nH], add the charge, or use upper-case atoms with explicit double bonds.");

        /// <summary>Aromatic atom outside a ring.</summary>
        public static readonly ProblemDescriptor AromaticOutsideRing = new(
            "chemistry-aromatic-outside-ring", Severity.Error, "Aromatic atom outside a ring",
            "Atom {0} ({1}) is written as aromatic but lies on no ring.",
            "Lower-case symbols stand for atoms of aromatic rings only.",
            "Write the symbol in upper case, or close the ring.");

        internal static IReadOnlyList<ProblemDescriptor> Entries => [Valence, NoKekuleForm, AromaticOutsideRing];
    }
}
