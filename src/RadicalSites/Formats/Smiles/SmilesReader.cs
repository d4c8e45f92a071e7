using System;
using System.Collections.Generic;
using System.Diagnostics.CodeAnalysis;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Perception;

namespace RadicalSites.Formats.Smiles;

/// <summary>Reads SMILES after the OpenSMILES specification into molecules.</summary>
/// <remarks>
/// One pass over the text, linear in its length, without recursion. Positions in problems are 0-based UTF-16 offsets.
/// Stateless to the outside and safe for use by many threads. Source: [OPENSMILES].
/// </remarks>
public static class SmilesReader
{
    [ThreadStatic]
    private static SmilesParse? parseOfThread;

    /// <summary>Reads a molecule.</summary>
    /// <param name="text">SMILES without white space.</param>
    /// <returns>The molecule; atoms in the order of the text.</returns>
    /// <exception cref="SmilesFormatException">The text is no SMILES, or describes an impossible molecule.</exception>
    public static Molecule Parse(ReadOnlySpan<char> text) => Parse(text, SmilesReaderOptions.Strict);

    /// <summary>Reads a molecule.</summary>
    /// <param name="text">SMILES.</param>
    /// <param name="options">How strictly to read.</param>
    /// <returns>The molecule; atoms in the order of the text.</returns>
    /// <exception cref="SmilesFormatException">The text is no SMILES, or describes an impossible molecule.</exception>
    public static Molecule Parse(ReadOnlySpan<char> text, SmilesReaderOptions options) =>
        TryParse(text, options, out Molecule? molecule, out FormatProblem? problem)
            ? molecule
            : throw new SmilesFormatException(problem);

    /// <summary>Reads a molecule without throwing.</summary>
    /// <param name="text">SMILES without white space.</param>
    /// <param name="molecule">The molecule on success.</param>
    /// <param name="problem">What is wrong otherwise.</param>
    /// <returns>Whether the text is a molecule.</returns>
    public static bool TryParse(
        ReadOnlySpan<char> text, [NotNullWhen(true)] out Molecule? molecule,
        [NotNullWhen(false)] out FormatProblem? problem) =>
        TryParse(text, SmilesReaderOptions.Strict, out molecule, out problem);

    /// <summary>Reads a molecule without throwing.</summary>
    /// <param name="text">SMILES.</param>
    /// <param name="options">How strictly to read.</param>
    /// <param name="molecule">The molecule on success.</param>
    /// <param name="problem">What is wrong otherwise.</param>
    /// <returns>Whether the text is a molecule.</returns>
    public static bool TryParse(
        ReadOnlySpan<char> text, SmilesReaderOptions options, [NotNullWhen(true)] out Molecule? molecule,
        [NotNullWhen(false)] out FormatProblem? problem)
    {
        ArgumentNullException.ThrowIfNull(options);
        SmilesParse parse = parseOfThread ??= new SmilesParse();
        molecule = parse.Read(text, options, null, out problem);
        if (molecule is not null)
        {
            problem = null;
            return true;
        }

        problem = problem! with { Input = text.ToString() };
        return false;
    }

    /// <summary>Reads a molecule without throwing, and tells what was noticed on the way.</summary>
    /// <param name="text">SMILES.</param>
    /// <param name="options">How strictly to read.</param>
    /// <param name="molecule">The molecule on success.</param>
    /// <param name="problem">What is wrong otherwise.</param>
    /// <param name="remarks">
    /// Stereo marks and text that lenient reading left out, and marks / and \ that fix nothing because the other end of the
    /// double bond has none; may be empty.
    /// </param>
    /// <returns>Whether the text is a molecule.</returns>
    public static bool TryParse(
        ReadOnlySpan<char> text, SmilesReaderOptions options, [NotNullWhen(true)] out Molecule? molecule,
        [NotNullWhen(false)] out FormatProblem? problem, out IReadOnlyList<FormatProblem> remarks)
    {
        ArgumentNullException.ThrowIfNull(options);
        var found = new List<FormatProblem>();
        SmilesParse parse = parseOfThread ??= new SmilesParse();
        molecule = parse.Read(text, options, found, out problem);
        string input = found.Count > 0 || molecule is null ? text.ToString() : "";
        remarks = found.ConvertAll(remark => remark with { Input = input });
        problem = molecule is null ? problem! with { Input = input } : null;
        return molecule is not null;
    }
}
