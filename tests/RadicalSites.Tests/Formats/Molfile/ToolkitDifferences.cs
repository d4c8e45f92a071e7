using System.Collections.Generic;

namespace RadicalSites.Tests.Formats.Molfile;

/// <summary>Records whose toolkit file does not hold what its SMILES says, with the reason.</summary>
internal static class ToolkitDifferences
{
    // name, kind, tool (start), reason
    private static readonly List<(string Name, string Kind, string Tool, string Reason)> Known =
    [
        ("trans-cyclooctene", "2D V2000", "Open Babel", "drawn as a cis ring; its SMILES leaves out stereo in rings"),
        ("cis-cyclooctene", "2D V2000", "Open Babel", "drawn as a cis ring; its SMILES leaves out stereo in rings"),
        ("phosphine", "3D with hydrogens", "RDKit", "it perceives no centre at phosphorus when it reads its file back"),
        ("NCI line 4951", "2D V2000", "RDKit", "the quinoid double bonds are stereo bonds, drawn as such, but not perceived by it"),
    ];

    internal static bool Explained(string name, string kind, string tool) => Known.Exists(
        entry => entry.Name == name && entry.Kind == kind && tool.StartsWith(entry.Tool, System.StringComparison.Ordinal));
}
