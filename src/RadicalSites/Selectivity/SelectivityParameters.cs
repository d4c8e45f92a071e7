using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

/// <summary>The parameter tables of the selectivity model, read once; what was fitted lies on top as shifts.</summary>
internal static class SelectivityParameters
{
    /// <summary>Names of the rate classes, in the order of <see cref="RateClass"/>.</summary>
    internal static readonly string[] ClassNames = Enum.GetNames<RateClass>();

    /// <summary>Number of kinds of groups.</summary>
    internal static readonly int GroupCount = Enum.GetValues<AlphaGroupKind>().Length;

    /// <summary>Parameters of all rate classes of a carrier, by class, as the table has them.</summary>
    internal static ClassRate[] RatesOf(Carrier carrier) => Tables.Rates[carrier.Id];

    /// <summary>Row of the table of polar groups.</summary>
    internal static PolarGroup Group(AlphaGroupKind kind) => Tables.Groups[(int)kind];

    /// <summary>Sigma-I of an aryl group.</summary>
    internal static double ArylInductive => Tables.Others.Aryl;

    /// <summary>Constants of a protonated oxygen or carbonyl group.</summary>
    internal static PolarGroup Oxonium => Tables.Others.Oxonium;

    /// <summary>Hammett constants of a group name, or null.</summary>
    internal static HammettConstants? Hammett(string group) => Tables.Hammett.GetValueOrDefault(group);

    /// <summary>Row of a solvent, or null; case is ignored.</summary>
    internal static MediumRow? Medium(string solvent) => Tables.Media.GetValueOrDefault(solvent);

    /// <summary>Ids of all media, ascending.</summary>
    internal static IReadOnlyList<string> MediumIds { get; } = [.. Tables.Media.Keys.Order(StringComparer.Ordinal)];

    private static class Tables
    {
        internal static readonly FrozenDictionary<string, ClassRate[]> Rates = ReadRates();
        internal static readonly PolarGroup[] Groups = new PolarGroup[GroupCount];
        internal static readonly (double Aryl, PolarGroup Oxonium) Others = ReadPolar();

        internal static readonly FrozenDictionary<string, HammettConstants> Hammett = CsvTable
            .ReadEmbedded("hammett.csv", "group", "meta", "para", "para_plus").Rows
            .ToFrozenDictionary(static row => row.Required("group"), static row => new HammettConstants(
                row.Number("meta", -3, 3), row.Number("para", -3, 3), row.Number("para_plus", -3, 3)));

        internal static readonly FrozenDictionary<string, MediumRow> Media = CsvTable
            .ReadEmbedded(
                "media.csv", "solvent", "phase", "carrier", "base", "gain", "half_molar", "neat_molar", "sigma_factor",
                "source", "locator").Rows
            .ToFrozenDictionary(
                static row => row.Required("solvent"),
                static row => new MediumRow(
                    row.Required("carrier"), row.Required("phase") == "gas", row.Number("base", 0.1, 10),
                    row.Number("gain", 0, 20), row.Number("half_molar", 0.01, 1000), row.Number("neat_molar", 0.01, 100),
                    row.Number("sigma_factor", 0, 5)),
                StringComparer.OrdinalIgnoreCase);

        private static FrozenDictionary<string, ClassRate[]> ReadRates()
        {
            var rates = new Dictionary<string, ClassRate[]>();
            CsvTable table = CsvTable.ReadEmbedded(
                "class_rates.csv", "carrier", "class", "ln_a", "b_kelvin", "sigma_ln", "source", "locator");
            foreach (CsvRow row in table.Rows)
            {
                string carrier = row.Required("carrier");
                if (!rates.TryGetValue(carrier, out ClassRate[]? list))
                {
                    rates[carrier] = list = new ClassRate[ClassNames.Length];
                }

                list[(int)row.Choice<RateClass>("class")] = new ClassRate(
                    row.Number("ln_a", -20, 20), row.Number("b_kelvin", -10000, 10000), row.Number("sigma_ln", 0, 5));
            }

            return rates.ToFrozenDictionary();
        }

        private static (double Aryl, PolarGroup Oxonium) ReadPolar()
        {
            double aryl = 0;
            PolarGroup oxonium = default;
            CsvTable table = CsvTable.ReadEmbedded(
                "polar_groups.csv", "group", "sigma_inductive", "alpha_early", "alpha_late", "beta_early", "beta_late", "note");
            foreach (CsvRow row in table.Rows)
            {
                var group = new PolarGroup(
                    row.Number("sigma_inductive", -2, 2), row.Number("alpha_early", -20, 20), row.Number("alpha_late", -20, 20),
                    row.Number("beta_early", -20, 20), row.Number("beta_late", -20, 20));
                switch (row.Required("group"))
                {
                    case "Aryl":
                        aryl = group.SigmaInductive;
                        break;
                    case "Oxonium":
                        oxonium = group;
                        break;
                    case "Vinyl":
                        break;
                    default:
                        Groups[(int)row.Choice<AlphaGroupKind>("group")] = group;
                        break;
                }
            }

            return (aryl, oxonium);
        }
    }
}
