using System;
using System.Diagnostics;
using System.Globalization;
using System.IO;

namespace RadicalSites.Cli.Tests;

/// <summary>The tool as a process of its own: signals, pipes, devices. Skipped parts say why.</summary>
public sealed class ProcessTests : IDisposable
{
    private static readonly string ToolPath = Path.Combine(AppContext.BaseDirectory, "RadicalSites.Cli.dll");

    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Kill_at_random_points_and_resume_give_the_same_bytes()
    {
        int trials = Environment.GetEnvironmentVariable("RADICALSITES_LONG_TESTS") == "1" ? 50 : 3;
        string input = folder.Write("a.smi", Molecules.List(20_000));
        string expected = folder["expected"];
        Assert.Equal(1, Wait(Start("predict", input, "--format", "ndjson", "--output", expected)));
        var random = new Random(7);
        for (int trial = 0; trial < trials; trial++)
        {
            string output = folder[string.Create(CultureInfo.InvariantCulture, $"out-{trial}")];
            int kills = 0;
            while (kills < 3)
            {
                using Process run = Start("predict", input, "--format", "ndjson", "--output", output, "--resume", "--threads", "2");
                if (run.WaitForExit(200 + random.Next(700)))
                {
                    break;
                }

                run.Kill();
                run.WaitForExit();
                kills++;
            }

            if (!File.Exists(output))
            {
                Assert.Equal(1, Wait(Start("predict", input, "--format", "ndjson", "--output", output, "--resume")));
            }

            Assert.Equal(File.ReadAllBytes(expected), File.ReadAllBytes(output));
            File.Delete(output);
        }
    }

    [Fact]
    public void Full_device_and_closed_pipe_are_exit_code_3()
    {
        if (!File.Exists("/dev/full"))
        {
            return; // Only Linux has the device; elsewhere OutputFileTests covers a stream that fails.
        }

        string input = folder.Write("a.smi", Molecules.List(5000));
        (int full, string fullError) = Shell($"dotnet {ToolPath} isomers {input} > /dev/full");
        Assert.Equal(3, full);
        Assert.Contains("No space left", fullError, StringComparison.Ordinal);
        (int named, _) = Shell($"dotnet {ToolPath} isomers CCC --output /dev/full");
        Assert.Equal(3, named);
        (int pipe, string pipeError) = Shell($"dotnet {ToolPath} isomers {input} | head -n 1 > /dev/null; exit ${{PIPESTATUS[0]}}");
        Assert.Equal(3, pipe);
        Assert.Contains("closed the pipe", pipeError, StringComparison.Ordinal);
    }

    [Fact]
    public void Interrupt_finishes_the_record_and_is_exit_code_4()
    {
        if (OperatingSystem.IsWindows())
        {
            return; // There is no kill -INT; PipelineTests cancels in the process.
        }

        // Standard input stays open, so only the signal can end the run.
        var start = new ProcessStartInfo("dotnet")
        {
            RedirectStandardInput = true, RedirectStandardOutput = true, RedirectStandardError = true,
            ArgumentList = { ToolPath, "isomers", "-" },
        };
        using Process run = Process.Start(start)!;
        run.StandardInput.Write("CCC\n");
        run.StandardInput.Flush();
        string first = run.StandardOutput.ReadLine() + "|" + run.StandardOutput.ReadLine();
        Shell(string.Create(CultureInfo.InvariantCulture, $"kill -INT {run.Id}"));

        Assert.Equal(4, Wait(run));
        Assert.Equal("CCCBr\t6|CC(C)Br\t2", first);
    }

    [Fact]
    public void Two_runs_that_share_a_redirected_file_do_not_overwrite_each_other()
    {
        if (OperatingSystem.IsWindows())
        {
            return; // The shell of the test is bash.
        }

        (int code, _) = Shell($"(dotnet {ToolPath} convert C; dotnet {ToolPath} convert CC) > {folder["out"]}");

        Assert.Equal(0, code);
        Assert.Equal("C\nCC\n", File.ReadAllText(folder["out"]));
    }

    private static Process Start(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet") { RedirectStandardError = true, RedirectStandardOutput = true };
        start.ArgumentList.Add(ToolPath);
        foreach (string argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        Process process = Process.Start(start)!;
        process.ErrorDataReceived += static (_, _) => { };
        process.BeginErrorReadLine();
        return process;
    }

    private static int Wait(Process process)
    {
        using (process)
        {
            Assert.True(process.WaitForExit(TimeSpan.FromMinutes(2)), "The tool ends.");
            return process.ExitCode;
        }
    }

    private static (int Code, string Error) Shell(string command)
    {
        var start = new ProcessStartInfo("bash") { RedirectStandardError = true };
        start.ArgumentList.Add("-c");
        start.ArgumentList.Add(command);
        using Process process = Process.Start(start)!;
        string error = process.StandardError.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, error);
    }
}
