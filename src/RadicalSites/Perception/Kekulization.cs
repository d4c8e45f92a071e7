using System;
using System.Collections.Generic;
using System.Globalization;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Finds localised double bonds for aromatic input: a matching of the atoms that need one.</summary>
/// <remarks>
/// An aromatic atom needs a double bond when its sigma bonds and hydrogens leave exactly one valence open (carbon with
/// three partners, pyridine nitrogen ...); pyrrole nitrogen, furan oxygen and atoms with an exocyclic double bond need
/// none; a wildcard may have one. Atoms forced by a single free neighbour are paired first, the rest greedily, and what
/// remains by augmenting paths with blossoms, so a Kekule form is found whenever one exists.
/// </remarks>
internal static class Kekulization
{
    private const int NoNeed = 0;
    private const int Optional = 1;
    private const int Needed = 2;

    /// <summary>Gives every aromatic bond of the draft its order.</summary>
    /// <returns>The problem, or null when a Kekule form was found.</returns>
    internal static FormatProblem? Localise(StructureDraft draft, CompletionScratch scratch)
    {
        int count = draft.AtomCount;
        ReadOnlySpan<BuilderBond> bonds = draft.Bonds.AsSpan(0, draft.BondCount);
        int[] need = scratch.First;
        int[] mate = scratch.Second;
        for (int i = 0; i < count; i++)
        {
            mate[i] = -1;
            need[i] = NoNeed;
            if (draft.Atoms[i].IsAromatic)
            {
                if ((scratch.AtomFlags[i] & AtomFlags.Ring) == 0)
                {
                    return OutsideRing(draft, i);
                }

                need[i] = NeedOf(draft, scratch, i);
            }
            else if (draft.Atoms[i].Element == 0 && (scratch.AtomFlags[i] & AtomFlags.Ring) != 0)
            {
                need[i] = Optional;
            }
        }

        MarkCandidates(draft, scratch, bonds, need);
        Pair(scratch, need, mate, count);
        for (int i = 0; i < count; i++)
        {
            if (need[i] == Needed && mate[i] < 0 && !Matching.Augment(scratch, need, mate, count, i))
            {
                return NoForm(draft, scratch, i);
            }
        }

        for (int i = 0; i < bonds.Length; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            if (bond.Order == BondOrder.Unknown)
            {
                bond.Order = mate[bond.Begin] == bond.End ? BondOrder.Double : BondOrder.Single;
            }
        }

        return null;
    }

    // An unmarked bond between aromatic atoms of different rings (biphenyl) is single; only ring bonds may be double.
    private static void MarkCandidates(
        StructureDraft draft, CompletionScratch scratch, ReadOnlySpan<BuilderBond> bonds, int[] need)
    {
        for (int i = 0; i < bonds.Length; i++)
        {
            ref readonly BuilderBond bond = ref bonds[i];
            if (bond.Order == BondOrder.Unknown && (scratch.BondFlags[i] & CompletionScratch.RingBit) != 0
                && need[bond.Begin] != NoNeed && need[bond.End] != NoNeed)
            {
                scratch.BondFlags[i] |= CompletionScratch.CandidateBit;
            }
        }
    }

    private static int NeedOf(StructureDraft draft, CompletionScratch scratch, int index)
    {
        ref BuilderAtom atom = ref draft.Atoms[index];
        if (atom.Element == 0)
        {
            return Optional;
        }

        int sigma = 0;
        foreach (Neighbor neighbor in scratch.NeighborsOf(index))
        {
            BondOrder order = draft.Bonds[neighbor.Bond].Order;
            sigma += order == BondOrder.Unknown ? 1 : (int)order;
        }

        ReadOnlySpan<byte> valences = Valences.Of(atom.Element, atom.Charge);
        if (atom.Hydrogens < 0)
        {
            // Organic subset: one valence is kept for the pi bond, hydrogens fill what is left of the lowest valence.
            int lowest = valences.Length > 0 ? valences[0] : 0;
            sigma += atom.FoldedHydrogens;
            int implied = Math.Max(0, lowest - sigma - 1);
            atom.Hydrogens = (sbyte)(implied + atom.FoldedHydrogens);
            sigma += implied;
        }
        else
        {
            sigma += atom.Hydrogens;
        }

        return TakesDouble(valences, sigma, atom.Element, atom.Charge) ? Needed : NoNeed;
    }

    /// <summary>Whether an aromatic atom with so many sigma bonds and hydrogens is read as one that needs a double bond.</summary>
    internal static bool TakesDouble(ReadOnlySpan<byte> valences, int sigma, int element, int charge)
    {
        foreach (byte valence in valences)
        {
            if (valence == sigma)
            {
                return false;
            }

            if (valence > sigma)
            {
                // Two open valences on N, O or S mean an open shell beside a lone pair, not a pi bond; a nitrogen cation
                // has no lone pair.
                return valence - sigma == 1 || element is 6 or 14 || (element is 7 or 15 && charge > 0);
            }
        }

        return false;
    }

