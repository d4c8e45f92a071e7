namespace RadicalSites.Selectivity;

/// <summary>Enthalpies of the two propagation steps at a site (Hess from bond dissociation enthalpies, 298.15 K).</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="AbstractionKilojoulesPerMole">X + R-H to HX + R [kJ/mol], or <see langword="null"/> without data.</param>
/// <param name="TransferKilojoulesPerMole">R + X-Y to R-X + Y [kJ/mol], or <see langword="null"/> without data.</param>
/// <param name="SigmaKilojoulesPerMole">Standard uncertainty of each step [kJ/mol], or <see langword="null"/> without data.</param>
/// <param name="Verdict">Whether the chain propagates here.</param>
public sealed record StepEnthalpies(
    double? AbstractionKilojoulesPerMole, double? TransferKilojoulesPerMole, double? SigmaKilojoulesPerMole,
    ChainVerdict Verdict)
{
    /// <summary>Sum of both steps [kJ/mol], or <see langword="null"/> without data.</summary>
    public double? OverallKilojoulesPerMole => AbstractionKilojoulesPerMole + TransferKilojoulesPerMole;
}
