using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

/// <summary>Gives each site its bond dissociation enthalpy: the very bond, else its class, else class and increments, else none.</summary>
/// <remarks>
/// <para>Increments: the group that weakens or strengthens the bond most acts in full, the second at half, each further
/// one at a quarter of its own effect (saturation of radical stabilisation), on the base of the degree and ring.</para>
/// <para>Ring terms of three- and four-membered rings add in full, also beside a group; those of larger rings only to
/// plain carbons, since delocalised radicals are planar anyway.</para>
/// Immutable and safe for use by many threads.
/// </remarks>
public sealed partial class BdeAssigner
{
    private readonly BdeTable table;

    /// <summary>Makes an assigner over a table.</summary>
    /// <param name="table">The table; the shipped one when not given.</param>
    public BdeAssigner(BdeTable? table = null) => this.table = table ?? BdeTable.Default;

    /// <summary>The table used.</summary>
    public BdeTable Table => table;

    /// <summary>Assigns all sites of a molecule.</summary>
    /// <param name="analysis">The molecule with its sites.</param>
    /// <returns>One assignment for each site, in the order of the sites.</returns>
    public IReadOnlyList<BdeAssignment> Assign(SiteAnalysis analysis)
    {
        ArgumentNullException.ThrowIfNull(analysis);
        if (analysis.Sites.Count == 0)
        {
            return [];
        }

        BdeMatch? match = table.Matcher.Match(analysis.Molecule);
        var assignments = new BdeAssignment[analysis.Sites.Count];
        for (int i = 0; i < assignments.Length; i++)
        {
            Site site = analysis.Sites[i];
            IReadOnlyList<BdeEntry> exact = match?.Entries(analysis.Symmetry!, site) ?? [];
            assignments[i] = exact.Count > 0 ? FromEntries(site, exact) : FromClasses(analysis.Molecule, site);
        }

        return assignments;
    }

    private static BdeAssignment FromEntries(Site site, IReadOnlyList<BdeEntry> entries)
    {
        var evidence = new BdeEvidence[entries.Count];
        for (int i = 0; i < evidence.Length; i++)
        {
            BdeEntry entry = entries[i];
            evidence[i] = new BdeEvidence(
                entry.Id, entry.KilojoulesPerMole, i == 0 ? "this bond" : "second reading", entry.Source, entry.Locator);
        }

        return new BdeAssignment
        {
            SiteNumber = site.Number,
            KilojoulesPerMole = entries[0].KilojoulesPerMole,
            SigmaKilojoulesPerMole = entries[0].SigmaKilojoulesPerMole,
            Basis = BdeBasis.Measured,
            Evidence = evidence,
        };
    }

    private static BdeAssignment None(Site site, string reason) => new()
    {
        SiteNumber = site.Number,
        KilojoulesPerMole = null,
        SigmaKilojoulesPerMole = null,
        Basis = BdeBasis.None,
        Evidence = [],
        Reason = reason,
    };

    private static BdeEvidence Evidence(BdeClassEntry entry, double value, string role) =>
        new(entry.Id, value, entry.IsAnalogy ? role + ", analogy" : role, entry.Source, entry.Locator);

    // Outside what the classes were made for: ions beside the carbon, metals, boron, phosphorus, isotopic mixtures aside.
    internal static string? OutsideValidity(Molecule molecule, Site site)
    {
        if (site.FormalCharge != 0)
        {
            return "the carbon is charged";
        }

        foreach (AlphaGroup group in site.AlphaGroups)
        {
            switch (group.Kind)
            {
                case AlphaGroupKind.Ammonium:
                    return "it stands beside an ammonium nitrogen";
                case AlphaGroupKind.Carboxylate:
                    return "it stands beside a carboxylate";
                case AlphaGroupKind.Metal:
                    return "it stands beside a metal atom";
                case AlphaGroupKind.Boron:
                    return "it stands beside boron";
                case AlphaGroupKind.Phosphorus:
                    return "it stands beside phosphorus";
                case AlphaGroupKind.OtherNitrogen or AlphaGroupKind.OtherChalcogen or AlphaGroupKind.PeroxideOxygen
                    or AlphaGroupKind.OtherUnsaturatedCarbon or AlphaGroupKind.Other:
                    return "it stands beside a group without published values";
                default:
                    int charge = molecule.AtomSpan[group.Atom].FormalCharge;
                    if (charge != 0 && group.Kind is not (AlphaGroupKind.Nitro or AlphaGroupKind.Sulfoxide or AlphaGroupKind.Sulfonyl))
                    {
                        return "it stands beside a charged atom";
                    }

                    break;
            }
        }

        return null;
    }
}
