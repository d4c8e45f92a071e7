using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Products;

/// <summary>How an allylic radical divides between its two ends, by a published ratio for the substitution pattern.</summary>
/// <remarks>The patterns stand in <c>radical_ends.csv</c>; everything else is left open.</remarks>
/// <param name="DirectPart">Part at the carbon that lost the hydrogen, 0 to 1.</param>
/// <param name="HalfWidth">Half width of the 90 % interval of the part.</param>
/// <param name="Analogue">The substrate measured.</param>
/// <param name="Source">Key in the bibliography.</param>
internal sealed record EndSplit(double DirectPart, double HalfWidth, string Analogue, string Source)
{
    private const double NinetyPercent = 1.645;

    private static readonly Lazy<List<Row>> Rows = new(static () => Read(CsvTable.EmbeddedText("radical_ends.csv")));

    /// <summary>A split for two different ends, or <see langword="null"/> when none was published.</summary>
    internal static EndSplit? Find(Molecule molecule, Site site, int otherEnd, int ends, int halogen)
    {
        int direct = site.Carbons[0];
        if (ends != 2 || site.Conjugation.Count != 1 || site.Conjugation[0].Kind != ConjugationKind.Allylic)
        {
            return null;
        }

        int middle = site.Conjugation[0].Atom;
        if (molecule.AtomSpan[middle].HydrogenCount != 1 || !IsPlain(molecule, direct, middle)
            || !IsPlain(molecule, otherEnd, middle))
        {
            return null;
        }

        // Carbon neighbours of the ends besides the middle one.
        int directDegree = molecule.DegreeOf(direct) - 1;
        int otherDegree = molecule.DegreeOf(otherEnd) - 1;
        foreach (Row row in Rows.Value)
        {
            if (row.Halogen != halogen)
            {
                continue;
            }

            if ((directDegree, otherDegree) == (row.More, row.Less))
            {
                return new EndSplit(row.Part, NinetyPercent * row.Sigma, row.Analogue, row.Source);
            }

            if ((otherDegree, directDegree) == (row.More, row.Less))
            {
                return new EndSplit(1 - row.Part, NinetyPercent * row.Sigma, row.Analogue, row.Source);
            }
        }

        return null;
    }

    private static List<Row> Read(string text)
    {
        string[] columns =
        [
            "id", "halogen", "more_substituted", "less_substituted", "part", "sigma", "analogue", "source", "locator",
            "checked", "note",
        ];
        var rows = new List<Row>();
        foreach (CsvRow row in CsvTable.Read("radical_ends.csv", text, columns, []).Rows)
        {
            rows.Add(new Row(
                Elements.Find(row.Required("halogen")), row.Integer("more_substituted", 0, 2),
                row.Integer("less_substituted", 0, 2), row.Number("part", 0, 1), row.Number("sigma", 0.001, 1),
                row.Required("analogue"), row.Required("source")));
        }

        return rows;
    }

    // An acyclic end with saturated carbon ligands only.
    private static bool IsPlain(Molecule molecule, int end, int middle)
    {
        if (molecule.AtomSpan[end].IsInRing)
        {
            return false;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(end))
        {
            if (neighbor.Atom == middle)
            {
                continue;
            }

            if (molecule.AtomSpan[neighbor.Atom].AtomicNumber != 6)
            {
                return false;
            }

            foreach (Neighbor second in molecule.NeighborsOf(neighbor.Atom))
            {
                if (molecule.BondSpan[second.Bond].Order != BondOrder.Single)
                {
                    return false;
                }
            }
        }

        return true;
    }

    private sealed record Row(
        int Halogen, int More, int Less, double Part, double Sigma, string Analogue, string Source);
}
