namespace RadicalSites.Selectivity;

/// <summary>Hammett constants of one ring substituent.</summary>
internal sealed record HammettConstants(double Meta, double Para, double ParaPlus);
