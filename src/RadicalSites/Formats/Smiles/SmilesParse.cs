using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Smiles;

namespace RadicalSites.Formats.Smiles;

/// <summary>State of one pass over a SMILES; used again by its thread for the next text.</summary>
internal sealed partial class SmilesParse
{
    private readonly StructureDraft draft = new();
    private int[] branchAtoms = new int[32];
    private int[] branchPositions = new int[32];
    private RingOpening[] openings = new RingOpening[16];
    private int openingCount;
    private int[] openingOfNumber = new int[100];
    private RingEnds[] ringEnds = new RingEnds[16];
    private int ringCount;
    private bool mayRepeatBond;
    private bool lenient;
    private List<FormatProblem>? remarks;
    private StereoMark[] marks = new StereoMark[8];
    private int markCount;
    private DirectionMark[] directions = new DirectionMark[8];
    private int directionCount;
    private FormatProblem? failure;

    private int previous;
    private char bondSymbol;
    private int bondPosition;

    internal Molecule? Read(ReadOnlySpan<char> text, SmilesReaderOptions options, List<FormatProblem>? found, out FormatProblem? problem)
    {
        draft.Clear();
        lenient = options.IsLenient;
        remarks = found;
        draft.AcceptsAnyValence = lenient;
        if (lenient)
        {
            text = text.Trim();
            int end = text.IndexOfAny(' ', '\t');
            if (end >= 0)
            {
                Remark(Entry.Trailing, end);
                text = text[..end];
            }
        }

        ForgetOpenings();
        ringCount = 0;
        mayRepeatBond = false;
        incidenceReady = false;
        markCount = 0;
        directionCount = 0;
        failure = null;
        previous = -1;
        bondSymbol = '\0';
        bool ok = text.Length == 0
            ? Fail(Entry.Empty, 0)
            : text.Length > options.LongestText
                ? Fail(Entry.TooLong, options.LongestText, text.Length, options.LongestText)
                : Scan(text);
        ok = ok && CompleteStereo();
        problem = failure;
        if (!ok)
        {
            return null;
        }

        return MoleculeCompletion.Complete(draft, out problem);
    }

    private bool Scan(ReadOnlySpan<char> text)
    {
        int branches = 0;
        int at = 0;
        while (at < text.Length)
        {
            char c = text[at];
            switch (c)
            {
                case 'C':
                    if (at + 1 < text.Length && text[at + 1] == 'l')
                    {
                        at++;
                        Organic(17, false, at - 1);
                    }
                    else
                    {
                        Organic(6, false, at);
                    }

                    at++;
                    break;
                case 'N':
                    Organic(7, false, at++);
                    break;
                case 'O':
                    Organic(8, false, at++);
                    break;
                case 'c':
                    Organic(6, true, at++);
                    break;
                case 'n':
                    Organic(7, true, at++);
                    break;
                case 'o':
                    Organic(8, true, at++);
                    break;
                case 's':
                    Organic(16, true, at++);
                    break;
                case 'p':
                    Organic(15, true, at++);
                    break;
                case 'b':
                    Organic(5, true, at++);
                    break;
                case 'S':
                    Organic(16, false, at++);
                    break;
                case 'P':
                    Organic(15, false, at++);
                    break;
                case 'F':
                    Organic(9, false, at++);
                    break;
                case 'I':
                    Organic(53, false, at++);
                    break;
                case 'B':
                    if (at + 1 < text.Length && text[at + 1] == 'r')
                    {
                        at++;
                        Organic(35, false, at - 1);
                    }
                    else
                    {
                        Organic(5, false, at);
                    }

                    at++;
                    break;
                case '*':
                    Organic(0, false, at++);
                    break;
                case '[':
                    if (!Bracket(text, ref at))
                    {
                        return false;
                    }

                    break;
                case '(':
                    if (previous < 0 || bondSymbol != '\0')
                    {
                        return Fail(Entry.BranchEmpty, at);
                    }

                    if (branches == branchAtoms.Length)
                    {
                        Array.Resize(ref branchAtoms, 2 * branches);
                        Array.Resize(ref branchPositions, 2 * branches);
                    }

                    branchAtoms[branches] = previous;
                    branchPositions[branches++] = at++;
                    if (at < text.Length && text[at] == ')')
                    {
                        return Fail(Entry.BranchEmpty, at);
                    }

                    break;
                case ')':
                    if (branches == 0)
                    {
                        return Fail(Entry.BranchUnopened, at);
                    }

                    if (bondSymbol != '\0')
                    {
                        return Fail(Entry.BondDangling, bondPosition);
                    }

                    previous = branchAtoms[--branches];
                    at++;
                    break;
                case '-' or '=' or '#' or '$' or ':' or '/' or '\\':
                    if (previous < 0 || bondSymbol != '\0')
                    {
                        return Fail(Entry.BondDangling, at);
                    }

                    bondSymbol = c;
                    bondPosition = at++;
                    break;
                case '.':
                    if (previous < 0 || bondSymbol != '\0' || at + 1 == text.Length)
                    {
                        return Fail(Entry.BondDangling, bondSymbol != '\0' ? bondPosition : at);
                    }

                    previous = -1;
                    at++;
                    break;
                case >= '0' and <= '9' or '%':
                    if (!RingBond(text, ref at))
                    {
                        return false;
                    }

                    break;
                default:
                    return char.IsWhiteSpace(c)
                        ? Fail(Entry.Trailing, at)
                        : char.IsAsciiLetter(c)
                            ? Fail(Entry.UnknownElement, at, c.ToString())
                            : Fail(Entry.UnexpectedCharacter, at, c.ToString());
            }
        }

        if (branches > 0)
        {
            return Fail(Entry.BranchUnclosed, branchPositions[branches - 1]);
        }

        if (bondSymbol != '\0')
        {
            return Fail(Entry.BondDangling, bondPosition);
        }

        if (openingCount > 0)
        {
            return FailUnclosed();
        }

        return !mayRepeatBond || RingBondsDiffer();
    }

