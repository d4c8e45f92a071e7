using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>A molfile as read: header, molecule and remarks.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record MolfileDocument
{
    /// <summary>First header line without white space around it; may be empty.</summary>
    public required string Name { get; init; }

    /// <summary>Second header line (program, date, dimension) as it stands.</summary>
    public required string ProgramLine { get; init; }

    /// <summary>Third header line as it stands.</summary>
    public required string Comment { get; init; }

    /// <summary>Version of the connection table.</summary>
    public required MolfileVersion Version { get; init; }

    /// <summary>Whether the chiral flag is set; it does not change how wedges are read.</summary>
    public required bool IsChiralFlagSet { get; init; }

    /// <summary>The molecule.</summary>
    public required Molecule Molecule { get; init; }

    /// <summary>What was read with a tolerance or left out; may be empty.</summary>
    public required IReadOnlyList<Diagnostic> Remarks { get; init; }

    /// <summary>1-based number of the last line that belongs to the connection table.</summary>
    public required int EndLine { get; init; }
}
