namespace RadicalSites.Selectivity;

/// <summary>Rate per hydrogen of a class relative to primary: ln k = LnA + Kelvin / T.</summary>
internal readonly record struct ClassRate(double LnA, double Kelvin, double Sigma);
