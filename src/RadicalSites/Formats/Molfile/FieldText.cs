using System;
using System.Globalization;

namespace RadicalSites.Formats.Molfile;

/// <summary>Reads the number fields of connection tables, without culture and without allocation.</summary>
internal static class FieldText
{
    /// <summary>The columns of a fixed field; shorter or empty when the line ends before.</summary>
    internal static ReadOnlySpan<char> Columns(ReadOnlySpan<char> line, int start, int length) =>
        start >= line.Length ? default : line.Slice(start, Math.Min(length, line.Length - start));

    /// <summary>Reads an integer with blanks around it; an empty field is 0.</summary>
    internal static bool TryInteger(ReadOnlySpan<char> field, out int value)
    {
        field = field.Trim(' ');
        value = 0;
        if (field.IsEmpty)
        {
            return true;
        }

        int at = field[0] is '-' or '+' ? 1 : 0;
        if (at == field.Length || field.Length - at > 9)
        {
            return false;
        }

        for (int i = at; i < field.Length; i++)
        {
            uint digit = (uint)(field[i] - '0');
            if (digit > 9)
            {
                return false;
            }

            value = (value * 10) + (int)digit;
        }

        value = field[0] == '-' ? -value : value;
        return true;
    }

    /// <summary>Reads a finite decimal number with blanks around it; an empty field is 0.</summary>
    internal static bool TryNumber(ReadOnlySpan<char> field, out double value)
    {
        field = field.Trim(' ');
        value = 0;
        if (field.IsEmpty)
        {
            return true;
        }

        // Up to 15 digits and a point are exact as integer over a power of ten; the rest takes the slow way.
        long digits = 0;
        int at = field[0] is '-' or '+' ? 1 : 0;
        int point = -1;
        bool plain = field.Length - at <= 16 && field.Length > at;
        for (int i = at; i < field.Length && plain; i++)
        {
            uint digit = (uint)(field[i] - '0');
            if (digit <= 9)
            {
                digits = (digits * 10) + digit;
            }
            else if (field[i] == '.' && point < 0)
            {
                point = i;
            }
            else
            {
                plain = false;
            }
        }

        if (plain && point >= 0 && field.Length - at > 1)
        {
            double size = digits / Powers[field.Length - 1 - point];
            value = field[0] == '-' ? -size : size;
            return true;
        }

        return double.TryParse(
            field, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent,
            CultureInfo.InvariantCulture, out value) && double.IsFinite(value);
    }

    /// <summary>Cuts the next word off a text.</summary>
    /// <returns>The word; empty when the text holds none.</returns>
    internal static ReadOnlySpan<char> Word(ref ReadOnlySpan<char> text)
    {
        text = text.TrimStart(Blanks);
        int end = text.IndexOfAny(Blanks);
        ReadOnlySpan<char> word = end < 0 ? text : text[..end];
        text = text[word.Length..];
        return word;
    }

    private const string Blanks = " \t";

    private static readonly double[] Powers =
        [1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16];
}
