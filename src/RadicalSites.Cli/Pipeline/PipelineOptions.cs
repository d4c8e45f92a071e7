using System;
using System.Collections.Generic;
using RadicalSites.Cli.Input;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Options that all commands over records share.</summary>
internal sealed record PipelineOptions
{
    internal required IReadOnlyList<InputItem> Inputs { get; init; }

    internal required OutputFormat Format { get; init; }

    internal string? OutputFile { get; init; }

    internal bool StopOnError { get; init; }

    internal int Threads { get; init; } = 1;

    /// <summary>Most records to read from all inputs together.</summary>
    internal long Limit { get; init; } = long.MaxValue;

    internal (int Part, int Parts)? Shard { get; init; }

    internal bool Resume { get; init; }

    internal bool Quiet { get; init; }

    /// <summary>The options that decide the bytes of the output, as given.</summary>
    internal string Job { get; init; } = "";

    /// <summary>How long a reader that waits for standard input is waited for at the end.</summary>
    internal TimeSpan ReaderGrace { get; init; } = TimeSpan.FromMilliseconds(200);

    /// <summary>Whether the only input is a SMILES typed by a person.</summary>
    internal bool IsSingle => Inputs.Count == 1 && Inputs[0].IsArgument;

    /// <summary>Whether JSON is written for a person: one molecule was typed.</summary>
    internal bool IsIndented => Format == OutputFormat.Json && IsSingle;
}
