using RadicalSites.Quantities;

namespace RadicalSites.Heat;

/// <summary>What is planned for the batch.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record HeatOptions
{
    /// <summary>Amount of substrate; 1 mol by default.</summary>
    public Amount Batch { get; init; } = Amount.FromMoles(1);

    /// <summary>Equivalents of halogen source per substrate, greater than zero; 1 by default.</summary>
    public double Equivalents { get; init; } = 1;

    /// <summary>The solvent, or <see langword="null"/> for a neat reaction.</summary>
    public Solvent? Solvent { get; init; }

    /// <summary>Volume of the solvent [mL], greater than zero; 5 mL per gram of substrate when not given.</summary>
    public double? SolventMilliliters { get; init; }

    /// <summary>Measured specific heat capacity of the whole mixture [J/(g K)], which then replaces the table's.</summary>
    public double? MixtureJoulesPerGramKelvin { get; init; }

    /// <summary>Temperature at which the reaction is run; 25 C by default.</summary>
    public Temperature Start { get; init; } = Temperature.FromCelsius(25);
}
