using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using BenchmarkDotNet.Attributes;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Benchmarks;

/// <summary>The stages over the 4,999 SMILES of the NCI file; times and bytes are for one molecule.</summary>
[MemoryDiagnoser(displayGenColumns: false)]
public class NciBenchmarks
{
    private const int Records = 4999;
    private string[] lines = [];
    private Molecule[] molecules = [];
    private HalogenationPredictor predictor = null!;

    /// <summary>Lines of the file.</summary>
    public static string[] ReadLines() =>
        [.. File.ReadLines(Path.Combine(AppContext.BaseDirectory, "nci_first_5k.smi"))
            .Select(static line => line.Split('\t', ' ')[0])];

    /// <summary>Reads the file.</summary>
    [GlobalSetup]
    public void Prepare()
    {
        lines = ReadLines();
        var read = new List<Molecule>();
        foreach (string line in lines)
        {
            if (SmilesReader.TryParse(line, out Molecule? molecule, out _))
            {
                read.Add(molecule);
            }
        }

        molecules = [.. read];
        predictor = new HalogenationPredictor(
            new ReactionConditions(ReagentCatalogue.Get("Cl2"), Temperature.FromCelsius(25)));
    }

    /// <summary>SMILES to molecule.</summary>
    [Benchmark(OperationsPerInvoke = Records)]
    public int Parse()
    {
        int read = 0;
        foreach (string line in lines)
        {
            read += SmilesReader.TryParse(line, out _, out _) ? 1 : 0;
        }

        return read;
    }

    /// <summary>Equivalence and topicity of all atoms.</summary>
    [Benchmark(OperationsPerInvoke = Records)]
    public long Equivalence() => Sum(static molecule => SymmetryAnalysis.Perceive(molecule).OrbitCount(EquivalenceLevel.Constitutional));

    /// <summary>Sites with their classes.</summary>
    [Benchmark(OperationsPerInvoke = Records)]
    public long Sites() => Sum(static molecule => SiteFinder.Find(molecule).Sites.Count);

    /// <summary>Canonical isomeric SMILES.</summary>
    [Benchmark(OperationsPerInvoke = Records)]
    public long Canonical() => Sum(static molecule => CanonicalSmiles.Write(molecule).Length);

    /// <summary>Prediction with products.</summary>
    [Benchmark(OperationsPerInvoke = Records)]
    public long Predict() => Sum(molecule => predictor.Predict(molecule).Products.Count);

    private long Sum(Func<Molecule, long> work)
    {
        long sum = 0;
        foreach (Molecule molecule in molecules)
        {
            sum += work(molecule);
        }

        return sum;
    }
}
