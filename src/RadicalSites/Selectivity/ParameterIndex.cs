using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

/// <summary>Names and order of all adjustable parameters.</summary>
internal static class ParameterIndex
{
    internal const int ScalarsPerCarrier = 5;
    internal const int PolarBeta = 0;
    internal const int AttenuationInLiquid = 1;
    internal const int HammettRho = 2;
    internal const int Steric = 3;
    internal const int SlopeWeak = 4;

    private const int GroupColumns = 4;

    private static readonly int PerCarrier = SelectivityParameters.ClassNames.Length + ScalarsPerCarrier;

    // Order matters: the list is built before the index of names over it.
    internal static readonly SelectivityParameter[] All = Build();

    private static readonly FrozenDictionary<string, int> ByName =
        All.Select(static (parameter, index) => (parameter.Name, index))
            .ToFrozenDictionary(static pair => pair.Name, static pair => pair.index, StringComparer.OrdinalIgnoreCase);

    internal static int Find(string name) => ByName.GetValueOrDefault(name, -1);

    internal static int OfClass(Carrier carrier, RateClass rateClass) => (Position(carrier) * PerCarrier) + (int)rateClass;

    internal static int OfScalar(Carrier carrier, int scalar) =>
        (Position(carrier) * PerCarrier) + SelectivityParameters.ClassNames.Length + scalar;

    /// <summary>Index of a group's alpha or beta term.</summary>
    internal static int OfGroup(AlphaGroupKind kind, bool late, bool beta) =>
        (ReagentCatalogue.Carriers.Count * PerCarrier) + ((int)kind * GroupColumns) + (late ? 2 : 0) + (beta ? 1 : 0);

    private static int Position(Carrier carrier)
    {
        IReadOnlyList<Carrier> carriers = ReagentCatalogue.Carriers;
        for (int i = 0; i < carriers.Count; i++)
        {
            if (carriers[i].Id == carrier.Id)
            {
                return i;
            }
        }

        throw new ArgumentException("The carrier is not in the catalogue.", nameof(carrier));
    }

    private static SelectivityParameter[] Build()
    {
        var list = new List<SelectivityParameter>();
        foreach (Carrier carrier in ReagentCatalogue.Carriers)
        {
            ClassRate[] rates = SelectivityParameters.RatesOf(carrier);
            for (int i = 0; i < rates.Length; i++)
            {
                // Rates are relative to primary, which therefore does not move.
                double spread = i == (int)RateClass.Primary ? 0 : rates[i].Sigma;
                list.Add(new($"{carrier.Id}/{(RateClass)i}", rates[i].LnA + (rates[i].Kelvin / 298.15), spread, carrier.Id));
            }

            list.Add(new($"{carrier.Id}/polar-beta", carrier.PolarBeta, 0.3 * Math.Abs(carrier.PolarBeta), carrier.Id));
            list.Add(new($"{carrier.Id}/attenuation-liquid", carrier.AttenuationInLiquid, 0.1, carrier.Id));
            list.Add(new($"{carrier.Id}/hammett-rho", carrier.HammettRho, 0.15 * Math.Abs(carrier.HammettRho), carrier.Id));
            list.Add(new($"{carrier.Id}/steric", carrier.Steric, 0.3 * carrier.Steric, carrier.Id));
            list.Add(new($"{carrier.Id}/slope", carrier.SlopeWeak, 0.08 * carrier.SlopeWeak, carrier.Id));
        }

        foreach (AlphaGroupKind kind in Enum.GetValues<AlphaGroupKind>())
        {
            PolarGroup group = SelectivityParameters.Group(kind);
            list.Add(new($"early/alpha/{kind}", group.AlphaEarly, 0.7, null));
            list.Add(new($"early/beta/{kind}", group.BetaEarly, 0.4, null));
            list.Add(new($"late/alpha/{kind}", group.AlphaLate, 1.5, null));
            list.Add(new($"late/beta/{kind}", group.BetaLate, 0.8, null));
        }

        return [.. list];
    }
}
