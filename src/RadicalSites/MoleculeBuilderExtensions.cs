using System;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Perception;

namespace RadicalSites;

/// <summary>Completes a builder to an immutable molecule.</summary>
/// <remarks>Stateless and safe for use by many threads; a builder belongs to one thread.</remarks>
public static class MoleculeBuilderExtensions
{
    /// <summary>Checks the graph, completes hydrogens, finds the Kekule form, perceives rings and aromaticity.</summary>
    /// <param name="builder">The collected graph; it is not changed and may be used on.</param>
    /// <returns>The molecule; plain hydrogens added as atoms are folded.</returns>
    /// <exception cref="MoleculeFormatException">The graph describes an impossible molecule; the problem names the atoms.</exception>
    public static Molecule ToMolecule(this MoleculeBuilder builder)
    {
        ArgumentNullException.ThrowIfNull(builder);
        return DraftFiller.Complete(builder, out FormatProblem? problem) ?? throw new MoleculeFormatException(problem!);
    }
}
