using System;
using System.IO;

namespace RadicalSites.Cli.Tests;

/// <summary>A folder that lives as long as its test.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("radicalsites-");

    public string this[string name] => Path.Combine(folder.FullName, name);

    public string Write(string name, string text)
    {
        File.WriteAllText(this[name], text);
        return this[name];
    }

    public void Dispose() => folder.Delete(recursive: true);
}
