using System;
using System.Buffers;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using static RadicalSites.Perception.LocalPatterns;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Interference;

namespace RadicalSites.Interference;

internal sealed partial class GroupWalk
{
    // Each aromatic ring system (atoms joined by aromatic bonds) is judged once.
    private void ActivatedRings()
    {
        int count = molecule.AtomCount;
        bool any = false;
        for (int atom = 0; atom < count && !any; atom++)
        {
            any = molecule.AtomSpan[atom].IsAromatic;
        }

        if (!any)
        {
            return;
        }

        bool[] seen = ArrayPool<bool>.Shared.Rent(count);
        int[] system = ArrayPool<int>.Shared.Rent(count);
        Array.Clear(seen, 0, count);
        for (int atom = 0; atom < count; atom++)
        {
            if (!seen[atom] && molecule.AtomSpan[atom].IsAromatic)
            {
                int size = Gather(atom, seen, system);
                JudgeSystem(system.AsSpan(0, size));
            }
        }

        ArrayPool<bool>.Shared.Return(seen);
        ArrayPool<int>.Shared.Return(system);
    }

    private int Gather(int start, bool[] seen, int[] system)
    {
        int size = 0;
        system[size++] = start;
        seen[start] = true;
        for (int head = 0; head < size; head++)
        {
            foreach (Neighbor neighbor in molecule.NeighborsOf(system[head]))
            {
                if (molecule.BondSpan[neighbor.Bond].IsAromatic && !seen[neighbor.Atom])
                {
                    seen[neighbor.Atom] = true;
                    system[size++] = neighbor.Atom;
                }
            }
        }

        return size;
    }

    private void JudgeSystem(ReadOnlySpan<int> system)
    {
        int donorHeteroatom = -1;
        int pyridineNitrogens = 0;
        int alkyl = 0;
        foreach (int atom in system)
        {
            Atom data = molecule.AtomSpan[atom];
            if (data.AtomicNumber != 6 && data.FormalCharge == 0)
            {
                bool donor = data.AtomicNumber is 8 or 16 or 34 or 52
                    || (data.AtomicNumber == 7 && (data.HydrogenCount > 0 || molecule.DegreeOf(atom) == 3));
                donorHeteroatom = donor ? atom : donorHeteroatom;
                pyridineNitrogens += !donor && data.AtomicNumber == 7 ? 1 : 0;
            }

            alkyl += data.AtomicNumber == 6 ? SubstituentDonor(atom) : 0;
        }

        // Azoles with two or more pyridine-type nitrogens (triazoles, tetrazoles) are no longer electron-rich.
        if (donorHeteroatom >= 0 && pyridineNitrogens <= 1 && !IsDeactivated(system) && HasFreePosition(system))
        {
            Add(Entry.ElectronRichHeteroarene, donorHeteroatom);
        }

        if (donorHeteroatom < 0 && pyridineNitrogens == 0 && (alkyl >= 3 || system.Length >= 10))
        {
            Add(Entry.PolycyclicArene, system.ToArray());
        }
    }

    private bool HasFreePosition(ReadOnlySpan<int> system)
    {
        foreach (int atom in system)
        {
            if (ElementOf(atom) == 6 && molecule.AtomSpan[atom].HydrogenCount > 0)
            {
                return true;
            }
        }

        return false;
    }

    // A strong acceptor on the ring system (nitro, carbonyl, nitrile, sulfonyl, ring cation) offsets a donor.
    private bool IsDeactivated(ReadOnlySpan<int> system)
    {
        foreach (int atom in system)
        {
            if (molecule.AtomSpan[atom].FormalCharge > 0)
            {
                return true;
            }

            foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
            {
                int other = neighbor.Atom;
                if (molecule.BondSpan[neighbor.Bond].IsAromatic)
                {
                    continue;
                }

                if (IsAcyl(other) || (ElementOf(other) == 6 && HasTripleBond(molecule, other) && DegreeTwoNitrile(other))
                    || (ElementOf(other) == 7 && IsNitro(molecule, other, out _)) || (ElementOf(other) == 16 && CountOxo(molecule, other) >= 2))
                {
                    return true;
                }
            }
        }

        return false;
    }

    /// <summary>Counts alkyl groups on a ring carbon (0 or 1), and reports strong donors on the way.</summary>
    private int SubstituentDonor(int ringAtom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(ringAtom))
        {
            int other = neighbor.Atom;
            if (molecule.BondSpan[neighbor.Bond].IsAromatic)
            {
                continue;
            }

            if (IsSaturatedCarbon(other))
            {
                return 1;
            }

            if (OrderOf(neighbor) == BondOrder.Single && IsArylDonor(ringAtom, other))
            {
                Report(Entry.ElectronRichArene, other, ringAtom);
            }
        }

        return 0;
    }

    private void Report(ProblemDescriptor problem, int donor, int ringAtom)
    {
        Span<int> ring = stackalloc int[AromaticRing.Longest];
        int size = AromaticRing.Around(molecule, ringAtom, ring);
        if (!IsDeactivated(ring[..size]) && HasFreePosition(ring[..size]))
        {
            Add(problem, donor, ringAtom);
        }
    }

    // Alkoxy, aryloxy, acylamino; phenols and anilines have rules of their own.
    private bool IsArylDonor(int ringAtom, int other)
    {
        Atom data = molecule.AtomSpan[other];
        if (data.FormalCharge < 0 && data.AtomicNumber == 8)
        {
            return true;
        }

        if (data.FormalCharge != 0 || data.IsAromatic || HydrogensOn(other) > 1)
        {
            return false;
        }

        return data.AtomicNumber switch
        {
            8 => HydrogensOn(other) == 0 && molecule.DegreeOf(other) == 2 && !OnAcylOrSulfonyl(other, ringAtom),
            7 => OnAcylOrSulfonyl(other, ringAtom) && HasOnlySingleBonds(molecule, other) && !IsImide(other),
            _ => false,
        };
    }

    private bool IsImide(int nitrogen)
    {
        int acyl = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(nitrogen))
        {
            acyl += IsAcyl(neighbor.Atom) || ElementOf(neighbor.Atom) == 16 ? 1 : 0;
        }

        return acyl >= 2;
    }
}
