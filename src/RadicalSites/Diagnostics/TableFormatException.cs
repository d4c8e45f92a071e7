using System;
using System.Globalization;

namespace RadicalSites.Diagnostics;

/// <summary>A data table does not follow its schema.</summary>
public sealed class TableFormatException : FormatException
{
    /// <summary>Makes the exception.</summary>
    /// <param name="table">Name of the table or file.</param>
    /// <param name="line">1-based line.</param>
    /// <param name="column">Name of the column concerned, or an empty text.</param>
    /// <param name="reason">What is wrong and what is expected.</param>
    public TableFormatException(string table, int line, string column, string reason)
        : base(string.Create(CultureInfo.InvariantCulture, $"{table}, line {line}{(string.IsNullOrEmpty(column) ? "" : $", column {column}")}: {reason}"))
    {
        Table = table;
        Line = line;
        Column = column;
        Reason = reason;
    }

    /// <summary>Name of the table or file.</summary>
    public string Table { get; }

    /// <summary>1-based line.</summary>
    public int Line { get; }

    /// <summary>Name of the column concerned, or an empty text.</summary>
    public string Column { get; }

    /// <summary>What is wrong and what is expected.</summary>
    public string Reason { get; }
}
