namespace RadicalSites.Molecules;

/// <summary>A neighbour of an atom and the bond that leads there.</summary>
/// <param name="Atom">0-based index of the neighbouring atom.</param>
/// <param name="Bond">0-based index of the bond.</param>
public readonly record struct Neighbor(int Atom, int Bond);
