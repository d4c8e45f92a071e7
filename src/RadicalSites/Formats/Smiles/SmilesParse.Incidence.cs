using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesParse
{
    private int[] incidenceStarts = [];
    private int[] incidence = [];
    private bool incidenceReady;

    // Bonds of an atom in the order of the draft. Listed on first need, so that texts without allene marks pay nothing.
    private ReadOnlySpan<int> BondsOf(int atom)
    {
        if (!incidenceReady)
        {
            ListIncidence();
            incidenceReady = true;
        }

        return incidence.AsSpan(incidenceStarts[atom], incidenceStarts[atom + 1] - incidenceStarts[atom]);
    }

    private void ListIncidence()
    {
        int atoms = draft.AtomCount;
        if (incidenceStarts.Length < atoms + 2)
        {
            incidenceStarts = new int[(2 * atoms) + 2];
        }

        if (incidence.Length < 2 * draft.BondCount)
        {
            incidence = new int[4 * draft.BondCount];
        }

        Span<int> starts = incidenceStarts.AsSpan(0, atoms + 2);
        starts.Clear();
        ReadOnlySpan<BuilderBond> bonds = draft.Bonds.AsSpan(0, draft.BondCount);
        foreach (ref readonly BuilderBond bond in bonds)
        {
            starts[bond.Begin + 2]++;
            starts[bond.End + 2]++;
        }

        for (int i = 2; i < starts.Length; i++)
        {
            starts[i] += starts[i - 1];
        }

        // Filling moves each start to the next atom's place, which leaves the starts where they belong.
        for (int i = 0; i < bonds.Length; i++)
        {
            incidence[starts[bonds[i].Begin + 1]++] = i;
            incidence[starts[bonds[i].End + 1]++] = i;
        }
    }
}