    // Pairs atoms that have a single free partner, again and again; then pairs the next free atom with its first partner.
    private static void Pair(CompletionScratch scratch, int[] need, int[] mate, int count)
    {
        int[] free = scratch.Third;
        int[] queue = scratch.Fourth;
        int queued = 0;
        for (int i = 0; i < count; i++)
        {
            free[i] = 0;
            if (need[i] == NoNeed)
            {
                continue;
            }

            foreach (Neighbor neighbor in scratch.NeighborsOf(i))
            {
                free[i] += (scratch.BondFlags[neighbor.Bond] & CompletionScratch.CandidateBit) != 0 ? 1 : 0;
            }

            if (free[i] == 1 && need[i] == Needed)
            {
                queue[queued++] = i;
            }
        }

        int cursor = 0;
        while (true)
        {
            int atom;
            if (queued > 0)
            {
                atom = queue[--queued];
            }
            else
            {
                while (cursor < count && (need[cursor] != Needed || mate[cursor] >= 0))
                {
                    cursor++;
                }

                if (cursor == count)
                {
                    return;
                }

                atom = cursor++;
            }

            if (mate[atom] < 0)
            {
                int partner = FreePartner(scratch, need, mate, atom);
                if (partner >= 0)
                {
                    mate[atom] = partner;
                    mate[partner] = atom;
                    queued = Release(scratch, need, mate, free, queue, queued, atom);
                    queued = Release(scratch, need, mate, free, queue, queued, partner);
                }
            }
        }
    }

    private static int FreePartner(CompletionScratch scratch, int[] need, int[] mate, int atom)
    {
        int optional = -1;
        foreach (Neighbor neighbor in scratch.NeighborsOf(atom))
        {
            if ((scratch.BondFlags[neighbor.Bond] & CompletionScratch.CandidateBit) == 0 || mate[neighbor.Atom] >= 0)
            {
                continue;
            }

            if (need[neighbor.Atom] == Needed)
            {
                return neighbor.Atom;
            }

            optional = neighbor.Atom;
        }

        return optional;
    }

    private static int Release(
        CompletionScratch scratch, int[] need, int[] mate, int[] free, int[] queue, int queued, int atom)
    {
        foreach (Neighbor neighbor in scratch.NeighborsOf(atom))
        {
            int other = neighbor.Atom;
            if ((scratch.BondFlags[neighbor.Bond] & CompletionScratch.CandidateBit) != 0 && mate[other] < 0
                && --free[other] == 1 && need[other] == Needed && queued < queue.Length)
            {
                queue[queued++] = other;
            }
        }

        return queued;
    }

    private static FormatProblem OutsideRing(StructureDraft draft, int atom) => new()
    {
        Descriptor = ProblemCatalogue.Chemistry.AromaticOutsideRing,
        Message = ProblemCatalogue.Chemistry.AromaticOutsideRing.Format(atom, Elements.SymbolOf(draft.Atoms[atom].Element)),
        Position = draft.Atoms[atom].Position,
        Atoms = [atom],
    };

    private static FormatProblem NoForm(StructureDraft draft, CompletionScratch scratch, int start)
    {
        // The connected aromatic atoms around the one that found no partner.
        var atoms = new List<int> { start };
        var seen = new HashSet<int> { start };
        for (int head = 0; head < atoms.Count && atoms.Count < 64; head++)
        {
            foreach (Neighbor neighbor in scratch.NeighborsOf(atoms[head]))
            {
                if (draft.Atoms[neighbor.Atom].IsAromatic && draft.Bonds[neighbor.Bond].Order == BondOrder.Unknown
                    && seen.Add(neighbor.Atom))
                {
                    atoms.Add(neighbor.Atom);
                }
            }
        }

        atoms.Sort();
        var names = new StringBuilder();
        int nitrogen = -1;
        foreach (int atom in atoms)
        {
            names.Append(names.Length > 0 ? ", " : "").Append(atom.ToString(CultureInfo.InvariantCulture));
            ref BuilderAtom data = ref draft.Atoms[atom];
            nitrogen = nitrogen < 0 && data is { Element: 7, Charge: 0, Hydrogens: 0 } && scratch.NeighborsOf(atom).Length == 2
                ? atom
                : nitrogen;
        }

        string hint = nitrogen < 0
            ? ""
            : string.Create(CultureInfo.InvariantCulture, $"; atom {nitrogen} is a nitrogen that may need its hydrogen: [nH]");
        return new FormatProblem
        {
            Descriptor = ProblemCatalogue.Chemistry.NoKekuleForm,
            Message = ProblemCatalogue.Chemistry.NoKekuleForm.Format(names.ToString()).TrimEnd('.') + hint + ".",
            Position = draft.Atoms[nitrogen >= 0 ? nitrogen : start].Position,
            Atoms = atoms,
        };
    }
}
