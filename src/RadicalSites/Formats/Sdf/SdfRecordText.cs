using System;
using System.Collections.Generic;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Molfile;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Sdf;

/// <summary>Reads the text of one record: connection table, then data items.</summary>
internal static class SdfRecordText
{
    /// <summary>Reads a record; its problem, if any, counts lines in the whole input.</summary>
    internal static SdfRecord Read(ReadOnlySpan<char> text, long number, long firstLine, long lastLine, bool isTooLong, int limit)
    {
        FormatProblem? problem;
        MolfileDocument? document = null;
        if (isTooLong)
        {
            ProblemDescriptor entry = ProblemCatalogue.Molfile.TooLong;
            problem = new FormatProblem { Descriptor = entry, Message = entry.Format(limit), Line = LineOf(firstLine, 1) };
        }
        else if (!MolfileReader.TryRead(text, out document, out problem))
        {
            problem = problem with { Line = LineOf(firstLine, Math.Max(1, problem.Line)) };
        }

        List<SdfField> fields = [];
        List<Diagnostic>? remarks = null;
        if (!isTooLong)
        {
            ReadFields(text, document?.EndLine ?? 0, firstLine, fields, ref remarks);
        }

        Molecule? molecule = document?.Molecule;
        return new SdfRecord
        {
            Number = number,
            FirstLine = firstLine,
            LastLine = lastLine,
            Name = document?.Name ?? NameOf(text),
            Molecule = molecule,
            Problem = problem,
            Fields = fields.Count == 0 ? Array.Empty<SdfField>() : fields.ToArray(),
            Remarks = remarks is null ? document?.Remarks ?? [] : [.. document?.Remarks ?? [], .. remarks],
        };
    }

    /// <summary>The first line, shortened to a name.</summary>
    internal static string NameOf(ReadOnlySpan<char> text)
    {
        int end = text.IndexOfAny('\n', '\r');
        ReadOnlySpan<char> name = (end < 0 ? text : text[..end]).Trim('\uFEFF').Trim();
        return (name.Length > 200 ? name[..200] : name).ToString();
    }

    private static int LineOf(long firstLine, int line) => (int)Math.Min(int.MaxValue, firstLine + line - 1);

    // Without a connection table that was understood, the items start at M  END or at the first line that looks like a header.
    private static void ReadFields(
        ReadOnlySpan<char> text, int endLine, long firstLine, List<SdfField> fields, ref List<Diagnostic>? remarks)
    {
        var cursor = new LineCursor(text);
        bool inTable = endLine == 0;
        string? header = null;
        var value = new StringBuilder();
        int blanks = 0;
        while (cursor.Next())
        {
            ReadOnlySpan<char> line = cursor.Current;
            if (cursor.Line <= endLine)
            {
                continue;
            }

            bool isHeader = line.Length > 0 && line[0] == '>' && (header is null || blanks > 0 || value.Length == 0 || IsHeader(line));
            if (inTable)
            {
                inTable = !(line.StartsWith("M  END", StringComparison.Ordinal) || (cursor.Line > 3 && IsHeader(line)));
                if (inTable || !isHeader)
                {
                    continue;
                }
            }

            if (isHeader)
            {
                Flush(header, value, fields);
                header = line.ToString();
                blanks = 0;
            }
            else if (line.IsWhiteSpace())
            {
                blanks++;
            }
            else if (header is null)
            {
                if (remarks is null)
                {
                    (remarks = []).Add(Diagnostic.Create(
                        ProblemCatalogue.MolfileRemarks.StrayLine, [], firstLine + cursor.Line - 1));
                }
            }
            else
            {
                // A value that goes on after blank lines keeps them.
                value.Append('\n', value.Length > 0 ? 1 + blanks : 0).Append(line);
                blanks = 0;
            }
        }

        Flush(header, value, fields);
    }

    private static bool IsHeader(ReadOnlySpan<char> line)
    {
        if (line.Length < 2 || line[0] != '>')
        {
            return false;
        }

        int open = line.IndexOf('<');
        return open > 0 && line[open..].Contains('>');
    }

    private static void Flush(string? header, StringBuilder value, List<SdfField> fields)
    {
        if (header is null)
        {
            return;
        }

        int open = header.IndexOf('<', 1);
        int close = open < 0 ? -1 : header.LastIndexOf('>');
        string name = close > open ? header[(open + 1)..close] : header[1..].Trim();
        fields.Add(new SdfField(name, value.ToString()) { Header = header });
        value.Clear();
    }
}
