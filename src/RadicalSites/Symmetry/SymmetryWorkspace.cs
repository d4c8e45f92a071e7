using System;

namespace RadicalSites.Symmetry;

/// <summary>Scratch arrays and engines of one thread.</summary>
internal sealed class SymmetryWorkspace
{
    private const int LargestKept = 1 << 16;

    [ThreadStatic]
    private static SymmetryWorkspace? own;

    internal readonly SymmetryGraph Graph = new();
    internal readonly SymmetryGraph FragmentGraph = new();
    internal readonly ColorPartition Constitution = new();
    internal readonly ColorPartition Stereo = new();
    internal readonly ColorPartition Mirrored = new();
    internal readonly AutomorphismProbe Probe = new();
    internal readonly IsomorphismSearch Isomorphism = new();
    internal readonly CanonicalSearch Canonical = new();
    internal readonly OrbitForest ConstitutionalOrbits = new();
    internal readonly OrbitForest MirrorOrbits = new();
    internal readonly OrbitForest ProperOrbits = new();
    internal readonly FlexibleFrames Flexible = new();
    internal readonly TopicitySearch Topicity = new();
    internal sbyte[] MirroredConfiguration = [];
    internal int[] Places = [];

    /// <summary>The workspace of the calling thread; its users do not nest.</summary>
    internal static SymmetryWorkspace Own => own ??= new SymmetryWorkspace();

    /// <summary>Lets the scratch of the calling thread go when it has grown by a very large molecule.</summary>
    internal static void Release(int atoms)
    {
        if (atoms > LargestKept)
        {
            own = null;
        }
    }

    internal int[] PlacesFor(int n)
    {
        if (Places.Length < n)
        {
            Places = new int[Math.Max(64, n)];
        }

        return Places;
    }
}
