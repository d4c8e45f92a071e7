using System;
using RadicalSites.Molecules;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Selectivity;

/// <summary>Rate per hydrogen at one reagent and temperature; everything that depends on these alone is computed once.</summary>
/// <remarks>
/// ln k = class Arrhenius term + Evans-Polanyi term for the deviation of the bond from its class + polar terms of groups
/// on the carbon (alpha) and along the chain (attenuated sigma-I) + Hammett term for ring substituents - steric term.
/// </remarks>
internal sealed partial class RateModel
{
    private const double GasConstant = 8.314462618e-3;
    private const double Reference = 298.15;
    private const double HammettReference = 353.15;

    // Bonds up to this much stronger than their class still react as the class does (adamantane CH against isobutane).
    private const double StrongThreshold = 18;

    // Least uncertainty of ln k of a site within its class: the scatter of alkane sites in published distributions.
    private const double SiteScatter = 0.10;

    private static readonly double[] Anchors = [438.9, 423, 411, 402, 378, 362, 352, 368, 355, 342];

    private readonly Carrier carrier;
    private readonly double kelvin;
    private readonly double inverseEnergy;
    private readonly double[] classValue;
    private readonly double[] classSigma;

    internal RateModel(ReactionConditions conditions)
    {
        carrier = conditions.Reagent.Carrier;
        kelvin = conditions.Temperature.Kelvin;
        inverseEnergy = 1 / (GasConstant * kelvin);
        (double factor, double factorSigma) = SelectivityParameters.Medium(conditions.Solvent, carrier);
        double medium = 1 + ((factor - 1) * Reference / kelvin);
        ClassRate[] rates = SelectivityParameters.RatesOf(carrier);
        classValue = new double[rates.Length];
        classSigma = new double[rates.Length];
        for (int i = 0; i < rates.Length; i++)
        {
            double value = rates[i].LnA + (rates[i].Kelvin / kelvin);
            classValue[i] = medium * value;
            classSigma[i] = Math.Sqrt((rates[i].Sigma * rates[i].Sigma) + Square(factorSigma * value));
        }
    }

    internal LnRate Rate(Molecule molecule, Site site, double bde, double bdeSigma)
    {
        RateClass rateClass = ClassOf(site);
        double value = classValue[(int)rateClass];

        double deviation = bde - Anchors[(int)rateClass];
        double slope = 0;
        double energy = 0;
        if (deviation < 0)
        {
            slope = carrier.SlopeWeak;
            energy = deviation;
        }
        else if (deviation > StrongThreshold)
        {
            slope = carrier.SlopeStrong;
            energy = deviation - StrongThreshold;
        }

        if ((rateClass == RateClass.Methyl && site.AlphaGroups.Count > 0)
            || (site.Conjugation.Count > 0 && CountHalogens(site) > 0))
        {
            // Halomethanes and side-chain halides of arenes and alkenes: bond energy gives the wrong order there (benzyl
            // chloride reacts more slowly than toluene in spite of its weaker bond), the alpha terms hold all of it.
            slope = 0;
        }
        else if (HasAcceptor(site))
        {
            // Beside halogens and acceptors the bond is weak but the attack slow: for early transition states the alpha
            // terms hold all of it, for late ones half of the bond's weakening counts.
            slope *= carrier.SlopeWeak > 0.5 ? 0.5 : 0;
        }

        value -= slope * energy * inverseEnergy;
        double polar = PolarTerm(molecule, site, out double polarSize) * Reference / kelvin;
        value += polar;
        double hammett = site.Conjugation.Count > 0 ? HammettTerm(molecule, site) * HammettReference / kelvin : 0;
        value += hammett;
        double steric = carrier.Steric > 0 ? carrier.Steric * BranchesBeside(molecule, site.Carbons[0]) : 0;
        value -= steric;

        double own = Math.Sqrt(
            Square(SiteScatter) + Square(carrier.PolarSigma * polarSize * Reference / kelvin)
            + Square(0.3 * hammett) + Square(0.5 * steric));
        return new LnRate(value, rateClass, classSigma[(int)rateClass], slope * bdeSigma * inverseEnergy, own);
    }

    private static double Square(double value) => value * value;

    private static RateClass ClassOf(Site site)
    {
        int degree = Math.Min(3, (int)site.Degree);
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            if (neighbor.Kind is ConjugationKind.Allylic or ConjugationKind.Propargylic)
            {
                return (RateClass)((int)RateClass.Allylic1 + Math.Max(0, degree - 1));
            }
        }

        if (site.Conjugation.Count > 0)
        {
            return (RateClass)((int)RateClass.Benzylic1 + Math.Max(0, degree - 1));
        }

        // A donor heteroatom counts as a further alkyl group; its own effect is in the bond energy and the alpha term.
        int donors = 0;
        foreach (AlphaGroup group in site.AlphaGroups)
        {
            donors += IsDonor(group.Kind) ? 1 : 0;
        }

        return (RateClass)Math.Min(3, degree + donors);
    }

    private static bool HasAcceptor(Site site)
    {
        foreach (AlphaGroup group in site.AlphaGroups)
        {
            if (!IsDonor(group.Kind))
            {
                return true;
            }
        }

        return false;
    }

    private static bool IsDonor(AlphaGroupKind kind) => kind is AlphaGroupKind.Hydroxyl or AlphaGroupKind.Ether
        or AlphaGroupKind.EsterOxygen or AlphaGroupKind.OtherOxygen or AlphaGroupKind.Amine or AlphaGroupKind.AmideNitrogen
        or AlphaGroupKind.AromaticNitrogen or AlphaGroupKind.Sulfide or AlphaGroupKind.Silicon;
}
