using System;
using System.Collections.Generic;
using System.IO;
using System.IO.Compression;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Turns the INPUT arguments into a stream of records in constant memory.</summary>
internal static class RecordInput
{
    /// <summary>Longest line that is read; a longer one is a failed record.</summary>
    internal const int LongestLine = 1 << 20;

    /// <summary>Reads all inputs one after the other; record numbers run on.</summary>
    internal static IEnumerable<RawRecord> Read(IReadOnlyList<string> inputs, ToolHost host)
    {
        long number = 0;
        foreach (string input in inputs)
        {
            if (input == "-")
            {
                foreach (RawRecord record in ReadLines(host.Input, number))
                {
                    number = record.Number;
                    yield return record;
                }
            }
            else if (IsFile(input))
            {
                using Stream stream = Open(input);
                foreach (RawRecord record in ReadLines(stream, number))
                {
                    number = record.Number;
                    yield return record;
                }
            }
            else
            {
                yield return new RawRecord(++number, 0, input, null);
            }
        }
    }

    /// <summary>Whether every input is a SMILES given as an argument.</summary>
    internal static bool IsSingleArgument(IReadOnlyList<string> inputs) => inputs.Count == 1 && inputs[0] != "-" && !IsFile(inputs[0]);

    /// <summary>Reads the text of a record as a molecule.</summary>
    internal static InputRecord Parse(RawRecord raw)
    {
        var source = new RecordSource(raw.Number, raw.Text.Length > LongestLine ? raw.Text[..80] + "..." : raw.Text, raw.Name);
        if (raw.Text.Length > LongestLine)
        {
            return new InputRecord(source, raw.Line, null, new FormatProblem
            {
                Descriptor = ProblemCatalogue.Smiles.TooLong,
                Message = ProblemCatalogue.Smiles.TooLong.Format(raw.Text.Length, LongestLine),
                Position = LongestLine,
                Input = raw.Text[..80],
            });
        }

        return SmilesReader.TryParse(raw.Text, out Molecule? molecule, out FormatProblem? problem)
            ? new InputRecord(source, raw.Line, molecule, null)
            : new InputRecord(source, raw.Line, null, problem);
    }

    private static bool IsFile(string input) =>
        input.EndsWith(".smi", StringComparison.OrdinalIgnoreCase) || input.EndsWith(".smiles", StringComparison.OrdinalIgnoreCase)
        || input.EndsWith(".smi.gz", StringComparison.OrdinalIgnoreCase) || input.EndsWith(".smiles.gz", StringComparison.OrdinalIgnoreCase)
        || File.Exists(input);

    private static Stream Open(string path)
    {
        FileStream file;
        try
        {
            file = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, 1 << 16);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            throw new ToolException(ExitCode.InputOutput, $"cannot read {path}: {error.Message}");
        }

        // By the magic number, so that a wrong file name does no harm.
        Span<byte> magic = stackalloc byte[2];
        int read = file.ReadAtLeast(magic, 2, throwOnEndOfStream: false);
        file.Position = 0;
        return read == 2 && magic[0] == 0x1F && magic[1] == 0x8B ? new GZipStream(file, CompressionMode.Decompress) : file;
    }

    // A line is SMILES, white space, optional name; blank lines and lines that start with # are no records.
    private static IEnumerable<RawRecord> ReadLines(Stream stream, long before)
    {
        using var reader = new StreamReader(stream, new UTF8Encoding(false), true, 1 << 16, leaveOpen: true);
        int line = 0;
        while (reader.ReadLine() is { } text)
        {
            line++;
            ReadOnlySpan<char> trimmed = text.AsSpan().Trim();
            if (trimmed.IsEmpty || trimmed[0] == '#')
            {
                continue;
            }

            int end = trimmed.IndexOfAny(' ', '\t');
            string smiles = end < 0 ? trimmed.ToString() : trimmed[..end].ToString();
            string? name = end < 0 ? null : trimmed[end..].Trim().ToString();
            yield return new RawRecord(++before, line, smiles, name);
        }
    }
}
