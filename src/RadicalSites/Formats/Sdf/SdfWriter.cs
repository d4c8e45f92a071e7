using System;
using System.Collections.Generic;
using System.IO;
using RadicalSites.Formats.Molfile;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Sdf;

/// <summary>Writes structure-data files.</summary>
/// <remarks>
/// Lines end with LF. Fields that this library adds start with <see cref="ResultPrefix"/>; fields of the input keep their
/// headers. A value cannot hold everything: blank lines inside are left out, and a line that looks like
/// a terminator or a header is set off by a blank. Stateless and safe for use by many threads. Source: [CTFILE].
/// </remarks>
public static class SdfWriter
{
    /// <summary>Start of the names of fields that hold results of this library.</summary>
    public const string ResultPrefix = "RS_";

    /// <summary>Writes one record.</summary>
    /// <param name="writer">Where to; it stays open.</param>
    /// <param name="molecule">The molecule.</param>
    /// <param name="fields">Data items in order; may be empty.</param>
    /// <param name="options">How to write the molfile; <see langword="null"/> = defaults.</param>
    /// <exception cref="MolfileFormatException">The format cannot hold the molecule.</exception>
    public static void Write(
        TextWriter writer, Molecule molecule, IReadOnlyList<SdfField> fields, MolfileWriterOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(fields);
        writer.Write(MolfileWriter.Write(molecule, options));
        foreach (SdfField field in fields)
        {
            writer.Write(IsUsable(field.Header) ? field.Header : $"> <{NameOf(field.Name)}>");
            writer.Write('\n');
            WriteValue(writer, field.Value);
            writer.Write('\n');
        }

        writer.Write("$$$$\n");
    }

    private static bool IsUsable(string header) => header.StartsWith('>') && header.AsSpan().IndexOfAny('\n', '\r') < 0;

    private static string NameOf(string name) =>
        name.AsSpan().IndexOfAny("<>\r\n") < 0
            ? name
            : throw new ArgumentException($"A field name holds no angle brackets and no line ends: '{name}'.", nameof(name));

    private static void WriteValue(TextWriter writer, string value)
    {
        var cursor = new LineCursor(value);
        while (cursor.Next())
        {
            ReadOnlySpan<char> line = cursor.Current;
            if (line.IsWhiteSpace())
            {
                // A really blank line would end the value.
                continue;
            }

            if (line[0] == '>' || line.StartsWith("$$$$", StringComparison.Ordinal))
            {
                writer.Write(' ');
            }

            writer.Write(line);
            writer.Write('\n');
        }
    }
}
