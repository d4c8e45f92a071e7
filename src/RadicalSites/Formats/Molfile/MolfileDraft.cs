using System;
using System.Collections.Generic;
using System.Globalization;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using Remark = RadicalSites.Diagnostics.ProblemCatalogue.MolfileRemarks;

namespace RadicalSites.Formats.Molfile;

/// <summary>A molecule on its way to a molfile: marks are chosen, the text is read back, marks are corrected.</summary>
internal sealed partial class MolfileDraft
{
    private const int MostRounds = 12;
    private const int MostLayouts = 6;

    private readonly Molecule molecule;
    private readonly MolfileWriterOptions options;

    // Ends whose only carrier is a hydrogen get it as an atom, since a drawing can state its side only so.
    private readonly List<int> shownHydrogens = [];
    private readonly int[] hydrogenCounts;

    // Per bond: mark, and the atom at the narrow end.
    private readonly byte[] marks;
    private readonly int[] narrow;
    private readonly int[] choice;

    internal MolfileDraft(Molecule molecule, MolfileWriterOptions options)
    {
        this.molecule = molecule;
        this.options = options;
        marks = new byte[molecule.BondCount];
        narrow = new int[molecule.BondCount];
        choice = new int[molecule.StereoSpan.Length];
        hydrogenCounts = new int[molecule.AtomCount];
        for (int i = 0; i < hydrogenCounts.Length; i++)
        {
            hydrogenCounts[i] = molecule.AtomSpan[i].HydrogenCount;
        }

        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind == StereoKind.CisTrans)
            {
                ShowHydrogen(element.Focus);
                ShowHydrogen(element.FocusEnd);
            }
        }
    }

    internal List<Diagnostic> Losses { get; } = [];

    /// <summary>What no connection table can hold, stereo aside.</summary>
    internal Diagnostic? FindObstacles()
    {
        for (int i = 0; i < molecule.AtomCount; i++)
        {
            if (molecule.AtomSpan[i].AtomicNumber == 0)
            {
                return Diagnostic.Create(Remark.NoWildcard, [i], i);
            }

            int valence = BondSum(i) + hydrogenCounts[i];
            if (valence > 14)
            {
                return Diagnostic.Create(Remark.NoValence, [i], i, valence);
            }
        }

        foreach (Bond bond in molecule.BondSpan)
        {
            if (bond.Order == BondOrder.Quadruple)
            {
                return Diagnostic.Create(Remark.NoQuadruple, [bond.Begin, bond.End], bond.Begin, bond.End);
            }
        }

        return null;
    }

    internal string Write()
    {
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind is not (StereoKind.Tetrahedral or StereoKind.Allene or StereoKind.CisTrans))
            {
                Losses.Add(Lost(element));
            }
        }

        Point[]? own = OwnCoordinates();
        bool hasStereo = molecule.StereoSpan.Length > Losses.Count;
        if (own is null && !hasStereo)
        {
            return Print(new Point[molecule.AtomCount + shownHydrogens.Count]);
        }

        string? best = null;
        List<Diagnostic>? fewest = null;
        for (int attempt = own is null ? 1 : 0; attempt <= MostLayouts; attempt++)
        {
            Point[] points = attempt == 0 ? own! : StereoLayout.Place(molecule, shownHydrogens, attempt);
            string text = Fit(points, out List<Diagnostic> losses);
            if (fewest is null || losses.Count < fewest.Count)
            {
                best = text;
                fewest = losses;
            }

            if (fewest.Count == 0)
            {
                break;
            }
        }

        Losses.AddRange(fewest!);
        return best!;
    }

    // Chooses marks, reads the text back and corrects them until the stereo is that of the molecule.
    private string Fit(Point[] points, out List<Diagnostic> losses)
    {
        Array.Clear(marks);
        Array.Clear(choice);
        for (int i = 0; i < choice.Length; i++)
        {
            Choose(i);
        }

        string text = "";
        losses = [];
        for (int round = 0; round < MostRounds; round++)
        {
            text = Print(points);
            losses = [];
            if (!MolfileReader.TryParse(text, out Molecule? back, out FormatProblem? problem))
            {
                losses.Add(Diagnostic.Create(Remark.StereoLost, [], "the molecule (" + problem.Code + ")"));
                return text;
            }

            if (!Correct(back, losses))
            {
                break;
            }
        }

        return text;
    }

    // Returns whether a mark was changed, so that another look is worth while.
    private bool Correct(Molecule back, List<Diagnostic> losses)
    {
        bool changed = false;
        Dictionary<(int, int), StereoElement> found = [];
        foreach (StereoElement element in back.StereoSpan)
        {
            found[Place(element)] = element;
        }

        for (int i = 0; i < choice.Length; i++)
        {
            StereoElement wanted = molecule.StereoSpan[i];
            if (wanted.Kind is not (StereoKind.Tetrahedral or StereoKind.Allene or StereoKind.CisTrans))
            {
                continue;
            }

            bool present = found.Remove(Place(wanted), out StereoElement? actual) && actual!.Kind == wanted.Kind;
            bool good = present && StereoComparison.IsSame(molecule, wanted, actual!);
            if (!good)
            {
                losses.Add(Lost(wanted));
                changed |= wanted.Kind != StereoKind.CisTrans && (present ? Turn(i) : Next(i));
            }
        }

        foreach (StereoElement extra in found.Values)
        {
            if (extra.Kind == StereoKind.CisTrans && MarkEither(extra))
            {
                changed = true;
            }
            else
            {
                losses.Add(Lost(extra));
            }
        }

        return changed;
    }

    private static (int, int) Place(StereoElement element) =>
        (Math.Min(element.Focus, element.FocusEnd), Math.Max(element.Focus, element.FocusEnd));

    private static Diagnostic Lost(StereoElement element) => Diagnostic.Create(
        Remark.StereoLost, element.Focus == element.FocusEnd ? [element.Focus] : [element.Focus, element.FocusEnd],
        element.Focus == element.FocusEnd
            ? string.Create(CultureInfo.InvariantCulture, $"atom {element.Focus}")
            : string.Create(CultureInfo.InvariantCulture, $"the double bond of atoms {element.Focus} and {element.FocusEnd}"));

    private bool MarkEither(StereoElement element)
    {
        // The middle bond of a cumulene, or the double bond itself.
        foreach (Neighbor neighbor in molecule.NeighborsOf(element.Focus))
        {
            if (molecule.BondSpan[neighbor.Bond].Order == BondOrder.Double && marks[neighbor.Bond] == BondMark.None
                && (neighbor.Atom == element.FocusEnd || molecule.DegreeOf(neighbor.Atom) == 2))
            {
                marks[neighbor.Bond] = BondMark.Either;
                narrow[neighbor.Bond] = molecule.BondSpan[neighbor.Bond].Begin;
                return true;
            }
        }

        return false;
    }

    private void ShowHydrogen(int atom)
    {
        if (molecule.DegreeOf(atom) == 1 && hydrogenCounts[atom] > 0)
        {
            hydrogenCounts[atom]--;
            shownHydrogens.Add(atom);
        }
    }

    private Point[]? OwnCoordinates()
    {
        if (molecule.CoordinateSpan.IsEmpty)
        {
            return null;
        }

        var points = new Point[molecule.AtomCount + shownHydrogens.Count];
        molecule.CoordinateSpan.CopyTo(points);
        for (int i = 0; i < shownHydrogens.Count; i++)
        {
            points[molecule.AtomCount + i] = StereoLayout.BesideDoubleBond(molecule, shownHydrogens[i], points);
        }

        return points;
    }

    private int BondSum(int atom)
    {
        int sum = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            sum += (int)molecule.BondSpan[neighbor.Bond].Order;
        }

        return sum;
    }
}
