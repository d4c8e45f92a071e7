using System;
using System.Collections.Generic;
using System.Numerics;
using System.Threading;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>All ways to replace C(sp3)-H hydrogens of a molecule by one halogen, counted exactly and listed lazily.</summary>
/// <remarks>
/// Two products are the same when an automorphism of the substrate relates them. Counts come from the cycle index of the
/// automorphism group (Polya), so they need no list; the list is made by orderly generation, one pattern per orbit, with
/// nothing remembered in between. Geminal and vicinal products are included, and a molecule may have several fragments.
/// Constitution is exact in every mode. In the modes with stereo the automorphisms must keep the configuration of the
/// substrate, so diastereomeric and enantiomeric products are listed apart. Immutable and safe for use by many threads.
/// </remarks>
public sealed class IsomerEnumeration
{
    /// <summary>Largest molecule, in atoms, whose isomers are enumerated.</summary>
    public const int AtomLimit = 2000;

    private readonly IsomerSubstrate substrate;
    private readonly SubstitutionSymmetry? symmetry;
    private readonly bool symmetryIsWhole;

    private IsomerEnumeration(
        Molecule molecule, IsomerOptions options, IsomerSubstrate substrate, SubstitutionSymmetry? symmetry,
        bool symmetryIsWhole, IReadOnlyList<Diagnostic> diagnostics)
    {
        Molecule = molecule;
        Options = options;
        this.substrate = substrate;
        this.symmetry = symmetry;
        this.symmetryIsWhole = symmetryIsWhole;
        Diagnostics = diagnostics;
    }

    /// <summary>The substrate.</summary>
    public Molecule Molecule { get; }

    /// <summary>What is enumerated.</summary>
    public IsomerOptions Options { get; }

    /// <summary>Hydrogens that can be replaced, 0 or more.</summary>
    public int HydrogenCount => substrate.HydrogenCount;

    /// <summary>
    /// Remarks: no site, or a molecule or symmetry too large (then there are neither counts nor products).
    /// </summary>
    public IReadOnlyList<Diagnostic> Diagnostics { get; }

    /// <summary>Prepares an enumeration.</summary>
    /// <param name="molecule">The substrate; may have several fragments.</param>
    /// <param name="options">What to enumerate.</param>
    /// <param name="cancellation">Ends the symmetry search.</param>
    /// <returns>The enumeration.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The halogen is none of F, Cl, Br, I, or the numbers of times are not 1 or more, in order.</exception>
    public static IsomerEnumeration Of(Molecule molecule, IsomerOptions options, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        ArgumentNullException.ThrowIfNull(options);
        Check(options);
        bool withStereo = options.Stereo != ProductStereoMode.None;
        IsomerSubstrate substrate = IsomerSubstrate.Prepare(molecule, withStereo);
        var diagnostics = new List<Diagnostic>();
        if (substrate.Carbons.Length == 0)
        {
            diagnostics.Add(Diagnostic.Create(ProblemCatalogue.General.NoSites, []));
        }

        if (molecule.AtomCount > AtomLimit)
        {
            diagnostics.Add(Diagnostic.Create(
                ProblemCatalogue.Products.MoleculeTooLarge, [], molecule.AtomCount, AtomLimit));
            return new IsomerEnumeration(molecule, options, substrate, null, false, diagnostics.AsReadOnly());
        }

        StereoPermutations? stereo = substrate.Molecule.StereoElements.Count > 0
            ? new StereoPermutations(substrate.Molecule)
            : null;
        SubstitutionSymmetry? symmetry = SubstitutionSymmetry.Find(
            substrate.Molecule, substrate.Carbons, stereo, cancellation);
        bool whole = stereo is null;
        if (symmetry is null)
        {
            diagnostics.Add(Diagnostic.Create(ProblemCatalogue.Products.SymmetryTooLarge, []));
        }
        else if (stereo is not null)
        {
            // Without a smaller group there is nothing that a lost stereocentre could make equal again.
            SubstitutionSymmetry? all = SubstitutionSymmetry.Find(substrate.Molecule, substrate.Carbons, null, cancellation);
            whole = all is not null && all.Order == symmetry.Order;
        }

        return new IsomerEnumeration(molecule, options, substrate, symmetry, whole, diagnostics.AsReadOnly());
    }

    /// <summary>Exact number of constitutions (or marked products) by halogens added, without listing them.</summary>
    /// <param name="maximumTimes">Highest number of halogens, 0 or more; at most the number of hydrogens is used.</param>
    /// <returns>
    /// Index = number of halogens, starting at 0 with one; <see langword="null"/> when the symmetry is too large, or when
    /// stereocentres of the substrate can be lost so that only the list is exact.
    /// </returns>
    public IReadOnlyList<BigInteger>? Count(int maximumTimes)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(maximumTimes);
        int degree = Math.Min(maximumTimes, HydrogenCount);
        return symmetryIsWhole ? symmetry?.Count(degree) : null;
    }

    /// <summary>Lists the products one by one, fewer halogens first; order and text do not depend on the atom order.</summary>
    /// <param name="cancellation">Ends the enumeration.</param>
    /// <returns>A lazy sequence; each product is made when it is asked for.</returns>
    public IEnumerable<IsomerProduct> Enumerate(CancellationToken cancellation = default)
    {
        if (symmetry is null)
        {
            yield break;
        }

        long number = 0;
        int most = Math.Min(Options.MaximumTimes, HydrogenCount);
        for (int times = Options.MinimumTimes; times <= most; times++)
        {
            // Only products that lost a marked stereocentre can meet again; nothing else is remembered.
            HashSet<string>? met = symmetryIsWhole ? null : new HashSet<string>(StringComparer.Ordinal);
            foreach (byte[] pattern in SubstitutionPatterns.Enumerate(symmetry, times, cancellation))
            {
                IsomerProduct product = substrate.Make(
                    Options, pattern, number + 1, symmetry.Degeneracy(pattern), out bool lost);
                if (lost && met is not null && !met.Add(product.CanonicalSmiles))
                {
                    continue;
                }

                number++;
                yield return product;
            }
        }
    }

    private static void Check(IsomerOptions options)
    {
        if (options.Halogen is not (9 or 17 or 35 or 53))
        {
            throw new ArgumentOutOfRangeException(
                nameof(options), options.Halogen, "The halogen is 9 (F), 17 (Cl), 35 (Br) or 53 (I).");
        }

        ArgumentOutOfRangeException.ThrowIfLessThan(options.MinimumTimes, 1, nameof(options));
        ArgumentOutOfRangeException.ThrowIfLessThan(options.MaximumTimes, options.MinimumTimes, nameof(options));
    }
}
