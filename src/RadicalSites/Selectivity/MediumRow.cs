namespace RadicalSites.Selectivity;

/// <summary>One row of the table of media.</summary>
internal sealed record MediumRow(
    string Carrier, bool IsGas, double Base, double Gain, double HalfMolar, double NeatMolar, double Sigma);
