using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Sdf;

/// <summary>One record of an SDF: a molecule, or why it is none, with its data items.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record SdfRecord
{
    /// <summary>1-based number of the record in the input.</summary>
    public required long Number { get; init; }

    /// <summary>1-based first line of the record in the input.</summary>
    public required long FirstLine { get; init; }

    /// <summary>1-based last line of the record, its terminator included.</summary>
    public required long LastLine { get; init; }

    /// <summary>Name from the first header line; may be empty.</summary>
    public required string Name { get; init; }

    /// <summary>The molecule; <see langword="null"/> when there is a <see cref="Problem"/>.</summary>
    public required Molecule? Molecule { get; init; }

    /// <summary>Why the record is no molecule, lines counted in the whole input; otherwise <see langword="null"/>.</summary>
    public required FormatProblem? Problem { get; init; }

    /// <summary>Data items in the order of the input; also given for a record that is no molecule.</summary>
    public required IReadOnlyList<SdfField> Fields { get; init; }

    /// <summary>What was read with a tolerance or left out; may be empty.</summary>
    public required IReadOnlyList<Diagnostic> Remarks { get; init; }
}
