using System;

namespace RadicalSites.Molecules;

/// <summary>Renumbers square-planar, trigonal-bipyramidal and octahedral codes when carriers are listed in another order.</summary>
/// <remarks>Source: [OPENSMILES] tables of the SP, TB and OH codes.</remarks>
internal static class CoordinationCodes
{
    // Places of the carriers a, b, c ... for each code, as slots of an ideal body.
    // Square: slots 0 1 2 3 run around. Bipyramid: 0 and 4 are the poles, 1 2 3 run anticlockwise seen from 0.
    // Octahedron: 0 and 5 are the poles, 1 2 3 4 run anticlockwise seen from 0.
    private static readonly int[][] Square = [[0, 1, 2, 3], [0, 2, 1, 3], [0, 1, 3, 2]];
    private static readonly int[][] Bipyramid = BuildBipyramid();
    private static readonly int[][] Octahedron = BuildOctahedron();

    /// <summary>Code of the same body for another order of the carriers.</summary>
    /// <param name="element">The element with its order and code.</param>
    /// <param name="order">The same carriers in the new order.</param>
    /// <returns>The code, 1-based.</returns>
    internal static int Reorder(StereoElement element, ReadOnlySpan<int> order)
    {
        int[][] codes = CodesOf(element.Kind);
        int[] slots = codes[element.Configuration - 1];
        Span<int> wanted = stackalloc int[order.Length];
        for (int i = 0; i < order.Length; i++)
        {
            wanted[i] = slots[element.CarrierSpan.IndexOf(order[i])];
        }

        for (int code = 0; code < codes.Length; code++)
        {
            if (SameBody(element.Kind, wanted, codes[code]))
            {
                return code + 1;
            }
        }

        return element.Configuration;
    }

    /// <summary>Slot of the ideal body for each carrier of an element, in the order of its carriers.</summary>
    internal static ReadOnlySpan<int> SlotsOf(StereoElement element) => CodesOf(element.Kind)[element.Configuration - 1];

    private static int[][] CodesOf(StereoKind kind) => kind switch
    {
        StereoKind.SquarePlanar => Square,
        StereoKind.TrigonalBipyramidal => Bipyramid,
        _ => Octahedron,
    };

    // Two placings are the same body when opposite pairs agree and, for the handed ones, the sense of rotation agrees.
    private static bool SameBody(StereoKind kind, ReadOnlySpan<int> left, ReadOnlySpan<int> right)
    {
        switch (kind)
        {
            case StereoKind.SquarePlanar:
                return Opposite(left, 0, 2) == Opposite(right, 0, 2);
            case StereoKind.TrigonalBipyramidal:
                return AxisOf(left) == AxisOf(right) && Handedness(left, 5) == Handedness(right, 5);
            default:
                for (int i = 0; i < 6; i++)
                {
                    if (left.IndexOf(OppositeSlot(left[i])) != right.IndexOf(OppositeSlot(right[i])))
                    {
                        return false;
                    }
                }

                return Handedness(left, 6) == Handedness(right, 6);
        }
    }

    private static int Opposite(ReadOnlySpan<int> slots, int a, int step) => slots.IndexOf((slots[a] + step) % 4);

    private static (int Low, int High) AxisOf(ReadOnlySpan<int> slots)
    {
        int top = slots.IndexOf(0);
        int bottom = slots.IndexOf(4);
        return (Math.Min(top, bottom), Math.Max(top, bottom));
    }

    private static int OppositeSlot(int slot) => slot switch { 0 => 5, 5 => 0, 1 => 3, 3 => 1, 2 => 4, _ => 2 };

    // Sign of rotation: looking from the pole with the lower carrier, do the equatorial carriers in ascending order turn
    // anticlockwise?
    private static bool Handedness(ReadOnlySpan<int> slots, int count)
    {
        int from;
        int last = count - 1;
        Span<int> equator = stackalloc int[4];
        int filled = 0;
        if (count == 5)
        {
            from = Math.Min(slots.IndexOf(0), slots.IndexOf(4));
        }
        else
        {
            from = 0;
        }

        // Rotate the body so that "from" is at slot 0, keeping the sense of rotation.
        bool flipped = count == 5 ? slots[from] == 4 : false;
        if (count == 6)
        {
            return OctahedralSense(slots);
        }

        for (int i = 0; i <= last; i++)
        {
            if (slots[i] is not (0 or 4))
            {
                equator[filled++] = slots[i];
            }
        }

        bool ascending = (equator[1] - equator[0] + 3) % 3 == 1;
        return ascending != flipped;
    }

