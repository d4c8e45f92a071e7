using System;
using System.IO;
using System.Text;
using System.Threading;

namespace RadicalSites.Cli.Tests;

/// <summary>Runs the tool inside the test process and keeps what it writes.</summary>
internal sealed record ToolRun(int ExitCode, byte[] OutputBytes, string Error)
{
    public string Output => Encoding.UTF8.GetString(OutputBytes);

    public string[] Lines => Output.Split('\n', StringSplitOptions.RemoveEmptyEntries);

    public static ToolRun Of(params string[] arguments) => WithInput("", arguments);

    public static ToolRun WithInput(string input, params string[] arguments)
    {
        using var output = new MemoryStream();
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(input));
        return On(stream, output, CancellationToken.None, arguments) with { OutputBytes = output.ToArray() };
    }

    public static ToolRun On(Stream input, Stream output, CancellationToken cancellation, params string[] arguments)
    {
        using var error = new StringWriter { NewLine = "\n" };
        int code = Tool.Run(arguments, new ToolHost(input, output, error) { Cancellation = cancellation });
        return new ToolRun(code, [], error.ToString());
    }
}
