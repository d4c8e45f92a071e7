using System;
using System.Collections.Generic;
using System.Linq;
using System.Threading;
using RadicalSites.Molecules;

namespace RadicalSites.Course;

/// <summary>Grows the network level by level, following what can matter and pooling the rest by halogen count.</summary>
/// <remarks>
/// The part of the substrate that ever passes through a species is the sum over its parents of their passage times
/// the branch to it; it is known exactly before the species is expanded. Species below the threshold or beyond the limit
/// are pooled by halogen count; a pool reacts on as the mean of the followed species with as many halogens (of the last
/// level that has any), so mass and halogen stay accounted for. What goes beyond the highest halogen count stays in the
/// last pool.
/// </remarks>
internal sealed class CourseNetworkBuilder
{
    private readonly Func<Molecule, SpeciesReactions> react;
    private readonly Func<string, IReadOnlyDictionary<string, double>, MeasuredRate?> measured;
    private readonly CourseOptions options;
    private readonly List<CourseSpecies> species = [];
    private readonly List<(int From, string? To, int Halogens, double Rate)> steps = [];
    private readonly Dictionary<string, int> indices = new(StringComparer.Ordinal);
    private readonly Dictionary<string, double> rates = new(StringComparer.Ordinal);
    private bool limitReached;

    /// <summary>Prepares a builder.</summary>
    /// <param name="react">Products and rates of a molecule by the model.</param>
    /// <param name="measured">A published rate for a species, given the rates of the species before it.</param>
    /// <param name="options">Bounds.</param>
    internal CourseNetworkBuilder(
        Func<Molecule, SpeciesReactions> react,
        Func<string, IReadOnlyDictionary<string, double>, MeasuredRate?> measured, CourseOptions options)
    {
        this.react = react;
        this.measured = measured;
        this.options = options;
    }

    internal CourseNetwork Build(Molecule substrate, string canonicalSmiles, CancellationToken cancellation)
    {
        var level = new List<Candidate> { new(canonicalSmiles, substrate) { Passage = 1 } };
        double unit = 0;
        for (int halogens = 0; halogens <= options.HalogensFollowed && level.Count > 0; halogens++)
        {
            // Levels only ever lead to the next one, so numbering by level is a topological order.
            level.Sort(static (left, right) =>
            {
                int byPassage = right.Passage.CompareTo(left.Passage);
                return byPassage != 0 ? byPassage : string.CompareOrdinal(left.Smiles, right.Smiles);
            });
            var next = new Dictionary<string, Candidate>(StringComparer.Ordinal);
            foreach (Candidate candidate in level)
            {
                cancellation.ThrowIfCancellationRequested();
                if (halogens > 0 && candidate.Passage < options.FollowThreshold)
                {
                    continue;
                }

                if (species.Count >= options.SpeciesLimit)
                {
                    limitReached = true;
                    break;
                }

                Expand(candidate, halogens, next, ref unit);
            }

            level = [.. next.Values];
        }

        return Finish(unit);
    }

    private void Expand(Candidate candidate, int halogens, Dictionary<string, Candidate> next, ref double unit)
    {
        SpeciesReactions reactions = react(candidate.Molecule);
        double total = reactions.Total;
        MeasuredRate? published = total > 0 ? measured(candidate.Smiles, rates) : null;
        double scale = published is null ? 1 : published.Rate / total;
        unit = halogens == 0 ? total : unit;
        rates[candidate.Smiles] = total * scale;
        int index = species.Count;
        indices.Add(candidate.Smiles, index);
        species.Add(new CourseSpecies
        {
            Number = index + 1,
            CanonicalSmiles = candidate.Smiles,
            Molecule = candidate.Molecule,
            HalogenCount = halogens,
            RelativeRate = total * scale,
            Passage = candidate.Passage,
            RateBasis = total == 0 ? CourseRateBasis.None
                : published is null ? CourseRateBasis.Model : CourseRateBasis.MeasuredRatio,
            Evidence = published?.Evidence ?? [],
        });
        foreach (SpeciesReaction product in reactions.Products)
        {
            bool beyond = halogens == options.HalogensFollowed;
            steps.Add((index, beyond ? null : product.CanonicalSmiles, halogens + 1, product.Rate * scale));
            if (!beyond)
            {
                if (!next.TryGetValue(product.CanonicalSmiles, out Candidate? child))
                {
                    child = new Candidate(product.CanonicalSmiles, product.Molecule);
                    next.Add(product.CanonicalSmiles, child);
                }

                child.Passage += candidate.Passage * product.Rate / total;
            }
        }
    }

    private CourseNetwork Finish(double unit)
    {
        int lowestPool = options.HalogensFollowed + 1;
        foreach ((int _, string? to, int halogens, double _) in steps)
        {
            if (to is null || !indices.ContainsKey(to))
            {
                lowestPool = Math.Min(lowestPool, halogens);
            }
        }

        int[] pools = steps.Exists(step => step.To is null || !indices.ContainsKey(step.To))
            ? [.. Enumerable.Range(lowestPool, options.HalogensFollowed + 2 - lowestPool)]
            : [];
        var finished = new Dictionary<(int From, int To), double>();
        foreach ((int from, string? to, int halogens, double rate) in steps)
        {
            int target = to is not null && indices.TryGetValue(to, out int index)
                ? index
                : species.Count + halogens - lowestPool;
            finished[(from, target)] = finished.GetValueOrDefault((from, target)) + (rate / unit);
        }

        for (int i = 0; i + 1 < pools.Length; i++)
        {
            if (MeanRate(pools[i]) is > 0 and double mean)
            {
                finished[(species.Count + i, species.Count + i + 1)] = mean / unit;
            }
        }

        return new CourseNetwork
        {
            Species = [.. species.Select(one => one with { RelativeRate = unit == 0 ? 0 : one.RelativeRate / unit })],
            PoolHalogens = pools,
            Steps = [.. finished.Select(static step => (step.Key.From, step.Key.To, step.Value))],
            LimitReached = limitReached,
        };
    }

    // Mean over what passes through the followed species of a level, or of the last level below that has any.
    private double MeanRate(int halogens)
    {
        for (int level = halogens; level > 0; level--)
        {
            double passage = 0;
            double sum = 0;
            foreach (CourseSpecies one in species)
            {
                if (one.HalogenCount == level)
                {
                    passage += one.Passage;
                    sum += one.Passage * one.RelativeRate;
                }
            }

            if (passage > 0)
            {
                return sum / passage;
            }
        }

        return 0;
    }

    private sealed class Candidate(string smiles, Molecule molecule)
    {
        internal string Smiles { get; } = smiles;

        internal Molecule Molecule { get; } = molecule;

        internal double Passage { get; set; }
    }
}
