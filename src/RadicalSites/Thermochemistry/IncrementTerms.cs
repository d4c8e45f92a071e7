using System;
using System.Collections.Generic;
using System.Globalization;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

/// <summary>Which increments act on a carbon, and how often: the row of the design matrix of the fit.</summary>
/// <remarks>
/// The base counts all substituents other than hydrogen, not carbon alone: a hydroxyl in place of a methyl then acts
/// nearly alike on every carbon, so that one increment serves all degrees. A group acts in full the first time; each
/// repeat has a term of its own (saturation), and unlike groups on one carbon share a further term for each pair.
/// </remarks>
internal static class IncrementTerms
{
    internal static Dictionary<string, double> Of(Molecule molecule, Site site)
    {
        var terms = new Dictionary<string, double>(StringComparer.Ordinal)
        {
            ["base-" + Substituents(molecule, site.Carbons[0]).ToString(CultureInfo.InvariantCulture)] = 1,
        };
        var counts = new SortedDictionary<string, int>(StringComparer.Ordinal);
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            Count(counts, FamilyOf(neighbor.Kind));
            if (neighbor.Kind == ConjugationKind.Allylic && site.RingSize is null && IsExtended(molecule, neighbor))
            {
                terms["extended-alkenyl"] = terms.GetValueOrDefault("extended-alkenyl") + 1;
            }
        }

        foreach (AlphaGroup group in site.AlphaGroups)
        {
            Count(counts, FamilyOf(group.Kind));
        }

        Groups(counts, terms);
        Ring(molecule, site, counts, terms);
        Cyclopropyl(molecule, site, terms);
        return terms;
    }

    private static void Groups(SortedDictionary<string, int> counts, Dictionary<string, double> terms)
    {
        int stabilising = 0;
        foreach ((string family, int count) in counts)
        {
            terms["group-" + family] = 1;
            stabilising += IsNearlyAdditive(family) ? 0 : 1;
            if (count > 1)
            {
                terms["repeat-" + family] = count - 1;
            }
        }

        if (stabilising > 1)
        {
            terms["unlike-pair"] = stabilising * (stabilising - 1) / 2;
        }
    }

    private static void Ring(
        Molecule molecule, Site site, SortedDictionary<string, int> counts, Dictionary<string, double> terms)
    {
        if (site.RingSize is not { } size || size > 12)
        {
            return;
        }

        if (site.IsBridgehead && site.Degree == SiteDegree.Tertiary)
        {
            terms[size <= 5 ? "bridgehead-5" : size == 6 ? "bridgehead-6" : "bridgehead-7"] = 1;
        }
        else if (size <= 4)
        {
            terms[size == 3 ? "ring-3" : "ring-4"] = 1;
            if (site.Conjugation.Count > 0)
            {
                terms["strained-alkenyl"] = 1;
            }
        }
        else if (site.Conjugation.Count > 1)
        {
            // Two pi groups held in the plane of the radical help it; an alkenyl closed to the cyclopentadienyl radical does not.
            terms[size == 5 && counts.ContainsKey("alkenyl") ? "cyclopentadienyl" : "planar-pair"] = 1;
        }
        else if (site.Conjugation.Count == 1)
        {
            terms["planar-ring"] = 1;
        }
        else if (counts.Count == 0)
        {
            // Bridged rings cannot relieve strain on the way to the radical: they behave like the chair of cyclohexane.
            terms[BridgeheadNeighbors(molecule, site) switch
            {
                2 => "one-atom-bridge",
                1 => "stiff-ring",
                _ => size == 6 ? "stiff-ring" : size == 5 ? "ring-5" : "ring-7",
            }] = 1;
        }
    }

    // Beside one bridgehead the ring is held stiff; between two (a one-atom bridge) the radical is strained further.
    private static int BridgeheadNeighbors(Molecule molecule, Site site)
    {
        RingAnalysis rings = RingAnalysis.Perceive(molecule);
        int count = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(site.Carbons[0]))
        {
            count += rings.IsBridgehead(neighbor.Atom) ? 1 : 0;
        }

        return count;
    }

    // A radical beside a cyclopropane ring shares its bent bonds.
    private static void Cyclopropyl(Molecule molecule, Site site, Dictionary<string, double> terms)
    {
        if (site.RingSize == 3)
        {
            return;
        }

        RingAnalysis rings = RingAnalysis.Perceive(molecule);
        foreach (Neighbor neighbor in molecule.NeighborsOf(site.Carbons[0]))
        {
            if (molecule.AtomSpan[neighbor.Atom] is { AtomicNumber: 6, IsInRing: true } && rings.SmallestRingSize(neighbor.Atom) == 3)
            {
                terms["cyclopropyl"] = 1;
            }
        }
    }

    private static bool IsExtended(Molecule molecule, ConjugatedNeighbor alkenyl)
    {
        int end = alkenyl.PiAtoms[1];
        foreach (Neighbor neighbor in molecule.NeighborsOf(end))
        {
            if (neighbor.Atom != alkenyl.PiAtoms[0] && HasPiBond(molecule, neighbor.Atom))
            {
                return true;
            }
        }

        return false;
    }

    private static bool HasPiBond(Molecule molecule, int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order is BondOrder.Double or BondOrder.Triple)
            {
                return true;
            }
        }

        return false;
    }

    // Halogens and trifluoromethyl hardly compete with other groups for the radical.
    private static bool IsNearlyAdditive(string family) =>
        family is "fluorine" or "chlorine" or "bromine" or "iodine" or "trifluoromethyl";

    private static int Substituents(Molecule molecule, int carbon)
    {
        int count = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            count += molecule.AtomSpan[neighbor.Atom].AtomicNumber == 1 ? 0 : 1;
        }

        return count;
    }

    private static void Count(SortedDictionary<string, int> counts, string family) =>
        counts[family] = counts.GetValueOrDefault(family) + 1;

    private static string FamilyOf(ConjugationKind kind) => kind switch
    {
        ConjugationKind.Benzylic or ConjugationKind.HeteroBenzylic => "aryl",
        ConjugationKind.Allylic => "alkenyl",
        _ => "alkynyl",
    };

    private static string FamilyOf(AlphaGroupKind kind) => kind switch
    {
        AlphaGroupKind.Hydroxyl or AlphaGroupKind.Ether => "oxygen",
        AlphaGroupKind.EsterOxygen => "acyloxy",
        AlphaGroupKind.Aldehyde or AlphaGroupKind.Ketone => "acyl",
        AlphaGroupKind.CarboxylicAcid or AlphaGroupKind.Ester or AlphaGroupKind.Amide or AlphaGroupKind.AcylHalide => "carboxyl",
        _ => kind.ToString().ToLowerInvariant(),
    };
}
