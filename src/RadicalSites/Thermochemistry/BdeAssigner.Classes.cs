using System;
using System.Collections.Generic;
using System.Globalization;
using RadicalSites.Molecules;
using RadicalSites.Sites;

namespace RadicalSites.Thermochemistry;

public sealed partial class BdeAssigner
{
    private const double SaturationSecond = 0.5;
    private const double SaturationFurther = 0.25;

    // Standard deviation added where effects of several groups are combined [kJ/mol]: scatter of doubly substituted
    // carbons around the rule (dichloro-, difluoro-, diaryl-, diallyl-carbons of the table).
    private const double CombinationSigma = 6;

    private static readonly string[] ConjugationNames = Enum.GetNames<ConjugationKind>();
    private static readonly string[] AlphaNames = Enum.GetNames<AlphaGroupKind>();

    private BdeAssignment FromClasses(Molecule molecule, Site site)
    {
        if (OutsideValidity(molecule, site) is { } reason)
        {
            return None(site, reason);
        }

        if (table.FindClass("base", "", site.Degree) is not { } root)
        {
            return None(site, $"the table has no base value for a {site.Degree.ToString().ToLowerInvariant()} carbon");
        }

        int groups = site.Conjugation.Count + site.AlphaGroups.Count;
        if (groups == 0)
        {
            return Plain(site, root);
        }

        string[] names = Names(site);
        if (table.FindClass("group", names.Length == 1 ? names[0] : string.Join('+', names), site.Degree) is { } whole)
        {
            return WithRing(site, whole, root);
        }

        return Combined(site, root, names);
    }

    private BdeAssignment Plain(Site site, BdeClassEntry root)
    {
        if (site.IsBridgehead && site.Degree == SiteDegree.Tertiary && site.RingSize is { } size)
        {
            string group = size <= 5 ? "5" : size == 6 ? "6" : "7";
            if (table.FindClass("bridgehead", group, SiteDegree.Tertiary) is { } bridgehead)
            {
                return Single(site, bridgehead, bridgehead.KilojoulesPerMole, bridgehead.SigmaKilojoulesPerMole, []);
            }
        }

        return RingTerm(site) is { } ring
            ? Single(
                site, root, root.KilojoulesPerMole + ring.KilojoulesPerMole,
                Math.Max(ring.SigmaKilojoulesPerMole, root.SigmaKilojoulesPerMole),
                [Evidence(ring, ring.KilojoulesPerMole, "ring term")])
            : Single(site, root, root.KilojoulesPerMole, root.SigmaKilojoulesPerMole, []);
    }

    private BdeAssignment WithRing(Site site, BdeClassEntry whole, BdeClassEntry root)
    {
        if (site.RingSize is <= 4 && RingTerm(site) is { } ring)
        {
            double sigma = Math.Sqrt((whole.SigmaKilojoulesPerMole * whole.SigmaKilojoulesPerMole) + (CombinationSigma * CombinationSigma));
            return Single(
                site, whole, whole.KilojoulesPerMole + ring.KilojoulesPerMole, sigma,
                [Evidence(ring, ring.KilojoulesPerMole, "ring term")]) with { Basis = BdeBasis.Increments };
        }

        if (site.IsBridgehead && site.Degree == SiteDegree.Tertiary)
        {
            // A bridgehead radical cannot turn its orbital toward the pi group or lone pair (Bredt): the group does not
            // help, the bridgehead value stays, with the doubt in its sigma.
            BdeAssignment plain = Plain(site with { Conjugation = [], AlphaGroups = [] }, root);
            return plain with
            {
                SigmaKilojoulesPerMole = Math.Sqrt((plain.SigmaKilojoulesPerMole!.Value * plain.SigmaKilojoulesPerMole.Value) + 100),
                IsAnalogy = true,
                Basis = BdeBasis.Increments,
            };
        }

        return Single(site, whole, whole.KilojoulesPerMole, whole.SigmaKilojoulesPerMole, []);
    }

