namespace RadicalSites.Thermochemistry;

/// <summary>How a value came about.</summary>
public enum BdeKind : byte
{
    /// <summary>Measured directly (kinetics, photoacoustic, photoelectron ...).</summary>
    Measured,

    /// <summary>Evaluated from several measurements by a compilation or thermochemical network.</summary>
    Evaluated,

    /// <summary>Computed by quantum chemistry.</summary>
    Computed,

    /// <summary>Estimated by analogy or increments.</summary>
    Estimated,
}
