using System;
using System.IO;

namespace RadicalSites.Tests;

/// <summary>Finds the folder of the repository from the folder of the test assembly.</summary>
internal static class RepositoryRoot
{
    public static string Path { get; } = Find();

    private static string Find()
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(System.IO.Path.Combine(folder.FullName, "RadicalSites.sln")))
            {
                return folder.FullName;
            }
        }

        throw new InvalidOperationException("The tests run from a folder inside the repository.");
    }
}
