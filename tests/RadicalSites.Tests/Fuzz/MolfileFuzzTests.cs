using System;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Molfile;
using RadicalSites.Formats.Sdf;
using RadicalSites.Formats.Streams;
using RadicalSites.Tests.Formats.Molfile;

namespace RadicalSites.Tests.Fuzz;

/// <summary>
/// Mutated molfiles and SDF: a molecule or a problem of the catalogue, nothing else. RADICALSITES_LONG_TESTS=1 runs a
/// million inputs.
/// </summary>
public sealed class MolfileFuzzTests
{
    private static readonly bool Long = Environment.GetEnvironmentVariable("RADICALSITES_LONG_TESTS") == "1";

    private static readonly string[] Pieces =
    [
        "M  END", "$$$$", "> <A>", "M  CHG  1   1   1", "M  V30 ", "V3000", "V2000", "999", "-1", "  4", "  2", "\r", "\n", "\n\n",
        "M  RAD  1   1   2", "M  ISO  1   1 999", "R#", "*", " H ", "BEGIN ATOM", "END", "-", "(", "=", "\u00e9", "\0", "\t", "1e308", "NaN",
        "  1  2  4  0", " CFG=2", " VAL=-1", "A    1", "S  SKP  3", "\uFEFF",
    ];

    [Fact]
    public void Read_of_mutated_text_is_a_molecule_or_a_coded_problem()
    {
        string[] seeds = Seeds();
        var random = new Random(20240501);
        int rounds = Long ? 1_000_000 : 20_000;
        for (int i = 0; i < rounds; i++)
        {
            string text = Mutate(seeds[random.Next(seeds.Length)], seeds, random);
            try
            {
                if (!MolfileReader.TryParse(text, out _, out FormatProblem? problem))
                {
                    Assert.NotNull(ProblemCatalogue.Find(problem.Code));
                    Assert.NotEmpty(problem.Render());
                }

                if (i % 4 == 0)
                {
                    foreach (SdfRecord record in SdfReader.Read(new StringReader(text), new SdfReaderOptions { LongestRecord = 1 << 16 }))
                    {
                        Assert.True(record.Molecule is null != record.Problem is null);
                    }
                }
            }
            catch (Exception mistake) when (mistake is not Xunit.Sdk.XunitException)
            {
                Assert.Fail(string.Create(CultureInfo.InvariantCulture, $"round {i}: {mistake}\n{text}"));
            }
        }
    }

    private static string[] Seeds()
    {
        string path = Path.Combine(AppContext.BaseDirectory, "TestData", "Molfile", "toolkit_files.sdf.gz");
        return [.. RecordReader.Split(File.OpenRead(path), InputFormat.Sdf).Take(200).Select(static record => record.Text), Drawings.Alanine];
    }

    private static string Mutate(string seed, string[] seeds, Random random)
    {
        var text = new System.Text.StringBuilder(seed);
        int changes = 1 + random.Next(6);
        for (int i = 0; i < changes && text.Length > 0; i++)
        {
            int at = random.Next(text.Length);
            switch (random.Next(6))
            {
                case 0:
                    text[at] = (char)random.Next(random.Next(8) == 0 ? 0x3000 : 128);
                    break;
                case 1:
                    text.Remove(at, Math.Min(random.Next(40), text.Length - at));
                    break;
                case 2:
                    text.Insert(at, Pieces[random.Next(Pieces.Length)]);
                    break;
                case 3:
                    text[at] = (char)('0' + random.Next(10));
                    break;
                case 4:
                    string other = seeds[random.Next(seeds.Length)];
                    int from = random.Next(other.Length);
                    text.Insert(at, other.AsSpan(from, Math.Min(random.Next(200), other.Length - from)));
                    break;
                default:
                    text.Length = at;
                    break;
            }
        }

        return text.ToString();
    }
}
