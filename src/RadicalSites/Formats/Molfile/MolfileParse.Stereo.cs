using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using Remark = RadicalSites.Diagnostics.ProblemCatalogue.MolfileRemarks;

namespace RadicalSites.Formats.Molfile;

/// <content>Coordinates and tetrahedral centres.</content>
internal sealed partial class MolfileParse
{
    private bool[] marked = new bool[64];

    private void AddCoordinatesAndStereo(bool isFlaggedFlat)
    {
        int count = draft.AtomCount;
        bool any = false;
        bool deep = false;
        for (int i = 0; i < count; i++)
        {
            any |= points[i] != default;
            deep |= Math.Abs(points[i].Z) > 1e-4;
        }

        if (!any)
        {
            AddParities();
            return;
        }

        draft.Coordinates = points.AsSpan(0, count).ToArray();
        bool wedges = MarkNarrowEnds();
        bool solid = deep && !(isFlaggedFlat && wedges);
        if (solid || wedges)
        {
            for (int i = 0; i < count; i++)
            {
                if (solid || marked[i])
                {
                    AddCentre(i, solid);
                }
            }
        }

        AddDoubleBonds(solid);
    }

    // Only the narrow end of a wedge is marked by it.
    private bool MarkNarrowEnds()
    {
        if (marked.Length < draft.AtomCount)
        {
            marked = new bool[2 * draft.AtomCount];
        }

        marked.AsSpan(0, draft.AtomCount).Clear();
        bool any = false;
        for (int i = 0; i < draft.BondCount; i++)
        {
            if (marks[i] is BondMark.Up or BondMark.Down)
            {
                marked[draft.Bonds[i].Begin] = true;
                any = true;
            }
        }

        return any;
    }

    private void AddCentre(int atom, bool solid)
    {
        ReadOnlySpan<Neighbor> around = NeighborsOf(atom);
        if (around.Length is < 3 or > 4 || HasEitherAt(atom))
        {
            if (!solid && !IsCumuleneEnd(atom))
            {
                Note(Remark.AmbiguousWedge, atom + 1);
            }

            return;
        }

        if (!IsPossibleCentre(atom, solid))
        {
            if (!solid && !IsCumuleneEnd(atom))
            {
                Note(Remark.AmbiguousWedge, atom + 1);
            }

            return;
        }

        Span<Point> directions = stackalloc Point[4];
        var carriers = new int[4];
        carriers[3] = -1;
        for (int i = 0; i < around.Length; i++)
        {
            carriers[i] = around[i].Atom;
            directions[i] = solid
                ? StereoGeometry.Direction(points[atom], points[around[i].Atom])
                : Drawn(atom, around[i]);
        }

        int configuration = around.Length == 4
            ? StereoGeometry.OfFour(directions)
            : solid ? StereoGeometry.OfThree(directions) : StereoGeometry.OfDrawnThree(directions);
        if (configuration != 0)
        {
            draft.AddStereo(new StereoElement(StereoKind.Tetrahedral, atom, atom, carriers, configuration));
        }
        else if (!solid)
        {
            Note(Remark.AmbiguousWedge, atom + 1);
        }
    }

    private Point Drawn(int atom, Neighbor neighbor)
    {
        Point flat = StereoGeometry.Direction(
            points[atom] with { Z = 0 }, points[neighbor.Atom] with { Z = 0 });
        byte mark = draft.Bonds[neighbor.Bond].Begin == atom ? marks[neighbor.Bond] : BondMark.None;
        return flat with { Z = mark == BondMark.Up ? 1 : mark == BondMark.Down ? -1 : 0 };
    }

    private bool HasEitherAt(int atom)
    {
        foreach (Neighbor neighbor in NeighborsOf(atom))
        {
            if (marks[neighbor.Bond] == BondMark.Either && draft.Bonds[neighbor.Bond].Begin == atom
                && draft.Bonds[neighbor.Bond].Order == BondOrder.Single)
            {
                return true;
            }
        }

        return false;
    }

    private bool IsPossibleCentre(int atom, bool solid)
    {
        ref BuilderAtom center = ref draft.Atoms[atom];
        ReadOnlySpan<Neighbor> around = NeighborsOf(atom);
        int total = around.Length + center.Hydrogens;
        int sum = center.Hydrogens;
        bool single = true;
        foreach (Neighbor neighbor in around)
        {
            BondOrder order = draft.Bonds[neighbor.Bond].Order;
            single &= order == BondOrder.Single;
            sum += (int)order;
        }

        bool lonePair = around.Length == 3 && total == 3;
        bool shape = center.Element switch
        {
            5 => center.Charge == -1 && total == 4 && single,
            6 or 14 or 32 or 50 or 82 => total == 4 && single && center.Charge == 0,
            7 => single && ((total == 4 && center.Charge == 1)
                || (lonePair && center.Charge == 0 && (!solid || IsHeldNitrogen(atom)))),
            15 or 33 or 51 => total == 4 || (lonePair && center.Charge == 0 && single),
            16 or 34 or 52 => total == 4 || (lonePair && (sum == 4 ? center.Charge == 0 : sum == 3 && center.Charge == 1)),
            _ => false,
        };
        return shape && !HasLikeLigands(atom, -1);
    }

