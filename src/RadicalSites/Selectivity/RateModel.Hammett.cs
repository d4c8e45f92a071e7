using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

internal sealed partial class RateModel
{
    private const double LnOf10 = 2.302585092994046;

    /// <summary>ln 10 times rho times sigma of the substituents of benzene rings beside the site; ortho substituents do not count.</summary>
    private double HammettTerm(Molecule molecule, Site site)
    {
        double sum = 0;
        for (int i = 0; i < site.Conjugation.Count; i++)
        {
            ConjugatedNeighbor neighbor = site.Conjugation[i];
            if (neighbor.Kind != ConjugationKind.Benzylic || neighbor.PiAtoms.Count != 6)
            {
                continue;
            }

            for (int place = 2; place <= 4; place++)
            {
                sum += SubstituentSigma(molecule, neighbor.PiAtoms[place], isPara: place == 3);
            }
        }

        return LnOf10 * parameters.HammettRho * sum;
    }

    private double SubstituentSigma(Molecule molecule, int ringAtom, bool isPara)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(ringAtom))
        {
            if (molecule.BondSpan[neighbor.Bond].IsAromatic || molecule.BondSpan[neighbor.Bond].IsInRing)
            {
                continue;
            }

            if (RingSubstituent.NameOf(molecule, ringAtom, neighbor.Atom) is { } name
                && SelectivityParameters.Hammett(name) is { } constants)
            {
                return !isPara ? constants.Meta : carrier.UsesSigmaPlus ? constants.ParaPlus : constants.Para;
            }
        }

        return 0;
    }
}
