using System;
using System.Collections.Generic;
using System.IO;

namespace RadicalSites.Formats.Sdf;

/// <summary>Reads structure-data files record by record.</summary>
/// <remarks>
/// <para>One result for each record: a molecule or a problem, with record number, line range and data items. Memory is
/// bounded by the largest record allowed; the input may be of any length. The record splitter is tolerant (any line
/// ends, missing last terminator, blank lines, a terminator-like line inside a data value); what a record holds is read
/// strictly by <see cref="Molfile.MolfileReader"/>.</para>
/// <para>A data value may have several lines. Blank lines inside a value are kept when text follows them before the next
/// header. Stateless and safe for use by many threads; an enumeration belongs to one thread. Source: [CTFILE].</para>
/// </remarks>
public static class SdfReader
{
    /// <summary>Reads the records of a text.</summary>
    /// <param name="reader">The text; it stays open. Decoding is the caller's; see <see cref="Streams.RecordReader.OpenText"/>.</param>
    /// <param name="options">Limits; <see langword="null"/> = defaults.</param>
    /// <returns>One entry for each record, in order, read as the enumeration goes on; may be empty.</returns>
    public static IEnumerable<SdfRecord> Read(TextReader reader, SdfReaderOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(reader);
        int limit = (options ?? SdfReaderOptions.Default).LongestRecord;
        ArgumentOutOfRangeException.ThrowIfLessThan(limit, 1024, nameof(options));
        return Enumerate(reader, limit);
    }

    private static IEnumerable<SdfRecord> Enumerate(TextReader reader, int limit)
    {
        var splitter = new SdfSplitter(reader, limit);
        for (long number = 1; splitter.Next(); number++)
        {
            yield return SdfRecordText.Read(
                splitter.Text, number, splitter.FirstLine, splitter.LastLine, splitter.IsTooLong, limit);
        }
    }
}
