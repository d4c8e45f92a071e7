using RadicalSites.Diagnostics;

namespace RadicalSites.Formats.Molfile;

/// <summary>A text could not be read as a molfile, or a molecule not be written as one.</summary>
public sealed class MolfileFormatException : MoleculeFormatException
{
    /// <summary>Makes the exception from the problem found.</summary>
    /// <param name="problem">The problem with code, line and column.</param>
    public MolfileFormatException(FormatProblem problem)
        : base(problem)
    {
    }

    /// <summary>1-based line of the text; 0 when there is none.</summary>
    public int Line => Problem.Line;
}
