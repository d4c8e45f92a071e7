using System.Collections.Generic;
using System.Linq;
using System.Numerics;
using RadicalSites.Molecules;
using RadicalSites.Products;

namespace RadicalSites.Tests.Products;

/// <summary>Isomer counts by the cycle index against published counts and against the list itself.</summary>
public class SubstitutionSymmetryTests
{
    [Fact]
    public void Count_fullerane_equals_the_published_numbers_of_C60_derivatives()
    {
        // Balasubramanian, K. Chem. Phys. Lett. 1991, 182, 257 (isomers of C60H60-nDn under the full icosahedral
        // group): 1, 1, 23, 303, 4190, 45718, 418470. From memory.
        SubstitutionSymmetry symmetry = SymmetryOf(Cages.Fullerane());

        Assert.Equal(120, symmetry.Order);
        Assert.Equal("1 1 23 303 4190 45718 418470", string.Join(' ', symmetry.Count(6)));
    }

    [Fact]
    public void Count_dodecahedrane_sums_to_the_two_colourings_of_the_dodecahedron()
    {
        // Polya: 1/120 (2^20 + 15 * 2^10 + 20 * 2^8 + 24 * 2^4 + 1 * 2^10 + 15 * 2^12 + 20 * 2^4 + 24 * 2^2) = 9436,
        // by hand from the cycle types of the 20 vertices under the full icosahedral group.
        SubstitutionSymmetry symmetry = SymmetryOf(Cages.Dodecahedrane());

        BigInteger total = symmetry.Count(20).Aggregate(BigInteger.Zero, static (sum, count) => sum + count);

        Assert.Equal(120, symmetry.Order);
        Assert.Equal(new BigInteger(9436), total);
    }

    [Theory]
    [InlineData("propane", "1 2 4 5 6 5 4 2 1")]
    [InlineData("cubane", "1 1 3 3 6 3 3 1 1")]
    [InlineData("methane", "1 1 1 1 1")]
    public void Count_equals_the_textbook_numbers(string name, string expected)
    {
        // Chloropropanes: one chlorine 2, two 4, three 5 ... (common textbook counts); cubane under its 48 operations,
        // Polya 1937 and later textbooks. Common practice.
        Molecule molecule = name switch
        {
            "propane" => Cages.Hydrocarbon(3, [(0, 1), (1, 2)]),
            "cubane" => Cages.Hydrocarbon(
                8, [(0, 1), (1, 2), (2, 3), (3, 0), (4, 5), (5, 6), (6, 7), (7, 4), (0, 4), (1, 5), (2, 6), (3, 7)]),
            _ => Cages.Hydrocarbon(1, []),
        };
        SubstitutionSymmetry symmetry = SymmetryOf(molecule);
        int degree = expected.Split(' ').Length - 1;

        Assert.Equal(expected, string.Join(' ', symmetry.Count(degree)));
    }

    [Theory]
    [MemberData(nameof(Skeletons))]
    public void Enumerate_lists_as_many_patterns_as_the_cycle_index_counts(int carbons, int[] bonds)
    {
        Molecule molecule = Cages.Hydrocarbon(carbons, [.. bonds.Chunk(2).Select(static pair => (pair[0], pair[1]))]);
        SubstitutionSymmetry symmetry = SymmetryOf(molecule);
        BigInteger[] counts = symmetry.Count(4);
        int hydrogens = symmetry.Capacity.Sum(static one => one);

        for (int times = 1; times <= 4; times++)
        {
            var listed = new HashSet<string>();
            BigInteger ways = BigInteger.Zero;
            foreach (byte[] pattern in SubstitutionPatterns.Enumerate(symmetry, times, default))
            {
                Assert.True(listed.Add(string.Join(',', pattern)));
                ways += symmetry.Degeneracy(pattern);
            }

            Assert.Equal(counts[times], new BigInteger(listed.Count));
            Assert.Equal(Choose(hydrogens, times), ways);
        }
    }

    public static TheoryData<int, int[]> Skeletons => new()
    {
        { 3, [0, 1, 1, 2] },
        { 5, [0, 1, 0, 2, 0, 3, 0, 4] },
        { 8, [0, 1, 1, 2, 1, 3, 3, 4, 4, 5, 5, 6, 5, 7] },
        { 7, [0, 1, 1, 2, 2, 3, 3, 4, 4, 5, 5, 0, 0, 6] },
        { 10, [0, 1, 1, 2, 2, 3, 3, 4, 4, 5, 5, 0, 1, 6, 6, 7, 7, 3, 7, 8, 8, 9, 9, 5] },
        { 7, [0, 1, 1, 2, 2, 3, 3, 4, 4, 5, 5, 0, 0, 6, 6, 3] },
        { 12, [0, 1, 1, 2, 1, 3, 1, 4, 4, 5, 5, 6, 5, 7, 5, 8, 8, 9, 9, 10, 9, 11] },
    };

    [Fact]
    public void Find_many_independent_isopropyl_groups_costs_their_sum()
    {
        // A chain of 30 CH carbons, each with an isopropyl group: 2^30 and more operations, all in small factors.
        const int links = 30;
        var bonds = new List<(int, int)>();
        for (int i = 0; i < links; i++)
        {
            if (i > 0)
            {
                bonds.Add((i - 1, i));
            }

            int branch = links + (3 * i);
            bonds.AddRange([(i, branch), (branch, branch + 1), (branch, branch + 2)]);
        }

        bonds.Add((0, 4 * links));
        Molecule molecule = Cages.Hydrocarbon((4 * links) + 1, bonds);
        SubstitutionSymmetry symmetry = SymmetryOf(molecule);

        // One halogen: the end methyl, 30 chain carbons, 30 CH, 30 pairs of methyls; the last link has two extra H.
        Assert.Equal(new BigInteger(91), symmetry.Count(1)[1]);
        Assert.Equal(BigInteger.Pow(2, links), symmetry.Order);
        Assert.Equal(symmetry.Count(2)[2], new BigInteger(SubstitutionPatterns.Enumerate(symmetry, 2, default).Count()));
    }

    private static SubstitutionSymmetry SymmetryOf(Molecule molecule)
    {
        int[] carbons = [.. Enumerable.Range(0, molecule.AtomCount).Where(i => molecule.Atoms[i].HydrogenCount > 0)];
        SubstitutionSymmetry? symmetry = SubstitutionSymmetry.Find(molecule, carbons, null, default);
        Assert.NotNull(symmetry);
        return symmetry;
    }

    private static BigInteger Choose(int total, int picked)
    {
        BigInteger ways = BigInteger.One;
        for (int i = 1; i <= picked; i++)
        {
            ways = ways * (total - picked + i) / i;
        }

        return ways;
    }
}
