using System;
using System.Globalization;

namespace RadicalSites.Diagnostics;

/// <summary>One record of a table with its place, for strict access by column.</summary>
internal sealed class CsvRow(string table, int line, string[] columns, string[] fields)
{
    internal int Line => line;

    internal string Table => table;

    /// <summary>Field of a column, or an empty text when the table has no such (optional) column.</summary>
    internal string Text(string column)
    {
        int index = Array.IndexOf(columns, column);
        return index < 0 ? "" : fields[index].Trim();
    }

    /// <summary>Field that may not be empty.</summary>
    internal string Required(string column) =>
        Text(column) is { Length: > 0 } text ? text : throw Error(column, "the field is empty.");

    /// <summary>Finite number within bounds.</summary>
    internal double Number(string column, double least, double most)
    {
        string text = Required(column);
        if (!double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) || !double.IsFinite(value))
        {
            throw Error(column, $"'{text}' is no number; write it with a decimal point.");
        }

        return value >= least && value <= most
            ? value
            : throw Error(column, string.Create(CultureInfo.InvariantCulture, $"{value} is outside {least} to {most}."));
    }

    internal int Integer(string column, int least, int most)
    {
        double value = Number(column, least, most);
        return value == Math.Floor(value) ? (int)value : throw Error(column, $"'{Text(column)}' is no whole number.");
    }

    /// <summary>Finite number within bounds, or null for an empty field.</summary>
    internal double? OptionalNumber(string column, double least, double most) =>
        Text(column).Length == 0 ? null : Number(column, least, most);

    /// <summary>Member of an enumeration by name.</summary>
    internal T Choice<T>(string column)
        where T : struct, Enum =>
        Enum.TryParse(Required(column), ignoreCase: true, out T value) && Enum.IsDefined(value)
            ? value
            : throw Error(column, $"'{Text(column)}' is none of {string.Join(", ", Enum.GetNames<T>())}.");

    internal TableFormatException Error(string column, string reason) => new(table, line, column, reason);
}
