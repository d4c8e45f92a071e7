using System;
using System.Collections.Generic;
using System.Diagnostics.CodeAnalysis;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>Writes molecules as molfiles, V2000 or V3000.</summary>
/// <remarks>
/// <para>The localised form is written. Charges, isotopes, radicals, hydrogen counts (by the valence field where the normal
/// valence would imply another count), atom classes and stereo are kept: the text is read back before it is returned, and
/// its stereo compared. Coordinates of the molecule are written when they fit its stereo; otherwise, and for a molecule
/// with stereo but no coordinates, a plain layout is computed that carries wedges and the sides of double bonds (it is
/// made for programs, not for the eye). Without stereo and coordinates all coordinates are zero. Double bonds without
/// stated configuration are marked "either" where the drawing would state one.</para>
/// <para>Not writable: wildcards, quadruple bonds; square planar, bipyramidal and octahedral centres (see
/// <see cref="MolfileWriterOptions.AllowStereoLoss"/>). Culture plays no role; lines end with LF. Stateless to the outside
/// and safe for use by many threads. Source: [CTFILE].</para>
/// </remarks>
public static class MolfileWriter
{
    /// <summary>Writes a molecule.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="options">How to write; <see langword="null"/> = defaults.</param>
    /// <returns>The molfile up to and with the line <c>M  END</c>.</returns>
    /// <exception cref="MolfileFormatException">The format cannot hold the molecule; the code says what.</exception>
    public static string Write(Molecule molecule, MolfileWriterOptions? options = null) =>
        TryWrite(molecule, options, out string? text, out IReadOnlyList<Diagnostic> losses)
            ? text
            : throw new MolfileFormatException(new FormatProblem
            {
                Descriptor = ProblemCatalogue.Find(losses[0].Code)!,
                Message = losses[0].Message,
                Atoms = losses[0].Atoms,
            });

    /// <summary>Writes a molecule without throwing.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="options">How to write; <see langword="null"/> = defaults.</param>
    /// <param name="text">The molfile on success.</param>
    /// <param name="losses">What the format cannot hold; empty when nothing is lost.</param>
    /// <returns>Whether the molecule was written; with losses only when the options allow them.</returns>
    public static bool TryWrite(
        Molecule molecule, MolfileWriterOptions? options, [NotNullWhen(true)] out string? text,
        out IReadOnlyList<Diagnostic> losses)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        options ??= MolfileWriterOptions.Default;
        var draft = new MolfileDraft(molecule, options);
        text = null;
        if (draft.FindObstacles() is { } obstacle)
        {
            losses = [obstacle];
            return false;
        }

        string result = draft.Write();
        losses = draft.Losses;
        if (losses.Count == 0 || options.AllowStereoLoss)
        {
            text = result;
            return true;
        }

        return false;
    }
}
