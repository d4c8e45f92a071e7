using System;
using System.Collections.Generic;
using System.Linq;
using MathNet.Numerics.LinearAlgebra;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

/// <summary>Fits the increment model to the C-H table by weighted least squares.</summary>
/// <remarks>
/// <para>Value = base of the degree + ring or bridgehead term + group effects. Of several groups the strongest acts in
/// full, the second at 0.4, further ones at 0.2 (saturation); which is the strongest follows from the fit itself,
/// which is repeated until the order no longer changes.</para>
/// <para>Effects of atoms with lone pairs and of sulfur groups shrink with the degree of the carbon (factors 1, 0.8, 0.6,
/// 0.5), those of pi groups do not. Rows weigh 1 / (sigma^2 + 5^2).</para>
/// Stateless and safe for use by many threads.
/// </remarks>
public static class IncrementRegression
{
    private const double ModelSigma = 5;
    private const double SecondGroup = 0.4;
    private const double FurtherGroup = 0.2;
    private const double Ridge = 1e-6;
    private const int MostRounds = 20;
    private static readonly double[] DegreeScale = [1, 0.8, 0.6, 0.5];

    /// <summary>Fits the model to the preferred rows of a table.</summary>
    /// <param name="table">The table; the shipped one when not given.</param>
    /// <returns>Coefficients and rows.</returns>
    public static IncrementFit Fit(BdeTable? table = null)
    {
        Sample[] samples = [.. (table ?? BdeTable.Default).Entries.Where(static entry => entry.IsPreferred).Select(Describe).OfType<Sample>()];
        string[] names = [.. samples.SelectMany(static sample => sample.Terms.Select(static term => term.Name)).Distinct().Order(StringComparer.Ordinal)];
        Vector<double> coefficients = Solve(samples, names, out double[,] weights, out Matrix<double> inverse);
        double variance = Variance(samples, weights, coefficients, names.Length);
        var list = new IncrementCoefficient[names.Length];
        for (int j = 0; j < names.Length; j++)
        {
            int column = j;
            int rows = Enumerable.Range(0, samples.Length).Count(i => weights[i, column] != 0);
            list[j] = new IncrementCoefficient(names[j], coefficients[j], Math.Sqrt(variance * inverse[j, j]), rows);
        }

        var results = new IncrementRow[samples.Length];
        for (int i = 0; i < samples.Length; i++)
        {
            results[i] = new IncrementRow(
                samples[i].Entry, samples[i].IsHydrocarbon, Value(weights, i, coefficients), LeftOut(samples, names, i, list));
        }

        return new IncrementFit(list, results);
    }

    private static double? LeftOut(Sample[] samples, string[] names, int left, IncrementCoefficient[] all)
    {
        foreach ((string name, _) in samples[left].Terms)
        {
            if (all[Array.IndexOf(names, name)].RowCount < 2)
            {
                return null;
            }
        }

        Sample[] others = [.. samples.Where((_, index) => index != left)];
        Vector<double> coefficients = Solve(others, names, out _, out _);
        double[,] own = Design([samples[left]], names, coefficients);
        return Value(own, 0, coefficients);
    }

    private static Vector<double> Solve(Sample[] samples, string[] names, out double[,] weights, out Matrix<double> inverse)
    {
        Vector<double> coefficients = Vector<double>.Build.Dense(names.Length);
        weights = Design(samples, names, coefficients);
        inverse = Matrix<double>.Build.Dense(1, 1);
        for (int round = 0; round < MostRounds; round++)
        {
            Matrix<double> design = Matrix<double>.Build.DenseOfArray(weights);
            Vector<double> rowWeights = Vector<double>.Build.Dense(
                samples.Length, i => 1 / (Square(samples[i].Entry.SigmaKilojoulesPerMole) + Square(ModelSigma)));
            Vector<double> values = Vector<double>.Build.Dense(samples.Length, i => samples[i].Entry.KilojoulesPerMole);
            Matrix<double> weighted = design.Transpose() * Matrix<double>.Build.DenseOfDiagonalVector(rowWeights);
            inverse = ((weighted * design) + (Ridge * Matrix<double>.Build.DenseIdentity(names.Length))).Inverse();
            coefficients = inverse * (weighted * values);
            double[,] next = Design(samples, names, coefficients);
            bool settled = weights.Cast<double>().SequenceEqual(next.Cast<double>());
            weights = next;
            if (settled)
            {
                break;
            }
        }

        return coefficients;
    }

