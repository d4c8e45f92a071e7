using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text.RegularExpressions;

namespace RadicalSites.Tests.Architecture;

/// <summary>Sizes and shapes of source files; the bounds stand in the contributors' guide.</summary>
public sealed partial class SourceFileTests
{
    private const int LongestFile = 500;

    [Fact]
    public void Source_files_none_is_longer_than_the_bound()
    {
        string[] tooLong = SourceFiles("src").Concat(SourceFiles("tests")).Concat(SourceFiles("benchmarks"))
            .Where(static file => File.ReadLines(file).Count() > LongestFile)
            .ToArray();

        Assert.Empty(tooLong);
    }

    [Fact]
    public void Source_files_nine_in_ten_stay_under_300_lines()
    {
        int[] lengths = SourceFiles("src").Select(static file => File.ReadLines(file).Count()).ToArray();

        Assert.True(lengths.Count(static length => length <= 300) >= 0.9 * lengths.Length);
    }

    [Fact]
    public void Source_files_hold_one_public_type_each()
    {
        var crowded = new List<string>();
        foreach (string file in SourceFiles("src"))
        {
            int types = File.ReadLines(file).Count(static line => PublicType().IsMatch(line));
            if (types > 1)
            {
                crowded.Add(file);
            }
        }

        Assert.Empty(crowded);
    }

    // Only the first column counts: nested types belong to their owner's file.
    [GeneratedRegex(@"^public (static |sealed |abstract |readonly |partial |ref )*(class|record|record struct|struct|enum|interface|delegate) ")]
    private static partial Regex PublicType();

    private static IEnumerable<string> SourceFiles(string folder)
    {
        string root = Path.Combine(RepositoryRoot.Path, folder);
        return Directory.EnumerateFiles(root, "*.cs", SearchOption.AllDirectories)
            .Where(static file => !file.Contains($"{Path.DirectorySeparatorChar}obj{Path.DirectorySeparatorChar}", StringComparison.Ordinal)
                && !file.Contains($"{Path.DirectorySeparatorChar}bin{Path.DirectorySeparatorChar}", StringComparison.Ordinal));
    }
}
