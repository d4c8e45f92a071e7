using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Formats.Streams;

namespace RadicalSites.Tests.Formats.Molfile;

/// <summary>
/// Molfiles written by RDKit and Open Babel, read back, against the SMILES of the same toolkit. The file and the versions
/// are made by TestData/Molfile/make_toolkit_files.py.
/// </summary>
public sealed class ToolkitFileTests
{
    [Fact]
    public void Read_files_of_other_toolkits_gives_their_molecules()
    {
        var wrong = new List<string>();
        int count = 0;
        foreach (InputRecord record in Records())
        {
            count++;
            string expected = record.Fields.Single(static field => field.Name == "SMILES").Value;
            string kind = record.Fields.Single(static field => field.Name == "KIND").Value;
            string tool = record.Fields.Single(static field => field.Name == "TOOL").Value;
            string actual = record.Molecule is null ? record.Problem!.Message : CanonicalSmiles.Write(record.Molecule);
            string answer = CanonicalSmiles.Write(SmilesReader.Parse(expected));
            if (actual != answer && !ToolkitDifferences.Explained(record.Name!, kind, tool))
            {
                wrong.Add($"{tool}, {kind}, {record.Name}: {actual} is not {answer}");
            }
        }

        Assert.True(count > 400, $"{count} records");
        Assert.True(wrong.Count == 0, $"{wrong.Count} of {count}:\n{string.Join('\n', wrong)}");
    }

    private static IEnumerable<InputRecord> Records() => RecordReader.Read(
        File.OpenRead(Path.Combine(AppContext.BaseDirectory, "TestData", "Molfile", "toolkit_files.sdf.gz")), InputFormat.Sdf);
}
