using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Formats.Smiles;

/// <summary>Marks / and \ on the bonds of aromatic and small rings, as drawing programs write them, fix nothing.</summary>
public sealed class AromaticMarksTests
{
    [Theory]
    [InlineData("C1=N/C=C\\C=C1", "c1ccncc1")]
    [InlineData("CC1=N/C=C\\C=C1", "Cc1ccccn1")]
    [InlineData("C\\C=C\\C1=N/C=C\\C=C1", "C/C=C/c1ccccn1")]
    [InlineData("C1=C/C=C/C=C\\C=C\\C=C/C=C\\C=C\\C=C/C=C1", "C1=CC=CC=CC=CC=CC=CC=CC=CC=C1")]
    [InlineData("FC=C8/C=C8/C=C\\F", "FC=C8C=C8/C=C\\F")]
    public void Write_marked_aromatic_ring_is_read_back(string marked, string plain)
    {
        Molecule molecule = SmilesReader.Parse(marked);
        string canonical = CanonicalSmiles.Write(SmilesReader.Parse(plain));

        Assert.Equal(canonical, CanonicalSmiles.Write(molecule));
        Assert.Equal(canonical, CanonicalSmiles.Write(SmilesReader.Parse(SmilesWriter.Write(molecule))));
    }
}
