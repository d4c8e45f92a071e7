using System;
using System.Collections.Generic;

namespace RadicalSites.Molecules;

/// <summary>A stereocentre, stereo axis or stereo double bond with its configuration.</summary>
/// <remarks>
/// The meaning of <see cref="Configuration"/> follows the order of <see cref="Carriers"/>:
/// <list type="bullet">
/// <item>Tetrahedral and allene: 1 = seen from the first carrier the others run anticlockwise (@), 2 = clockwise (@@).
/// Allene carriers are the two at one end, then the two at the other end, in the order OpenSMILES reads them.</item>
/// <item>CisTrans: <see cref="Focus"/> and <see cref="FocusEnd"/> are the terminal atoms of the double bond (or of the
/// odd cumulene), carriers are one neighbour of each; 1 = on opposite sides (trans), 2 = on the same side (cis).</item>
/// <item>Square planar, trigonal bipyramidal, octahedral: the number of the OpenSMILES code.</item>
/// </list>
/// A carrier of -1 is an implicit hydrogen or a lone pair. Immutable and safe for use by many threads.
/// </remarks>
public sealed class StereoElement
{
    private readonly int[] carriers;

    internal StereoElement(StereoKind kind, int focus, int focusEnd, int[] carriers, int configuration)
    {
        Kind = kind;
        Focus = focus;
        FocusEnd = focusEnd;
        this.carriers = carriers;
        Configuration = configuration;
    }

    /// <summary>Geometry described.</summary>
    public StereoKind Kind { get; }

    /// <summary>0-based index of the centre, of the central atom of an allene, or of one end of the double bond.</summary>
    public int Focus { get; }

    /// <summary>0-based index of the other end of the double bond; equal to <see cref="Focus"/> for centres.</summary>
    public int FocusEnd { get; }

    /// <summary>0-based indices of the carriers in reading order; -1 stands for an implicit hydrogen or a lone pair.</summary>
    public IReadOnlyList<int> Carriers => carriers;

    /// <summary>Configuration number, 1-based; see the remarks.</summary>
    public int Configuration { get; }

    internal ReadOnlySpan<int> CarrierSpan => carriers;
}
