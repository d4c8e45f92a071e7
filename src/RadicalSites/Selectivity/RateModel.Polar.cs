using System;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

internal sealed partial class RateModel
{
    // Carbons looked at on the way out from the site; groups further away than this do not count.
    private const int Reach = 5;
    private const int MostCarbons = 64;

    /// <summary>Sum of polar terms at 298.15 K; <paramref name="size"/> is the sum of their magnitudes.</summary>
    private double PolarTerm(Molecule molecule, Site site, out double size)
    {
        double sum = 0;
        size = 0;
        int halogens = 0;
        for (int i = 0; i < site.AlphaGroups.Count; i++)
        {
            AlphaGroupKind kind = site.AlphaGroups[i].Kind;
            double term = parameters.Alpha[(int)kind];
            if (IsHalogen(kind))
            {
                term = site.Conjugation.Count > 0
                    ? SideChainHalogenTerm(halogens++)
                    : HalogenTerm(site.Degree, halogens++, term);
            }

            sum += term;
            size += Math.Abs(term);
        }

        sum += ChainTerm(molecule, site, out double chainSize);
        size += chainSize;
        return sum;
    }

    // Rate constants of chlorine atoms with the chloromethanes: the first halogen speeds methane up, further ones do not.
    private double HalogenTerm(SiteDegree degree, int before, double first) => (degree, before) switch
    {
        (SiteDegree.Methyl, 0) => 1.87 * Math.Min(1, carrier.PolarScale),
        (SiteDegree.Methyl, 1) => 0,
        (SiteDegree.Methyl, _) => -0.35,
        (_, 0) => first,
        _ => -1.0,
    };

    // Toluene to benzyl chloride to benzal chloride near 100 C: 1 : 0.25 : 0.083 per hydrogen (table consecutive_rates);
    // the same order holds for the trichloromethyl radical. Taken over to the other carriers and to allylic carbons.
    private static double SideChainHalogenTerm(int before) => before == 0 ? -1.74 : -1.37;

    private static bool IsHalogen(AlphaGroupKind kind) => kind is AlphaGroupKind.Fluorine or AlphaGroupKind.Chlorine
        or AlphaGroupKind.Bromine or AlphaGroupKind.Iodine;

    private static int CountHalogens(Site site)
    {
        int count = 0;
        for (int i = 0; i < site.AlphaGroups.Count; i++)
        {
            count += IsHalogen(site.AlphaGroups[i].Kind) ? 1 : 0;
        }

        return count;
    }

    // Breadth-first over saturated carbons; a group on a carbon n bonds away acts with attenuation^(n-1). A
    // trifluoromethyl group is one group, not a carbon with three.
    private double ChainTerm(Molecule molecule, Site site, out double size)
    {
        Span<int> carbons = stackalloc int[MostCarbons];
        Span<int> distances = stackalloc int[MostCarbons];
        carbons[0] = site.Carbons[0];
        distances[0] = 0;
        int filled = 1;
        double sensitivity = site.Degree <= SiteDegree.Primary ? carrier.PrimarySensitivity : 1;
        double induction = 0;
        double beta = 0;
        for (int head = 0; head < filled; head++)
        {
            int carbon = carbons[head];
            int distance = distances[head];
            foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
            {
                int other = neighbor.Atom;
                if (carbons[..filled].Contains(other))
                {
                    continue;
                }

                if (IsChainCarbon(molecule, carbon, other))
                {
                    if (filled < MostCarbons && distance < Reach)
                    {
                        carbons[filled] = other;
                        distances[filled++] = distance + 1;
                    }
                }
                else if (distance > 0)
                {
                    induction += (distance == 1 ? sensitivity : attenuation[distance])
                        * GroupSigma(molecule, carbon, other, out double bridging);
                    beta += distance == 1 ? bridging : 0;
                }
            }
        }

        // Relief by a halogen beside the site needs a transition state with a developed radical: not a primary one.
        if (site.Degree <= SiteDegree.Primary && !carrier.HasLateTransitionState)
        {
            beta = Math.Min(0, beta);
        }

        double term = (parameters.PolarBeta * induction) + beta;
        size = Math.Abs(term);
        return term;
    }

    private static bool IsChainCarbon(Molecule molecule, int from, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        if (data.AtomicNumber != 6 || data.IsAromatic)
        {
            return false;
        }

        int fluorines = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order != BondOrder.Single)
            {
                return false;
            }

            fluorines += molecule.AtomSpan[neighbor.Atom].AtomicNumber == 9 && neighbor.Atom != from ? 1 : 0;
        }

        return fluorines < 3;
    }

    private double GroupSigma(Molecule molecule, int carbon, int atom, out double bridging)
    {
        bridging = 0;
        Atom data = molecule.AtomSpan[atom];
        if (data.AtomicNumber == 1)
        {
            return 0;
        }

        if (data.IsAromatic && data.AtomicNumber == 6)
        {
            return SelectivityParameters.ArylInductive;
        }

        if (AlphaGroupPerception.KindOf(molecule, carbon, atom) is not { } kind)
        {
            return 0;
        }

        bridging = parameters.Beta[(int)kind];
        return parameters.Sigma[(int)kind];
    }

    // Heavy atoms two bonds away beyond the first shield a site from a bulky carrier; tied back in a ring they count half,
    // and aromatic rings are part of their class already.
    private static double CrowdingOf(Molecule molecule, int carbon)
    {
        double count = -1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            Atom other = molecule.AtomSpan[neighbor.Atom];
            if (other.AtomicNumber == 1 || other.IsAromatic)
            {
                continue;
            }

            double weight = molecule.BondSpan[neighbor.Bond].IsInRing ? 0.5 : 1;
            foreach (Neighbor second in molecule.NeighborsOf(neighbor.Atom))
            {
                count += second.Atom != carbon && molecule.AtomSpan[second.Atom].AtomicNumber > 1 ? weight : 0;
            }
        }

        return Math.Max(0, count);
    }
}
