using System;

namespace RadicalSites.Diagnostics;

/// <summary>A text could not be read as a molecule.</summary>
public class MoleculeFormatException : FormatException
{
    /// <summary>Makes the exception from the problem found.</summary>
    /// <param name="problem">The problem with code and place.</param>
    public MoleculeFormatException(FormatProblem problem)
        : base(problem?.Render())
    {
        ArgumentNullException.ThrowIfNull(problem);
        Problem = problem;
    }

    /// <summary>The problem with code, place, cause and remedy.</summary>
    public FormatProblem Problem { get; }

    /// <summary>Code in the catalogue.</summary>
    public string Code => Problem.Code;

    /// <summary>0-based offset in the text; -1 when there is none.</summary>
    public int Position => Problem.Position;
}
