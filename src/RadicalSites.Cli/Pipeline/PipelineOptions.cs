using System.Collections.Generic;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Options that all commands over records share.</summary>
internal sealed record PipelineOptions
{
    internal required IReadOnlyList<string> Inputs { get; init; }

    internal required OutputFormat Format { get; init; }

    internal string? OutputFile { get; init; }

    internal bool StopOnError { get; init; }

    internal int Threads { get; init; } = 1;

    internal long Limit { get; init; } = long.MaxValue;

    internal (int Part, int Parts)? Shard { get; init; }

    internal bool Resume { get; init; }

    internal bool Quiet { get; init; }
}
