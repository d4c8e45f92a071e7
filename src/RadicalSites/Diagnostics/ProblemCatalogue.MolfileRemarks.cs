using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Remarks on molfiles that were read, and on what a molfile cannot hold.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class MolfileRemarks
    {
        /// <summary>Columns shifted.</summary>
        public static readonly ProblemDescriptor Misaligned = Info(
            "molfile-misaligned", "Columns are shifted", "Line {0} was read by its white space, since its columns do not hold numbers.",
            "The file was edited by hand, or a number is wider than its field.", "Write the file again with a program that keeps the columns.");

        /// <summary>Missing end.</summary>
        public static readonly ProblemDescriptor MissingEnd = Info(
            "molfile-missing-end", "M  END is missing", "The connection table has no M  END line; it was complete otherwise.",
            "The file was written by an old program or edited.", "Add the line M  END after the properties.");

        /// <summary>Unknown property line.</summary>
        public static readonly ProblemDescriptor UnknownProperty = Info(
            "molfile-unknown-property", "Property line not used", "Line {0} ({1}) is not used.",
            "The line holds a display property, group data or an extension.", "Nothing, unless the line changes the molecule.");

        /// <summary>Alias.</summary>
        public static readonly ProblemDescriptor Alias = Caution(
            "molfile-alias", "Atom alias not used", "Atom number {0} has the alias '{1}'; the atom was read as drawn.",
            "An alias is a label; it may stand for a group that is not drawn.", "Draw the group in full if the alias abbreviates one.");

        /// <summary>Singlet radical.</summary>
        public static readonly ProblemDescriptor Singlet = Caution(
            "molfile-singlet", "Singlet state not kept", "Atom number {0} is marked as a singlet; two open valences are kept without their spin.",
            "The molecule model counts unpaired electrons, not spin states.", "Nothing for C-H sites; mind it for carbenes.");

        /// <summary>Enhanced stereo groups.</summary>
        public static readonly ProblemDescriptor StereoGroups = Caution(
            "molfile-stereo-groups", "Stereo groups read as absolute",
            "The file marks stereocentres as racemic or relative groups; they were read as drawn.",
            "Groups of stereocentres (racemic, relative) are not part of the molecule model.", "Read the result for one of the stereoisomers.");

        /// <summary>Ambiguous wedges.</summary>
        public static readonly ProblemDescriptor AmbiguousWedge = Caution(
            "molfile-stereo-ambiguous", "Stereo mark without meaning",
            "The wedges at atom number {0} do not define a configuration.",
            "The atom is no stereocentre, the wedges contradict each other, or neighbours lie on one line.", "Redraw the wedges.");

        /// <summary>Hydrogen placed by the Kekule form.</summary>
        public static readonly ProblemDescriptor HydrogenPlaced = Info(
            "molfile-hydrogen-placed", "Hydrogen on an aromatic nitrogen",
            "Only with a hydrogen on atom number {0} do the aromatic bonds have a Kekule form; it was placed there.",
            "Bond type 4 does not say which nitrogen carries the hydrogen.", "Draw the hydrogen to state it.");

        /// <summary>Wildcard cannot be written.</summary>
        public static readonly ProblemDescriptor NoWildcard = Error(
            "molfile-write-wildcard", "Wildcard in a molfile", "Atom {0} is a wildcard, which would be a query atom in a molfile.",
            "A molfile describes a molecule; its generic symbols belong to queries.", "Replace the wildcard, or write SMILES.");

        /// <summary>Quadruple bond cannot be written.</summary>
        public static readonly ProblemDescriptor NoQuadruple = Error(
            "molfile-write-quadruple", "Quadruple bond in a molfile", "The bond of atoms {0} and {1} is quadruple; the format ends at triple bonds.",
            "Bond types of the format are single, double, triple and aromatic.", "Write SMILES.");

        /// <summary>Hydrogen count cannot be written.</summary>
        public static readonly ProblemDescriptor NoValence = Error(
            "molfile-write-valence", "Valence beyond the format", "Atom {0} has a total valence of {1}; the valence field ends at 14.",
            "The hydrogens are counts that only the valence field can hold.", "Give the hydrogens as atoms, or write SMILES.");

        /// <summary>Stereo lost on writing.</summary>
        public static readonly ProblemDescriptor StereoLost = Caution(
            "molfile-write-stereo", "Stereo cannot be written", "The configuration of {0} has no form in a molfile and is left out.",
            "The format knows tetrahedral centres, and double bonds and allenes through coordinates.", "Write SMILES, or give coordinates.");

        /// <summary>Lines outside of data items.</summary>
        public static readonly ProblemDescriptor StrayLine = Info(
            "sdf-stray-line", "Line outside of a data item", "Line {0} stands between the molfile and the first data header; it is not used.",
            "A data header starts with >.", "Give the line a data header, or remove it.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
        [
            Misaligned, MissingEnd, UnknownProperty, Alias, Singlet, StereoGroups, AmbiguousWedge, HydrogenPlaced, NoWildcard,
            NoQuadruple, NoValence, StereoLost, StrayLine,
        ];

        private static ProblemDescriptor Info(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Info, title, message, cause, remedy);

        private static ProblemDescriptor Caution(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Caution, title, message, cause, remedy);

        private static ProblemDescriptor Error(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Error, title, message, cause, remedy);
    }
}
