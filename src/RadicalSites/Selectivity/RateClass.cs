namespace RadicalSites.Selectivity;

/// <summary>Classes with rate parameters of their own; the digit counts the carbon neighbours.</summary>
internal enum RateClass : byte
{
    Methyl,
    Primary,
    Secondary,
    Tertiary,
    Benzylic1,
    Benzylic2,
    Benzylic3,
    Allylic1,
    Allylic2,
    Allylic3,
}
