using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <content>Choice of the bond that carries the mark of a centre.</content>
internal sealed partial class MolfileDraft
{
    private void Choose(int index)
    {
        StereoElement element = molecule.StereoSpan[index];
        if (element.Kind is not (StereoKind.Tetrahedral or StereoKind.Allene))
        {
            return;
        }

        List<(int Bond, int Narrow)> candidates = Candidates(element);
        while (choice[index] < candidates.Count)
        {
            (int bond, int end) = candidates[choice[index]];
            if (marks[bond] == BondMark.None)
            {
                marks[bond] = BondMark.Up;
                narrow[bond] = end;
                return;
            }

            choice[index]++;
        }
    }

    private bool Turn(int index)
    {
        List<(int Bond, int Narrow)> candidates = Candidates(molecule.StereoSpan[index]);
        if (choice[index] >= candidates.Count)
        {
            return false;
        }

        ref byte mark = ref marks[candidates[choice[index]].Bond];
        if (mark == BondMark.Down)
        {
            return Next(index);
        }

        mark = BondMark.Down;
        return true;
    }

    private bool Next(int index)
    {
        List<(int Bond, int Narrow)> candidates = Candidates(molecule.StereoSpan[index]);
        if (choice[index] >= candidates.Count)
        {
            return false;
        }

        marks[candidates[choice[index]].Bond] = BondMark.None;
        choice[index]++;
        Choose(index);
        return choice[index] < candidates.Count;
    }

    // Bonds of the centre (or of the ends of an allene), those least in the way of other centres first.
    private List<(int Bond, int Narrow)> Candidates(StereoElement element)
    {
        List<(int Bond, int Narrow)> found = [];
        if (element.Kind == StereoKind.Tetrahedral)
        {
            AddSingleBonds(element.Focus, found);
        }
        else
        {
            foreach (Neighbor arm in molecule.NeighborsOf(element.Focus))
            {
                AddSingleBonds(arm.Atom, found);
            }
        }

        found.Sort((left, right) => (Rank(left), left.Bond).CompareTo((Rank(right), right.Bond)));
        return found;
    }

    private void AddSingleBonds(int atom, List<(int Bond, int Narrow)> found)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order == BondOrder.Single)
            {
                found.Add((neighbor.Bond, atom));
            }
        }
    }

    private int Rank((int Bond, int Narrow) candidate)
    {
        Bond bond = molecule.BondSpan[candidate.Bond];
        int other = bond.Other(candidate.Narrow);
        int rank = (bond.IsInRing ? 4 : 0) + (molecule.DegreeOf(other) == 1 ? 0 : 1);
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind == StereoKind.Tetrahedral && element.Focus == other)
            {
                return rank + 8;
            }
        }

        return rank;
    }
}
