namespace RadicalSites.Selectivity;

/// <summary>Polar constants of one functional group; see the header of the table polar_groups.</summary>
internal readonly record struct PolarGroup(
    double SigmaInductive, double AlphaEarly, double AlphaLate, double BetaEarly, double BetaLate);