    private static double Variance(Sample[] samples, double[,] weights, Vector<double> coefficients, int parameters)
    {
        double sum = 0;
        for (int i = 0; i < samples.Length; i++)
        {
            double residual = Value(weights, i, coefficients) - samples[i].Entry.KilojoulesPerMole;
            sum += residual * residual / (Square(samples[i].Entry.SigmaKilojoulesPerMole) + Square(ModelSigma));
        }

        return sum / Math.Max(1, samples.Length - parameters);
    }

    // Row i, column j: how much of coefficient j acts in sample i.
    private static double[,] Design(Sample[] samples, string[] names, Vector<double> coefficients)
    {
        var design = new double[samples.Length, names.Length];
        for (int i = 0; i < samples.Length; i++)
        {
            var groups = new List<(int Column, double Scale, double Effect)>();
            foreach ((string name, double scale) in samples[i].Terms)
            {
                int column = Array.IndexOf(names, name);
                if (name.StartsWith("group:", StringComparison.Ordinal))
                {
                    groups.Add((column, scale, Math.Abs(scale * coefficients[column])));
                }
                else
                {
                    design[i, column] += scale;
                }
            }

            groups.Sort(static (left, right) => right.Effect != left.Effect ? right.Effect.CompareTo(left.Effect) : left.Column.CompareTo(right.Column));
            for (int rank = 0; rank < groups.Count; rank++)
            {
                design[i, groups[rank].Column] += groups[rank].Scale * (rank == 0 ? 1 : rank == 1 ? SecondGroup : FurtherGroup);
            }
        }

        return design;
    }

    private static double Value(double[,] design, int row, Vector<double> coefficients)
    {
        double sum = 0;
        for (int j = 0; j < coefficients.Count; j++)
        {
            sum += design[row, j] * coefficients[j];
        }

        return sum;
    }

    private static double Square(double value) => value * value;

    private static Sample? Describe(BdeEntry entry)
    {
        SiteAnalysis analysis = SiteFinder.Find(entry.Molecule);
        Site? site = analysis.SiteOf(entry.Carbon);
        if (site is null)
        {
            return null;
        }

        var terms = new List<(string Name, double Scale)> { ("base:" + site.Degree, 1) };
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            terms.Add(("group:" + neighbor.Kind, 1));
        }

        foreach (AlphaGroup group in site.AlphaGroups)
        {
            bool fades = group.Kind is not (AlphaGroupKind.Aldehyde or AlphaGroupKind.Ketone or AlphaGroupKind.CarboxylicAcid
                or AlphaGroupKind.Ester or AlphaGroupKind.Amide or AlphaGroupKind.Nitrile or AlphaGroupKind.Trifluoromethyl);
            terms.Add(("group:" + group.Kind, fades ? DegreeScale[(int)site.Degree] : 1));
        }

        if (site.IsBridgehead && site.Degree == SiteDegree.Tertiary)
        {
            terms.Add((site.RingSize <= 5 ? "bridgehead:5" : "bridgehead:6", 1));
        }
        else if (site.RingSize is <= 4 || (site.RingSize == 5 && site.Conjugation.Count + site.AlphaGroups.Count == 0))
        {
            terms.Add(("ring:" + site.RingSize.Value.ToString(System.Globalization.CultureInfo.InvariantCulture), 1));
        }

        return new Sample(entry, IsHydrocarbon(entry.Molecule), terms);
    }

    private static bool IsHydrocarbon(Molecule molecule)
    {
        foreach (Atom atom in molecule.AtomSpan)
        {
            if (atom.AtomicNumber is not (1 or 6))
            {
                return false;
            }
        }

        return true;
    }

    private sealed record Sample(BdeEntry Entry, bool IsHydrocarbon, List<(string Name, double Scale)> Terms);
}
