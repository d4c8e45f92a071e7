using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.IO.Compression;
using System.Linq;
using System.Text;
using RadicalSites.Canonical;
using RadicalSites.Formats.Sdf;
using RadicalSites.Formats.Smiles;
using RadicalSites.Formats.Streams;
using RadicalSites.Tests.Formats.Molfile;

namespace RadicalSites.Tests.Formats.Sdf;

/// <summary>Records, data items and tolerance of the splitter.</summary>
public sealed class SdfReaderTests
{
    private static readonly string Methane = Drawings.Atoms(["C   0  0"]);

    [Fact]
    public void Read_gives_one_result_for_each_record_with_lines()
    {
        string text = Methane + "$$$$\nbad\n\n\nnonsense\n$$$$\n" + Methane + "$$$$\n";
        SdfRecord[] records = Read(text);
        Assert.Equal([1L, 2L, 3L], records.Select(static record => record.Number));
        Assert.Equal([(1L, 7L), (8L, 12L), (13L, 19L)], records.Select(static record => (record.FirstLine, record.LastLine)));
        Assert.NotNull(records[0].Molecule);
        Assert.Equal("molfile-counts-line", records[1].Problem!.Code);
        Assert.Equal(11, records[1].Problem!.Line);
        Assert.Equal("bad", records[1].Name);
        Assert.NotNull(records[2].Molecule);
    }

    [Fact]
    public void Read_keeps_data_items_in_order_with_their_headers()
    {
        string text = Methane + "> <B>\none\ntwo\n\n>  25 <A.a> (X-1) DT12\n3,5\n\n> DT7\n\n$$$$\n";
        SdfField[] fields = [.. Read(text).Single().Fields];
        Assert.Equal(["B", "A.a", "DT7"], fields.Select(static field => field.Name));
        Assert.Equal(["one\ntwo", "3,5", ""], fields.Select(static field => field.Value));
        Assert.Equal(">  25 <A.a> (X-1) DT12", fields[1].Header);
    }

    [Fact]
    public void Read_of_a_failed_record_still_gives_its_data_items()
    {
        SdfRecord record = Read(Drawings.Atoms(["Q   0  0"]) + "> <ID>\n17\n\n$$$$\n").Single();
        Assert.Equal("molfile-query-atom", record.Problem!.Code);
        Assert.Equal("17", record.Fields.Single().Value);
    }

    [Fact]
    public void Read_takes_a_terminator_inside_a_value_for_data_when_another_item_follows()
    {
        string text = Methane + "> <A>\nx\n$$$$\ny\n\n> <B>\n1\n\n$$$$\n" + Methane + "> <A>\nlast\n$$$$\n" + Methane + "$$$$\n";
        SdfRecord[] records = Read(text);
        Assert.Equal(3, records.Length);
        Assert.Equal("x\n$$$$\ny", records[0].Fields[0].Value);
        Assert.Equal("last", records[1].Fields.Single().Value);
        Assert.All(records, static record => Assert.NotNull(record.Molecule));
    }

    [Theory]
    [InlineData("")]
    [InlineData("$$$$")]
    [InlineData("$$$$\n\n\n")]
    [InlineData("$$$$  \r\n")]
    public void Read_accepts_any_end_of_the_file(string end) => Assert.Single(Read(Methane + end));

    [Fact]
    public void Read_keeps_blank_lines_inside_a_value_and_remarks_on_stray_lines()
    {
        SdfRecord record = Read(Methane + "stray\n> <A>\none\n\ntwo\n\n> <B>\n2\n\n$$$$\n").Single();
        Assert.Equal(["one\n\ntwo", "2"], record.Fields.Select(static field => field.Value));
        Assert.Contains(record.Remarks, static remark => remark.Code == "sdf-stray-line");
    }

    [Fact]
    public void Read_of_a_record_beyond_the_limit_is_one_failure()
    {
        string text = Methane + "> <A>\n" + new string('x', 100_000) + "\n\n$$$$\n" + Methane + "$$$$\n";
        SdfRecord[] records = [.. SdfReader.Read(new StringReader(text), new SdfReaderOptions { LongestRecord = 4096 })];
        Assert.Equal(2, records.Length);
        Assert.Equal("record-too-long", records[0].Problem!.Code);
        Assert.NotNull(records[1].Molecule);
    }

    [Fact]
    public void Read_is_the_same_in_a_culture_with_decimal_comma()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            using var writer = new StringWriter(CultureInfo.CurrentCulture);
            SdfWriter.Write(writer, SmilesReader.Parse("C[C@H](O)F"), [new SdfField("RS_X", "1.5")]);
            Assert.DoesNotContain(',', writer.ToString());
            Assert.Equal(
                CanonicalSmiles.Write(SmilesReader.Parse("C[C@H](O)F")), CanonicalSmiles.Write(Read(writer.ToString()).Single().Molecule!));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Write_sets_off_values_that_look_like_structure()
    {
        using var writer = new StringWriter(CultureInfo.InvariantCulture);
        SdfField[] fields = [new SdfField("A", "$$$$\n> <B>\nend"), new SdfField("C", "3") { Header = ">  <C> (7)" }];
        SdfWriter.Write(writer, SmilesReader.Parse("C"), fields);
        SdfRecord record = Read(writer.ToString()).Single();
        Assert.Equal([" $$$$\n > <B>\nend", "3"], record.Fields.Select(static field => field.Value));
        Assert.Equal(">  <C> (7)", record.Fields[1].Header);
    }

    [Fact]
    public void Records_of_a_compressed_stream_with_Latin_1_names_are_read()
    {
        byte[] text = Encoding.Latin1.GetBytes(Methane.Replace("test", "m\u00e9thane", StringComparison.Ordinal) + "$$$$\n" + Methane);
        using var packed = new MemoryStream();
        using (var zip = new GZipStream(packed, CompressionLevel.Fastest, leaveOpen: true))
        {
            zip.Write(text);
        }

        InputRecord[] records = [.. RecordReader.Read(new MemoryStream(packed.ToArray()), InputFormat.Sdf)];
        Assert.Equal(["m\u00e9thane", "test"], records.Select(static record => record.Name));
    }

    [Fact]
    public void Records_of_SMILES_lines_have_names_lines_and_limits()
    {
        string text = "\uFEFFCC ethane  gas\n\n# remark\r\nC(\n" + new string('C', 5000) + "\nO\tw\u00e4ter\n";
        InputRecord[] records =
        [
            .. RecordReader.Read(
                new MemoryStream(Encoding.UTF8.GetBytes(text)), InputFormat.Smiles, new RecordReaderOptions { LongestLine = 1000 }),
        ];
        Assert.Equal([1L, 4L, 5L, 6L], records.Select(static record => record.FirstLine));
        Assert.Equal("ethane  gas", records[0].Name);
        Assert.Equal("smiles-branch-unclosed", records[1].Problem!.Code);
        Assert.Equal("record-too-long", records[2].Problem!.Code);
        Assert.Equal("w\u00e4ter", records[3].Name);
    }

    private static SdfRecord[] Read(string text) => [.. SdfReader.Read(new StringReader(text))];
}
