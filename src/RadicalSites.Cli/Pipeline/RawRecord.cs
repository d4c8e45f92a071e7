namespace RadicalSites.Cli.Pipeline;

/// <summary>Text of one record before it is read as a molecule.</summary>
internal readonly record struct RawRecord(long Number, int Line, string Text, string? Name);
