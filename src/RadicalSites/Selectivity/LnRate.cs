namespace RadicalSites.Selectivity;

/// <summary>ln of the rate per hydrogen of a site with the parts of its uncertainty.</summary>
/// <param name="Value">ln k relative to a primary alkane hydrogen.</param>
/// <param name="Class">Rate class; its error is common to all sites of the class.</param>
/// <param name="ClassSigma">Standard deviation of the class value.</param>
/// <param name="BdeSigma">Standard deviation that comes from the bond enthalpy.</param>
/// <param name="OwnSigma">Standard deviation of terms that this site has alone (polar, medium, steric).</param>
internal readonly record struct LnRate(double Value, RateClass Class, double ClassSigma, double BdeSigma, double OwnSigma);
