using System;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

/// <summary>The parameters of one carrier after calibration, ready for use.</summary>
internal sealed class CarrierParameters
{
    internal CarrierParameters(Carrier carrier, SelectivityCalibration calibration)
    {
        ReadOnlySpan<double> shifts = calibration.Shifts;
        ReadOnlySpan<double> sigmas = calibration.Sigmas;
        ClassRate[] table = SelectivityParameters.RatesOf(carrier);
        Rates = new ClassRate[table.Length];
        for (int i = 0; i < table.Length; i++)
        {
            int index = ParameterIndex.OfClass(carrier, (RateClass)i);
            double sigma = i == (int)RateClass.Primary ? table[i].Sigma : sigmas[index];
            Rates[i] = new ClassRate(table[i].LnA + shifts[index], table[i].Kelvin, sigma);
        }

        PolarBeta = carrier.PolarBeta + shifts[ParameterIndex.OfScalar(carrier, ParameterIndex.PolarBeta)];
        AttenuationInLiquid = Math.Clamp(
            carrier.AttenuationInLiquid + shifts[ParameterIndex.OfScalar(carrier, ParameterIndex.AttenuationInLiquid)], 0, 0.9);
        HammettRho = carrier.HammettRho + shifts[ParameterIndex.OfScalar(carrier, ParameterIndex.HammettRho)];
        Steric = Math.Max(0, carrier.Steric + shifts[ParameterIndex.OfScalar(carrier, ParameterIndex.Steric)]);
        SlopeWeak = Math.Max(0, carrier.SlopeWeak + shifts[ParameterIndex.OfScalar(carrier, ParameterIndex.SlopeWeak)]);
        bool late = carrier.HasLateTransitionState;
        Alpha = new double[SelectivityParameters.GroupCount];
        Beta = new double[Alpha.Length];
        Sigma = new double[Alpha.Length];
        for (int i = 0; i < Alpha.Length; i++)
        {
            var kind = (AlphaGroupKind)i;
            PolarGroup group = carrier.ActsInStrongAcid ? Protonated(kind) : SelectivityParameters.Group(kind);
            Sigma[i] = group.SigmaInductive;
            Alpha[i] = carrier.PolarScale
                * ((late ? group.AlphaLate : group.AlphaEarly) + shifts[ParameterIndex.OfGroup(kind, late, beta: false)]);
            Beta[i] = carrier.PolarScale
                * ((late ? group.BetaLate : group.BetaEarly) + shifts[ParameterIndex.OfGroup(kind, late, beta: true)]);
        }
    }

    /// <summary>Whether strong acid protonates a group.</summary>
    internal static bool IsBasic(AlphaGroupKind kind) => kind is AlphaGroupKind.Amine or AlphaGroupKind.Hydroxyl
        or AlphaGroupKind.Ether or AlphaGroupKind.EsterOxygen or AlphaGroupKind.Ester or AlphaGroupKind.CarboxylicAcid
        or AlphaGroupKind.Ketone or AlphaGroupKind.Aldehyde or AlphaGroupKind.Amide or AlphaGroupKind.AmideNitrogen
        or AlphaGroupKind.Sulfide;

    private static PolarGroup Protonated(AlphaGroupKind kind) =>
        kind == AlphaGroupKind.Amine ? SelectivityParameters.Group(AlphaGroupKind.Ammonium)
        : IsBasic(kind) ? SelectivityParameters.Oxonium
        : SelectivityParameters.Group(kind);

    /// <summary>Rate classes in the order of <see cref="RateClass"/>.</summary>
    internal ClassRate[] Rates { get; }

    internal double PolarBeta { get; }

    internal double AttenuationInLiquid { get; }

    internal double HammettRho { get; }

    internal double Steric { get; }

    internal double SlopeWeak { get; }

    /// <summary>Terms of groups on the attacked carbon, by kind.</summary>
    internal double[] Alpha { get; }

    /// <summary>Terms of groups on the neighbouring carbon beyond induction, by kind.</summary>
    internal double[] Beta { get; }

    /// <summary>Sigma-I by kind.</summary>
    internal double[] Sigma { get; }
}
