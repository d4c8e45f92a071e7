using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

public static partial class ProblemCatalogue
{
    /// <summary>Text that is not SMILES.</summary>
    /// <remarks>Immutable and safe for use by many threads.</remarks>
    public static class Smiles
    {
        /// <summary>Nothing to read.</summary>
        public static readonly ProblemDescriptor Empty = Error(
            "smiles-empty", "Empty text", "The SMILES is empty.",
            "A line or an argument without a structure was given.", "Give a SMILES such as CCC.");

        /// <summary>Character that no rule allows here.</summary>
        public static readonly ProblemDescriptor UnexpectedCharacter = Error(
            "smiles-unexpected-character", "Unexpected character", "Unexpected character '{0}'.",
            "The character is no SMILES symbol, or not at this place.", "Remove or correct the character.");

        /// <summary>Unknown element.</summary>
        public static readonly ProblemDescriptor UnknownElement = Error(
            "smiles-unknown-element", "Unknown element", "'{0}' is no element symbol.",
            "Element symbols start with an upper-case letter; aromatic ones are b c n o p s as se te.",
            "Correct the symbol, or put it in brackets.");

        /// <summary>Bracket not closed or malformed.</summary>
        public static readonly ProblemDescriptor Bracket = Error(
            "smiles-bracket", "Malformed bracket atom", "Malformed bracket atom: {0}.",
            "The order is isotope, symbol, stereo, hydrogens, charge, class, then ].", "Write it as in [13C@H+:1].");

        /// <summary>Ring bond opened only.</summary>
        public static readonly ProblemDescriptor RingUnclosed = Error(
            "smiles-ring-unclosed", "Ring bond not closed", "Ring bond {0} is opened but never closed.",
            "The digit occurs once; ring bonds come in pairs.", "Write the digit at the second atom as well, or remove it.");

        /// <summary>The two ends of a ring bond differ.</summary>
        public static readonly ProblemDescriptor RingMismatch = Error(
            "smiles-ring-bond-mismatch", "Ring bond orders differ", "The two ends of ring bond {0} carry different bond symbols.",
            "A bond symbol may stand at either end, or at both if they agree.", "Make the symbols equal or remove one.");

        /// <summary>Ring bond to itself or twice the same bond.</summary>
        public static readonly ProblemDescriptor RingSelf = Error(
            "smiles-ring-bond-duplicate", "Ring bond joins bonded atoms", "Ring bond {0} joins an atom to itself or to an atom it is bonded to already.",
            "Two atoms carry one bond only.", "Use the bond symbol = or # for a multiple bond.");

        /// <summary>Ring number malformed.</summary>
        public static readonly ProblemDescriptor RingNumber = Error(
            "smiles-ring-number", "Malformed ring number", "A ring number after % has two digits, or any number of digits in parentheses.",
            "%nn needs exactly two digits.", "Write %10 or %(100).");

        /// <summary>Parenthesis not closed.</summary>
        public static readonly ProblemDescriptor BranchUnclosed = Error(
            "smiles-branch-unclosed", "Branch not closed", "The branch is opened but never closed.",
            "A closing parenthesis is missing.", "Add ) where the branch ends.");

        /// <summary>Closing parenthesis too many.</summary>
        public static readonly ProblemDescriptor BranchUnopened = Error(
            "smiles-branch-unopened", "Branch not opened", "A branch is closed that was never opened.",
            "There is one ) too many.", "Remove the parenthesis.");

        /// <summary>Branch without content or without an atom before it.</summary>
        public static readonly ProblemDescriptor BranchEmpty = Error(
            "smiles-branch-misplaced", "Empty or misplaced branch", "A branch needs an atom before it and one inside.",
            "() or a branch at the start of the text or after a bond symbol.", "Remove the parentheses or add the atom.");

        /// <summary>Bond symbol without atom.</summary>
        public static readonly ProblemDescriptor BondDangling = Error(
            "smiles-bond-dangling", "Bond without atom", "A bond symbol has no atom on one side.",
            "The text ends, branches or starts with a bond symbol, or two symbols follow each other.",
            "Remove the bond symbol or add the atom.");

        /// <summary>Contradicting directional bonds.</summary>
        public static readonly ProblemDescriptor DirectionConflict = Error(
            "smiles-direction-conflict", "Contradicting / and \\", "The marks / and \\ at this double bond contradict each other.",
            "Two neighbours of one end cannot lie on the same side.", "Correct one of the marks.");

        /// <summary>Stereo with a wrong number of neighbours.</summary>
        public static readonly ProblemDescriptor StereoNeighbors = Error(
            "smiles-stereo-neighbors", "Stereo mark does not fit the neighbours", "Atom {0} has {1} neighbours, which does not fit its stereo mark {2}.",
            "@ needs four neighbours (a hydrogen or lone pair counts), @SP four, @TB five, @OH six.", "Remove the mark or complete the neighbours.");

        /// <summary>Text longer than allowed.</summary>
        public static readonly ProblemDescriptor TooLong = Error(
            "smiles-too-long", "Text too long", "The SMILES has {0} characters; the limit is {1}.",
            "The line is damaged or the limit is set low.", "Raise the limit in the options if the molecule is really that large.");

        /// <summary>White space inside.</summary>
        public static readonly ProblemDescriptor Trailing = Error(
            "smiles-white-space", "White space in the SMILES", "White space ends a SMILES; text follows it.",
            "A name belongs to the line format, not to the SMILES.", "Pass the part before the white space.");

        /// <summary>Remark: a directional bond beside a double bond whose other end has none.</summary>
        public static readonly ProblemDescriptor DirectionIncomplete = new(
            "smiles-direction-incomplete", Severity.Info, "Incomplete / or \\", "The mark / or \\ at the double bond of atom {0} has no partner at the other end.",
            "Both ends of a double bond need a mark to fix its geometry.", "Add the second mark, or remove this one.");

        internal static IReadOnlyList<ProblemDescriptor> Entries =>
        [
            Empty, UnexpectedCharacter, UnknownElement, Bracket, RingUnclosed, RingMismatch, RingSelf, RingNumber,
            BranchUnclosed, BranchUnopened, BranchEmpty, BondDangling, DirectionConflict, StereoNeighbors, TooLong, Trailing,
            DirectionIncomplete,
        ];

        private static ProblemDescriptor Error(string code, string title, string message, string cause, string remedy) =>
            new(code, Severity.Error, title, message, cause, remedy);
    }
}
