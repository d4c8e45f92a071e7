using System.Collections.Generic;
using System.Numerics;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>One product of replacing hydrogens by halogen, without any statement on how much of it forms.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record IsomerProduct
{
    /// <summary>1-based number in the order of enumeration: fewer halogens first.</summary>
    public required long Number { get; init; }

    /// <summary>Canonical SMILES in the stereo mode asked for; open stereo units are left unmarked.</summary>
    public required string CanonicalSmiles { get; init; }

    /// <summary>The product; its first atoms are those of the substrate, the halogens follow.</summary>
    public required Molecule Molecule { get; init; }

    /// <summary>For each product atom the 0-based substrate atom it came from, -1 for a halogen.</summary>
    public required IReadOnlyList<int> SubstrateAtoms { get; init; }

    /// <summary>0-based substrate index of the carbon that carries each new halogen, ascending; repeated when geminal.</summary>
    public required IReadOnlyList<int> HalogenCarbons { get; init; }

    /// <summary>Number of sets of substrate hydrogens whose replacement gives this product.</summary>
    public required BigInteger Degeneracy { get; init; }

    /// <summary>
    /// Canonical SMILES of every stereoisomer that the open units allow, ascending; <see langword="null"/> unless asked for.
    /// </summary>
    public IReadOnlyList<string>? Stereoisomers { get; init; }
}
