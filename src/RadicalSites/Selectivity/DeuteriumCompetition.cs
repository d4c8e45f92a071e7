using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

/// <summary>How much of the abstraction takes deuterium or tritium, by the primary kinetic isotope effect.</summary>
internal static class DeuteriumCompetition
{
    // ln(kH/kT) over ln(kH/kD) when zero-point energies alone count (Swain's relation).
    private const double TritiumExponent = 1.442;

    /// <summary>Summed rate of all C-D and C-T bonds on the scale of the weights; 0 when there are none.</summary>
    internal static double WeightOf(RateModel rates, SiteAnalysis analysis, ReadOnlySpan<LnRate> lnRates, double largest)
    {
        Molecule molecule = analysis.Molecule;
        double sum = 0;
        ReadOnlySpan<Atom> atoms = molecule.AtomSpan;
        for (int i = 0; i < atoms.Length; i++)
        {
            if (atoms[i].AtomicNumber != 1 || atoms[i].MassNumber <= 1)
            {
                continue;
            }

            foreach (Neighbor neighbor in molecule.NeighborsOf(i))
            {
                double effect = rates.LnIsotopeEffect * (atoms[i].MassNumber == 3 ? TritiumExponent : 1);
                if (LnRateAt(rates, analysis, lnRates, neighbor.Atom) is { } value)
                {
                    sum += Math.Exp(value - effect - largest);
                }
            }
        }

        return sum;
    }

    private static double? LnRateAt(RateModel rates, SiteAnalysis analysis, ReadOnlySpan<LnRate> lnRates, int carbon)
    {
        if (analysis.SiteOf(carbon) is { } site)
        {
            return lnRates[site.Number - 1].Value;
        }

        Molecule molecule = analysis.Molecule;
        if (!IsSaturatedCarbon(molecule, carbon))
        {
            return null;
        }

        // A carbon that carries deuterium only is no site; its class and groups give the rate, its bond that of the class.
        int degree = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            degree += molecule.AtomSpan[neighbor.Atom].AtomicNumber == 6 ? 1 : 0;
        }

        var stand = new Site
        {
            Number = 1,
            Carbons = [carbon],
            HydrogensPerCarbon = 1,
            Degree = (SiteDegree)Math.Min(degree, 3),
            Conjugation = ConjugationPerception.Find(molecule, carbon),
            AlphaGroups = AlphaGroupPerception.Find(molecule, carbon),
            RingSize = null,
            IsBridgehead = false,
            Topicity = Symmetry.Topicity.Homotopic,
        };
        return rates.Rate(molecule, stand, rates.AnchorOf(stand), 0).Value;
    }

    private static bool IsSaturatedCarbon(Molecule molecule, int atom)
    {
        if (molecule.AtomSpan[atom].AtomicNumber != 6 || molecule.AtomSpan[atom].IsAromatic)
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
}
