using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Pipeline;

/// <summary>One record of the input: a molecule, or why it is none.</summary>
internal sealed record InputRecord(RecordSource Source, int Line, Molecule? Molecule, FormatProblem? Problem);
