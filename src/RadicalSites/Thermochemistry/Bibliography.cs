using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text.Json;
using RadicalSites.Diagnostics;

namespace RadicalSites.Thermochemistry;

/// <summary>All publications that the shipped tables cite.</summary>
/// <remarks>Read once; immutable and safe for use by many threads.</remarks>
public static class Bibliography
{
    /// <summary>All entries, ordered by key.</summary>
    public static IReadOnlyList<BibliographyEntry> All => Holder.Ordered;

    /// <summary>Finds a publication.</summary>
    /// <param name="key">Key; case is ignored.</param>
    /// <returns>The entry, or <see langword="null"/>.</returns>
    public static BibliographyEntry? Find(string key)
    {
        ArgumentNullException.ThrowIfNull(key);
        return Holder.ByKey.GetValueOrDefault(key);
    }

    private static class Holder
    {
        internal static readonly BibliographyEntry[] Ordered =
        [
            .. Files().SelectMany(Read).OrderBy(static entry => entry.Key, StringComparer.Ordinal),
        ];

        internal static readonly FrozenDictionary<string, BibliographyEntry> ByKey =
            Ordered.ToFrozenDictionary(static entry => entry.Key, StringComparer.OrdinalIgnoreCase);

        private static IEnumerable<string> Files() => typeof(Bibliography).Assembly.GetManifestResourceNames()
            .Where(static name => name.StartsWith("RadicalSites.Data.bibliography", StringComparison.Ordinal))
            .Select(static name => name["RadicalSites.Data.".Length..])
            .Order(StringComparer.Ordinal);

        private static IEnumerable<BibliographyEntry> Read(string file)
        {
            using JsonDocument document = JsonDocument.Parse(CsvTable.EmbeddedText(file));
            foreach (JsonElement entry in document.RootElement.EnumerateArray())
            {
                yield return new BibliographyEntry(
                    Text(entry, "key") ?? throw new InvalidDataException($"{file}: an entry has no key."),
                    Text(entry, "citation") ?? throw new InvalidDataException($"{file}: an entry has no citation."),
                    Text(entry, "doi"));
            }
        }

        private static string? Text(JsonElement entry, string name) =>
            entry.TryGetProperty(name, out JsonElement value) && value.ValueKind == JsonValueKind.String ? value.GetString() : null;
    }
}
