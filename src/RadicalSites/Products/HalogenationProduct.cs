using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>One constitutionally distinct product of mono-halogenation.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record HalogenationProduct
{
    /// <summary>1-based number; products are ordered by falling share, then by canonical SMILES.</summary>
    public required int Number { get; init; }

    /// <summary>Canonical isomeric SMILES; the new stereocentre is left unspecified.</summary>
    public required string CanonicalSmiles { get; init; }

    /// <summary>
    /// The product as a molecule; its first atoms are those of the substrate, the halogen is the last atom (or stands where
    /// a hydrogen stood that was an atom of the graph).
    /// </summary>
    public required Molecule Molecule { get; init; }

    /// <summary>For each product atom the 0-based substrate atom it came from, -1 for the halogen.</summary>
    public required IReadOnlyList<int> SubstrateAtoms { get; init; }

    /// <summary>Number of hydrogens of the substrate whose replacement gives this product.</summary>
    public required int Degeneracy { get; init; }

    /// <summary>Numbers of the sites that give it, 1-based, ascending.</summary>
    public required IReadOnlyList<int> Sites { get; init; }

    /// <summary>Direct, or transposed; direct when both occur.</summary>
    public required ProductRoute Route { get; init; }

    /// <summary>Stereochemical outcome.</summary>
    public required StereoOutcome Stereo { get; init; }

    /// <summary>Share of the mono-halogenated product, 0 to 1, or <see langword="null"/> when not computed or not known.</summary>
    public double? Share { get; init; }

    /// <summary>Lower end of the 90 % interval of the share.</summary>
    public double? ShareLow { get; init; }

    /// <summary>Upper end of the 90 % interval of the share.</summary>
    public double? ShareHigh { get; init; }

    /// <summary>
    /// Canonical SMILES of every stereoisomer that the open units allow, ascending; <see langword="null"/> unless asked for.
    /// </summary>
    public IReadOnlyList<string>? Stereoisomers { get; init; }
}
