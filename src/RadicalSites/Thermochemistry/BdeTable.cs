using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;
using System.Security.Cryptography;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

/// <summary>Bond dissociation enthalpies at 298.15 K: C-H bonds of molecules, class values, and other bonds.</summary>
/// <remarks>
/// <see cref="Default"/> holds the shipped tables. A table of the user is read by <see cref="Parse"/> with the same
/// strictness and laid over the shipped one by <see cref="Overlay"/>. Immutable and safe for use by many threads.
/// </remarks>
public sealed partial class BdeTable
{
    private readonly FrozenDictionary<string, BdeClassEntry> classes;
    private readonly FrozenDictionary<string, BondEntry> bonds;
    private readonly BdeMatcher matcher;

    private BdeTable(
        string name, string version, IReadOnlyList<BdeEntry> entries, IReadOnlyList<BdeClassEntry> classEntries,
        IReadOnlyList<BondEntry> bondEntries)
    {
        Name = name;
        Version = version;
        Entries = entries;
        ClassEntries = classEntries;
        BondEntries = bondEntries;
        classes = classEntries.ToFrozenDictionary(static entry => KeyOf(entry.Kind, entry.Group, entry.Degree));

        // Several sources may give one bond; the first row of the table is the preferred one.
        bonds = bondEntries.GroupBy(static entry => entry.Bond)
            .ToFrozenDictionary(static group => group.Key, static group => group.First());
        matcher = new BdeMatcher(entries);
    }

    /// <summary>The shipped tables.</summary>
    public static BdeTable Default => Holder.Shipped;

    /// <summary>Name of the table, or the names joined by <c>+</c> when a user's table lies over the shipped one.</summary>
    public string Name { get; }

    /// <summary>Version: the table's number and the first digits of its SHA-256 checksum.</summary>
    public string Version { get; }

    /// <summary>C-H rows in table order.</summary>
    public IReadOnlyList<BdeEntry> Entries { get; }

    /// <summary>Class rows in table order.</summary>
    public IReadOnlyList<BdeClassEntry> ClassEntries { get; }

    /// <summary>Rows of other bonds in table order.</summary>
    public IReadOnlyList<BondEntry> BondEntries { get; }

    /// <summary>Finds another bond than C-H.</summary>
    /// <param name="bond">The two parts, for example <c>H-Br</c>.</param>
    /// <returns>The preferred row, or <see langword="null"/>.</returns>
    public BondEntry? FindBond(string bond)
    {
        ArgumentNullException.ThrowIfNull(bond);
        return bonds.GetValueOrDefault(bond);
    }

    /// <summary>All rows for one bond of a molecule.</summary>
    /// <param name="analysis">The molecule with its sites.</param>
    /// <param name="site">A site of it.</param>
    /// <returns>The rows, the preferred one first; may be empty.</returns>
    public IReadOnlyList<BdeEntry> FindEntries(SiteAnalysis analysis, Site site)
    {
        ArgumentNullException.ThrowIfNull(analysis);
        ArgumentNullException.ThrowIfNull(site);
        return matcher.Find(analysis, site);
    }

    internal BdeMatcher Matcher => matcher;

    internal BdeClassEntry? FindClass(string kind, string group, SiteDegree degree) =>
        classes.GetValueOrDefault(KeyOf(kind, group, degree));

    /// <summary>Lays this table over another: where both have a row, this one answers.</summary>
    /// <param name="below">The table that answers where this one is silent.</param>
    /// <returns>The combined table.</returns>
    public BdeTable Overlay(BdeTable below)
    {
        ArgumentNullException.ThrowIfNull(below);
        HashSet<string> own = [.. ClassEntries.Select(static entry => KeyOf(entry.Kind, entry.Group, entry.Degree))];
        return new BdeTable(
            Name + "+" + below.Name, Version + "+" + below.Version, [.. Entries, .. below.Entries],
            [.. ClassEntries, .. below.ClassEntries.Where(entry => !own.Contains(KeyOf(entry.Kind, entry.Group, entry.Degree)))],
            [.. BondEntries, .. below.BondEntries]);
    }

    private static string KeyOf(string kind, string group, SiteDegree degree) => kind + "|" + group + "|" + (int)degree;

    private static string ChecksumOf(params string[] texts)
    {
        byte[] hash = SHA256.HashData(Encoding.UTF8.GetBytes(string.Concat(texts).ReplaceLineEndings("\n")));
        return Convert.ToHexStringLower(hash)[..12];
    }

    private static class Holder
    {
        internal static readonly BdeTable Shipped = ReadShipped();
    }
}
