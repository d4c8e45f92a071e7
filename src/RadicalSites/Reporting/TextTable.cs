using System;
using System.Collections.Generic;
using System.IO;

namespace RadicalSites.Reporting;

/// <summary>A plain text table: columns padded with blanks, a rule of hyphens under the heads.</summary>
/// <param name="heads">Heads of the columns; one that starts with &gt; is aligned to the right.</param>
internal sealed class TextTable(params string[] heads)
{
    private readonly List<string[]> rows = [];

    internal void Add(params string[] cells) => rows.Add(cells);

    internal void Write(TextWriter writer)
    {
        var widths = new int[heads.Length];
        for (int column = 0; column < heads.Length; column++)
        {
            widths[column] = heads[column].TrimStart('>').Length;
            foreach (string[] row in rows)
            {
                widths[column] = Math.Max(widths[column], row[column].Length);
            }
        }

        WriteRow(writer, Array.ConvertAll(heads, static head => head.TrimStart('>')), widths);
        WriteRow(writer, Array.ConvertAll(widths, static width => new string('-', width)), widths);
        foreach (string[] row in rows)
        {
            WriteRow(writer, row, widths);
        }
    }

    private void WriteRow(TextWriter writer, string[] cells, int[] widths)
    {
        for (int column = 0; column < cells.Length; column++)
        {
            bool last = column == cells.Length - 1;
            string cell = heads[column][0] == '>' ? cells[column].PadLeft(widths[column]) : last ? cells[column] : cells[column].PadRight(widths[column]);
            writer.Write(cell);
            writer.Write(last ? "\n" : "  ");
        }
    }
}
