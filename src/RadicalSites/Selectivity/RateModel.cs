using System;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

/// <summary>Rate per hydrogen at one reagent and temperature; everything that depends on these alone is computed once.</summary>
/// <remarks>
/// ln k = class Arrhenius term + Evans-Polanyi term for the deviation of the bond from its class + polar terms of groups
/// on the carbon (alpha), beside it (beta) and along the chain (attenuated sigma-I) + Hammett term for ring substituents
/// - steric term; bounded by the ceiling of the carrier.
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
    private readonly CarrierParameters parameters;
    private readonly double kelvin;
    private readonly double inverseEnergy;
    private readonly double polarScale;
    private readonly double inverseCeiling;
    private readonly double[] classValue;
    private readonly double[] classSigma;
    private readonly double[] attenuation = new double[Reach + 1];

    internal RateModel(ReactionConditions conditions, SelectivityCalibration calibration)
    {
        carrier = conditions.Reagent.Carrier;
        parameters = new CarrierParameters(carrier, calibration);
        kelvin = conditions.Temperature.Kelvin;
        inverseEnergy = 1 / (GasConstant * kelvin);
        inverseCeiling = carrier.Ceiling > 0 ? 1 / carrier.Ceiling : 0;
        MediumEffect effect = MediumEffect.Of(conditions.Solvent, carrier);
        double medium = 1 + ((effect.Factor - 1) * Reference / kelvin);

        // A complexed chlorine atom is slower and therefore more sensitive to polar effects too, though less than to the
        // bond: half of the gain, set on the acids chlorinated in benzene and in tetrachloromethane.
        polarScale = Reference / kelvin * (1 + (0.5 * Math.Max(0, medium - 1)));
        ClassRate[] rates = parameters.Rates;
        classValue = new double[rates.Length];
        classSigma = new double[rates.Length];
        for (int i = 0; i < rates.Length; i++)
        {
            double value = rates[i].LnA + (rates[i].Kelvin / kelvin);
            classValue[i] = medium * value;
            classSigma[i] = Math.Sqrt((rates[i].Sigma * rates[i].Sigma) + Square(effect.Sigma * value));
        }

        // Inductive effects reach further in a liquid than in a gas; without a word about the medium their mean is taken.
        double factor = !effect.IsKnown ? 0.5 * (carrier.AttenuationInGas + parameters.AttenuationInLiquid)
            : effect.IsGas ? carrier.AttenuationInGas
            : parameters.AttenuationInLiquid;
        attenuation[1] = 1;
        for (int i = 2; i < attenuation.Length; i++)
        {
            attenuation[i] = attenuation[i - 1] * factor;
        }
    }

    /// <summary>ln(kH/kD) at the temperature of the model.</summary>
    internal double LnIsotopeEffect => Math.Log(carrier.IsotopeEffect) * Reference / kelvin;

    internal LnRate Rate(Molecule molecule, Site site, double bde, double bdeSigma)
    {
        RateClass rateClass = ClassOf(site);
        double value = classValue[(int)rateClass];
        double slope = Slope(site, rateClass, bde - Anchors[(int)rateClass], out double energy);
        value -= slope * energy * inverseEnergy;
        double polar = polarScale * PolarTerm(molecule, site, out double polarSize);
        value += polar;
        double hammett = site.Conjugation.Count > 0 ? HammettTerm(molecule, site) * HammettReference / kelvin : 0;
        value += hammett;
        double steric = parameters.Steric > 0 ? parameters.Steric * CrowdingOf(molecule, site.Carbons[0]) : 0;
        value -= steric;

        double own = Math.Sqrt(
            Square(SiteScatter) + Square(carrier.PolarSigma * polarSize * polarScale)
            + Square(0.3 * hammett) + Square(0.5 * steric));

        // At the ceiling every encounter reacts: k = 1 / (1/k + 1/ceiling), and what moves k moves the result less. The class
        // itself was measured under that bound, so only what lies beyond the class is damped.
        double damping = 1 / (1 + (Math.Exp(Math.Min(value, 500)) * inverseCeiling));
        double undamped = 1 + (Math.Exp(Math.Min(classValue[(int)rateClass], 500)) * inverseCeiling);
        return new LnRate(
            value + Math.Log(damping * undamped), rateClass, damping * classSigma[(int)rateClass],
            damping * slope * bdeSigma * inverseEnergy, damping * own);
    }

    /// <summary>Bond enthalpy of the class of a site [kJ/mol].</summary>
    internal double AnchorOf(Site site) => Anchors[(int)ClassOf(site)];

    private double Slope(Site site, RateClass rateClass, double deviation, out double energy)
    {
        energy = 0;
        bool onHalogen = (rateClass == RateClass.Methyl && site.AlphaGroups.Count > 0)
            || (site.Conjugation.Count > 0 && CountHalogens(site) > 0);
        if (onHalogen || (!carrier.HasLateTransitionState && HasAcceptor(site)))
        {
            // Halomethanes, side-chain halides and, for early transition states, all carbons beside acceptors: the bond
            // energy gives the wrong order there (benzyl chloride reacts more slowly than toluene in spite of its weaker
            // bond), the alpha terms hold all of it.
            return 0;
        }

        if (deviation < 0)
        {
            energy = deviation;
            return parameters.SlopeWeak;
        }

        if (deviation > StrongThreshold)
        {
            energy = deviation - StrongThreshold;
            return carrier.SlopeStrong;
        }

        return 0;
    }

    private static double Square(double value) => value * value;

    private RateClass ClassOf(Site site)
    {
        int degree = Math.Min(3, (int)site.Degree);
        for (int i = 0; i < site.Conjugation.Count; i++)
        {
            if (site.Conjugation[i].Kind is ConjugationKind.Allylic or ConjugationKind.Propargylic)
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
        for (int i = 0; i < site.AlphaGroups.Count; i++)
        {
            donors += IsDonor(site.AlphaGroups[i].Kind) ? 1 : 0;
        }

        return (RateClass)Math.Min(3, degree + donors);
    }

    private bool HasAcceptor(Site site)
    {
        for (int i = 0; i < site.AlphaGroups.Count; i++)
        {
            if (!IsDonor(site.AlphaGroups[i].Kind))
            {
                return true;
            }
        }

        return false;
    }

    private bool IsDonor(AlphaGroupKind kind) => !(carrier.ActsInStrongAcid && CarrierParameters.IsBasic(kind)) && kind is AlphaGroupKind.Hydroxyl or AlphaGroupKind.Ether
        or AlphaGroupKind.EsterOxygen or AlphaGroupKind.OtherOxygen or AlphaGroupKind.Amine or AlphaGroupKind.AmideNitrogen
        or AlphaGroupKind.AromaticNitrogen or AlphaGroupKind.Sulfide or AlphaGroupKind.Silicon;
}
