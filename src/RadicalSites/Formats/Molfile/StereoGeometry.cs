using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>Configurations from directions in space: pure geometry, no molecule.</summary>
internal static class StereoGeometry
{
    /// <summary>Below this, normalised volumes and sines count as flat: the drawing decides nothing.</summary>
    private const double Flat = 0.05;

    /// <summary>Unit vector from one point to another; zero when they coincide.</summary>
    internal static Point Direction(Point from, Point to)
    {
        double x = to.X - from.X;
        double y = to.Y - from.Y;
        double z = to.Z - from.Z;
        double length = Math.Sqrt((x * x) + (y * y) + (z * z));
        return length < 1e-6 ? default : new Point(x / length, y / length, z / length);
    }

    /// <summary>Configuration of four directions in carrier order.</summary>
    /// <returns>1 anticlockwise, 2 clockwise seen from the first; 0 when flat.</returns>
    internal static int OfFour(ReadOnlySpan<Point> directions)
    {
        Point first = directions[0];
        return OfVolume(-Volume(Minus(directions[1], first), Minus(directions[2], first), Minus(directions[3], first)));
    }

    /// <summary>Configuration of three directions in carrier order with the implicit carrier last.</summary>
    internal static int OfThree(ReadOnlySpan<Point> directions) => OfVolume(Volume(directions[0], directions[1], directions[2]));

    /// <summary>Configuration of three bonds of a drawing, marked by their z of 1 (up), -1 (down) or 0; implicit carrier last.</summary>
    /// <remarks>
    /// A stem of a T counts as lying between its arms. When all three bonds lie within a half plane, a mark on the middle
    /// one has the opposite meaning of a mark on an outer one, as geometry demands.
    /// </remarks>
    internal static int OfDrawnThree(ReadOnlySpan<Point> directions)
    {
        Span<double> turns = stackalloc double[3];
        int positive = 0;
        for (int i = 0; i < 3; i++)
        {
            Point next = directions[(i + 1) % 3];
            Point last = directions[(i + 2) % 3];
            turns[i] = (next.X * last.Y) - (next.Y * last.X);
            positive += turns[i] > Flat ? 1 : turns[i] < -Flat ? -1 : 0;
        }

        double sum = 0;
        for (int i = 0; i < 3; i++)
        {
            double side = Math.Abs(turns[i]) > Flat ? Math.Sign(turns[i]) : Math.Sign(positive);
            sum += directions[i].Z * side;
        }

        return sum > 0.5 ? 1 : sum < -0.5 ? 2 : 0;
    }

    /// <summary>Which side of the line from one end of a bond to the other a point lies on, in the plane.</summary>
    /// <returns>1 or -1; 0 when it lies on the line.</returns>
    internal static int SideInPlane(Point end, Point otherEnd, Point point)
    {
        Point axis = Direction(end, otherEnd);
        Point arm = Direction(end, point);
        double sine = (axis.X * arm.Y) - (axis.Y * arm.X);
        return sine > Flat ? 1 : sine < -Flat ? -1 : 0;
    }

    /// <summary>Whether two carriers lie on the same side of a double bond in space.</summary>
    /// <returns>1 on opposite sides, 2 on the same side; 0 when undecided.</returns>
    internal static int OfDoubleBond(Point first, Point second, Point firstCarrier, Point secondCarrier)
    {
        Point axis = Direction(first, second);
        Point left = Perpendicular(Direction(first, firstCarrier), axis);
        Point right = Perpendicular(Direction(second, secondCarrier), axis);
        double size = Math.Sqrt(Dot(left, left) * Dot(right, right));
        double cosine = Dot(left, right);
        return size < Flat * Flat || Math.Abs(cosine) < 0.17 * size ? 0 : cosine > 0 ? 2 : 1;
    }

    /// <summary>Configuration of an allene: two carriers at each end, as directions from their end.</summary>
    /// <param name="axis">Direction from the first end to the second.</param>
    /// <param name="first">First minus second carrier of the first end.</param>
    /// <param name="second">First minus second carrier of the second end.</param>
    /// <returns>1 anticlockwise, 2 clockwise seen from the first carrier; 0 when flat.</returns>
    internal static int OfAllene(Point axis, Point first, Point second) => OfVolume(Volume(axis, first, second));

    internal static Point Minus(Point left, Point right) => new(left.X - right.X, left.Y - right.Y, left.Z - right.Z);

    private static Point Perpendicular(Point vector, Point axis)
    {
        double along = Dot(vector, axis);
        return new Point(vector.X - (along * axis.X), vector.Y - (along * axis.Y), vector.Z - (along * axis.Z));
    }

    private static double Dot(Point left, Point right) => (left.X * right.X) + (left.Y * right.Y) + (left.Z * right.Z);

    private static double Volume(Point a, Point b, Point c) =>
        (a.X * ((b.Y * c.Z) - (b.Z * c.Y))) - (a.Y * ((b.X * c.Z) - (b.Z * c.X))) + (a.Z * ((b.X * c.Y) - (b.Y * c.X)));

    private static int OfVolume(double volume) => volume > Flat ? 1 : volume < -Flat ? 2 : 0;
}
