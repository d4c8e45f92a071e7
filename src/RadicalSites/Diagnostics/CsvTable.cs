using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Text;

namespace RadicalSites.Diagnostics;

/// <summary>Strict reader of the project's tables: comment header, column row, records; RFC 4180 without line breaks in fields.</summary>
internal sealed class CsvTable
{
    private readonly string[] columns;

    private CsvTable(string name, string[] columns, IReadOnlyList<CsvRow> rows, string text)
    {
        Name = name;
        this.columns = columns;
        Rows = rows;
        Text = text;
    }

    internal string Name { get; }

    internal IReadOnlyList<CsvRow> Rows { get; }

    /// <summary>The whole text, for checksums.</summary>
    internal string Text { get; }

    internal IReadOnlyList<string> Columns => columns;

    /// <summary>Reads an embedded table of the library.</summary>
    internal static CsvTable ReadEmbedded(string file, params string[] expected) =>
        Read(file, EmbeddedText(file), expected, []);

    internal static string EmbeddedText(string file)
    {
        using Stream stream = typeof(CsvTable).Assembly.GetManifestResourceStream("RadicalSites.Data." + file)
            ?? throw new InvalidDataException($"The embedded table {file} is missing; the assembly is damaged.");
        using var reader = new StreamReader(stream, Encoding.UTF8);
        return reader.ReadToEnd();
    }

    /// <summary>Reads a table.</summary>
    /// <param name="name">Name for messages.</param>
    /// <param name="text">The text.</param>
    /// <param name="expected">Columns that have to be there.</param>
    /// <param name="optional">Columns that may be there; any other is refused.</param>
    internal static CsvTable Read(string name, string text, string[] expected, string[] optional)
    {
        var rows = new List<CsvRow>();
        string[]? columns = null;
        int number = 0;
        foreach (ReadOnlySpan<char> raw in text.AsSpan().EnumerateLines())
        {
            number++;
            if (raw.IsWhiteSpace() || raw[0] == '#')
            {
                continue;
            }

            string[] fields = Split(name, number, raw);
            if (columns is null)
            {
                columns = fields;
                CheckColumns(name, number, columns, expected, optional);
            }
            else if (fields.Length != columns.Length)
            {
                throw new TableFormatException(name, number, "", string.Create(
                    CultureInfo.InvariantCulture, $"{fields.Length} fields, but the column row has {columns.Length}; check commas and quotes."));
            }
            else
            {
                rows.Add(new CsvRow(name, number, columns, fields));
            }
        }

        return columns is null
            ? throw new TableFormatException(name, Math.Max(1, number), "", "the column row is missing.")
            : new CsvTable(name, columns, rows, text);
    }

    private static void CheckColumns(string name, int line, string[] columns, string[] expected, string[] optional)
    {
        foreach (string column in expected)
        {
            if (Array.IndexOf(columns, column) < 0)
            {
                throw new TableFormatException(name, line, column, $"the column is missing; expected are {string.Join(", ", expected)}.");
            }
        }

        for (int i = 0; i < columns.Length; i++)
        {
            if (Array.IndexOf(expected, columns[i]) < 0 && Array.IndexOf(optional, columns[i]) < 0)
            {
                throw new TableFormatException(name, line, columns[i], $"unknown column; known are {string.Join(", ", [.. expected, .. optional])}.");
            }

            if (Array.IndexOf(columns, columns[i]) != i)
            {
                throw new TableFormatException(name, line, columns[i], "the column occurs twice.");
            }
        }
    }

    private static string[] Split(string name, int number, ReadOnlySpan<char> line)
    {
        var fields = new List<string>();
        var field = new StringBuilder();
        bool quoted = false;
        for (int i = 0; i < line.Length; i++)
        {
            char c = line[i];
            if (quoted && c == '"' && i + 1 < line.Length && line[i + 1] == '"')
            {
                field.Append('"');
                i++;
            }
            else if (c == '"')
            {
                quoted = !quoted;
            }
            else if (c == ',' && !quoted)
            {
                fields.Add(field.ToString());
                field.Clear();
            }
            else
            {
                field.Append(c);
            }
        }

        if (quoted)
        {
            throw new TableFormatException(name, number, "", "a quoted field is not closed.");
        }

        fields.Add(field.ToString());
        return fields.ToArray();
    }
}
