using System.IO;
using System.Threading;

namespace RadicalSites.Cli;

/// <summary>What the tool sees of its surroundings; tests hand in their own.</summary>
internal sealed class ToolHost(Stream input, Stream output, TextWriter error)
{
    internal Stream Input { get; } = input;

    internal Stream Output { get; } = output;

    internal TextWriter Error { get; } = error;

    internal bool InputIsTerminal { get; init; }

    internal bool ErrorIsTerminal { get; init; }

    internal CancellationToken Cancellation { get; init; }
}
