using RadicalSites.Diagnostics;

namespace RadicalSites.Formats.Smiles;

/// <summary>A text could not be read as SMILES.</summary>
public sealed class SmilesFormatException : MoleculeFormatException
{
    /// <summary>Makes the exception from the problem found.</summary>
    /// <param name="problem">The problem with code and position.</param>
    public SmilesFormatException(FormatProblem problem)
        : base(problem)
    {
    }
}
