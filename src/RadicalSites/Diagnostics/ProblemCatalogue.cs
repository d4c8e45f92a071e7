using System;
using System.Collections.Frozen;
using System.Collections.Generic;
using System.Linq;

namespace RadicalSites.Diagnostics;

/// <summary>Every code that the library gives out, with its text, cause and remedy.</summary>
/// <remarks>
/// The entries stand in the partial files beside this one, a file for each room, as static fields of
/// <see cref="ProblemDescriptor"/>. Immutable and safe for use by many threads.
/// </remarks>
public static partial class ProblemCatalogue
{
    /// <summary>All entries, ordered by code.</summary>
    public static IReadOnlyList<ProblemDescriptor> All => Holder.Ordered;

    /// <summary>Finds the entry of a code.</summary>
    /// <param name="code">A code such as <c>bde-none</c>; case is ignored.</param>
    /// <returns>The entry, or <see langword="null"/> when no such code exists.</returns>
    public static ProblemDescriptor? Find(string code)
    {
        ArgumentNullException.ThrowIfNull(code);
        return Holder.ByCode.GetValueOrDefault(code);
    }

    private static class Holder
    {
        internal static readonly ProblemDescriptor[] Ordered =
        [
            .. new[]
            {
                General.Entries,
                Smiles.Entries,
                Molfile.Entries,
                MolfileRemarks.Entries,
                Chemistry.Entries,
                Thermochemistry.Entries,
                Selectivity.Entries,
                Interference.Entries,
                Heat.Entries,
                Products.Entries,
                Course.Entries,
            }.SelectMany(static list => list).OrderBy(static entry => entry.Code, StringComparer.Ordinal),
        ];

        internal static readonly FrozenDictionary<string, ProblemDescriptor> ByCode =
            Ordered.ToFrozenDictionary(static entry => entry.Code, StringComparer.OrdinalIgnoreCase);
    }
}
