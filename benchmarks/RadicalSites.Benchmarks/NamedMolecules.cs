using System;
using System.Collections.Generic;
using System.Text;

namespace RadicalSites.Benchmarks;

/// <summary>The molecules of the stage benchmarks, each with the reason why it is there.</summary>
public static class NamedMolecules
{
    /// <summary>SMILES by name.</summary>
    public static IReadOnlyDictionary<string, string> All { get; } = new Dictionary<string, string>(StringComparer.Ordinal)
    {
        // The least there is: what a call costs whatever the molecule.
        ["methane"] = "C",

        // A small drug: ring, acid, stereocentre, isopropyl; the everyday case.
        ["arylpropionic-acid"] = "CC(C)Cc1ccc(cc1)[C@@H](C)C(=O)O",

        // Fused saturated rings and many stereocentres: topicity has most to do.
        ["steroid"] = "C[C@H](CCCC(C)C)[C@H]1CC[C@@H]2[C@@]1(CC[C@H]3[C@H]2CC=C4[C@@]3(CC[C@@H](C4)O)C)C",

        // A large ring with sugars: dense stereo and a ring of fourteen.
        ["macrolide"] = "CCC1C(C(C(C(=O)C(CC(C(C(C(C(C(=O)O1)C)OC2CC(C(C(O2)C)O)(C)OC)C)OC3C(C(CC(O3)C)N(C)C)O)(C)O)C)C)O)(C)O",

        // A chain of repeated units that are alike nearby and different far away.
        ["peptide"] = Repeat("N[C@@H](C)C(=O)N[C@@H](Cc1ccccc1)C(=O)NCC(=O)", 6) + "O",

        // Sixty equal atoms: automorphisms of a cage without any hydrogen.
        ["C60"] = "c12c3c4c5c1c1c6c7c2c2c8c3c3c9c4c4c%10c5c5c1c1c6c6c%11c7c2c2c7c8c3c3c8c9c4c4c9c%10c5c5c1c1c6c6c%11c2c2c7c3c3c8c4c4c9c5c1c1c6c2c3c41",

        // Twenty equal CH in a cage: one site, 120 automorphisms.
        ["dodecahedrane"] = "C12C3C4C5C1C1C6C2C2C3C3C4C4C5C1C1C6C2C3C41",

        // Repeated branching: orbits of powers of two.
        ["dendrimer"] = Dendrimer(6),

        // A thousand carbons: growth with size.
        ["chain-1000"] = new string('C', 1000),
    };

    /// <summary>A tree of CH carbons with two branches at each, to a depth.</summary>
    public static string Dendrimer(int depth)
    {
        string branch = "C";
        for (int i = 1; i < depth; i++)
        {
            branch = $"C({branch}){branch}";
        }

        return $"C({branch})({branch}){branch}";
    }

    /// <summary>A text some times over.</summary>
    public static string Repeat(string text, int times) => new StringBuilder().Insert(0, text, times).ToString();
}
