using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Quantities;

namespace RadicalSites.Selectivity;

/// <summary>The halogen sources and chain carriers that the library knows.</summary>
/// <remarks>Read once from the embedded tables; immutable and safe for use by many threads.</remarks>
public static class ReagentCatalogue
{
    /// <summary>All reagents in table order.</summary>
    public static IReadOnlyList<Reagent> All => Holder.Reagents;

    /// <summary>All carriers in table order.</summary>
    public static IReadOnlyList<Carrier> Carriers => Holder.Carriers;

    /// <summary>Finds a reagent.</summary>
    /// <param name="id">Id, for example <c>Br2</c>; case is ignored.</param>
    /// <returns>The reagent, or <see langword="null"/>.</returns>
    public static Reagent? Find(string id)
    {
        ArgumentNullException.ThrowIfNull(id);
        return Holder.ById.GetValueOrDefault(id);
    }

    /// <summary>Gets a reagent that has to exist.</summary>
    /// <param name="id">Id, for example <c>Br2</c>; case is ignored.</param>
    /// <returns>The reagent.</returns>
    /// <exception cref="ArgumentException">There is no such reagent; the message lists all ids.</exception>
    public static Reagent Get(string id) => Find(id)
        ?? throw new ArgumentException($"There is no reagent '{id}'. Known are {string.Join(", ", All.Select(static r => r.Id))}.", nameof(id));

    private static class Holder
    {
        internal static readonly Carrier[] Carriers =
        [
            .. CsvTable.ReadEmbedded(
                "carriers.csv", "id", "name", "epsilon_weak", "epsilon_strong", "transition_state", "polar_beta", "attenuation_gas",
                "attenuation_liquid", "polar_scale", "hammett_rho", "hammett_scale", "steric", "ceiling", "isotope_effect",
                "sigma_polar", "primary_sensitivity", "medium", "source", "locator")
                .Rows.Select(static row => new Carrier
                {
                    Id = row.Required("id"),
                    Name = row.Required("name"),
                    SlopeWeak = row.Number("epsilon_weak", 0, 2),
                    SlopeStrong = row.Number("epsilon_strong", 0, 2),
                    PolarBeta = row.Number("polar_beta", -20, 20),
                    HasLateTransitionState = row.Required("transition_state") == "late",
                    AttenuationInGas = row.Number("attenuation_gas", 0, 1),
                    AttenuationInLiquid = row.Number("attenuation_liquid", 0, 1),
                    PolarScale = row.Number("polar_scale", 0, 5),
                    HammettRho = row.Number("hammett_rho", -5, 5),
                    UsesSigmaPlus = row.Required("hammett_scale") == "sigma+",
                    Steric = row.Number("steric", 0, 5),
                    PrimarySensitivity = row.Number("primary_sensitivity", 0.1, 10),
                    ActsInStrongAcid = row.Required("medium") == "acid",
                    Ceiling = row.Number("ceiling", 0, 1e6),
                    IsotopeEffect = row.Number("isotope_effect", 1, 20),
                    PolarSigma = row.Number("sigma_polar", 0, 2),
                    Source = row.Required("source"),
                }),
        ];

        internal static readonly Reagent[] Reagents =
        [
            .. CsvTable.ReadEmbedded(
                "reagents.csv", "id", "name", "carrier", "halogen", "hydrogen_bond", "transfer_bond", "by_product",
                "celsius_min", "celsius_max", "celsius_default", "kind", "source", "locator")
                .Rows.Select(static row => new Reagent
                {
                    Id = row.Required("id"),
                    Name = row.Required("name"),
                    Carrier = Array.Find(Carriers, carrier => carrier.Id == row.Required("carrier"))
                        ?? throw row.Error("carrier", $"there is no carrier '{row.Text("carrier")}'."),
                    Halogen = Elements.Find(row.Required("halogen")) is > 0 and int halogen
                        ? halogen
                        : throw row.Error("halogen", "no element symbol."),
                    HydrogenBond = row.Required("hydrogen_bond"),
                    TransferBond = row.Required("transfer_bond"),
                    ByProduct = row.Required("by_product"),
                    Minimum = Temperature.FromCelsius(row.Number("celsius_min", -200, 600)),
                    Maximum = Temperature.FromCelsius(row.Number("celsius_max", -200, 600)),
                    Default = Temperature.FromCelsius(row.Number("celsius_default", -200, 600)),
                    Kind = row.Required("kind"),
                    Source = row.Required("source"),
                }),
        ];

        internal static readonly FrozenDictionary<string, Reagent> ById =
            Reagents.ToFrozenDictionary(static reagent => reagent.Id, StringComparer.OrdinalIgnoreCase);
    }
}
