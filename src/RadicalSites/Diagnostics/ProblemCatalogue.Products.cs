using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Remarks on products and on their enumeration.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Products
    {
        /// <summary>Benzylic radical: ring positions carry spin but give no product.</summary>
        public static readonly ProblemDescriptor RingPositionExcluded = new(
            "product-ring-position-excluded", Severity.Info, "Ring positions of a benzylic radical are left out",
            "The radical of site {0} is delocalised into an aromatic ring; halogen on a ring position is not counted as a product.",
            "Capture at a ring position would give a product without the aromatic ring, tens of kilojoules per mole less stable, and benzylic radicals are captured at the side chain.",
            "None is needed. Ring halogenation, where it happens, is a polar reaction: see the interference remarks.");

        /// <summary>A heteroatom end of the delocalised radical.</summary>
        public static readonly ProblemDescriptor HeteroatomEndExcluded = new(
            "product-heteroatom-end-excluded", Severity.Info, "Heteroatom ends of a radical are left out",
            "The radical of site {0} is delocalised onto a heteroatom; halogen on it is not counted as a product.",
            "Halogen bound to oxygen or nitrogen is a reagent itself and does not survive the reaction.",
            "None is needed; the product at carbon carries the whole share.");

        /// <summary>A transposed double bond that a small ring cannot hold.</summary>
        public static readonly ProblemDescriptor StrainedEndExcluded = new(
            "product-strained-end-excluded", Severity.Info, "A transposed product would be too strained",
            "The radical of site {0} has a canonical form with a double bond at a bridgehead or cumulated in a small ring; it is not counted as a product.",
            "Bredt's rule and the strain of small-ring cumulenes rule the form out.",
            "None is needed; the other ends carry the whole share.");

        /// <summary>Several ends share one radical and no published ratio applies.</summary>
        public static readonly ProblemDescriptor EndSplitUnknown = new(
            "product-end-split-unknown", Severity.Caution, "Split between the ends of a radical is unknown",
            "The radical of site {0} is captured at {1} different positions; no published ratio applies, so only the sum of their shares ({2:P1}) is known and each share is bounded by zero and that sum.",
            "Which end takes the halogen depends on substitution, halogen source and temperature, and allylic halides equilibrate.",
            "Take the bounds as they are, or settle the split by a measurement on a close analogue.");

        /// <summary>Several ends share one radical and a published ratio of a class is used.</summary>
        public static readonly ProblemDescriptor EndSplitFromAnalogue = new(
            "product-end-split-analogue", Severity.Info, "Split between the ends of a radical from an analogue",
            "The radical of site {0} is captured at {1} different positions; the split follows the published ratio for {2} [{3}].",
            "The ratio was measured on another substrate of the same substitution pattern.",
            "Treat the split as an estimate within the interval given.");

        /// <summary>The symmetry group has too many elements to list.</summary>
        public static readonly ProblemDescriptor SymmetryTooLarge = new(
            "isomers-symmetry-too-large", Severity.Error, "Symmetry too large to list",
            "One part of the molecule has so many symmetry operations that they cannot be listed; there are neither counts nor products.",
            "Dendrimers and molecules with many nested equivalent groups have groups with millions of elements.",
            "Enumerate a fragment that stands for the repeated part.");

        /// <summary>The products of a very large molecule would not fit in memory.</summary>
        public static readonly ProblemDescriptor TooManyAtoms = new(
            "product-atom-limit", Severity.Error, "Too many products of a very large molecule",
            "From site {0} on no products are built: together they would hold more than {1} atoms.",
            "Every product is as large as the substrate, so memory grows with the square of its size.",
            "Raise the limit, or work on the part of the molecule that matters.");

        /// <summary>The molecule is too large for isomer enumeration.</summary>
        public static readonly ProblemDescriptor MoleculeTooLarge = new(
            "isomers-molecule-too-large", Severity.Error, "Molecule too large for isomer enumeration",
            "The molecule has {0} atoms; isomers are enumerated up to {1} atoms.",
            "The symmetry search grows with the square of the size.",
            "Enumerate a smaller model of the part that matters.");

        /// <summary>A site has no rate.</summary>
        public static readonly ProblemDescriptor SiteShareMissing = new(
            "product-share-missing", Severity.Caution, "Products of a site without a rate",
            "Site {0} has no rate, so its products have no share and the shares of the others leave it out.",
            "There is no bond dissociation enthalpy or rate for the site.",
            "Supply a value in a table of your own, or read the shares as those among the rated sites.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
        [
            RingPositionExcluded, HeteroatomEndExcluded, StrainedEndExcluded, EndSplitUnknown, EndSplitFromAnalogue,
            SymmetryTooLarge, SiteShareMissing, TooManyAtoms, MoleculeTooLarge,
        ];
    }
}
