using System;
using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

/// <summary>Why a text is not a molecule: a coded message with its place in the text.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record FormatProblem
{
    /// <summary>Catalogue entry of the problem.</summary>
    public required ProblemDescriptor Descriptor { get; init; }

    /// <summary>Code of the entry.</summary>
    public string Code => Descriptor.Code;

    /// <summary>What is wrong, one sentence, without the text and the caret.</summary>
    public required string Message { get; init; }

    /// <summary>0-based UTF-16 offset in a SMILES, or 0-based column in a line of a molfile; -1 when there is none.</summary>
    public int Position { get; init; } = -1;

    /// <summary>A second place that belongs to the problem (for example the opening of a ring bond); -1 when there is none.</summary>
    public int SecondPosition { get; init; } = -1;

    /// <summary>1-based line of a molfile, SDF or table; 0 when the input is a single line.</summary>
    public int Line { get; init; }

    /// <summary>The text (a SMILES, or the line concerned); shortened by <see cref="Render"/>, never here.</summary>
    public string Input { get; init; } = "";

    /// <summary>0-based atom indices concerned; may be empty.</summary>
    public IReadOnlyList<int> Atoms { get; init; } = Array.Empty<int>();

    /// <summary>Message, caret line under the text, cause and remedy.</summary>
    /// <returns>Several lines separated by line feeds, without a final one.</returns>
    public string Render() => ProblemText.Render(this);
}
