using RadicalSites.Diagnostics;

namespace RadicalSites.Cli.Pipeline;

/// <summary>A record that could not be read.</summary>
/// <param name="Number">1-based number in the whole input.</param>
/// <param name="Line">1-based line of its source at which it starts; 0 for an argument.</param>
/// <param name="Source">Name of the source.</param>
/// <param name="Problem">What is wrong.</param>
internal sealed record RecordFailure(long Number, long Line, string Source, FormatProblem Problem);
