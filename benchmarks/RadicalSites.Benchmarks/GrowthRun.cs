using System;
using System.Collections.Generic;
using System.Diagnostics;
using System.Globalization;
using System.Linq;
using System.Threading.Tasks;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Sites;

namespace RadicalSites.Benchmarks;

/// <summary>
/// How time grows: with the size of a molecule as the exponent b of time = a * atoms^b, with the number of records, and
/// with threads. Prints Markdown.
/// </summary>
internal static class GrowthRun
{
    private static readonly HalogenationPredictor Predictor = new(
        new ReactionConditions(ReagentCatalogue.Get("Cl2"), Temperature.FromCelsius(25)));

    internal static void Run(int mostRecords)
    {
        // Everything compiled at its best before the first figure.
        Run(NciBenchmarks.ReadLines(), 50_000);
        Size();
        Records(mostRecords);
        Threads();
    }

    private static void Size()
    {
        (string Name, Func<int, string> Make, int[] Sizes)[] families =
        [
            ("chain", static n => new string('C', n), [50, 100, 200, 400, 800, 1600]),
            ("ring", static n => "C1" + new string('C', n - 2) + "C1", [50, 100, 200, 400, 800, 1600]),
            ("peptide", static n => NamedMolecules.Repeat("N[C@@H](Cc1ccccc1)C(=O)NCC(=O)", n) + "O", [2, 4, 8, 16, 32]),
            ("fused drug-like units", static n => NamedMolecules.Repeat("CC(C)Cc1ccc(cc1)C(C)C(=O)N", n) + "C", [2, 4, 8, 16, 32]),
            ("dendrimer", NamedMolecules.Dendrimer, [3, 4, 5, 6, 7, 8]),
        ];
        (string Name, Action<string, Molecule> Work)[] stages =
        [
            ("parse", static (text, _) => SmilesReader.Parse(text)),
            ("sites", static (_, molecule) => SiteFinder.Find(molecule)),
            ("canonical SMILES", static (_, molecule) => CanonicalSmiles.Write(molecule)),
        ];
        Console.WriteLine("## Growth with the size of the molecule\n");
        Console.WriteLine("Time fitted as a * atoms^b over the sizes named; microseconds for the largest.\n");
        Console.WriteLine("| family | atoms | stage | exponent b | largest |");
        Console.WriteLine("|---|---|---|---:|---:|");
        foreach ((string family, Func<int, string> make, int[] sizes) in families)
        {
            foreach ((string stage, Action<string, Molecule> work) in stages)
            {
                var points = new List<(double X, double Y)>();
                foreach (int size in sizes)
                {
                    string text = make(size);
                    Molecule molecule = SmilesReader.Parse(text);
                    points.Add((Math.Log(molecule.AtomCount), Math.Log(Best(() => work(text, molecule)))));
                }

                Console.WriteLine(string.Create(
                    CultureInfo.InvariantCulture,
                    $"| {family} | {Math.Exp(points[0].X):F0} to {Math.Exp(points[^1].X):F0} | {stage} | {Slope(points):F2} | {Math.Exp(points[^1].Y):F0} us |"));
            }
        }

        Console.WriteLine();
    }

    private static void Records(int most)
    {
        string[] lines = NciBenchmarks.ReadLines();
        Console.WriteLine("## Cost of a record\n\nNCI file over and over, text to prediction, one thread.\n");
        Console.WriteLine("| records | us for one | memory in use after |");
        Console.WriteLine("|---:|---:|---:|");
        for (int count = 1000; count <= most; count *= 10)
        {
            TimeSpan taken = Run(lines, count);
            Console.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"| {count:N0} | {taken.TotalMicroseconds / count:F1} | {GC.GetTotalMemory(true) / 1048576.0:F1} MiB |"));
        }

        Console.WriteLine();
    }

    private static TimeSpan Run(string[] lines, int count)
    {
        long start = Stopwatch.GetTimestamp();
        for (int i = 0; i < count; i++)
        {
            if (SmilesReader.TryParse(lines[i % lines.Length], out Molecule? molecule, out _))
            {
                Predictor.Predict(molecule);
            }
        }

        return Stopwatch.GetElapsedTime(start);
    }

    private static void Threads()
    {
        string[] lines = NciBenchmarks.ReadLines();
        Console.WriteLine("## Threads\n\nNCI file, text to prediction.\n");
        Console.WriteLine("| threads | us for one | speed-up |");
        Console.WriteLine("|---:|---:|---:|");
        double one = 0;
        for (int threads = 1; threads <= Environment.ProcessorCount; threads *= 2)
        {
            var options = new ParallelOptions { MaxDegreeOfParallelism = threads };
            double best = Best(() => Parallel.ForEach(lines, options, static line =>
            {
                if (SmilesReader.TryParse(line, out Molecule? molecule, out _))
                {
                    Predictor.Predict(molecule);
                }
            })) / lines.Length;
            one = threads == 1 ? best : one;
            Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"| {threads} | {best:F1} | {one / best:F2} |"));
        }
    }

    // Best of several runs [us]; more runs for what is short.
    private static double Best(Action work)
    {
        double best = double.MaxValue;
        long begun = Stopwatch.GetTimestamp();
        for (int i = 0; i < 2000 && (i < 5 || Stopwatch.GetElapsedTime(begun).TotalMilliseconds < 250); i++)
        {
            long start = Stopwatch.GetTimestamp();
            work();
            best = Math.Min(best, Stopwatch.GetElapsedTime(start).TotalMicroseconds);
        }

        return best;
    }

    private static double Slope(List<(double X, double Y)> points)
    {
        double x = points.Average(static point => point.X);
        double y = points.Average(static point => point.Y);
        return points.Sum(point => (point.X - x) * (point.Y - y)) / points.Sum(point => (point.X - x) * (point.X - x));
    }
}
