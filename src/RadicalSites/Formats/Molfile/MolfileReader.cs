using System;
using System.Diagnostics.CodeAnalysis;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>Reads molfiles, V2000 and V3000, into molecules.</summary>
/// <remarks>
/// <para>Read: counts, atom and bond block, charges, isotopes, radicals (M lines, which supersede the fields of the atom
/// block), valence field, atom-atom map numbers, hydrogens as atoms or implied by the normal valence, bond type 4
/// (localised, or refused when the rings have no Kekule form), wedges in 2D, geometry in 3D, atom parity when all
/// coordinates are zero, cis/trans and allene configuration from coordinates, "either" marks. Lines may end with LF,
/// CR LF or CR; M&#160;&#160;END may be missing; shifted columns are read by white space and remarked on.</para>
/// <para>Refused with a code: query atoms and bonds, atom lists, R groups, attachment points, link nodes, repeat units,
/// dative, hydrogen and zero-order bonds, reactions. Not used: the chiral flag, reaction and display fields, parities
/// when there are coordinates.</para>
/// <para>Problems carry the 1-based line and the 0-based column. Linear in the length of the text. Stateless to the
/// outside and safe for use by many threads. Source: [CTFILE].</para>
/// </remarks>
public static class MolfileReader
{
    [ThreadStatic]
    private static MolfileParse? parseOfThread;

    /// <summary>Reads a molecule.</summary>
    /// <param name="text">A molfile with its header lines; text after its end is ignored.</param>
    /// <returns>The molecule.</returns>
    /// <exception cref="MolfileFormatException">The text is no molfile, or describes no single possible molecule.</exception>
    public static Molecule Parse(ReadOnlySpan<char> text) =>
        TryRead(text, out MolfileDocument? document, out FormatProblem? problem)
            ? document.Molecule
            : throw new MolfileFormatException(problem);

    /// <summary>Reads a molecule without throwing.</summary>
    /// <param name="text">A molfile with its header lines; text after its end is ignored.</param>
    /// <param name="molecule">The molecule on success.</param>
    /// <param name="problem">What is wrong otherwise.</param>
    /// <returns>Whether the text is a molecule.</returns>
    public static bool TryParse(
        ReadOnlySpan<char> text, [NotNullWhen(true)] out Molecule? molecule,
        [NotNullWhen(false)] out FormatProblem? problem)
    {
        bool ok = TryRead(text, out MolfileDocument? document, out problem);
        molecule = document?.Molecule;
        return ok;
    }

    /// <summary>Reads a molfile with header and remarks without throwing.</summary>
    /// <param name="text">A molfile with its header lines; text after its end is ignored.</param>
    /// <param name="document">Header, molecule and remarks on success.</param>
    /// <param name="problem">What is wrong otherwise.</param>
    /// <returns>Whether the text is a molecule.</returns>
    public static bool TryRead(
        ReadOnlySpan<char> text, [NotNullWhen(true)] out MolfileDocument? document,
        [NotNullWhen(false)] out FormatProblem? problem)
    {
        MolfileParse parse = parseOfThread ??= new MolfileParse();
        document = parse.Read(text, out problem);
        if (document is null)
        {
            problem ??= new FormatProblem
            {
                Descriptor = ProblemCatalogue.Molfile.Empty,
                Message = ProblemCatalogue.Molfile.Empty.Format(),
            };
            return false;
        }

        problem = null;
        return true;
    }
}
