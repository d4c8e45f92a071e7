using System;
using RadicalSites.Diagnostics;

namespace RadicalSites.Reporting;

/// <summary>The JSON schema that every record follows.</summary>
/// <remarks>Stateless and safe for use by many threads.</remarks>
public static class ReportSchema
{
    /// <summary>Name and number of the schema; the number is raised when a meaning changes.</summary>
    public const string Id = "radicalsites/1";

    internal static ReadOnlySpan<byte> IdUtf8 => "radicalsites/1"u8;

    /// <summary>The schema itself, JSON Schema draft 2020-12.</summary>
    /// <returns>The text of the schema file shipped in the package.</returns>
    public static string Text => CsvTable.EmbeddedText("radicalsites-1.schema.json");
}
