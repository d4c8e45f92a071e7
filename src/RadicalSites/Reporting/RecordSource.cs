using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites.Reporting;

/// <summary>Where a record comes from.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Number">1-based number of the record in the whole input.</param>
/// <param name="Text">The SMILES as read; <see langword="null"/> for a record of a molfile or SDF.</param>
/// <param name="Name">Name of the record, or <see langword="null"/>.</param>
public sealed record RecordSource(long Number, string? Text, string? Name)
{
    /// <summary>What was read with a tolerance or left out; reports list it before their own remarks.</summary>
    public IReadOnlyList<Diagnostic> Remarks { get; init; } = [];
}
