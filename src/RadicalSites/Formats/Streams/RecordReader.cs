using System;
using System.Collections.Generic;
using System.IO;
using System.IO.Compression;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Sdf;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Streams;

/// <summary>Reads SMILES lines, molfiles and SDF, plain or gzip, as one stream of records in constant memory.</summary>
/// <remarks>
/// A line of SMILES is the SMILES, white space, and an optional name that reaches to the end of the line. Blank lines and
/// lines that start with <c>#</c> are no records. Text is UTF-8 (a byte order mark is honoured, UTF-16 with mark as
/// well); bytes that are no UTF-8 are read as Latin-1. Cutting (<see cref="Split(TextReader, InputFormat, RecordReaderOptions)"/>)
/// and reading (<see cref="Parse"/>) are separate steps, so that many threads can read what one thread cuts. Stateless
/// and safe for use by many threads; an enumeration belongs to one thread.
/// </remarks>
public static class RecordReader
{
    private static readonly Encoding Utf8 =
        Encoding.GetEncoding("utf-8", EncoderFallback.ReplacementFallback, new StrayByteFallback());

    /// <summary>Opens a stream as text: gzip by its first two bytes, then UTF-8 with Latin-1 for stray bytes.</summary>
    /// <param name="stream">The stream; disposing the reader disposes it.</param>
    /// <returns>The text.</returns>
    public static TextReader OpenText(Stream stream)
    {
        ArgumentNullException.ThrowIfNull(stream);
        var buffered = new BufferedStream(stream, 1 << 16);
        var start = new byte[2];
        int read = buffered.ReadAtLeast(start, 2, throwOnEndOfStream: false);
        Stream whole = new PrefixedStream(start.AsMemory(0, read), buffered);
        Stream plain = read == 2 && start[0] == 0x1F && start[1] == 0x8B
            ? new GZipStream(whole, CompressionMode.Decompress)
            : whole;
        return new StreamReader(plain, Utf8, detectEncodingFromByteOrderMarks: true, bufferSize: 1 << 15);
    }

    /// <summary>Reads the records of a stream.</summary>
    /// <param name="stream">Plain or gzip; it is closed at the end of the enumeration.</param>
    /// <param name="format">Format of the records.</param>
    /// <param name="options">Limits; <see langword="null"/> = defaults.</param>
    /// <returns>One entry for each record, in order, read as the enumeration goes on; may be empty.</returns>
    /// <exception cref="InvalidDataException">The gzip data is damaged (thrown while enumerating).</exception>
    public static IEnumerable<InputRecord> Read(Stream stream, InputFormat format, RecordReaderOptions? options = null)
    {
        foreach (RawRecord record in Split(stream, format, options))
        {
            yield return Parse(record);
        }
    }

    /// <summary>Cuts a stream into records without reading them as molecules.</summary>
    /// <param name="stream">Plain or gzip; it is closed at the end of the enumeration.</param>
    /// <param name="format">Format of the records.</param>
    /// <param name="options">Limits; <see langword="null"/> = defaults.</param>
    /// <returns>One entry for each record, in order; may be empty.</returns>
    /// <exception cref="InvalidDataException">The gzip data is damaged (thrown while enumerating).</exception>
    public static IEnumerable<RawRecord> Split(Stream stream, InputFormat format, RecordReaderOptions? options = null)
    {
        using TextReader reader = OpenText(stream);
        foreach (RawRecord record in Split(reader, format, options))
        {
            yield return record;
        }
    }

    /// <summary>Cuts a text into records without reading them as molecules.</summary>
    /// <param name="reader">The text; it stays open.</param>
    /// <param name="format">Format of the records.</param>
    /// <param name="options">Limits; <see langword="null"/> = defaults.</param>
    /// <returns>One entry for each record, in order; may be empty.</returns>
    public static IEnumerable<RawRecord> Split(TextReader reader, InputFormat format, RecordReaderOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(reader);
        RecordReaderOptions limits = options ?? RecordReaderOptions.Default;
        ArgumentOutOfRangeException.ThrowIfLessThan(limits.LongestLine, 16, nameof(options));
        ArgumentOutOfRangeException.ThrowIfLessThan(limits.LongestRecord, 1024, nameof(options));
        return format == InputFormat.Smiles
            ? SmilesLines(reader, limits.LongestLine)
            : Blocks(reader, format, limits.LongestRecord);
    }

