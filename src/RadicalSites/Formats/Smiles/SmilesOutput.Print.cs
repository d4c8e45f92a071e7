using System;
using System.Numerics;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesOutput
{
    // Prints the tree that Explore found: atom, ring digits, branches, last child on the main line.
    private void Print(int root)
    {
        usedDigits.AsSpan().Clear();
        int depth = 0;
        stack[0] = root;
        PrintAtom(root);
        cursor[root] = molecule.NeighborOffsets[root];
        while (depth >= 0)
        {
            int atom = stack[depth];
            Neighbor? child = NextChild(atom);
            if (child is not { } next)
            {
                depth--;
                if (depth >= 0 && isBranch[depth])
                {
                    Append(')');
                }

                continue;
            }

            bool branch = --childCount[atom] > 0;
            EnsureBranch(depth);
            isBranch[depth] = branch;
            if (branch)
            {
                Append('(');
            }

            PrintBond(atom, next.Bond, next.Atom);
            PrintAtom(next.Atom);
            cursor[next.Atom] = molecule.NeighborOffsets[next.Atom];
            stack[++depth] = next.Atom;
        }
    }

    private bool[] isBranch = new bool[64];

    private void EnsureBranch(int depth)
    {
        if (depth >= isBranch.Length)
        {
            Array.Resize(ref isBranch, 2 * (depth + 1));
        }
    }

    private Neighbor? NextChild(int atom)
    {
        int end = molecule.NeighborOffsets[atom + 1];
        while (cursor[atom] < end)
        {
            Neighbor neighbor = molecule.NeighborSpan[sorted[cursor[atom]++]];
            if (parentBond[neighbor.Atom] == neighbor.Bond && neighbor.Bond != parentBond[atom])
            {
                return neighbor;
            }
        }

        return null;
    }

    private void PrintAtom(int index)
    {
        Atom atom = molecule.AtomSpan[index];
        int stereo = stereoOfAtom[index];
        string mark = stereo < 0 ? "" : MarkOf(molecule.StereoSpan[stereo], index);
        int hiddenHydrogen = HydrogenToWrite(index);
        if (mark.Length == 0 && hiddenHydrogen == 0 && IsOrganic(index, atom))
        {
            AppendSymbol(atom);
        }
        else
        {
            PrintBracket(index, atom, mark, hiddenHydrogen);
        }

        for (int at = ringHead[index]; at >= 0; at = closureNext[at])
        {
            PrintClosure(index, at);
        }
    }

    private void PrintBracket(int index, Atom atom, string mark, int hiddenHydrogen)
    {
        Append('[');
        if (atom.MassNumber > 0)
        {
            AppendNumber(atom.MassNumber);
        }

        AppendSymbol(atom);
        Append(mark);
        int hydrogens = atom.HydrogenCount - hiddenHydrogen;
        if (hydrogens > 0)
        {
            Append('H');
            if (hydrogens > 1)
            {
                AppendNumber(hydrogens);
            }
        }

        if (atom.FormalCharge != 0)
        {
            Append(atom.FormalCharge > 0 ? '+' : '-');
            if (Math.Abs(atom.FormalCharge) > 1)
            {
                AppendNumber(Math.Abs(atom.FormalCharge));
            }
        }

        if (atom.AtomClass > 0)
        {
            Append(':');
            AppendNumber(atom.AtomClass);
        }

        Append(']');
        if (hiddenHydrogen > 0)
        {
            // A hydrogen that carries the geometry of the double bond has to be written out.
            Append('(');
            Append(DirectionToHydrogen(index));
            Append("[H])");
        }
    }

    private void AppendSymbol(Atom atom)
    {
        string symbol = Elements.SymbolOf(atom.AtomicNumber);
        if (!atom.IsAromatic || atom.AtomicNumber == 0)
        {
            Append(symbol);
            return;
        }

        foreach (char c in symbol)
        {
            Append(char.ToLowerInvariant(c));
        }
    }

    private bool IsOrganic(int index, Atom atom)
    {
        if (atom.FormalCharge != 0 || atom.MassNumber != 0 || atom.AtomClass != 0)
        {
            return false;
        }

        if (atom.AtomicNumber == 0)
        {
            return atom.HydrogenCount == 0 && !atom.IsAromatic;
        }

        if (atom.AtomicNumber is not (5 or 6 or 7 or 8 or 9 or 15 or 16 or 17 or 35 or 53))
        {
            return false;
        }

        int bonds = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(index))
        {
            Bond bond = molecule.BondSpan[neighbor.Bond];
            bonds += bond.IsAromatic ? 1 : (int)bond.Order;
        }

        ReadOnlySpan<byte> valences = Valences.Of(atom.AtomicNumber, 0);
        if (atom.IsAromatic)
        {
            return atom.HydrogenCount == Math.Max(0, valences[0] - bonds - 1);
        }

        foreach (byte valence in atom.AtomicNumber is 17 or 35 or 53 ? valences[..1] : valences)
        {
            if (valence >= bonds)
            {
                return atom.HydrogenCount == valence - bonds;
            }
        }

        return atom.HydrogenCount == 0;
    }

    private void PrintBond(int from, int index, int to)
    {
        Bond bond = molecule.BondSpan[index];
        bool bothAromatic = molecule.AtomSpan[from].IsAromatic && molecule.AtomSpan[to].IsAromatic;
        if (bond.IsAromatic && bothAromatic)
        {
            if (DirectionOf(from, index, to) is var mark and not '\0')
            {
                Append(mark);
            }

            return;
        }

        switch (bond.Order)
        {
            case BondOrder.Single:
                char direction = DirectionOf(from, index, to);
                if (direction != '\0')
                {
                    Append(direction);
                }
                else if (bothAromatic)
                {
                    Append('-');
                }

                break;
            case BondOrder.Double:
                Append('=');
                break;
            case BondOrder.Triple:
                Append('#');
                break;
            default:
                Append('$');
                break;
        }
    }

    private void PrintClosure(int atom, int closure)
    {
        int bond = closureBond[closure];
        int other = molecule.BondSpan[bond].Other(atom);
        int digit = closureDigit[closure];
        if (digit == 0)
        {
            digit = TakeDigit();
            closureDigit[Partner(other, bond)] = digit;
            PrintBond(atom, bond, other);
        }
        else
        {
            usedDigits[digit >> 6] &= ~(1UL << (digit & 63));
        }

        if (digit < 10)
        {
            Append((char)('0' + digit));
        }
        else if (digit < 100)
        {
            Append('%');
            AppendNumber(digit);
        }
        else
        {
            Append("%(");
            AppendNumber(digit);
            Append(')');
        }
    }

    private int Partner(int atom, int bond)
    {
        int at = ringHead[atom];
        while (closureBond[at] != bond)
        {
            at = closureNext[at];
        }

        return at;
    }

    private int TakeDigit()
    {
        for (int word = 0; ; word++)
        {
            if (word == usedDigits.Length)
            {
                Array.Resize(ref usedDigits, 2 * word);
            }

            ulong free = ~usedDigits[word] & (word == 0 ? ~1UL : ulong.MaxValue);
            if (free != 0)
            {
                int bit = BitOperations.TrailingZeroCount(free);
                usedDigits[word] |= 1UL << bit;
                return (word << 6) + bit;
            }
        }
    }
}
