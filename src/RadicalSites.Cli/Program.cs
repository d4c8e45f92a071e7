using System;
using System.IO;
using System.Runtime.InteropServices;
using System.Threading;
using Microsoft.Win32.SafeHandles;

namespace RadicalSites.Cli;

/// <summary>Entry of the tool: connects the process to <see cref="Tool"/>.</summary>
internal static class Program
{
    private static int Main(string[] arguments)
    {
        using var cancellation = new CancellationTokenSource();
        using PosixSignalRegistration interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, Cancel);
        using PosixSignalRegistration terminate = PosixSignalRegistration.Create(PosixSignal.SIGTERM, Cancel);
        using Stream output = OpenOutput();
        using Stream input = Console.OpenStandardInput();
        var host = new ToolHost(input, output, Console.Error)
        {
            InputIsTerminal = !Console.IsInputRedirected,
            ErrorIsTerminal = !Console.IsErrorRedirected && Environment.GetEnvironmentVariable("TERM") != "dumb",
            Cancellation = cancellation.Token,
        };
        return Tool.Run(arguments, host);

        void Cancel(PosixSignalContext context)
        {
            context.Cancel = true;
            cancellation.Cancel();
        }
    }

    // The console stream swallows a closed pipe; a file stream over the descriptor reports it.
    private static Stream OpenOutput()
    {
        if (OperatingSystem.IsWindows() || !Console.IsOutputRedirected)
        {
            return Console.OpenStandardOutput();
        }

        try
        {
            var stream = new FileStream(new SafeFileHandle(1, ownsHandle: false), FileAccess.Write, bufferSize: 0);

            // A regular file keeps a position of its own in the file stream and would be overwritten from its start.
            return stream.CanSeek ? Console.OpenStandardOutput() : stream;
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException)
        {
            return Console.OpenStandardOutput();
        }
    }
}
