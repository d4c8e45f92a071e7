using System;
using System.IO;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Fuzz;

/// <summary>
/// Mutated SMILES are read or refused with a coded problem, nothing else; what is read can be written and read back.
/// Long mode (RADICALSITES_LONG_TESTS=1) runs a million mutants.
/// </summary>
public sealed class SmilesFuzzTests
{
    private const string Alphabet = "CNOPSFIBclnosp[]()=#$:/\\.-+@H%0123456789*ra HTBOAL";

    [Fact]
    public void TryParse_mutants_are_read_or_refused_with_a_code()
    {
        int rounds = Environment.GetEnvironmentVariable("RADICALSITES_LONG_TESTS") == "1" ? 1_000_000 : 20_000;
        string[] seeds =
        [
            .. File.ReadLines(Path.Combine(AppContext.BaseDirectory, "TestData", "Reference", "nci_first_5k.smi"))
                .Where(static (_, index) => index % 25 == 0).Select(static line => line.Split('\t', ' ')[0]).Where(static s => s.Length is > 0 and < 60),
            "N[C@](Br)(O)C", "F/C=C/C=C\\F", "OC(Cl)=[C@]=C(C)F", "S[As@TB5](F)(N)(Cl)Br", "Br[Co@OH12](Cl)(I)(F)(S)C",
            "[2H]C([13CH3:7])%12CC%12", "c1ccc2c(c1)[nH]c1ccccc12", "C%(100)CC%(100)", "[H]/N=C/C", "=C", "C1C1", "S@@(C)", "50-00-0",
        ];
        var random = new Random(12345);
        for (int round = 0; round < rounds; round++)
        {
            string text = Mutate(seeds[random.Next(seeds.Length)], random);
            if (!SmilesReader.TryParse(text, out Molecule? molecule, out FormatProblem? problem))
            {
                Assert.NotNull(ProblemCatalogue.Find(problem.Code));
                Assert.InRange(problem.Position, -1, text.Length);
                Assert.NotEmpty(problem.Render());
                continue;
            }

            string written = SmilesWriter.Write(molecule);
            Assert.True(SmilesReader.TryParse(written, out Molecule? again, out FormatProblem? back), $"{text} -> {written}: {back?.Message}");
            Assert.Equal(molecule.AtomCount, again.AtomCount);
            Assert.Equal(MolecularFormula.Of(molecule).ToString(), MolecularFormula.Of(again).ToString());
        }
    }

    [Fact]
    public void Write_whole_reference_file_closes_and_is_idempotent()
    {
        foreach (string line in File.ReadLines(Path.Combine(AppContext.BaseDirectory, "TestData", "Reference", "nci_first_5k.smi")))
        {
            if (!SmilesReader.TryParse(line.Split('\t', ' ')[0], out Molecule? molecule, out _))
            {
                continue;
            }

            string canonical = CanonicalSmiles.Write(molecule);
            Assert.Equal(canonical, CanonicalSmiles.Write(SmilesReader.Parse(canonical)));
            Assert.Equal(canonical, CanonicalSmiles.Write(SmilesReader.Parse(SmilesWriter.Write(molecule))));
        }
    }

    private static string Mutate(string seed, Random random)
    {
        char[] text = seed.ToCharArray();
        string result = new(text);
        for (int edits = random.Next(1, 4); edits > 0; edits--)
        {
            int at = random.Next(result.Length + 1);
            result = random.Next(4) switch
            {
                0 => result.Insert(at, Alphabet[random.Next(Alphabet.Length)].ToString()),
                1 when at < result.Length => result.Remove(at, 1),
                2 when at < result.Length => result[..at] + Alphabet[random.Next(Alphabet.Length)] + result[(at + 1)..],
                _ => result[..at] + result[(at / 2)..],
            };
        }

        return result;
    }
}
