using System;
using System.Globalization;

namespace RadicalSites.Quantities;

/// <summary>An absolute temperature.</summary>
/// <remarks>Equality is exact equality of the kelvin value. Immutable and safe for use by many threads.</remarks>
public readonly record struct Temperature : IComparable<Temperature>
{
    private const double ZeroCelsius = 273.15;

    private Temperature(double kelvin) => Kelvin = kelvin;

    /// <summary>Temperature [K], greater than zero.</summary>
    public double Kelvin { get; }

    /// <summary>Temperature [degree Celsius].</summary>
    public double Celsius => Kelvin - ZeroCelsius;

    /// <summary>Makes a temperature from kelvin.</summary>
    /// <param name="kelvin">Temperature [K]; finite and greater than zero.</param>
    /// <returns>The temperature.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite or not above absolute zero.</exception>
    public static Temperature FromKelvin(double kelvin)
    {
        if (!double.IsFinite(kelvin) || kelvin <= 0)
        {
            throw new ArgumentOutOfRangeException(nameof(kelvin), kelvin, "A temperature is finite and above 0 K.");
        }

        return new Temperature(kelvin);
    }

    /// <summary>Makes a temperature from degrees Celsius.</summary>
    /// <param name="celsius">Temperature [degree Celsius]; finite and above -273.15.</param>
    /// <returns>The temperature.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite or not above absolute zero.</exception>
    public static Temperature FromCelsius(double celsius) => FromKelvin(Math.Round(celsius + ZeroCelsius, 9));

    /// <summary>Reads <c>80C</c>, <c>353K</c> or a bare number, which is in degrees Celsius.</summary>
    /// <param name="text">The text; a degree sign before the unit is allowed, case of the unit is ignored.</param>
    /// <param name="temperature">The temperature when the text is valid.</param>
    /// <returns>Whether the text is a temperature above absolute zero.</returns>
    public static bool TryParse(string? text, out Temperature temperature)
    {
        temperature = default;
        ReadOnlySpan<char> rest = text.AsSpan().Trim();
        if (rest.IsEmpty)
        {
            return false;
        }

        bool kelvin = rest[^1] is 'K' or 'k';
        if (kelvin || rest[^1] is 'C' or 'c')
        {
            rest = rest[..^1].TrimEnd();
            if (!rest.IsEmpty && rest[^1] == '°')
            {
                rest = rest[..^1].TrimEnd();
            }
        }

        if (!double.TryParse(rest, NumberStyles.Float, CultureInfo.InvariantCulture, out double value))
        {
            return false;
        }

        double absolute = kelvin ? value : Math.Round(value + ZeroCelsius, 9);
        if (!double.IsFinite(absolute) || absolute <= 0)
        {
            return false;
        }

        temperature = new Temperature(absolute);
        return true;
    }

    /// <inheritdoc/>
    public int CompareTo(Temperature other) => Kelvin.CompareTo(other.Kelvin);

    /// <summary>Whether one temperature is lower than another.</summary>
    /// <param name="left">First temperature.</param>
    /// <param name="right">Second temperature.</param>
    /// <returns>Whether <paramref name="left"/> is lower.</returns>
    public static bool operator <(Temperature left, Temperature right) => left.Kelvin < right.Kelvin;

    /// <summary>Whether one temperature is higher than another.</summary>
    /// <param name="left">First temperature.</param>
    /// <param name="right">Second temperature.</param>
    /// <returns>Whether <paramref name="left"/> is higher.</returns>
    public static bool operator >(Temperature left, Temperature right) => left.Kelvin > right.Kelvin;

    /// <summary>Whether one temperature is at most another.</summary>
    /// <param name="left">First temperature.</param>
    /// <param name="right">Second temperature.</param>
    /// <returns>Whether <paramref name="left"/> is not higher.</returns>
    public static bool operator <=(Temperature left, Temperature right) => left.Kelvin <= right.Kelvin;

    /// <summary>Whether one temperature is at least another.</summary>
    /// <param name="left">First temperature.</param>
    /// <param name="right">Second temperature.</param>
    /// <returns>Whether <paramref name="left"/> is not lower.</returns>
    public static bool operator >=(Temperature left, Temperature right) => left.Kelvin >= right.Kelvin;

    /// <summary>Kelvin with the unit, invariant culture.</summary>
    /// <returns>For example <c>353.15 K</c>.</returns>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{Kelvin} K");
}
