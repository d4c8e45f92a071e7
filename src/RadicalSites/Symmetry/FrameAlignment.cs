using System;

namespace RadicalSites.Symmetry;

/// <summary>
/// Gives configurations to the frames that state none, so that equivalent ones are related by an operation that keeps
/// the configuration. The choice within one orbit is free; a single frame is its own reference.
/// </summary>
internal static class FrameAlignment
{
    /// <summary>Aligns the frames from index <paramref name="stated"/> on.</summary>
    internal static void Align(SymmetryWorkspace workspace, int stated, ReadOnlySpan<int> constitutional)
    {
        SymmetryGraph graph = workspace.Graph;
        int count = graph.ElementCount;
        Span<bool> done = count - stated <= 256 ? stackalloc bool[256] : new bool[count - stated];
        done.Clear();
        for (int e = stated; e < count; e++)
        {
            if (done[e - stated])
            {
                continue;
            }

            done[e - stated] = true;
            int focus = graph.Focus[e];
            if (workspace.Constitution.Length[workspace.Constitution.CellOf[focus]] == 1)
            {
                continue;
            }

            for (int f = e + 1; f < count; f++)
            {
                if (!done[f - stated] && graph.Kind[f] == graph.Kind[e] && constitutional[graph.Focus[f]] == constitutional[focus])
                {
                    Carry(workspace, stated, done, focus, graph.Focus[f]);
                }
            }
        }
    }

    private static void Carry(SymmetryWorkspace workspace, int stated, Span<bool> done, int from, int to)
    {
        SymmetryGraph graph = workspace.Graph;
        int count = graph.ElementCount;
        graph.ElementCount = 0;
        int[]? image = workspace.Probe.TryMap(graph, workspace.Constitution, from, to) ? workspace.Probe.Image
            : workspace.Isomorphism.TryFind(
                graph, workspace.Constitution, workspace.Constitution, [from], [to], false) ? workspace.Isomorphism.Image
            : null;
        graph.ElementCount = count;
        if (image is null)
        {
            return;
        }

        // A long cycle is followed by going over the frames until nothing is left to carry.
        for (bool any = true; any;)
        {
            any = false;
            for (int e = stated; e < count; e++)
            {
                int there = Target(graph, e, image);
                if (!done[e - stated] || there < stated || done[there - stated])
                {
                    continue;
                }

                int sign = graph.Kind[e] == SymmetryGraph.Axis
                    ? StereoImage.SignOfAxis(graph, e, image)
                    : StereoImage.SignOfCenter(graph, e, image);
                if (sign == 0)
                {
                    continue;
                }

                graph.Configuration[there] = (sbyte)(graph.Configuration[there] * sign);
                done[there - stated] = true;
                any = true;
            }
        }
    }

    private static int Target(SymmetryGraph graph, int element, int[] image)
    {
        int focus = graph.Focus[element];
        int to = image[focus] < 0 ? focus : image[focus];
        if (graph.Kind[element] != SymmetryGraph.Axis)
        {
            return graph.CenterAt[to] - 1;
        }

        return graph.AxisAt[to] - 1;
    }
}
