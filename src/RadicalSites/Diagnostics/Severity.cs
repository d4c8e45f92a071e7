namespace RadicalSites.Diagnostics;

/// <summary>How much a diagnostic matters to the person who reads the result.</summary>
public enum Severity
{
    /// <summary>Worth knowing; nothing has to be done.</summary>
    Info,

    /// <summary>The result or the experiment needs attention.</summary>
    Caution,

    /// <summary>People or equipment may come to harm.</summary>
    Danger,

    /// <summary>The record has no result.</summary>
    Error,
}
