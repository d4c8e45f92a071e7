using System;
using System.Globalization;

namespace RadicalSites.Quantities;

/// <summary>An amount of substrate for a batch: a mass or an amount of substance.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public readonly record struct Amount
{
    private Amount(double value, bool isMass)
    {
        Value = value;
        IsMass = isMass;
    }

    /// <summary>Mass [g] or amount of substance [mol], as <see cref="IsMass"/> says; greater than zero.</summary>
    public double Value { get; }

    /// <summary>Whether the value is a mass.</summary>
    public bool IsMass { get; }

    /// <summary>Makes an amount from a mass.</summary>
    /// <param name="grams">Mass [g]; finite and greater than zero.</param>
    /// <returns>The amount.</returns>
    public static Amount FromGrams(double grams) => new(Positive(grams, nameof(grams)), true);

    /// <summary>Makes an amount from an amount of substance.</summary>
    /// <param name="moles">Amount of substance [mol]; finite and greater than zero.</param>
    /// <returns>The amount.</returns>
    public static Amount FromMoles(double moles) => new(Positive(moles, nameof(moles)), false);

    /// <summary>Reads <c>5g</c>, <c>250 mg</c>, <c>2kg</c>, <c>10mmol</c>, <c>0.5 mol</c>.</summary>
    /// <param name="text">Number and unit, invariant culture, case of the unit matters not.</param>
    /// <param name="amount">The amount when the text is valid.</param>
    /// <returns>Whether the text is a positive amount with a known unit.</returns>
    public static bool TryParse(string? text, out Amount amount)
    {
        amount = default;
        ReadOnlySpan<char> rest = text.AsSpan().Trim();
        int unitStart = rest.Length;
        while (unitStart > 0 && char.IsAsciiLetter(rest[unitStart - 1]))
        {
            unitStart--;
        }

        (double Factor, bool IsMass)? unit = rest[unitStart..] switch
        {
            var u when u.Equals("g", StringComparison.OrdinalIgnoreCase) => (1, true),
            var u when u.Equals("mg", StringComparison.OrdinalIgnoreCase) => (1e-3, true),
            var u when u.Equals("kg", StringComparison.OrdinalIgnoreCase) => (1e3, true),
            var u when u.Equals("mol", StringComparison.OrdinalIgnoreCase) => (1, false),
            var u when u.Equals("mmol", StringComparison.OrdinalIgnoreCase) => (1e-3, false),
            _ => null,
        };
        if (unit is null
            || !double.TryParse(rest[..unitStart].TrimEnd(), NumberStyles.Float, CultureInfo.InvariantCulture, out double value)
            || !double.IsFinite(value * unit.Value.Factor) || value <= 0)
        {
            return false;
        }

        amount = new Amount(value * unit.Value.Factor, unit.Value.IsMass);
        return true;
    }

    /// <summary>Amount of substance [mol].</summary>
    /// <param name="gramsPerMole">Molar mass of the substance [g/mol]; greater than zero.</param>
    /// <returns>The amount of substance [mol].</returns>
    public double InMoles(double gramsPerMole) => IsMass ? Value / gramsPerMole : Value;

    private static double Positive(double value, string name) =>
        double.IsFinite(value) && value > 0
            ? value
            : throw new ArgumentOutOfRangeException(name, value, "An amount is finite and greater than zero.");
}