    // A neutral nitrogen holds its configuration where all its bonds lie on rings; the invertomer of a computed geometry
    // says nothing elsewhere.
    private bool IsHeldNitrogen(int atom)
    {
        foreach (Neighbor neighbor in NeighborsOf(atom))
        {
            if (SmallestRing(neighbor.Bond, 8) == 0)
            {
                return false;
            }
        }

        return true;
    }

    // Two hydrogens, or two like end groups: told apart by neither geometry nor wedge.
    private bool HasLikeLigands(int atom, int except)
    {
        ReadOnlySpan<Neighbor> around = NeighborsOf(atom);
        int hydrogens = draft.Atoms[atom].Hydrogens;
        Span<(int Element, int Isotope, int Hydrogens, int Charge)> ends = stackalloc (int, int, int, int)[4];
        int filled = 0;
        foreach (Neighbor neighbor in around)
        {
            if (neighbor.Atom == except)
            {
                continue;
            }

            if (IsPlainHydrogen(neighbor.Atom))
            {
                hydrogens++;
                continue;
            }

            if (filled < ends.Length && EndGroup(neighbor.Atom, atom) is { } end)
            {
                if (ends[..filled].Contains(end))
                {
                    return true;
                }

                ends[filled++] = end;
            }
        }

        return hydrogens > 1;
    }

    private bool IsPlainHydrogen(int atom) =>
        draft.Atoms[atom] is { Element: 1, Isotope: 0, Charge: 0, AtomClass: 0 } && NeighborsOf(atom).Length == 1;

    // A neighbour that carries hydrogens only; oxygens of one acid count as alike whatever their bond order and hydrogen.
    private (int Element, int Isotope, int Hydrogens, int Charge)? EndGroup(int atom, int from)
    {
        ref BuilderAtom data = ref draft.Atoms[atom];
        int hydrogens = data.Hydrogens;
        foreach (Neighbor neighbor in NeighborsOf(atom))
        {
            if (neighbor.Atom == from)
            {
                continue;
            }

            if (!IsPlainHydrogen(neighbor.Atom))
            {
                return null;
            }

            hydrogens++;
        }

        bool acid = data.Element == 8 && draft.Atoms[from].Element is 15 or 33;
        return (data.Element, data.Isotope + (1000 * data.AtomClass), acid ? 0 : hydrogens, acid ? 0 : data.Charge);
    }

    // Without coordinates the atom parity states the configuration: carriers by number, hydrogen last.
    private void AddParities()
    {
        for (int i = 0; i < draft.AtomCount; i++)
        {
            if (raw[i].Parity is not (1 or 2) || NeighborsOf(i).Length is < 3 or > 4 || !IsPossibleCentre(i, false))
            {
                continue;
            }

            var carriers = new int[4];
            int filled = 0;
            int hydrogen = -1;
            foreach (Neighbor neighbor in NeighborsOf(i))
            {
                if (IsPlainHydrogen(neighbor.Atom))
                {
                    hydrogen = neighbor.Atom;
                }
                else
                {
                    carriers[filled++] = neighbor.Atom;
                }
            }

            Array.Sort(carriers, 0, filled);
            if (filled == 3)
            {
                carriers[3] = hydrogen;
            }

            draft.AddStereo(new StereoElement(StereoKind.Tetrahedral, i, i, carriers, raw[i].Parity == 1 ? 2 : 1));
        }
    }

    // Bonds of type 4 are localised after stereo was read; a double bond of an aromatic ring has no configuration.
    private static Molecule WithoutAromaticMarks(Molecule molecule)
    {
        List<StereoElement>? kept = null;
        ReadOnlySpan<StereoElement> stereo = molecule.StereoSpan;
        for (int i = 0; i < stereo.Length; i++)
        {
            bool drop = stereo[i].Kind == StereoKind.CisTrans && IsAromaticBond(molecule, stereo[i].Focus, stereo[i].FocusEnd);
            if (drop && kept is null)
            {
                kept = [.. stereo[..i]];
            }
            else if (!drop)
            {
                kept?.Add(stereo[i]);
            }
        }

        return kept is null ? molecule : molecule.WithStereo([.. kept]);
    }

    private static bool IsAromaticBond(Molecule molecule, int begin, int end)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(begin))
        {
            if (neighbor.Atom == end)
            {
                return molecule.BondSpan[neighbor.Bond].IsAromatic;
            }
        }

        return false;
    }
}
