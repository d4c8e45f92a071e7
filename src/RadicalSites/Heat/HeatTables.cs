using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Diagnostics;

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
        internal static readonly Solvent[] Solvents =
        [
            .. CsvTable.ReadEmbedded(
                "solvents.csv", "id", "name", "smiles", "density", "heat_capacity", "boiling_point", "role", "source",
                "locator", "caution").Rows.Select(static row => new Solvent(
                row.Required("id"), row.Required("name"), row.Required("smiles"), row.Number("density", 0.3, 5),
                row.Number("heat_capacity", 0.3, 5), row.Number("boiling_point", -50, 500), row.Required("role"),
                row.Required("source"), row.Required("locator"), row.Text("caution"))),
        ];

        internal static readonly ReagentProperties[] Reagents =
        [
            .. CsvTable.ReadEmbedded(
                "reagent_properties.csv", "id", "name", "smiles", "state", "density", "gases", "exposure_limit", "source",
                "locator", "caution").Rows.Select(static row => new ReagentProperties(
                row.Required("id"), row.Required("name"), row.Required("smiles"), row.Required("state"),
                row.OptionalNumber("density", 0.3, 10), row.Text("gases") is { Length: > 0 } gases ? gases.Split(';') : [],
                row.Required("exposure_limit"), row.Required("source"), row.Required("locator"), row.Required("caution"))),
        ];
    }
}
