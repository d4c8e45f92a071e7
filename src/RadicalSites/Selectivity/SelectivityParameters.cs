using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Sites;

namespace RadicalSites.Selectivity;

/// <summary>The parameter tables of the selectivity model, read once.</summary>
internal static class SelectivityParameters
{
    /// <summary>Names of the rate classes, in the order of <see cref="RateClass"/>.</summary>
    internal static readonly string[] ClassNames = Enum.GetNames<RateClass>();

    private static readonly int AlphaCount = Enum.GetValues<AlphaGroupKind>().Length;

    /// <summary>Parameters of all rate classes of a carrier, by class.</summary>
    internal static ClassRate[] RatesOf(Carrier carrier) => Tables.Rates[carrier.Id];

    /// <summary>Sigma-I of a group.</summary>
    internal static double SigmaInductive(AlphaGroupKind kind) => Tables.SigmaInductive[(int)kind];

    /// <summary>Change of ln k of the carbon that carries a group, for the chlorine atom at 298.15 K.</summary>
    internal static double AlphaTerm(AlphaGroupKind kind) => Tables.Alpha[(int)kind];

    /// <summary>Sigma-I of an aryl group.</summary>
    internal static double ArylInductive => Tables.Aryl;

    /// <summary>Hammett constants of a group name, or null.</summary>
    internal static HammettConstants? Hammett(string group) => Tables.Hammett.GetValueOrDefault(group);

    /// <summary>Factor on ln(relative rate) for a complexing solvent and its standard deviation; 1 and 0 otherwise.</summary>
    internal static (double Factor, double Sigma) Medium(string? solvent, Carrier carrier) =>
        solvent is not null && Tables.Media.TryGetValue((solvent.ToUpperInvariant(), carrier.Id), out (double, double) found)
            ? found
            : (1, 0);

    private static class Tables
    {
        internal static readonly FrozenDictionary<string, ClassRate[]> Rates = ReadRates();
        internal static readonly double[] SigmaInductive = new double[AlphaCount];
        internal static readonly double[] Alpha = new double[AlphaCount];
        internal static readonly double Aryl = ReadPolar();

        internal static readonly FrozenDictionary<string, HammettConstants> Hammett = CsvTable
            .ReadEmbedded("hammett.csv", "group", "meta", "para", "para_plus").Rows
            .ToFrozenDictionary(static row => row.Required("group"), static row => new HammettConstants(
                row.Number("meta", -3, 3), row.Number("para", -3, 3), row.Number("para_plus", -3, 3)));

        internal static readonly FrozenDictionary<(string Solvent, string Carrier), (double Factor, double Sigma)> Media = CsvTable
            .ReadEmbedded("media.csv", "solvent", "carrier", "factor", "sigma_factor", "source", "locator").Rows
            .ToFrozenDictionary(
                static row => (row.Required("solvent").ToUpperInvariant(), row.Required("carrier")),
                static row => (row.Number("factor", 0.1, 10), row.Number("sigma_factor", 0, 5)));

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

        private static double ReadPolar()
        {
            double aryl = 0;
            foreach (CsvRow row in CsvTable.ReadEmbedded("polar_groups.csv", "group", "sigma_inductive", "alpha", "note").Rows)
            {
                double sigma = row.Number("sigma_inductive", -2, 2);
                if (row.Required("group") == "Aryl")
                {
                    aryl = sigma;
                }
                else if (row.Required("group") != "Vinyl")
                {
                    int kind = (int)row.Choice<AlphaGroupKind>("group");
                    SigmaInductive[kind] = sigma;
                    Alpha[kind] = row.Number("alpha", -20, 20);
                }
            }

            return aryl;
        }
    }
}
