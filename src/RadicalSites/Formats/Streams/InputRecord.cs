using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Sdf;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Streams;

/// <summary>One record of a stream: a molecule, or why it is none.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record InputRecord
{
    /// <summary>1-based number of the record in its stream.</summary>
    public required long Number { get; init; }

    /// <summary>1-based first line.</summary>
    public required long FirstLine { get; init; }

    /// <summary>1-based last line, a terminator included.</summary>
    public required long LastLine { get; init; }

    /// <summary>The SMILES as given; for other formats the name line.</summary>
    public required string Text { get; init; }

    /// <summary>Name of the record, or <see langword="null"/>.</summary>
    public required string? Name { get; init; }

    /// <summary>The molecule; <see langword="null"/> when there is a <see cref="Problem"/>.</summary>
    public required Molecule? Molecule { get; init; }

    /// <summary>Why the record is no molecule; position in the SMILES, or line in the stream.</summary>
    public required FormatProblem? Problem { get; init; }

    /// <summary>Data items of an SDF record in input order; otherwise empty.</summary>
    public IReadOnlyList<SdfField> Fields { get; init; } = [];

    /// <summary>What was read with a tolerance or left out; may be empty.</summary>
    public IReadOnlyList<Diagnostic> Remarks { get; init; } = [];
}
