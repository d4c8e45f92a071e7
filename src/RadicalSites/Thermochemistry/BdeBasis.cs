namespace RadicalSites.Thermochemistry;

/// <summary>What the bond dissociation enthalpy of a site rests on, strongest first.</summary>
public enum BdeBasis : byte
{
    /// <summary>This very bond of this very molecule was measured or evaluated.</summary>
    Measured,

    /// <summary>An environment class with published members.</summary>
    Class,

    /// <summary>A base class plus group increments.</summary>
    Increments,

    /// <summary>No data; the site has no value.</summary>
    None,
}
