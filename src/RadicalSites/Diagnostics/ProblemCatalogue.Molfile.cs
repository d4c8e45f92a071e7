using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Text that is not a molfile, or that this library does not read as a molecule.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Molfile
    {
        /// <summary>Nothing to read.</summary>
        public static readonly ProblemDescriptor Empty = Error(
            "molfile-empty", "Empty molfile", "The molfile ends before its counts line.",
            "The record is empty or cut off within its three header lines.", "Give the whole molfile, the three header lines included.");

        /// <summary>Counts line not understood.</summary>
        public static readonly ProblemDescriptor CountsLine = Error(
            "molfile-counts-line", "Malformed counts line", "The fourth line is no counts line: {0}.",
            "A header line is missing or there is one too many, or the counts are not in columns 1 to 6.",
            "Restore the three header lines (they may be blank); the fourth line starts with the numbers of atoms and bonds.");

        /// <summary>Version unknown.</summary>
        public static readonly ProblemDescriptor Version = Error(
            "molfile-version", "Unknown version", "Version '{0}' of the connection table is not known.",
            "Only V2000 and V3000 are defined.", "Write the file as V2000 or V3000.");

        /// <summary>Blocks cut off.</summary>
        public static readonly ProblemDescriptor Truncated = Error(
            "molfile-truncated", "Molfile cut off", "The {0} block ends after {1} of {2} lines.",
            "The file was cut off, or the counts line does not match the blocks.", "Restore the missing lines or correct the counts.");

        /// <summary>Field is no number.</summary>
        public static readonly ProblemDescriptor Field = Error(
            "molfile-field", "Malformed field", "'{0}' is no {1}.",
            "The columns are shifted, or the field holds another text.", "Put the value into the columns that the format names.");

        /// <summary>Symbol is no element.</summary>
        public static readonly ProblemDescriptor Symbol = Error(
            "molfile-atom-symbol", "Unknown atom symbol", "'{0}' is no element symbol.",
            "Element symbols start with an upper-case letter; the symbol stands in columns 32 to 34.", "Correct the symbol.");

        /// <summary>Query or generic atom.</summary>
        public static readonly ProblemDescriptor QueryAtom = Error(
            "molfile-query-atom", "Query atom", "'{0}' stands for a set of atoms, not for one.",
            "A, Q, X, M, *, R groups, atom lists, lone pairs and polymer beads belong to queries and generic structures.",
            "Replace it by an element; each member of a generic structure is a record of its own.");

        /// <summary>Query bond.</summary>
        public static readonly ProblemDescriptor QueryBond = Error(
            "molfile-query-bond", "Query bond", "{0} belongs to a query, not to a molecule.",
            "Bond types 5 to 8 and ring or chain topology describe a search.", "Give each bond type 1, 2, 3 or 4.");

        /// <summary>Query property.</summary>
        public static readonly ProblemDescriptor QueryProperty = Error(
            "molfile-query-property", "Query or generic property", "{0} belongs to a query or generic structure.",
            "Hydrogen counts of queries, substitution, unsaturation, atom lists, R groups and link nodes describe many molecules.",
            "Remove the property or export the molecule without query features.");

        /// <summary>Bond type without localised order.</summary>
        public static readonly ProblemDescriptor BondType = Error(
            "molfile-bond-type", "Bond type not supported", "{0} has no localised order here.",
            "Dative, hydrogen and zero-order bonds are not part of the bond model of this library.",
            "Write the bond as single with charges on both ends, or leave it out.");

        /// <summary>Reference to an atom that does not exist.</summary>
        public static readonly ProblemDescriptor AtomNumber = Error(
            "molfile-atom-number", "No such atom", "There is no atom number {0}; the molecule has {1}.",
            "A bond or property line names an atom that the atom block does not hold.", "Correct the number or the counts line.");

        /// <summary>Bond to itself or bond given twice.</summary>
        public static readonly ProblemDescriptor BondDuplicate = Error(
            "molfile-bond-duplicate", "Bond joins bonded atoms", "Atoms number {0} and {1} are one atom or carry a bond already.",
            "Two different atoms carry one bond only.", "Remove the line, or raise the bond type of the first one.");

        /// <summary>Property line malformed.</summary>
        public static readonly ProblemDescriptor PropertyLine = Error(
            "molfile-property-line", "Malformed property line", "Malformed property line: {0}.",
            "Lines such as M  CHG hold the number of entries, then pairs of atom number and value.", "Correct the line.");

        /// <summary>Valence field below the bonds drawn.</summary>
        public static readonly ProblemDescriptor StatedValence = Error(
            "molfile-valence", "Stated valence too small", "Atom number {0} has bonds of total order {1}, more than the valence {2} it states.",
            "The valence field counts all bonds, implied hydrogens included.", "Correct the valence field or leave it empty.");

        /// <summary>Polymers.</summary>
        public static readonly ProblemDescriptor Polymer = Error(
            "molfile-polymer", "Polymer", "The group of type {0} repeats a part of the structure.",
            "A repeat unit stands for molecules of many sizes, so counts of hydrogens are not defined.",
            "Draw a model compound without repeat unit.");

        /// <summary>Reaction files.</summary>
        public static readonly ProblemDescriptor Reaction = Error(
            "molfile-reaction", "Reaction or other container", "'{0}' starts a file of another kind.",
            "Reaction files, RD files and R-group files are not read.", "Extract the molecules as molfile or SDF.");

        /// <summary>V3000 syntax.</summary>
        public static readonly ProblemDescriptor ExtendedSyntax = Error(
            "molfile-v3000-syntax", "Malformed V3000 line", "Malformed V3000 line: {0}.",
            "Lines start with M  V30, blocks with BEGIN and END; atom lines are index, type, x, y, z, map; bond lines index, type, two atoms.",
            "Correct the line.");

        /// <summary>Aromatic nitrogen without decided hydrogen.</summary>
        public static readonly ProblemDescriptor AromaticHydrogen = Error(
            "molfile-aromatic-hydrogen", "Hydrogen of an aromatic ring not decided",
            "With bond type 4 the hydrogen can sit on any of the nitrogen atoms number {0}.",
            "Bond type 4 does not say which nitrogen carries the hydrogen.",
            "Draw the hydrogen as an atom, or write single and double bonds.");

        /// <summary>Line too long or record too long.</summary>
        public static readonly ProblemDescriptor TooLong = Error(
            "record-too-long", "Record too long", "The record is longer than the limit of {0} characters; it was skipped to its end.",
            "A terminator is missing, the file is damaged, or the limit is set low.", "Check the file, or raise the limit in the options.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
        [
            Empty, CountsLine, Version, Truncated, Field, Symbol, QueryAtom, QueryBond, QueryProperty, BondType, AtomNumber,
            BondDuplicate, PropertyLine, StatedValence, Polymer, Reaction, ExtendedSyntax, AromaticHydrogen, TooLong,
        ];

        private static ProblemDescriptor Error(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Error, title, message, cause, remedy);
    }
}
