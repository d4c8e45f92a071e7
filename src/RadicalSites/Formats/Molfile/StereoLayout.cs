using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <summary>Coordinates in the plane that can carry stereo: springs along bonds, across angles and across stereo bonds.</summary>
/// <remarks>The same molecule gives the same coordinates. Made for programs; a drawing for people needs a real layout.</remarks>
internal static class StereoLayout
{
    private const double Length = 1.5;
    private const int Repelling = 1200;

    /// <summary>Places all atoms, hydrogens that are to be shown behind the others.</summary>
    internal static Point[] Place(Molecule molecule, List<int> shownHydrogens, int attempt)
    {
        int count = molecule.AtomCount + shownHydrogens.Count;
        var x = new double[count];
        var y = new double[count];
        List<(int First, int Second, double Distance, double Weight)> springs = Springs(molecule, shownHydrogens);
        Start(molecule, shownHydrogens, attempt, x, y);
        int rounds = count > Repelling ? 60 : Math.Clamp(60000 / Math.Max(1, count), 80, 400);
        for (int round = 0; round < rounds; round++)
        {
            double step = 0.3 * (1 - (0.8 * round / rounds));
            foreach ((int first, int second, double distance, double weight) in springs)
            {
                Pull(x, y, first, second, distance, step * weight);
            }

            if (count <= Repelling && round % 2 == 0)
            {
                Repel(x, y, step);
            }
        }

        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind == StereoKind.CisTrans)
            {
                TurnOver(molecule, shownHydrogens, element, x, y);
            }
        }

        var points = new Point[count];
        for (int i = 0; i < count; i++)
        {
            points[i] = new Point(Math.Round(x[i], 4), Math.Round(y[i], 4), 0);
        }

        return points;
    }

    // A double bond outside of rings that came out the wrong way: one side of the molecule is mirrored at its axis.
    private static void TurnOver(Molecule molecule, List<int> shownHydrogens, StereoElement element, double[] x, double[] y)
    {
        int first = element.Focus;
        int last = element.FocusEnd;
        int left = Shown(molecule, shownHydrogens, element, 0, out bool leftTurned);
        int right = Shown(molecule, shownHydrogens, element, 1, out bool rightTurned);
        double ax = x[last] - x[first];
        double ay = y[last] - y[first];
        double leftSide = (ax * (y[left] - y[first])) - (ay * (x[left] - x[first]));
        double rightSide = (ax * (y[right] - y[last])) - (ay * (x[right] - x[last]));
        bool same = (element.Configuration == 2) != (leftTurned != rightTurned);
        double size = (ax * ax) + (ay * ay);
        if ((leftSide * rightSide > 0) == same || size < 1e-6)
        {
            return;
        }

        int partner = -1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(last))
        {
            partner = molecule.BondSpan[neighbor.Bond].Order == BondOrder.Double ? neighbor.Atom : partner;
        }

        // The side of the last atom; when it leads back to the first, the bond lies on a ring and stays as it is.
        HashSet<int> side = [last];
        Queue<int> queue = new(side);
        while (queue.TryDequeue(out int atom))
        {
            foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
            {
                if ((atom != last || neighbor.Atom != partner) && side.Add(neighbor.Atom))
                {
                    queue.Enqueue(neighbor.Atom);
                }
            }
        }

        if (side.Contains(first))
        {
            return;
        }

        for (int i = 0; i < x.Length; i++)
        {
            if (side.Contains(i < molecule.AtomCount ? i : shownHydrogens[i - molecule.AtomCount]))
            {
                double along = ((ax * (x[i] - x[last])) + (ay * (y[i] - y[last]))) / size;
                x[i] = (2 * (x[last] + (along * ax))) - x[i];
                y[i] = (2 * (y[last] + (along * ay))) - y[i];
            }
        }
    }

    /// <summary>A place for a hydrogen at the end of a double bond, opposite in the zig-zag to the bond's other side.</summary>
    internal static Point BesideDoubleBond(Molecule molecule, int end, ReadOnlySpan<Point> points)
    {
        int partner = molecule.NeighborsOf(end)[0].Atom;
        Point axis = StereoGeometry.Direction(points[partner], points[end]);
        return new Point(
            points[end].X + (0.5 * axis.X) - (0.87 * axis.Y), points[end].Y + (0.5 * axis.Y) + (0.87 * axis.X), points[end].Z);
    }

    private static List<(int First, int Second, double Distance, double Weight)> Springs(Molecule molecule, List<int> shownHydrogens)
    {
        List<(int First, int Second, double Distance, double Weight)> springs = [];
        foreach (Bond bond in molecule.BondSpan)
        {
            springs.Add((bond.Begin, bond.End, Length, 1));
        }

        for (int i = 0; i < molecule.AtomCount; i++)
        {
            ReadOnlySpan<Neighbor> around = molecule.NeighborsOf(i);
            double across = around.Length == 2 && IsLinear(molecule, i) ? 2 * Length : around.Length > 3 ? 1.41 * Length : 1.73 * Length;
            for (int j = 0; j < around.Length && around.Length <= 4; j++)
            {
                for (int k = j + 1; k < around.Length; k++)
                {
                    springs.Add((around[j].Atom, around[k].Atom, across, around.Length > 3 ? 0.15 : 0.5));
                }
            }
        }

        for (int i = 0; i < shownHydrogens.Count; i++)
        {
            int end = shownHydrogens[i];
            springs.Add((molecule.AtomCount + i, end, Length, 1));
            springs.Add((molecule.AtomCount + i, molecule.NeighborsOf(end)[0].Atom, 1.73 * Length, 0.5));
        }

        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind == StereoKind.CisTrans)
            {
                int left = Shown(molecule, shownHydrogens, element, 0, out bool leftTurned);
                int right = Shown(molecule, shownHydrogens, element, 1, out bool rightTurned);
                bool same = (element.Configuration == 2) != (leftTurned != rightTurned);
                springs.Add((left, right, (same ? 2.0 : 2.65) * Length, 1));
            }
        }

        return springs;
    }

    // The carrier as an atom of the drawing; another neighbour of the end lies on the other side.
    private static int Shown(Molecule molecule, List<int> shownHydrogens, StereoElement element, int side, out bool turned)
    {
        turned = false;
        int carrier = element.CarrierSpan[side];
        if (carrier >= 0)
        {
            return carrier;
        }

        int end = side == 0 ? element.Focus : element.FocusEnd;
        int hydrogen = shownHydrogens.IndexOf(end);
        if (hydrogen >= 0)
        {
            return molecule.AtomCount + hydrogen;
        }

        turned = true;
        foreach (Neighbor neighbor in molecule.NeighborsOf(end))
        {
            if (molecule.BondSpan[neighbor.Bond].Order != BondOrder.Double)
            {
                return neighbor.Atom;
            }
        }

        return end;
    }

    private static bool IsLinear(Molecule molecule, int atom)
    {
        int sum = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            sum += (int)molecule.BondSpan[neighbor.Bond].Order;
        }

        return sum == 4 && molecule.AtomSpan[atom].AtomicNumber == 6;
    }

    // Breadth-first over each fragment, neighbours fanned out; a fixed sequence of small shifts breaks ties.
    private static void Start(Molecule molecule, List<int> shownHydrogens, int attempt, double[] x, double[] y)
    {
        int atoms = molecule.AtomCount;
        var placed = new bool[atoms];
        var angle = new double[atoms];
        var queue = new Queue<int>();
        uint state = 12345u * (uint)attempt;
        double offset = 0;
        for (int start = 0; start < atoms; start++)
        {
            if (placed[start])
            {
                continue;
            }

            x[start] = offset;
            placed[start] = true;
            queue.Enqueue(start);
            double rightmost = offset;
            while (queue.TryDequeue(out int atom))
            {
                ReadOnlySpan<Neighbor> around = molecule.NeighborsOf(atom);
                int turn = 1;
                foreach (Neighbor neighbor in around)
                {
                    if (placed[neighbor.Atom])
                    {
                        continue;
                    }

                    state = (state * 1664525u) + 1013904223u;
                    double jitter = ((state >> 8) / 16777216.0) - 0.5;
                    double direction = angle[atom] + Math.PI + (2 * Math.PI * turn++ / Math.Max(3, around.Length)) + (0.4 * jitter * attempt);
                    placed[neighbor.Atom] = true;
                    angle[neighbor.Atom] = direction;
                    x[neighbor.Atom] = x[atom] + (Length * Math.Cos(direction));
                    y[neighbor.Atom] = y[atom] + (Length * Math.Sin(direction));
                    rightmost = Math.Max(rightmost, x[neighbor.Atom]);
                    queue.Enqueue(neighbor.Atom);
                }
            }

            offset = rightmost + (4 * Length);
        }

        for (int i = 0; i < shownHydrogens.Count; i++)
        {
            x[atoms + i] = x[shownHydrogens[i]] + 0.9;
            y[atoms + i] = y[shownHydrogens[i]] + 1.1 + (0.01 * i);
        }
    }

    private static void Pull(double[] x, double[] y, int first, int second, double distance, double step)
    {
        double dx = x[second] - x[first];
        double dy = y[second] - y[first];
        double length = Math.Sqrt((dx * dx) + (dy * dy));
        if (length < 1e-3)
        {
            dx = 1e-3 * (1 + (first % 7));
            dy = 1e-3 * (1 + (second % 5));
            length = Math.Sqrt((dx * dx) + (dy * dy));
        }

        double shift = 0.5 * step * (length - distance) / length;
        x[first] += shift * dx;
        y[first] += shift * dy;
        x[second] -= shift * dx;
        y[second] -= shift * dy;
    }

    private static void Repel(double[] x, double[] y, double step)
    {
        const double Near = 1.2 * Length;
        for (int i = 0; i < x.Length; i++)
        {
            for (int j = i + 1; j < x.Length; j++)
            {
                double dx = x[j] - x[i];
                double dy = y[j] - y[i];
                if (Math.Abs(dx) < Near && Math.Abs(dy) < Near && (dx * dx) + (dy * dy) < Near * Near)
                {
                    Pull(x, y, i, j, Near, 0.5 * step);
                }
            }
        }
    }
}
