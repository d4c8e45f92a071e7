namespace RadicalSites.Products;

/// <summary>What the substitution does to stereochemistry.</summary>
public enum StereoOutcome : byte
{
    /// <summary>No stereocentre is made, lost or affected.</summary>
    None,

    /// <summary>One new stereocentre in a product without others: a racemic mixture.</summary>
    Racemic,

    /// <summary>New stereocentre beside others: diastereomers, ratio not predicted.</summary>
    Diastereomers,

    /// <summary>Existing stereocentres are untouched and nothing new is made.</summary>
    Retained,

    /// <summary>The radical centre was a stereocentre and stays one: both configurations result.</summary>
    Epimerised,

    /// <summary>The radical centre was a stereocentre and is none in the product.</summary>
    Lost,
}
