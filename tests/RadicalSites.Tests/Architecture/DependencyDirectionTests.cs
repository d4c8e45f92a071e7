using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Architecture;

/// <summary>The rooms may use only the rooms to their left; read from the compiled assembly.</summary>
public sealed class DependencyDirectionTests
{
    // Rooms of one inner array do not use each other; a room may use every room of an earlier array.
    private static readonly string[][] Rooms =
    [
        ["Diagnostics", "Quantities"],
        ["Molecules"],
        ["Perception"],
        ["Formats", "Symmetry"],
        ["Canonical"],
        ["Sites"],
        ["Thermochemistry"],
        ["Selectivity"],
        ["Products"],
        ["Course", "Heat", "Interference"],
        [""],
        ["Reporting"],
    ];

    [Fact]
    public void Rooms_all_references_point_to_the_left()
    {
        var violations = new SortedSet<string>(StringComparer.Ordinal);
        foreach (Type type in typeof(Molecule).Assembly.GetTypes().Where(static type => IsOurs(type)))
        {
            string from = RoomOf(type);
            foreach (Type used in TypeReferences.Of(type).Where(static type => IsOurs(type)))
            {
                string to = RoomOf(used);
                if (from != to && LevelOf(to) >= LevelOf(from))
                {
                    violations.Add($"{Name(from)} uses {Name(to)}: {type.FullName} -> {used.FullName}");
                }
            }
        }

        Assert.True(violations.Count == 0, string.Join('\n', violations));
    }

    [Fact]
    public void Rooms_every_namespace_has_a_place_in_the_order()
    {
        string[] unknown = typeof(Molecule).Assembly.GetTypes()
            .Where(static type => IsOurs(type) && LevelOf(RoomOf(type)) < 0)
            .Select(static type => type.Namespace!)
            .Distinct()
            .ToArray();

        Assert.Empty(unknown);
    }

    [Fact]
    public void References_of_the_assembly_are_the_framework_and_MathNet_only()
    {
        string[] foreign = typeof(Molecule).Assembly.GetReferencedAssemblies()
            .Select(static name => name.Name!)
            .Where(static name => !name.StartsWith("System", StringComparison.Ordinal) && name is not ("MathNet.Numerics" or "netstandard"))
            .ToArray();

        Assert.Empty(foreign);
    }

    private static bool IsOurs(Type type) =>
        type.Namespace is { } name && (name == "RadicalSites" || name.StartsWith("RadicalSites.", StringComparison.Ordinal));

    private static string RoomOf(Type type)
    {
        string[] parts = type.Namespace!.Split('.');
        return parts.Length > 1 ? parts[1] : "";
    }

    private static int LevelOf(string room) => Array.FindIndex(Rooms, level => level.Contains(room));

    private static string Name(string room) => room.Length == 0 ? "the front door" : room;
}
