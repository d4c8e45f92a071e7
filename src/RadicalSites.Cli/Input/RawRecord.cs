namespace RadicalSites.Cli.Input;

/// <summary>One record as bytes of its batch.</summary>
/// <param name="Number">1-based number in the whole input.</param>
/// <param name="Line">1-based line of its source at which it starts; 0 for an argument.</param>
/// <param name="Start">Offset in the data of the batch.</param>
/// <param name="Length">Length in bytes.</param>
internal readonly record struct RawRecord(long Number, long Line, int Start, int Length);
