using System;
using System.Collections.Generic;
using System.Linq;
using MathNet.Numerics.LinearAlgebra;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

/// <summary>Derives group increments from the rows of a C-H table by weighted least squares.</summary>
/// <remarks>
/// <para>Model: value = base(number of substituents) + sum of group, repeat, pair, ring and bridgehead terms. Weights are
/// 1 / (sigma² + scatter²); the scatter is found by iteration so that the weighted sum of squares equals its degrees of
/// freedom. Leave-one-out errors follow from the leverages, e / (1 - h), which equals refitting without the row.</para>
/// Rows that take part: preferred rows of C(sp3)-H bonds outside ions, metals and boron. Stateless, safe for many threads.
/// </remarks>
public static class IncrementRegression
{
    private const double FullLeverage = 1 - 1e-9;

    /// <summary>Fits the increments.</summary>
    /// <param name="table">A table; the shipped one when not given.</param>
    /// <returns>The fit.</returns>
    /// <exception cref="ArgumentException">The table has fewer rows than terms.</exception>
    public static IncrementFit Fit(BdeTable? table = null)
    {
        Sample[] samples = [.. (table ?? BdeTable.Default).Entries.Where(static entry => entry.IsPreferred).Select(SampleOf).OfType<Sample>()];
        string[] names = [.. samples.SelectMany(static sample => sample.Terms.Keys).Distinct().Order(StringComparer.Ordinal)];
        if (samples.Length <= names.Length)
        {
            throw new ArgumentException("The table has too few C-H rows for a fit of increments.", nameof(table));
        }

        Matrix<double> design = Matrix<double>.Build.Dense(
            samples.Length, names.Length, (row, column) => samples[row].Terms.GetValueOrDefault(names[column]));
        Vector<double> values = Vector<double>.Build.Dense(samples.Length, row => samples[row].Entry.KilojoulesPerMole);
        double scatter = 4;
        Solution solution = Solve(design, values, samples, scatter);
        for (int round = 0; round < 60; round++)
        {
            double target = solution.WeightedSquares / Math.Max(1, samples.Length - solution.Rank);
            scatter = Math.Clamp(scatter * Math.Sqrt(target), 0.5, 30);
            solution = Solve(design, values, samples, scatter);
        }

        return new IncrementFit
        {
            Coefficients =
            [
                .. names.Select((name, i) => new IncrementCoefficient(
                    name, solution.Estimates[i], Math.Sqrt(Math.Max(0, solution.Covariance[i, i])),
                    samples.Count(sample => sample.Terms.ContainsKey(name)))),
            ],
            Covariance = [.. Enumerable.Range(0, names.Length).Select(i => (IReadOnlyList<double>)solution.Covariance.Row(i).ToArray())],
            LeaveOneOut = [.. samples.Select((sample, i) => LeftOut(sample, solution, i))],
            ScatterKilojoulesPerMole = scatter,
        };
    }

    private static LeaveOneOutRow LeftOut(Sample sample, Solution solution, int row)
    {
        double leverage = solution.Leverages[row];
        double? predicted = leverage > FullLeverage
            ? null
            : sample.Entry.KilojoulesPerMole - (solution.Residuals[row] / (1 - leverage));
        return new LeaveOneOutRow(sample.Entry, predicted, sample.IsHydrocarbon);
    }

    // The pseudo-inverse settles terms that always occur together; their sum is what the data fix.
    private static Solution Solve(Matrix<double> design, Vector<double> values, Sample[] samples, double scatter)
    {
        Vector<double> roots = Vector<double>.Build.Dense(
            samples.Length,
            row => 1 / Math.Sqrt((samples[row].Entry.SigmaKilojoulesPerMole * samples[row].Entry.SigmaKilojoulesPerMole) + (scatter * scatter)));
        Matrix<double> weighted = Matrix<double>.Build.DiagonalOfDiagonalVector(roots) * design;
        Matrix<double> inverse = weighted.PseudoInverse();
        Vector<double> target = roots.PointwiseMultiply(values);
        Vector<double> estimates = inverse * target;
        Vector<double> residuals = target - (weighted * estimates);
        Vector<double> leverages = (weighted * inverse).Diagonal();
        return new Solution(
            estimates, inverse * inverse.Transpose(), residuals.PointwiseDivide(roots), leverages,
            residuals * residuals, weighted.Rank());
    }

    private static Sample? SampleOf(BdeEntry entry)
    {
        SiteAnalysis analysis = SiteFinder.Find(entry.Molecule);
        if (analysis.SiteOf(entry.Carbon) is not { } site || BdeAssigner.OutsideValidity(entry.Molecule, site) is not null)
        {
            return null;
        }

        bool hydrocarbon = entry.Molecule.Atoms.All(static atom => atom.AtomicNumber is 1 or 6);
        return new Sample(entry, IncrementTerms.Of(entry.Molecule, site), hydrocarbon);
    }

    private sealed record Sample(BdeEntry Entry, Dictionary<string, double> Terms, bool IsHydrocarbon);

    private sealed record Solution(
        Vector<double> Estimates, Matrix<double> Covariance, Vector<double> Residuals, Vector<double> Leverages,
        double WeightedSquares, int Rank);
}
