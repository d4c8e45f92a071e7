namespace RadicalSites.Thermochemistry;

/// <summary>One publication that figures of the library come from.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Key">Key used by the tables.</param>
/// <param name="Citation">Full citation.</param>
/// <param name="Doi">Digital object identifier, or <see langword="null"/> where it is not certain.</param>
public sealed record BibliographyEntry(string Key, string Citation, string? Doi);
