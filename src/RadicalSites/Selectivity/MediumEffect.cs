using System;
using System.Collections.Generic;
using System.Globalization;

namespace RadicalSites.Selectivity;

/// <summary>What a solvent does: state of matter, and the factor on ln(relative rate) of one carrier.</summary>
internal readonly record struct MediumEffect(bool IsKnown, bool IsGas, double Factor, double Sigma)
{
    // Concentrations are written after the id: PhH@4M.
    private const char Separator = '@';

    /// <summary>Reads a solvent id with an optional concentration.</summary>
    /// <returns>The id, and the concentration [mol/L] or null; a null id when the text is not of that form.</returns>
    internal static (string? Id, double? Molar) Split(string solvent)
    {
        int at = solvent.IndexOf(Separator, StringComparison.Ordinal);
        if (at < 0)
        {
            return (solvent, null);
        }

        ReadOnlySpan<char> number = solvent.AsSpan(at + 1);
        return number.Length > 1 && char.ToUpperInvariant(number[^1]) == 'M'
            && double.TryParse(number[..^1], NumberStyles.Float, CultureInfo.InvariantCulture, out double molar)
            && molar is > 0 and < 100
            ? (solvent[..at], molar)
            : (null, null);
    }

    internal static MediumEffect Of(string? solvent, Carrier carrier)
    {
        if (solvent is null)
        {
            return new MediumEffect(false, false, 1, 0);
        }

        (string? id, double? molar) = Split(solvent);
        if (id is null || SelectivityParameters.Medium(id) is not { } row)
        {
            return new MediumEffect(false, false, 1, 0);
        }

        if (row.Carrier != carrier.Id)
        {
            return new MediumEffect(row.Carrier == "*" || row.Gain == 0, row.IsGas, 1, 0);
        }

        double concentration = molar ?? row.NeatMolar;
        double factor = row.Base + (row.Gain * concentration / (concentration + row.HalfMolar));
        return new MediumEffect(true, row.IsGas, factor, row.Sigma);
    }
}