    private BdeAssignment Combined(Site site, BdeClassEntry root, string[] names)
    {
        var parts = new List<(BdeClassEntry Entry, double Effect)>();
        for (int i = 0; i < names.Length; i++)
        {
            // A published value for the repeated group (two aryl groups, two chlorines) goes before the saturation rule.
            int end = i + 1;
            while (end < names.Length && names[end] == names[i])
            {
                end++;
            }

            string name = names[i];
            if (end - i > 1 && table.FindClass("group", string.Join('+', names[i..end]), site.Degree) is { } repeated)
            {
                parts.Add((repeated, repeated.KilojoulesPerMole - root.KilojoulesPerMole));
                i = end - 1;
            }
            else if (table.FindClass("group", name, site.Degree) is { } entry)
            {
                parts.Add((entry, entry.KilojoulesPerMole - root.KilojoulesPerMole));
            }
            else
            {
                return None(site, $"the group {name} has no published value on a {site.Degree.ToString().ToLowerInvariant()} carbon");
            }
        }

        parts.Sort(static (left, right) =>
        {
            int byEffect = Math.Abs(right.Effect).CompareTo(Math.Abs(left.Effect));
            return byEffect != 0 ? byEffect : string.CompareOrdinal(left.Entry.Id, right.Entry.Id);
        });
        double value = root.KilojoulesPerMole;
        double variance = CombinationSigma * CombinationSigma;
        var evidence = new List<BdeEvidence>();
        bool analogy = false;
        for (int i = 0; i < parts.Count; i++)
        {
            double weight = i == 0 ? 1 : i == 1 ? SaturationSecond : SaturationFurther;
            (BdeClassEntry entry, double effect) = parts[i];
            value += weight * effect;
            variance += weight * weight * entry.SigmaKilojoulesPerMole * entry.SigmaKilojoulesPerMole;
            analogy |= entry.IsAnalogy;
            evidence.Add(Evidence(
                entry, Math.Round(weight * effect, 3),
                string.Create(CultureInfo.InvariantCulture, $"increment x {weight}")));
        }

        if (site.RingSize is <= 4 && RingTerm(site) is { } ring)
        {
            value += ring.KilojoulesPerMole;
            evidence.Add(Evidence(ring, ring.KilojoulesPerMole, "ring term"));
        }

        evidence.Insert(0, Evidence(root, root.KilojoulesPerMole, "base"));
        return new BdeAssignment
        {
            SiteNumber = site.Number,
            KilojoulesPerMole = Math.Round(value, 3),
            SigmaKilojoulesPerMole = Math.Round(Math.Sqrt(variance), 3),
            Basis = BdeBasis.Increments,
            Evidence = evidence.AsReadOnly(),
            IsAnalogy = analogy,
        };
    }

    private BdeClassEntry? RingTerm(Site site) =>
        site.RingSize is { } size
            ? table.FindClass("ring", Math.Min(size, 7).ToString(CultureInfo.InvariantCulture), site.Degree) is { } term && size <= 12
                ? term
                : null
            : null;

    private static BdeAssignment Single(
        Site site, BdeClassEntry entry, double value, double sigma, IReadOnlyList<BdeEvidence> further) => new()
    {
        SiteNumber = site.Number,
        KilojoulesPerMole = Math.Round(value, 3),
        SigmaKilojoulesPerMole = Math.Round(sigma, 3),
        Basis = BdeBasis.Class,
        Evidence = [Evidence(entry, entry.KilojoulesPerMole, "class value"), .. further],
        IsAnalogy = entry.IsAnalogy,
    };

    private static string[] Names(Site site)
    {
        var names = new string[site.Conjugation.Count + site.AlphaGroups.Count];
        int filled = 0;
        foreach (ConjugatedNeighbor neighbor in site.Conjugation)
        {
            names[filled++] = ConjugationNames[(int)neighbor.Kind];
        }

        foreach (AlphaGroup group in site.AlphaGroups)
        {
            names[filled++] = AlphaNames[(int)group.Kind];
        }

        if (filled > 1)
        {
            Array.Sort(names, StringComparer.Ordinal);
        }

        return names;
    }
}
