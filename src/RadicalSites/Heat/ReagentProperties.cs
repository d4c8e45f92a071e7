using System.Collections.Generic;

namespace RadicalSites.Heat;

/// <summary>Physical and safety properties of a halogen source for a batch.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
/// <param name="Id">Id of the reagent, for example <c>Br2</c>.</param>
/// <param name="Name">Name of the substance.</param>
/// <param name="Smiles">Structure, from which the molar mass follows.</param>
/// <param name="State">gas, liquid or solid at 25 C.</param>
/// <param name="GramsPerMilliliter">Density at 25 C [g/mL] of a liquid or solid where known.</param>
/// <param name="Gases">Formula of each gas formed, one mole per mole of C-H replaced; may be empty.</param>
/// <param name="ExposureLimit">Published exposure limits in words; local limits win.</param>
/// <param name="Source">Key in the bibliography.</param>
/// <param name="Locator">Entry in the source.</param>
/// <param name="Caution">Usual cautions.</param>
public sealed record ReagentProperties(
    string Id, string Name, string Smiles, string State, double? GramsPerMilliliter, IReadOnlyList<string> Gases,
    string ExposureLimit, string Source, string Locator, string Caution);
