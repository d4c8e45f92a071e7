using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Heat;

namespace RadicalSites.Heat;

/// <summary>Heat, gas and materials of a batch from reaction enthalpies (Hess) and the properties of the solvent.</summary>
/// <remarks>
/// All halogen charged is taken to react at once in a perfectly insulated vessel, so the rise is what accumulation can
/// do at worst, not what a controlled feed does. Only sensible heat of the liquid counts; boiling and gas are left out.
/// Stateless and safe for use by many threads.
/// </remarks>
public static class HeatBalance
{
    /// <summary>Heat capacity taken for organic matter without its own figure [J/(g K)]: low end of the usual 1.6 to 2.4.</summary>
    public const double OrganicJoulesPerGramKelvin = 1.6;

    private const double LargeRiseKelvin = 50;
    private const double GasConstantBarLiters = 0.0831446;
    private const double DefaultMillilitersPerGram = 5;

    /// <summary>Computes the balance of a batch.</summary>
    /// <param name="substrate">The substrate.</param>
    /// <param name="reagent">The halogen source.</param>
    /// <param name="sites">Enthalpy and share of each site.</param>
    /// <param name="options">The batch.</param>
    /// <returns>The balance with cautions.</returns>
    /// <exception cref="ArgumentException">The substrate has no molar mass, or an option is out of range.</exception>
    public static HeatReport Compute(
        Molecule substrate, ReagentProperties reagent, IReadOnlyList<SiteEnthalpy> sites, HeatOptions options)
    {
        ArgumentNullException.ThrowIfNull(substrate);
        ArgumentNullException.ThrowIfNull(reagent);
        ArgumentNullException.ThrowIfNull(sites);
        ArgumentNullException.ThrowIfNull(options);
        CheckPositive(options.Equivalents, nameof(HeatOptions.Equivalents));
        CheckPositive(options.SolventMilliliters ?? 1, nameof(HeatOptions.SolventMilliliters));
        CheckPositive(options.MixtureJoulesPerGramKelvin ?? 1, nameof(HeatOptions.MixtureJoulesPerGramKelvin));
        double substrateMass = MolarMass(substrate, "substrate");
        double moles = options.Batch.InMoles(substrateMass);
        double reacting = moles * options.Equivalents;
        List<Material> materials = Materials(substrate, substrateMass, moles, reagent, options);
        (double? enthalpy, double? sigma) = Weighted(sites);
        double grams = materials.Sum(static material => material.Grams);
        double heatCapacity = options.MixtureJoulesPerGramKelvin ?? MixtureHeatCapacity(materials, options.Solvent);
        double? heat = -enthalpy * reacting;
        double? rise = heat is null ? null : Math.Max(0, heat.Value) * 1000 / (grams * heatCapacity);
        EvolvedGas[] gases = reagent.Gases
            .Select(formula => new EvolvedGas(formula, reacting, reacting * GasConstantBarLiters * options.Start.Kelvin))
            .ToArray();
        var report = new HeatReport
        {
            Reagent = reagent.Id,
            Sites = sites,
            KilojoulesPerMole = enthalpy,
            SigmaKilojoulesPerMole = sigma,
            MolesReacting = reacting,
            HeatKilojoules = heat,
            MixtureGrams = grams,
            JoulesPerGramKelvin = heatCapacity,
            AdiabaticRiseKelvin = rise,
            EndCelsius = options.Start.Celsius + rise,
            SolventBoilingPointCelsius = options.Solvent?.BoilingPointCelsius,
            Gases = gases,
            Materials = materials.AsReadOnly(),
            Diagnostics = [],
        };
        return report with { Diagnostics = Cautions(report, reagent, options) };
    }

    private static List<Material> Materials(
        Molecule substrate, double substrateMass, double moles, ReagentProperties reagent, HeatOptions options)
    {
        double reagentMass = MolarMass(SmilesReader.Parse(reagent.Smiles), reagent.Id);
        double reagentGrams = moles * options.Equivalents * reagentMass;
        var materials = new List<Material>
        {
            new("substrate", MolecularFormula.Of(substrate).ToString(), moles, moles * substrateMass, null, 1),
            new("halogen source", reagent.Name, moles * options.Equivalents, reagentGrams,
                reagent.State == "liquid" ? reagentGrams / reagent.GramsPerMilliliter : null, options.Equivalents),
        };
        if (options.Solvent is { } solvent)
        {
            double milliliters = options.SolventMilliliters ?? DefaultMillilitersPerGram * moles * substrateMass;
            materials.Add(new Material("solvent", solvent.Name, null, milliliters * solvent.GramsPerMilliliter, milliliters, null));
        }

        return materials;
    }

