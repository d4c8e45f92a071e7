namespace RadicalSites.Cli.Pipeline;

/// <summary>Formats of the output.</summary>
internal enum OutputFormat
{
    Table,
    Json,
    Ndjson,
    Csv,
    Smi,
    Mol,
    Sdf,
}
