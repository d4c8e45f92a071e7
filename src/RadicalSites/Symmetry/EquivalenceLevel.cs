namespace RadicalSites.Symmetry;

/// <summary>How strictly atoms count as equivalent. Each level refines the one before.</summary>
public enum EquivalenceLevel : byte
{
    /// <summary>
    /// Exchanged by an automorphism of the graph: element, charge, isotope, hydrogen count, unpaired electrons and bonds.
    /// Aromatic bonds are alike whatever the Kekule form; charges and bonds of other resonance forms (carboxylate,
    /// amidinium, nitro) count as written. Stereo plays no part.
    /// </summary>
    Constitutional,

    /// <summary>
    /// Exchanged by an automorphism that keeps the configuration of the whole fragment or turns it into its mirror image:
    /// the atoms are homotopic or enantiotopic.
    /// </summary>
    Enantiotopic,

    /// <summary>Exchanged by an automorphism that keeps the configuration of the whole fragment.</summary>
    Homotopic,
}
