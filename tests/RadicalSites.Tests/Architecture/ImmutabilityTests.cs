using System;
using System.Collections.Generic;
using System.Linq;
using System.Reflection;
using System.Runtime.CompilerServices;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Architecture;

/// <summary>Public types hold no state that can change after construction.</summary>
public sealed class ImmutabilityTests
{
    // Types whose job is to change: they belong to one thread and say so.
    private static readonly HashSet<string> MutableByDesign = [nameof(MoleculeBuilder)];

    [Fact]
    public void Public_types_have_only_fields_that_are_set_once()
    {
        var mutable = new List<string>();
        foreach (Type type in typeof(Molecule).Assembly.GetExportedTypes().Where(static type => !type.IsEnum && !type.IsInterface))
        {
            if (MutableByDesign.Contains(type.Name))
            {
                continue;
            }

            const BindingFlags fields =
                BindingFlags.Instance | BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly;
            mutable.AddRange(type.GetFields(fields)
                .Where(static field => !field.IsInitOnly && !field.IsLiteral && !IsBackingFieldOfInit(field)
                    && field.GetCustomAttribute<ThreadStaticAttribute>() is null
                    && field.GetCustomAttribute<CompilerGeneratedAttribute>() is null | field.Name.StartsWith('<'))
                .Select(field => $"{type.FullName}.{field.Name}"));
        }

        Assert.True(mutable.Count == 0, string.Join('\n', mutable));
    }

    private static bool IsBackingFieldOfInit(FieldInfo field)
    {
        if (!field.Name.StartsWith('<'))
        {
            return false;
        }

        string name = field.Name[1..field.Name.IndexOf('>', StringComparison.Ordinal)];
        PropertyInfo? property = field.DeclaringType!.GetProperty(
            name, BindingFlags.Instance | BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly);
        MethodInfo? setter = property?.SetMethod;
        return setter is null
            || setter.ReturnParameter.GetRequiredCustomModifiers().Contains(typeof(IsExternalInit));
    }
}
