namespace RadicalSites.Cli;

/// <summary>Exit codes of the tool.</summary>
internal static class ExitCode
{
    internal const int Done = 0;
    internal const int SomeFailed = 1;
    internal const int WrongUsage = 2;
    internal const int InputOutput = 3;
    internal const int LimitOrCancelled = 4;
    internal const int Internal = 70;
}
