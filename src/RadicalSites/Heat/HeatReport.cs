using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites.Heat;

/// <summary>Heat, gas and materials of one batch.</summary>
/// <remarks>Estimate from bond enthalpies; never a go-ahead. Immutable and safe for use by many threads.</remarks>
public sealed record HeatReport
{
    /// <summary>Id of the reagent.</summary>
    public required string Reagent { get; init; }

    /// <summary>Reaction enthalpy of each site.</summary>
    public required IReadOnlyList<SiteEnthalpy> Sites { get; init; }

    /// <summary>Share-weighted enthalpy per mole of C-H replaced [kJ/mol], or <see langword="null"/> without data.</summary>
    public required double? KilojoulesPerMole { get; init; }

    /// <summary>Standard uncertainty of the weighted enthalpy [kJ/mol], site errors taken as fully correlated.</summary>
    public required double? SigmaKilojoulesPerMole { get; init; }

    /// <summary>Moles of halogen source charged, all taken to react.</summary>
    public required double MolesReacting { get; init; }

    /// <summary>Heat released by the batch [kJ], positive when released.</summary>
    public required double? HeatKilojoules { get; init; }

    /// <summary>Total mass of the mixture [g].</summary>
    public required double MixtureGrams { get; init; }

    /// <summary>Specific heat capacity used for the mixture [J/(g K)].</summary>
    public required double JoulesPerGramKelvin { get; init; }

    /// <summary>Adiabatic temperature rise [K], 0 or more.</summary>
    public required double? AdiabaticRiseKelvin { get; init; }

    /// <summary>Adiabatic end temperature [degree Celsius].</summary>
    public required double? EndCelsius { get; init; }

    /// <summary>Boiling point of the solvent [degree Celsius], or <see langword="null"/> for a neat reaction.</summary>
    public required double? SolventBoilingPointCelsius { get; init; }

    /// <summary>Gases formed; may be empty.</summary>
    public required IReadOnlyList<EvolvedGas> Gases { get; init; }

    /// <summary>Masses and volumes.</summary>
    public required IReadOnlyList<Material> Materials { get; init; }

    /// <summary>Cautions, the standing note last.</summary>
    public required IReadOnlyList<Diagnostic> Diagnostics { get; init; }
}
