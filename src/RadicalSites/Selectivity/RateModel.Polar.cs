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
        foreach (AlphaGroup group in site.AlphaGroups)
        {
            double term = SelectivityParameters.AlphaTerm(group.Kind) * carrier.PolarAlphaScale;
            if (IsHalogen(group.Kind))
            {
                term = site.Conjugation.Count > 0
                    ? SideChainHalogenTerm(halogens++)
                    : HalogenTerm(site.Degree, halogens++, term);
            }

            sum += term;
            size += Math.Abs(term);
        }

        sum += ChainTerm(molecule, site.Carbons[0], out double chainSize);
        size += chainSize;
        return sum;
    }

    // Rate constants of chlorine atoms with the chloromethanes: the first halogen speeds methane up, further ones do not.
    private double HalogenTerm(SiteDegree degree, int before, double first) => (degree, before) switch
    {
        (SiteDegree.Methyl, 0) => 1.87 * Math.Min(1, carrier.PolarAlphaScale),
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
        foreach (AlphaGroup group in site.AlphaGroups)
        {
            count += IsHalogen(group.Kind) ? 1 : 0;
        }

        return count;
    }

    // Breadth-first over saturated and aromatic carbons; a group on a carbon n bonds away acts with attenuation^(n-1).
    private double ChainTerm(Molecule molecule, int start, out double size)
    {
        Span<int> carbons = stackalloc int[MostCarbons];
        Span<int> distances = stackalloc int[MostCarbons];
        carbons[0] = start;
        distances[0] = 0;
        int filled = 1;
        double sigma = 0;
        for (int head = 0; head < filled; head++)
        {
            int carbon = carbons[head];
            int distance = distances[head];
            if (distance == Reach)
            {
                break;
            }

            foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
            {
                int other = neighbor.Atom;
                if (!IsChainCarbon(molecule, other) || carbons[..filled].IndexOf(other) >= 0)
                {
                    if (distance > 0 && carbons[..filled].IndexOf(other) < 0)
                    {
                        sigma += Math.Pow(carrier.Attenuation, distance - 1) * GroupSigma(molecule, carbon, other);
                    }

                    continue;
                }

                if (filled < MostCarbons)
                {
                    carbons[filled] = other;
                    distances[filled++] = distance + 1;
                }
            }
        }

        double term = carrier.PolarBeta * sigma;
        size = Math.Abs(term);
        return term;
    }

    private static bool IsChainCarbon(Molecule molecule, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        if (data.AtomicNumber != 6 || data.IsAromatic)
        {
            return false;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order != BondOrder.Single)
            {
                return false;
            }
        }

        return true;
    }

    private static double GroupSigma(Molecule molecule, int carbon, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        if (data.AtomicNumber == 1)
        {
            return 0;
        }

        return data.IsAromatic && data.AtomicNumber == 6
            ? SelectivityParameters.ArylInductive
            : AlphaGroupPerception.KindOf(molecule, carbon, atom) is { } kind
                ? SelectivityParameters.SigmaInductive(kind)
                : 0;
    }

    // Carbons beside the site that carry three or more further heavy atoms in all shield it from a bulky carrier.
    private static int BranchesBeside(Molecule molecule, int carbon)
    {
        int branches = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            int degree = molecule.DegreeOf(neighbor.Atom);
            branches += molecule.AtomSpan[neighbor.Atom].IsAromatic ? 0 : degree >= 4 ? 2 : degree == 3 ? 1 : 0;
        }

        return branches;
    }
}
