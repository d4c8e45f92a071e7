namespace RadicalSites.Molecules;

/// <summary>Coordinates of an atom as the input gave them [angstrom in a 3D molfile, arbitrary unit in a 2D one].</summary>
/// <param name="X">First coordinate.</param>
/// <param name="Y">Second coordinate.</param>
/// <param name="Z">Third coordinate; 0 in a 2D drawing.</param>
public readonly record struct Point(double X, double Y, double Z);
