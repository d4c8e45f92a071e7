using System;

namespace RadicalSites.Cli.Pipeline;

/// <summary>What a command writes.</summary>
/// <param name="Header">Text before the first record; may be empty.</param>
/// <param name="CreateWriter">Makes a writer for one thread.</param>
internal sealed record OutputPlan(string Header, Func<RecordWriter> CreateWriter);
