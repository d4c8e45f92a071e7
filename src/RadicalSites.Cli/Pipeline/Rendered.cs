using RadicalSites.Diagnostics;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Output of one record.</summary>
/// <param name="Bytes">UTF-8 text, complete lines; may be empty.</param>
/// <param name="Record">The input record.</param>
/// <param name="Problem">Why it failed, or null.</param>
internal readonly record struct Rendered(byte[] Bytes, InputRecord Record, FormatProblem? Problem);
