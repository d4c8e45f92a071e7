using System;

namespace RadicalSites.Cli;

/// <summary>Ends the tool with a message and an exit code.</summary>
internal sealed class ToolException(int exitCode, string message, Exception? inner = null)
    : Exception(message, inner)
{
    internal int ExitCode { get; } = exitCode;
}
