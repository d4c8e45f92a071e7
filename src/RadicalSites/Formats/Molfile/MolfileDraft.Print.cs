using System;
using System.Collections.Generic;
using System.Globalization;
using System.Text;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <content>Text of the connection tables.</content>
internal sealed partial class MolfileDraft
{
    private readonly StringBuilder text = new();

    private string Print(ReadOnlySpan<Point> points)
    {
        text.Clear();
        bool flat = true;
        bool wide = false;
        foreach (Point point in points)
        {
            flat &= point.Z == 0;
            wide |= Math.Abs(point.X) >= 9999 || Math.Abs(point.Y) >= 9999 || Math.Abs(point.Z) >= 9999;
        }

        int bonds = molecule.BondCount + shownHydrogens.Count;
        foreach (Atom atom in molecule.AtomSpan)
        {
            wide |= atom.AtomClass > 999;
        }

        bool extended = options.Version == MolfileVersion.V3000
            || (options.Version is null && (wide || points.Length > 999 || bonds > 999));
        if (!extended && (wide || points.Length > 999 || bonds > 999))
        {
            throw new ArgumentException("V2000 holds up to 999 atoms and bonds, map numbers up to 999 and coordinates below 9999; ask for V3000.");
        }

        AppendLine(OneLine(options.Name));
        AppendLine(flat ? "  RadicalSites      2D" : "  RadicalSites      3D");
        AppendLine(OneLine(options.Comment));
        if (extended)
        {
            Extended(points, bonds);
        }
        else
        {
            Fixed(points, bonds);
        }

        AppendLine("M  END");
        return text.ToString();
    }

    private void Fixed(ReadOnlySpan<Point> points, int bonds)
    {
        text.Append(CultureInfo.InvariantCulture, $"{points.Length,3}{bonds,3}  0  0  0  0  0  0  0  0999 V2000\n");
        for (int i = 0; i < points.Length; i++)
        {
            Atom? atom = i < molecule.AtomCount ? molecule.AtomSpan[i] : null;
            int charge = atom?.FormalCharge ?? 0;
            int legacy = charge is >= -3 and <= 3 and not 0 ? 4 - charge : 0;
            int valence = atom is null ? 0 : ValenceField(i) switch { -1 => 0, 0 => 15, int stated => stated };
            string symbol = Elements.SymbolOf(atom?.AtomicNumber ?? 1);
            text.Append(
                CultureInfo.InvariantCulture,
                $"{points[i].X,10:F4}{points[i].Y,10:F4}{points[i].Z,10:F4} {symbol,-3} 0{legacy,3}  0  0  0{valence,3}  0  0  0{atom?.AtomClass ?? 0,3}  0  0\n");
        }

        for (int i = 0; i < bonds; i++)
        {
            (int first, int second, int order, byte mark) = BondLine(i);
            int stereo = (order, mark) switch { (1, BondMark.Up) => 1, (1, BondMark.Down) => 6, (2, BondMark.Either) => 3, _ => 0 };
            text.Append(CultureInfo.InvariantCulture, $"{first + 1,3}{second + 1,3}{order,3}{stereo,3}\n");
        }

        Pairs("CHG", static atom => atom.FormalCharge);
        Pairs("RAD", static atom => RadicalCode(atom));
        Pairs("ISO", static atom => atom.MassNumber);
    }

    private void Pairs(string key, Func<Atom, int> value)
    {
        List<(int Number, int Value)> entries = [];
        for (int i = 0; i < molecule.AtomCount; i++)
        {
            if (value(molecule.AtomSpan[i]) is int number and not 0)
            {
                entries.Add((i + 1, number));
            }
        }

        for (int start = 0; start < entries.Count; start += 8)
        {
            int count = Math.Min(8, entries.Count - start);
            text.Append(CultureInfo.InvariantCulture, $"M  {key}{count,3}");
            foreach ((int number, int entry) in entries.GetRange(start, count))
            {
                text.Append(CultureInfo.InvariantCulture, $" {number,3} {entry,3}");
            }

            text.Append('\n');
        }
    }

    private void Extended(ReadOnlySpan<Point> points, int bonds)
    {
        AppendLine("  0  0  0     0  0            999 V3000");
        AppendLine("M  V30 BEGIN CTAB");
        text.Append(CultureInfo.InvariantCulture, $"M  V30 COUNTS {points.Length} {bonds} 0 0 0\n");
        AppendLine("M  V30 BEGIN ATOM");
        for (int i = 0; i < points.Length; i++)
        {
            Atom? atom = i < molecule.AtomCount ? molecule.AtomSpan[i] : null;
            string symbol = Elements.SymbolOf(atom?.AtomicNumber ?? 1);
            text.Append(
                CultureInfo.InvariantCulture,
                $"M  V30 {i + 1} {symbol} {points[i].X:F4} {points[i].Y:F4} {points[i].Z:F4} {atom?.AtomClass ?? 0}");
            if (atom is { } data)
            {
                Option("CHG", data.FormalCharge);
                Option("RAD", RadicalCode(data));
                Option("MASS", data.MassNumber);
                Option("VAL", ValenceField(i) switch { -1 => 0, 0 => -1, int stated => stated });
            }

            text.Append('\n');
        }

        AppendLine("M  V30 END ATOM");
        if (bonds > 0)
        {
            AppendLine("M  V30 BEGIN BOND");
            for (int i = 0; i < bonds; i++)
            {
                (int first, int second, int order, byte mark) = BondLine(i);
                text.Append(CultureInfo.InvariantCulture, $"M  V30 {i + 1} {order} {first + 1} {second + 1}");
                Option("CFG", (order, mark) switch { (1, BondMark.Up) => 1, (1, BondMark.Down) => 3, (2, BondMark.Either) => 2, _ => 0 });
                text.Append('\n');
            }

            AppendLine("M  V30 END BOND");
        }

        AppendLine("M  V30 END CTAB");
    }

    private void Option(string key, int value)
    {
        if (value != 0)
        {
            text.Append(CultureInfo.InvariantCulture, $" {key}={value}");
        }
    }

    private (int First, int Second, int Order, byte Mark) BondLine(int index)
    {
        if (index >= molecule.BondCount)
        {
            int hydrogen = index - molecule.BondCount;
            return (shownHydrogens[hydrogen], molecule.AtomCount + hydrogen, 1, BondMark.None);
        }

        Bond bond = molecule.BondSpan[index];
        return marks[index] != BondMark.None && narrow[index] == bond.End
            ? (bond.End, bond.Begin, (int)bond.Order, marks[index])
            : (bond.Begin, bond.End, (int)bond.Order, marks[index]);
    }

    private static int RadicalCode(Atom atom) => atom.UnpairedElectrons switch { 1 => 2, 2 => 3, _ => 0 };

    // -1 where the normal valence implies the right hydrogens; the shown hydrogen counts as a bond.
    private int ValenceField(int index)
    {
        Atom atom = molecule.AtomSpan[index];
        int bonds = BondSum(index) + atom.HydrogenCount - hydrogenCounts[index];
        int unpaired = atom.UnpairedElectrons is 1 or 2 ? atom.UnpairedElectrons : 0;
        int implied = ImpliedHydrogens.Of(atom.AtomicNumber, atom.FormalCharge, bonds, unpaired);
        return implied == hydrogenCounts[index] ? -1 : bonds + hydrogenCounts[index];
    }

    private void AppendLine(string line) => text.Append(line).Append('\n');

    private static string OneLine(string value)
    {
        int end = value.AsSpan().IndexOfAny('\n', '\r');
        return end < 0 ? value : value[..end];
    }
}
