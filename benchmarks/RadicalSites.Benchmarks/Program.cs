using System.Globalization;
using BenchmarkDotNet.Running;
using RadicalSites.Benchmarks;

// growth [RECORDS]: exponents of growth, cost of a record up to RECORDS records, threads. Otherwise BenchmarkDotNet.
if (args is ["growth", ..])
{
    GrowthRun.Run(args.Length > 1 ? int.Parse(args[1], CultureInfo.InvariantCulture) : 1_000_000);
    return;
}

BenchmarkSwitcher.FromAssembly(typeof(StageBenchmarks).Assembly).Run(args);