    private static double MixtureHeatCapacity(List<Material> materials, Solvent? solvent)
    {
        double capacity = 0;
        double grams = 0;
        foreach (Material material in materials)
        {
            // Halogen sources are heavy molecules with small specific heat (bromine 0.47, sulfuryl chloride 1.0): they
            // count with a quarter of the organic figure, so the rise is not underestimated.
            double specific = material.Role switch
            {
                "solvent" => solvent!.JoulesPerGramKelvin,
                "substrate" => OrganicJoulesPerGramKelvin,
                _ => OrganicJoulesPerGramKelvin / 4,
            };
            capacity += material.Grams * specific;
            grams += material.Grams;
        }

        return capacity / grams;
    }

    private static (double? Enthalpy, double? Sigma) Weighted(IReadOnlyList<SiteEnthalpy> sites)
    {
        double share = 0;
        double sum = 0;
        double sigma = 0;
        foreach (SiteEnthalpy site in sites)
        {
            if (site.KilojoulesPerMole is { } enthalpy)
            {
                share += site.Share;
                sum += site.Share * enthalpy;
                sigma += site.Share * (site.SigmaKilojoulesPerMole ?? 0);
            }
        }

        return share > 0 ? (sum / share, sigma / share) : (null, null);
    }

    private static List<Diagnostic> Cautions(HeatReport report, ReagentProperties reagent, HeatOptions options)
    {
        var cautions = new List<Diagnostic>
        {
            Diagnostic.Create(Entry.Reagent, [], reagent.Name, reagent.Caution, reagent.ExposureLimit),
        };
        if (options.Solvent is { } solvent)
        {
            if (report.EndCelsius >= solvent.BoilingPointCelsius)
            {
                cautions.Add(Diagnostic.Create(
                    Entry.PassesBoilingPoint, [], report.EndCelsius.Value, solvent.Name, solvent.BoilingPointCelsius));
            }

            if (solvent.Caution.Length > 0)
            {
                cautions.Add(Diagnostic.Create(Entry.Solvent, [], solvent.Name, solvent.Caution));
            }
        }
        else if (options.MixtureJoulesPerGramKelvin is null)
        {
            cautions.Add(Diagnostic.Create(Entry.Neat, [], OrganicJoulesPerGramKelvin));
        }

        if (report.AdiabaticRiseKelvin >= LargeRiseKelvin)
        {
            cautions.Add(Diagnostic.Create(Entry.LargeRise, [], report.AdiabaticRiseKelvin.Value));
        }

        foreach (EvolvedGas gas in report.Gases)
        {
            cautions.Add(Diagnostic.Create(Entry.Gas, [], gas.Formula, gas.Moles, gas.Liters, options.Start.Celsius));
        }

        int[] missing = report.Sites.Where(static site => site.KilojoulesPerMole is null).Select(static site => site.SiteNumber).ToArray();
        if (missing.Length > 0)
        {
            cautions.Add(Diagnostic.Create(
                Entry.NoEnthalpy, [],
                string.Join(", ", missing.Select(static number => number.ToString(CultureInfo.InvariantCulture)))));
        }

        if (options.Equivalents > 1)
        {
            cautions.Add(Diagnostic.Create(Entry.ExcessHalogen, [], options.Equivalents));
        }

        cautions.Add(Diagnostic.Create(Entry.Induction, []));
        cautions.Add(Diagnostic.Create(Entry.Initiator, []));
        cautions.Add(Diagnostic.Create(Entry.StandingNote, []));
        return cautions;
    }

    private static double MolarMass(Molecule molecule, string what) =>
        MolecularFormula.Of(molecule).GramsPerMole is { } mass and > 0
            ? mass
            : throw new ArgumentException($"The {what} has no molar mass: it is empty or holds an atom without standard atomic weight.");

    private static void CheckPositive(double value, string name)
    {
        if (!double.IsFinite(value) || value <= 0)
        {
            throw new ArgumentOutOfRangeException(name, value, "The value is finite and greater than zero.");
        }
    }
}