    private void Organic(int element, bool aromatic, int position)
    {
        ref BuilderAtom atom = ref draft.AddAtom();
        atom.Element = (byte)element;
        atom.Hydrogens = element == 0 ? (sbyte)0 : (sbyte)-1;
        atom.IsAromatic = aromatic;
        atom.Position = position;
        draft.HasAromatic |= aromatic;
        Attach(draft.AtomCount - 1, aromatic);
    }

    // Joins a new atom to the one before it, or starts a fragment.
    private void Attach(int index, bool aromatic)
    {
        if (previous >= 0)
        {
            AddBond(previous, index, bondSymbol, aromatic && draft.Atoms[previous].IsAromatic, bondPosition);
            LeaveOpenBesideWildcard(previous, index, bondSymbol);
            if (markCount > 0)
            {
                AppendCarrier(previous, index);
            }
        }

        bondSymbol = '\0';
        previous = index;
    }

    private void AddBond(int begin, int end, char symbol, bool bothAromatic, int position)
    {
        ref BuilderBond bond = ref draft.AddBond();
        bond.Begin = begin;
        bond.End = end;
        bond.Position = position;
        switch (symbol)
        {
            case '\0':
                bond.Order = bothAromatic ? BondOrder.Unknown : BondOrder.Single;
                bond.IsAromatic = bothAromatic;
                break;
            case '=':
                bond.Order = BondOrder.Double;
                break;
            case '#':
                bond.Order = BondOrder.Triple;
                break;
            case '$':
                bond.Order = BondOrder.Quadruple;
                break;
            case ':':
                // An aromatic bond makes its ends aromatic, so that C1:C:C:C:C:C1 is benzene.
                bond.Order = BondOrder.Unknown;
                bond.IsAromatic = true;
                draft.Atoms[begin].IsAromatic = true;
                draft.Atoms[end].IsAromatic = true;
                draft.HasAromatic = true;
                break;
            case '/' or '\\':
                bond.Order = BondOrder.Single;
                AddDirection(draft.BondCount - 1, symbol == '/');
                break;
            default:
                bond.Order = BondOrder.Single;
                break;
        }
    }

    // A wildcard may be an aromatic atom: *1ccccc1 has a Kekule form with a double bond to it.
    private void LeaveOpenBesideWildcard(int begin, int end, char symbol)
    {
        ref BuilderAtom first = ref draft.Atoms[begin];
        ref BuilderAtom second = ref draft.Atoms[end];
        if (symbol == '\0' && ((first.Element == 0 && second.IsAromatic) || (second.Element == 0 && first.IsAromatic)))
        {
            draft.Bonds[draft.BondCount - 1].Order = BondOrder.Unknown;
        }
    }

    private void AddDirection(int bond, bool up)
    {
        if (directionCount == directions.Length)
        {
            Array.Resize(ref directions, 2 * directionCount);
        }

        directions[directionCount++] = new DirectionMark(bond, up);
    }

    private struct RingOpening
    {
        internal int Number;
        internal int Atom;
        internal char Symbol;
        internal int Position;

        /// <summary>Place of the ring bond among the carriers of a stereo mark at the opening atom.</summary>
        internal int Carrier;

        /// <summary>Number of bonds when the ring was opened: keeps the bond in the order of the opening.</summary>
        internal int Mark;
    }

    private struct StereoMark
    {
        internal int Atom;
        internal StereoKind Kind;
        internal int Configuration;
        internal int Count;
        internal Carriers Carriers;

        /// <summary>Whether the first carrier is the atom before the centre.</summary>
        internal bool HasPrevious;
    }

    /// <summary>Where the text opens and closes a ring bond.</summary>
    private readonly record struct RingEnds(int Bond, int Number, int Opening, int Closing);

    [System.Runtime.CompilerServices.InlineArray(8)]
    private struct Carriers
    {
        private int first;
    }

    private readonly record struct DirectionMark(int Bond, bool Up);
}
