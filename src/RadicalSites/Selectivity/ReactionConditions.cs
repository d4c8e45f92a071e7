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
    /// <param name="solvent">Id of the only solvent when it matters (see the table media), otherwise <see langword="null"/>.</param>
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

    /// <summary>Id of the solvent, or <see langword="null"/> for a gas or an inert solvent.</summary>
    public string? Solvent { get; }
}
