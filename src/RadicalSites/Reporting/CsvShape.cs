namespace RadicalSites.Reporting;

/// <summary>What a row of a CSV report stands for.</summary>
public enum CsvShape
{
    /// <summary>A site, without conditions.</summary>
    Sites,

    /// <summary>A site with rate and share.</summary>
    PredictedSites,

    /// <summary>A product with share.</summary>
    Products,

    /// <summary>A product of an enumeration.</summary>
    Isomers,
}
