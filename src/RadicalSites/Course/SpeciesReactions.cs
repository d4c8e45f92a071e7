using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Course;

/// <summary>What one species can do: every product of one more halogenation with its rate.</summary>
/// <param name="Products">Products with the rate of the whole molecule towards each [one scale for all molecules].</param>
internal sealed record SpeciesReactions(IReadOnlyList<SpeciesReaction> Products)
{
    /// <summary>Rate of the whole molecule.</summary>
    internal double Total
    {
        get
        {
            double sum = 0;
            foreach (SpeciesReaction product in Products)
            {
                sum += product.Rate;
            }

            return sum;
        }
    }
}

/// <summary>One product of a species.</summary>
/// <param name="CanonicalSmiles">Identity of the product.</param>
/// <param name="Molecule">The product.</param>
/// <param name="Rate">Rate of the whole molecule towards it, above 0.</param>
internal sealed record SpeciesReaction(string CanonicalSmiles, Molecule Molecule, double Rate);
