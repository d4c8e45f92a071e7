using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Text;

namespace RadicalSites.Heat;

/// <summary>The shipped tables of solvents and of reagent properties.</summary>
/// <remarks>Read once; immutable and safe for use by many threads.</remarks>
public static class HeatTables
{
    /// <summary>All solvents, in the order of the table.</summary>
    public static IReadOnlyList<Solvent> Solvents => Holder.Solvents;

    /// <summary>All halogen sources with their batch properties, in the order of the table.</summary>
    public static IReadOnlyList<ReagentProperties> Reagents => Holder.Reagents;

    /// <summary>Finds a solvent.</summary>
    /// <param name="id">Id; case is ignored.</param>
    /// <returns>The solvent, or <see langword="null"/>.</returns>
    public static Solvent? FindSolvent(string id)
    {
        foreach (Solvent solvent in Holder.Solvents)
        {
            if (solvent.Id.Equals(id, StringComparison.OrdinalIgnoreCase))
            {
                return solvent;
            }
        }

        return null;
    }

    /// <summary>Finds the batch properties of a halogen source.</summary>
    /// <param name="id">Id of the reagent; case is ignored.</param>
    /// <returns>The properties, or <see langword="null"/>.</returns>
    public static ReagentProperties? FindReagent(string id)
    {
        foreach (ReagentProperties reagent in Holder.Reagents)
        {
            if (reagent.Id.Equals(id, StringComparison.OrdinalIgnoreCase))
            {
                return reagent;
            }
        }

        return null;
    }

    private static class Holder
    {
        internal static readonly Solvent[] Solvents = Read("solvents.csv", 10, static row => new Solvent(
            row[0], row[1], row[2], Number(row[3]), Number(row[4]), Number(row[5]), row[6], row[7], row[8], row[9]));

        internal static readonly ReagentProperties[] Reagents = Read("reagent_properties.csv", 10, static row =>
            new ReagentProperties(
                row[0], row[1], row[2], row[3], row[4].Length == 0 ? null : Number(row[4]),
                row[5].Length == 0 ? [] : row[5].Split(';'), row[6], row[7], row[8], row[9]));

        private static T[] Read<T>(string name, int columns, Func<string[], T> make)
        {
            using Stream stream = typeof(HeatTables).Assembly.GetManifestResourceStream("RadicalSites.Data." + name)
                ?? throw new InvalidDataException($"The embedded table {name} is missing; the assembly is damaged.");
            using var reader = new StreamReader(stream);
            var rows = new List<T>();
            bool header = true;
            while (reader.ReadLine() is { } line)
            {
                if (line.Length == 0 || line[0] == '#')
                {
                    continue;
                }

                string[] fields = Split(line);
                if (fields.Length != columns)
                {
                    throw new InvalidDataException($"Table {name}: a row has {fields.Length} fields instead of {columns}: {line}");
                }

                if (!header)
                {
                    rows.Add(make(fields));
                }

                header = false;
            }

            return rows.ToArray();
        }

        // One line of RFC 4180 without line breaks inside a field.
        private static string[] Split(string line)
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

            fields.Add(field.ToString());
            return fields.ToArray();
        }

        private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
    }
}