    // Determinant sign of three mutually perpendicular carriers: the first, its lowest neighbour, the next one.
    private static bool OctahedralSense(ReadOnlySpan<int> slots)
    {
        int b = -1;
        int c = -1;
        for (int i = 1; i < 6; i++)
        {
            if (slots[i] == OppositeSlot(slots[0]))
            {
                continue;
            }

            if (b < 0)
            {
                b = i;
            }
            else if (c < 0 && slots[i] != OppositeSlot(slots[b]))
            {
                c = i;
            }
        }

        return Determinant(slots[0], slots[b], slots[c]) > 0;
    }

    private static int Determinant(int a, int b, int c)
    {
        (int X, int Y, int Z) p = Axis(a);
        (int X, int Y, int Z) q = Axis(b);
        (int X, int Y, int Z) r = Axis(c);
        return (p.X * ((q.Y * r.Z) - (q.Z * r.Y))) - (p.Y * ((q.X * r.Z) - (q.Z * r.X))) + (p.Z * ((q.X * r.Y) - (q.Y * r.X)));
    }

    private static (int X, int Y, int Z) Axis(int slot) => slot switch
    {
        0 => (0, 0, 1),
        5 => (0, 0, -1),
        1 => (1, 0, 0),
        2 => (0, 1, 0),
        3 => (-1, 0, 0),
        _ => (0, -1, 0),
    };

    private static int[][] BuildBipyramid()
    {
        // (from, towards, anticlockwise) for codes 1 to 20.
        (int From, int To, bool Anticlockwise)[] table =
        [
            (0, 4, true), (0, 4, false), (0, 3, true), (0, 3, false), (0, 2, true), (0, 2, false), (0, 1, true), (0, 1, false),
            (1, 4, true), (1, 3, true), (1, 4, false), (1, 3, false), (1, 2, true), (1, 2, false),
            (2, 4, true), (2, 3, true), (3, 4, true), (3, 4, false), (2, 3, false), (2, 4, false),
        ];
        var codes = new int[table.Length][];
        for (int code = 0; code < table.Length; code++)
        {
            var slots = new int[5];
            (int from, int to, bool anticlockwise) = table[code];
            slots[from] = 0;
            slots[to] = 4;
            int place = 0;
            for (int carrier = 0; carrier < 5; carrier++)
            {
                if (carrier != from && carrier != to)
                {
                    slots[carrier] = anticlockwise ? 1 + place : 1 + ((3 - place) % 3);
                    place++;
                }
            }

            codes[code] = slots;
        }

        return codes;
    }

    private static int[][] BuildOctahedron()
    {
        // (opposite of the first carrier, shape of the other four in ascending order, anticlockwise) for codes 1 to 30.
        (int Opposite, char Shape, bool Anticlockwise)[] table =
        [
            (5, 'U', true), (5, 'U', false), (4, 'U', true), (5, 'Z', true), (4, 'Z', true), (3, 'U', true), (3, 'Z', true),
            (5, '4', false), (4, '4', false), (5, '4', true), (4, '4', true), (3, '4', false), (3, '4', true),
            (5, 'Z', false), (4, 'Z', false), (4, 'U', false), (3, 'Z', false), (3, 'U', false),
            (2, 'U', true), (2, 'Z', true), (2, '4', false), (2, '4', true), (2, 'Z', false), (2, 'U', false),
            (1, 'U', true), (1, 'Z', true), (1, '4', false), (1, '4', true), (1, 'Z', false), (1, 'U', false),
        ];
        var codes = new int[table.Length][];
        for (int code = 0; code < table.Length; code++)
        {
            (int opposite, char shape, bool anticlockwise) = table[code];
            var slots = new int[6];
            slots[0] = 0;
            slots[opposite] = 5;

            // U runs around; Z and 4 cross the square once between the second and third or the third and fourth.
            ReadOnlySpan<int> path = shape switch { 'U' => [1, 2, 3, 4], 'Z' => [1, 2, 4, 3], _ => [1, 3, 4, 2] };
            int place = 0;
            for (int carrier = 1; carrier < 6; carrier++)
            {
                if (carrier != opposite)
                {
                    int slot = path[place++];
                    slots[carrier] = anticlockwise ? slot : slot is 2 ? 4 : slot is 4 ? 2 : slot;
                }
            }

            codes[code] = slots;
        }

        return codes;
    }
}
