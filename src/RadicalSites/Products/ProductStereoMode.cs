namespace RadicalSites.Products;

/// <summary>How the stereochemistry of products is written.</summary>
public enum ProductStereoMode : byte
{
    /// <summary>Constitution only: all stereo marks are dropped.</summary>
    None,

    /// <summary>Stereo of the substrate is kept where it survives; new stereo units are left open.</summary>
    Mark,

    /// <summary>As <see cref="Mark"/>, and every stereoisomer that the open units allow is listed.</summary>
    Expand,
}
