using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;

namespace RadicalSites.Tests.Conformance;

/// <summary>Reads the tables of TestData/Reference; their README.md describes them.</summary>
internal static class ReferenceTable
{
    public static IReadOnlyList<string[]> Read(string file) =>
        File.ReadLines(PathOf(file)).Where(static line => line.Length > 0 && line[0] != '#').Skip(1)
            .Select(static line => line.Split('\t')).ToArray();

    /// <summary>SMILES of the NCI file by its number.</summary>
    public static IReadOnlyList<(string Smiles, string Number)> NciFile() =>
        File.ReadLines(PathOf("nci_first_5k.smi")).Select(static line => line.Split('\t', ' '))
            .Select(static fields => (fields[0], fields[1])).ToArray();

    /// <summary>Disagreements that were looked into: case by aspect, with who is right and why.</summary>
    public static HashSet<(string Case, string Aspect)> Disagreements(string file) =>
        Read(file).Select(static row => (row[0], row[1])).ToHashSet();

    private static string PathOf(string file) => Path.Combine(AppContext.BaseDirectory, "TestData", "Reference", file);
}
