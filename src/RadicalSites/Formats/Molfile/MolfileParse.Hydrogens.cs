using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Molfile;
using Remark = RadicalSites.Diagnostics.ProblemCatalogue.MolfileRemarks;

namespace RadicalSites.Formats.Molfile;

/// <content>Neighbour lists and implied hydrogens.</content>
internal sealed partial class MolfileParse
{
    private int[] offsets = new int[65];
    private Neighbor[] neighbors = new Neighbor[144];
    private int[] work = new int[64];
    private readonly List<int> candidates = [];

    private ReadOnlySpan<Neighbor> NeighborsOf(int atom) => neighbors.AsSpan(offsets[atom], offsets[atom + 1] - offsets[atom]);

    // Lists the neighbours of each atom and refuses a bond that is given twice.
    private bool Connect(ref LineCursor cursor)
    {
        int atoms = draft.AtomCount;
        int bonds = draft.BondCount;
        if (offsets.Length < atoms + 1)
        {
            offsets = new int[2 * (atoms + 1)];
            work = new int[2 * (atoms + 1)];
        }

        if (neighbors.Length < 2 * bonds)
        {
            neighbors = new Neighbor[4 * bonds];
        }

        Span<int> fill = work.AsSpan(0, atoms);
        fill.Clear();
        ReadOnlySpan<BuilderBond> list = draft.Bonds.AsSpan(0, bonds);
        foreach (ref readonly BuilderBond bond in list)
        {
            fill[bond.Begin]++;
            fill[bond.End]++;
        }

        int sum = 0;
        for (int i = 0; i < atoms; i++)
        {
            int count = fill[i];
            offsets[i] = sum;
            fill[i] = sum;
            sum += count;
        }

        offsets[atoms] = sum;
        for (int i = 0; i < bonds; i++)
        {
            ref readonly BuilderBond bond = ref list[i];
            neighbors[fill[bond.Begin]++] = new Neighbor(bond.End, i);
            neighbors[fill[bond.End]++] = new Neighbor(bond.Begin, i);
        }

        fill.Fill(-1);
        for (int i = 0; i < atoms; i++)
        {
            foreach (Neighbor neighbor in NeighborsOf(i))
            {
                if (fill[neighbor.Atom] == i)
                {
                    return Fail(Entry.BondDuplicate, list[neighbor.Bond].Position, default, -1, [i + 1, neighbor.Atom + 1]);
                }

                fill[neighbor.Atom] = i;
            }
        }

        return true;
    }

    // Implied hydrogens by the stated valence, or else up to the next normal valence; a radical keeps its electrons.
    private void CompleteHydrogens(out bool ok)
    {
        ok = true;
        for (int i = 0; i < draft.AtomCount; i++)
        {
            ref BuilderAtom atom = ref draft.Atoms[i];
            int bonds = 0;
            int aromatic = 0;
            foreach (Neighbor neighbor in NeighborsOf(i))
            {
                BondOrder order = draft.Bonds[neighbor.Bond].Order;
                aromatic += order == BondOrder.Unknown ? 1 : 0;
                bonds += order == BondOrder.Unknown ? 1 : (int)order;
            }

            int unpaired = raw[i].Radical switch { 2 => 1, 1 or 3 => 2, _ => 0 };
            atom.Unpaired = (byte)unpaired;
            if (raw[i].Radical == 1)
            {
                (remarks ??= []).Add(Diagnostics.Diagnostic.Create(Remark.Singlet, [], i + 1));
            }

            int stated = raw[i].Valence;
            if (stated >= 0 && aromatic == 0)
            {
                if (stated < bonds)
                {
                    ok = Fail(Entry.StatedValence, raw[i].Line, default, -1, [i + 1, bonds, stated]);
                    return;
                }

                atom.Hydrogens = (sbyte)(stated - bonds);
                continue;
            }

            // An aromatic atom keeps one valence for the pi system, as far as its lowest valence has one.
            atom.Hydrogens = (sbyte)(aromatic > 0
                ? ImpliedHydrogens.OfAromatic(atom.Element, atom.Charge, bonds + unpaired)
                : ImpliedHydrogens.Of(atom.Element, atom.Charge, bonds, unpaired));
            if (i == forcedHydrogen)
            {
                atom.Hydrogens++;
            }
        }
    }

    // Neutral two-connected nitrogens (or P, As) with two aromatic bonds and no hydrogen could carry one.
    private void FindHydrogenCandidates()
    {
        candidates.Clear();
        for (int i = 0; i < draft.AtomCount && candidates.Count <= MostHydrogenTrials; i++)
        {
            ReadOnlySpan<Neighbor> around = NeighborsOf(i);
            if (around.Length == 2 && draft.Atoms[i] is { Element: 7 or 15 or 33, Charge: 0, Hydrogens: 0 }
                && draft.Bonds[around[0].Bond].Order == BondOrder.Unknown && draft.Bonds[around[1].Bond].Order == BondOrder.Unknown)
            {
                candidates.Add(i);
            }
        }
    }
}
