using System.Collections.Generic;

namespace RadicalSites.Diagnostics;

/// <summary>One remark on a result: a coded message with the atoms it concerns.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Code">Code in the catalogue, for example <c>bde-none</c>; see <see cref="ProblemCatalogue"/>.</param>
/// <param name="Severity">How much it matters.</param>
/// <param name="Message">The complete sentence for people, in English, invariant culture.</param>
/// <param name="Atoms">0-based atom indices of the molecule; may be empty.</param>
public sealed record Diagnostic(string Code, Severity Severity, string Message, IReadOnlyList<int> Atoms)
{
    /// <summary>Makes a diagnostic from its catalogue entry.</summary>
    /// <param name="problem">Entry of the catalogue.</param>
    /// <param name="atoms">0-based atom indices concerned; may be empty.</param>
    /// <param name="arguments">Values for the placeholders of the entry's message.</param>
    /// <returns>The diagnostic with the severity of the entry.</returns>
    public static Diagnostic Create(ProblemDescriptor problem, IReadOnlyList<int> atoms, params object[] arguments)
    {
        System.ArgumentNullException.ThrowIfNull(problem);
        return new Diagnostic(problem.Code, problem.Severity, problem.Format(arguments), atoms);
    }
}
