using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Sites;

// The work of the benchmark done with this library. usage: RadicalSites.Peers MODE FILE PASSES
// Prints the best pass [microseconds of processor time per molecule, collection included], a check number, and the bytes allocated for a molecule.
if (args.Length != 3)
{
    Console.Error.WriteLine("usage: RadicalSites.Peers parse|sites|canonical|write|predict FILE PASSES");
    return 2;
}

string[] lines = [.. File.ReadLines(args[1]).Select(static line => line.Split('\t', ' ')[0])];
var predictor = new HalogenationPredictor(
    new ReactionConditions(ReagentCatalogue.Get("Cl2"), Temperature.FromCelsius(25)));
Func<Molecule, long> work = args[0] switch
{
    "parse" => static molecule =>
    {
        long hydrogens = 0;
        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            hydrogens += molecule.Atoms[atom].HydrogenCount;
        }

        return hydrogens;
    },
    "sites" => static molecule => SiteFinder.Find(molecule).Sites.Count,
    "canonical" or "write" => static molecule => CanonicalSmiles.Write(molecule).Length,
    "predict" => molecule => predictor.Predict(molecule).Products.Count,
    _ => throw new ArgumentException("unknown mode: " + args[0]),
};

var read = new List<Molecule>();
if (args[0] == "write")
{
    foreach (string line in lines)
    {
        if (SmilesReader.TryParse(line, out Molecule? molecule, out _))
        {
            read.Add(molecule);
        }
    }
}

double best = double.MaxValue;
long check = 0;
long bytes = 0;
for (int pass = int.Parse(args[2], CultureInfo.InvariantCulture); pass > 0; pass--)
{
    check = 0;
    bytes = GC.GetAllocatedBytesForCurrentThread();
    TimeSpan start = Environment.CpuUsage.TotalTime;
    foreach (Molecule molecule in read)
    {
        check += work(molecule);
    }

    for (int i = 0; i < lines.Length && read.Count == 0; i++)
    {
        if (SmilesReader.TryParse(lines[i], out Molecule? molecule, out _))
        {
            check += work(molecule);
        }
    }

    best = Math.Min(best, (Environment.CpuUsage.TotalTime - start).TotalMicroseconds / lines.Length);
    bytes = GC.GetAllocatedBytesForCurrentThread() - bytes;
}

Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{best:F3} {check} {bytes / lines.Length}"));
return 0;