    /// <summary>Reads the text of a record as a molecule.</summary>
    /// <param name="record">A record as cut by <see cref="Split(TextReader, InputFormat, RecordReaderOptions)"/>.</param>
    /// <returns>The molecule or the problem.</returns>
    public static InputRecord Parse(RawRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        Molecule? molecule = null;
        FormatProblem? problem = record.Problem;
        if (record.Format != InputFormat.Smiles)
        {
            return ParseBlock(record);
        }

        if (problem is null && !SmilesReader.TryParse(record.Text, out molecule, out problem))
        {
            problem = problem with { Line = 0 };
        }

        return new InputRecord
        {
            Number = record.Number,
            FirstLine = record.FirstLine,
            LastLine = record.LastLine,
            Text = record.Text,
            Name = record.Name,
            Molecule = molecule,
            Problem = problem,
        };
    }

    private static InputRecord ParseBlock(RawRecord record)
    {
        SdfRecord block = SdfRecordText.Read(record.Text, record.Number, record.FirstLine, record.LastLine, false, 0);
        return new InputRecord
        {
            Number = record.Number,
            FirstLine = record.FirstLine,
            LastLine = record.LastLine,
            Text = block.Name,
            Name = block.Name.Length == 0 ? null : block.Name,
            Molecule = record.Problem is null ? block.Molecule : null,
            Problem = record.Problem ?? block.Problem,
            Fields = block.Fields,
            Remarks = block.Remarks,
        };
    }

    private static IEnumerable<RawRecord> SmilesLines(TextReader reader, int longest)
    {
        var lines = new LineSource(reader, longest);
        long number = 0;
        while (NextSmiles(lines, longest, ref number, out RawRecord? record))
        {
            if (record is not null)
            {
                yield return record;
            }
        }
    }

    private static bool NextSmiles(LineSource lines, int longest, ref long number, out RawRecord? record)
    {
        record = null;
        if (!lines.Next(out ReadOnlySpan<char> line))
        {
            return false;
        }

        line = line.Trim();
        if (line.IsEmpty || line[0] == '#')
        {
            return true;
        }

        FormatProblem? problem = null;
        string? name = null;
        if (lines.IsCut)
        {
            ProblemDescriptor entry = ProblemCatalogue.Molfile.TooLong;
            line = line[..Math.Min(80, line.Length)];
            problem = new FormatProblem { Descriptor = entry, Message = entry.Format(longest), Input = line.ToString() };
        }
        else
        {
            int end = line.IndexOfAny(' ', '\t');
            if (end >= 0)
            {
                name = line[end..].Trim().ToString();
                line = line[..end];
            }
        }

        record = new RawRecord
        {
            Number = ++number,
            FirstLine = lines.Line,
            LastLine = lines.Line,
            Format = InputFormat.Smiles,
            Text = line.ToString(),
            Name = name,
            Problem = problem,
        };
        return true;
    }

    private static IEnumerable<RawRecord> Blocks(TextReader reader, InputFormat format, int longest)
    {
        var splitter = new SdfSplitter(reader, longest);
        for (long number = 1; splitter.Next(); number++)
        {
            ProblemDescriptor entry = ProblemCatalogue.Molfile.TooLong;
            string name = SdfRecordText.NameOf(splitter.Text);
            yield return new RawRecord
            {
                Number = number,
                FirstLine = splitter.FirstLine,
                LastLine = splitter.LastLine,
                Format = format,
                Text = splitter.IsTooLong ? name : splitter.Text.ToString(),
                Name = name.Length == 0 ? null : name,
                Problem = splitter.IsTooLong
                    ? new FormatProblem
                    {
                        Descriptor = entry,
                        Message = entry.Format(longest),
                        Line = (int)Math.Min(int.MaxValue, splitter.FirstLine),
                    }
                    : null,
            };
        }
    }
}
