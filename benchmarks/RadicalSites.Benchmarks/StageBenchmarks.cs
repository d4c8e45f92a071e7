using System;
using System.Buffers;
using System.Collections.Generic;
using System.Text.Json;
using BenchmarkDotNet.Attributes;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Interference;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using RadicalSites.Products;
using RadicalSites.Quantities;
using RadicalSites.Reporting;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Symmetry;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Benchmarks;

/// <summary>Each stage of the pipeline by itself, over the named molecules.</summary>
[MemoryDiagnoser(displayGenColumns: false)]
public class StageBenchmarks
{
    private readonly ReactionConditions conditions =
        new(ReagentCatalogue.Get("Cl2"), Temperature.FromCelsius(25));

    private readonly ArrayBufferWriter<byte> buffer = new(1 << 20);
    private string smiles = "";
    private string kekule = "";
    private Molecule molecule = null!;
    private SiteAnalysis analysis = null!;
    private BdeAssigner assigner = null!;
    private IReadOnlyList<BdeAssignment> bdes = [];
    private SelectivityModel model = null!;
    private HalogenationPredictor predictor = null!;
    private Prediction prediction = null!;

    /// <summary>Name of the molecule.</summary>
    [ParamsSource(nameof(Names))]
    public string Name { get; set; } = "";

    /// <summary>Names of all molecules.</summary>
    public static IEnumerable<string> Names => NamedMolecules.All.Keys;

    /// <summary>Prepares what the stages start from.</summary>
    [GlobalSetup]
    public void Prepare()
    {
        smiles = NamedMolecules.All[Name];
        molecule = SmilesReader.Parse(smiles);
        kekule = smiles.ToUpperInvariant();
        analysis = SiteFinder.Find(molecule);
        assigner = new BdeAssigner(BdeTable.Default);
        bdes = assigner.Assign(analysis);
        model = new SelectivityModel(conditions);
        predictor = new HalogenationPredictor(conditions);
        prediction = predictor.Predict(molecule);
    }

    /// <summary>SMILES to molecule: hydrogens, Kekule form, rings, aromaticity.</summary>
    [Benchmark]
    public Molecule Parse() => SmilesReader.Parse(smiles);

    /// <summary>The same text with capital letters only, so that no Kekule form is searched: the difference is its cost.</summary>
    [Benchmark]
    public bool ParseWithoutKekule() => SmilesReader.TryParse(kekule, out _, out _);

    /// <summary>Rings.</summary>
    [Benchmark]
    public RingAnalysis Rings() => RingAnalysis.Perceive(molecule);

    /// <summary>Equivalence at three levels and topicity.</summary>
    [Benchmark]
    public SymmetryAnalysis EquivalenceAndTopicity() => SymmetryAnalysis.Perceive(molecule);

    /// <summary>Sites with their classes, equivalence included.</summary>
    [Benchmark]
    public SiteAnalysis Sites() => SiteFinder.Find(molecule);

    /// <summary>Bond enthalpies of sites already found.</summary>
    [Benchmark]
    public IReadOnlyList<BdeAssignment> BondEnthalpies() => assigner.Assign(analysis);

    /// <summary>Rates and shares.</summary>
    [Benchmark]
    public SelectivityResult Selectivity() => model.Evaluate(analysis, bdes);

    /// <summary>Products with canonical SMILES.</summary>
    [Benchmark]
    public ProductSet Products() => ProductEnumerator.Enumerate(analysis, 17);

    /// <summary>Groups that interfere.</summary>
    [Benchmark]
    public IReadOnlyList<InterferenceHit> Interference() => InterferenceFinder.Find(molecule, HalogenSources.All);

    /// <summary>Canonical isomeric SMILES.</summary>
    [Benchmark]
    public string Canonical() => CanonicalSmiles.Write(molecule);

    /// <summary>JSON of a prediction.</summary>
    [Benchmark]
    public int Json()
    {
        buffer.ResetWrittenCount();
        using var writer = new Utf8JsonWriter(buffer, JsonReport.WriterOptions());
        JsonReport.Write(writer, new RecordSource(1, smiles, null), prediction);
        writer.Flush();
        return buffer.WrittenCount;
    }

    /// <summary>The whole way from text to prediction.</summary>
    [Benchmark]
    public Prediction Whole() => predictor.Predict(SmilesReader.Parse(smiles));
}
