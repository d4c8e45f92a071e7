using System;
using RadicalSites.Quantities;

namespace RadicalSites.Selectivity;

/// <summary>Reagent, temperature and solvent of a halogenation.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record ReactionConditions
{
    /// <summary>Makes conditions.</summary>
    /// <param name="reagent">The halogen source.</param>
    /// <param name="temperature">Temperature; the usual one of the reagent when not given.</param>
    /// <param name="solvent">
    /// Medium: <c>gas</c>, <c>neat</c>, or the id of a solvent, with its concentration when it is diluted (<c>PhH@4M</c>);
    /// <see langword="null"/> when not stated, which is taken as between a gas and an inert liquid.
    /// </param>
    public ReactionConditions(Reagent reagent, Temperature? temperature = null, string? solvent = null)
    {
        ArgumentNullException.ThrowIfNull(reagent);
        Reagent = reagent;
        Temperature = temperature ?? reagent.Default;
        Solvent = solvent;
    }

    /// <summary>The halogen source.</summary>
    public Reagent Reagent { get; }

    /// <summary>The temperature.</summary>
    public Temperature Temperature { get; }

    /// <summary>The medium as given, or <see langword="null"/> when not stated.</summary>
    public string? Solvent { get; }
}
