namespace RadicalSites.Heat;

/// <summary>Reaction enthalpy of the replacement at one site.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="SiteNumber">Number of the site, 1-based.</param>
/// <param name="Share">Share of the mono-halogenation at the site, 0 to 1.</param>
/// <param name="KilojoulesPerMole">Enthalpy of R-H + reagent to R-X + by-product at 298.15 K [kJ/mol]; negative = heat released; <see langword="null"/> = not known.</param>
/// <param name="SigmaKilojoulesPerMole">Standard uncertainty [kJ/mol], or <see langword="null"/>.</param>
public sealed record SiteEnthalpy(int SiteNumber, double Share, double? KilojoulesPerMole, double? SigmaKilojoulesPerMole);
