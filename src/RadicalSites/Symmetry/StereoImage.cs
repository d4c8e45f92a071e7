namespace RadicalSites.Symmetry;

/// <summary>How a permutation of the atoms acts on stereo elements.</summary>
internal static class StereoImage
{
    /// <summary>
    /// +1 when the image of a centre or allene has the configuration of the element that stands there, -1 when it has the
    /// opposite one, 0 when no element of that kind stands there.
    /// </summary>
    /// <param name="graph">The graph with its elements.</param>
    /// <param name="element">Index of the element.</param>
    /// <param name="image">Image of each atom, -1 = the atom stays.</param>
    /// <param name="target">Configurations on the side of the image.</param>
    internal static int SignOfCenter(SymmetryGraph graph, int element, int[] image, sbyte[] target)
    {
        int there = graph.CenterAt[ImageOf(graph.Focus[element], image)] - 1;
        if (there < 0 || graph.Kind[there] != graph.Kind[element])
        {
            return 0;
        }

        if (graph.Kind[element] == SymmetryGraph.Allene)
        {
            return SignOfAllene(graph, element, there, image) * graph.Configuration[element] * target[there];
        }

        int[] carriers = graph.Carriers;
        int from = 4 * element;
        int to = 4 * there;
        int seen = 0;
        int sign = graph.Configuration[element] * target[there];
        for (int i = 0; i < 4; i++)
        {
            int carrier = carriers[from + i];
            int wanted = carrier < 0 ? carrier : ImageOf(carrier, image);
            int place = 0;
            while (place < 4 && (carriers[to + place] != wanted || (seen & (1 << place)) != 0))
            {
                place++;
            }

            if (place == 4)
            {
                return 0;
            }

            // Each carrier placed before one that stands further right is an inversion.
            if ((System.Numerics.BitOperations.PopCount((uint)(seen >> (place + 1))) & 1) != 0)
            {
                sign = -sign;
            }

            seen |= 1 << place;
        }

        return sign;
    }

    /// <summary>As <see cref="SignOfCenter"/>, for a double bond or odd cumulene.</summary>
    internal static int SignOfAxis(SymmetryGraph graph, int element, int[] image, sbyte[] target)
    {
        int begin = ImageOf(graph.Focus[element], image);
        int end = ImageOf(graph.FocusEnd[element], image);
        int there = graph.AxisAt[begin] - 1;
        if (there < 0)
        {
            return 0;
        }

        if (!Joins(graph, there, begin, end))
        {
            there = graph.AxisAt[end] - 1;
            if (there < 0 || !Joins(graph, there, begin, end))
            {
                return 0;
            }
        }

        int from = 4 * element;
        int to = 4 * there;
        int toBegin = graph.Focus[there] == begin ? to : to + 2;
        int toEnd = graph.Focus[there] == begin ? to + 2 : to;
        int sign = graph.Configuration[element] * target[there];
        if (ImageOf(graph.Carriers[from], image) != graph.Carriers[toBegin])
        {
            sign = -sign;
        }

        if (ImageOf(graph.Carriers[from + 2], image) != graph.Carriers[toEnd])
        {
            sign = -sign;
        }

        return sign;
    }

    /// <summary>Index of the element where the image of an element lies, or -1.</summary>
    internal static int TargetOf(SymmetryGraph graph, int element, int[] image)
    {
        int begin = ImageOf(graph.Focus[element], image);
        if (graph.Kind[element] != SymmetryGraph.Axis)
        {
            return graph.CenterAt[begin] - 1;
        }

        int end = ImageOf(graph.FocusEnd[element], image);
        int there = graph.AxisAt[begin] - 1;
        if (there >= 0 && !Joins(graph, there, begin, end))
        {
            there = graph.AxisAt[end] - 1;
        }

        return there >= 0 && Joins(graph, there, begin, end) ? there : -1;
    }

    /// <summary><see cref="SignOfCenter"/> or <see cref="SignOfAxis"/>, as the kind of the element asks.</summary>
    internal static int SignOf(SymmetryGraph graph, int element, int[] image, sbyte[] target) =>
        graph.Kind[element] == SymmetryGraph.Axis
            ? SignOfAxis(graph, element, image, target)
            : SignOfCenter(graph, element, image, target);

    /// <summary>Parity of the carriers; the two ends may exchange, a missing ligand goes with its partner.</summary>
    private static int SignOfAllene(SymmetryGraph graph, int element, int there, int[] image)
    {
        int sign = 1;
        for (int end = 0; end < 4; end += 2)
        {
            int at = (4 * element) + end;
            int explicitPlace = graph.Carriers[at] >= 0 ? 0 : 1;
            int wanted = ImageOf(graph.Carriers[at + explicitPlace], image);
            int place = 0;
            while (place < 4 && graph.Carriers[(4 * there) + place] != wanted)
            {
                place++;
            }

            if (place == 4)
            {
                return 0;
            }

            // Exchanging the two ends is an even permutation; only the order within an end counts.
            sign = (place & 1) == explicitPlace ? sign : -sign;
        }

        return sign;
    }

    private static bool Joins(SymmetryGraph graph, int element, int begin, int end) =>
        (graph.Focus[element] == begin && graph.FocusEnd[element] == end)
        || (graph.Focus[element] == end && graph.FocusEnd[element] == begin);

    // A carrier of -1 is an implicit hydrogen and stays one.
    private static int ImageOf(int atom, int[] image) => atom < 0 || image[atom] < 0 ? atom : image[atom];
}
