using System;
using System.IO;
using System.IO.Compression;
using System.Text;
using RadicalSites.Formats.Streams;

namespace RadicalSites.Cli.Input;

/// <summary>One INPUT of the command line: a SMILES, a file, or standard input.</summary>
internal sealed class InputItem
{
    private readonly string text;
    private readonly Stream? standardInput;

    private InputItem(string text, InputFormat format, bool isFile, Stream? standardInput)
    {
        this.text = text;
        this.standardInput = standardInput;
        Format = format;
        IsFile = isFile;
    }

    internal InputFormat Format { get; }

    internal bool IsFile { get; }

    internal bool IsStandardInput => standardInput is not null;

    internal bool IsArgument => !IsFile && !IsStandardInput;

    /// <summary>Name for messages and for the identity of a job.</summary>
    internal string Name => IsStandardInput ? "standard input" : text;

    /// <summary>Size in bytes as stored, or <see langword="null"/> where it is not known.</summary>
    internal long? StoredLength => IsFile ? new FileInfo(text).Length : null;

    /// <summary>Decides what an INPUT is: a file that exists, a name with a known ending, or else a SMILES.</summary>
    internal static InputItem Of(string text, InputFormat? forced, Stream standardInput)
    {
        if (text == "-")
        {
            return new InputItem("-", forced ?? InputFormat.Smiles, false, standardInput);
        }

        InputFormat? byName = FormatOf(text);
        if (File.Exists(text))
        {
            return new InputItem(text, forced ?? byName ?? throw new ToolException(
                ExitCode.WrongUsage, $"the format of {text} is not known from its name; say it with --input-format."), true, null);
        }

        return byName is null && !Directory.Exists(text)
            ? new InputItem(text, InputFormat.Smiles, false, null)
            : throw new ToolException(ExitCode.InputOutput, 
                Directory.Exists(text) ? $"{text} is a folder, not a file." : $"{text}: there is no such file.");
    }

    /// <summary>Opens the input at its start.</summary>
    /// <param name="stored">The stream as stored, to tell how far reading has come; <see langword="null"/> for arguments.</param>
    internal IRecordFeed Open(out Stream? stored)
    {
        if (IsArgument)
        {
            stored = null;
            return new ArgumentSplitter(text);
        }

        try
        {
            stored = standardInput
                ?? new FileStream(text, FileMode.Open, FileAccess.Read, FileShare.Read, 1, FileOptions.SequentialScan);
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            throw new ToolException(ExitCode.InputOutput, $"{Name}: cannot open: {problem.Message}", problem);
        }

        if (Format != InputFormat.Smiles)
        {
            return new BlockFeed(stored, Name, Format, IsStandardInput);
        }

        return new LineSplitter(Unpack(stored), Name);
    }

    // By the first two bytes, so that a wrong file name does no harm and packed standard input works.
    private static Stream Unpack(Stream stream)
    {
        var start = new byte[2];
        int read = stream.ReadAtLeast(start, 2, throwOnEndOfStream: false);
        var whole = new PrefixedStream(start.AsMemory(0, read), stream);
        return read == 2 && start[0] == 0x1F && start[1] == 0x8B ? new GZipStream(whole, CompressionMode.Decompress) : whole;
    }

    private static InputFormat? FormatOf(string name)
    {
        ReadOnlySpan<char> plain = name.EndsWith(".gz", StringComparison.OrdinalIgnoreCase) ? name.AsSpan(0, name.Length - 3) : name;
        return Path.GetExtension(plain) switch
        {
            var e when e.Equals(".smi", StringComparison.OrdinalIgnoreCase) => InputFormat.Smiles,
            var e when e.Equals(".smiles", StringComparison.OrdinalIgnoreCase) => InputFormat.Smiles,
            var e when e.Equals(".mol", StringComparison.OrdinalIgnoreCase) => InputFormat.Molfile,
            var e when e.Equals(".sdf", StringComparison.OrdinalIgnoreCase) => InputFormat.Sdf,
            _ => null,
        };
    }

    // An argument is one record, the empty one included: that is an error of the record, not of the command line.
    private sealed class ArgumentSplitter(string text)
        : RecordSplitter(new MemoryStream(Encoding.UTF8.GetBytes(text + "\n")), "argument", 0)
    {
        protected override int FindEnd(ReadOnlySpan<byte> data, int from, bool isLast) => isLast ? data.Length : 0;

        protected override bool Keep(ReadOnlySpan<byte> record, out ReadOnlySpan<byte> kept)
        {
            kept = record.Trim(" \t\r\n"u8);
            return true;
        }
    }
}
