using System;

namespace RadicalSites.Symmetry;

internal sealed partial class SymmetryGraph
{
    internal int FragmentCount;
    private int[] fragmentIndex = new int[64];
    private int[] fragmentMembers = new int[64];
    private int[] fragmentStart = new int[9];

    /// <summary>0-based index of the fragment of an atom; <see cref="FindFragments"/> comes first.</summary>
    internal int FragmentIndexOf(int atom) => fragmentIndex[atom];

    /// <summary>Atoms of the fragment of an atom, in breadth-first order from its lowest index.</summary>
    internal ReadOnlySpan<int> FragmentOf(int atom) => Fragment(fragmentIndex[atom]);

    /// <summary>Atoms of a fragment, in breadth-first order from its lowest index.</summary>
    internal ReadOnlySpan<int> Fragment(int index) =>
        fragmentMembers.AsSpan(fragmentStart[index], fragmentStart[index + 1] - fragmentStart[index]);

    /// <summary>Finds the connected fragments.</summary>
    internal void FindFragments()
    {
        int n = AtomCount;
        if (fragmentIndex.Length < n)
        {
            fragmentIndex = new int[Key.Length];
            fragmentMembers = new int[Key.Length];
        }

        Array.Fill(fragmentIndex, -1, 0, n);
        FragmentCount = 0;
        int done = 0;
        int found = 0;
        for (int seed = 0; seed < n && found < n; seed++)
        {
            if (fragmentIndex[seed] >= 0)
            {
                continue;
            }

            if (fragmentStart.Length < FragmentCount + 2)
            {
                Array.Resize(ref fragmentStart, 2 * fragmentStart.Length);
            }

            fragmentStart[FragmentCount] = done;
            fragmentIndex[seed] = FragmentCount;
            fragmentMembers[found++] = seed;
            while (done < found)
            {
                int atom = fragmentMembers[done++];
                int end = Offset[atom + 1];
                for (int i = Offset[atom]; i < end; i++)
                {
                    int next = Adjacent[i];
                    if (fragmentIndex[next] < 0)
                    {
                        fragmentIndex[next] = FragmentCount;
                        fragmentMembers[found++] = next;
                    }
                }
            }

            FragmentCount++;
        }

        fragmentStart[FragmentCount] = found;
    }

    /// <summary>Fills this graph with one fragment of another; places follow the order of the fragment's atoms.</summary>
    /// <param name="whole">Graph whose fragments are found.</param>
    /// <param name="index">0-based index of the fragment.</param>
    /// <param name="place">Receives the index here of each atom of the fragment.</param>
    internal void LoadFragment(SymmetryGraph whole, int index, int[] place)
    {
        ReadOnlySpan<int> atoms = whole.Fragment(index);
        int ends = 0;
        for (int i = 0; i < atoms.Length; i++)
        {
            place[atoms[i]] = i;
            ends += whole.DegreeOf(atoms[i]);
        }

        Reserve(atoms.Length, ends);
        AtomCount = atoms.Length;
        ElementCount = 0;
        BodyCount = 0;
        Array.Clear(CenterAt, 0, AtomCount);
        Array.Clear(AxisAt, 0, AtomCount);
        int at = 0;
        for (int i = 0; i < atoms.Length; i++)
        {
            int atom = atoms[i];
            Offset[i] = at;
            Key[i] = whole.Key[atom];
            for (int j = whole.Offset[atom]; j < whole.Offset[atom + 1]; j++)
            {
                Adjacent[at] = place[whole.Adjacent[j]];
                Weight[at++] = whole.Weight[j];
            }
        }

        Offset[atoms.Length] = at;
        for (int i = 0; i < atoms.Length; i++)
        {
            int center = whole.CenterAt[atoms[i]] - 1;
            if (center >= 0)
            {
                AddCopy(whole, center, place);
            }

            int axis = whole.AxisAt[atoms[i]] - 1;
            if (axis >= 0 && whole.Focus[axis] == atoms[i])
            {
                AddCopy(whole, axis, place);
            }
        }

        CopyBodies(whole, index, place);
    }

    private void AddCopy(SymmetryGraph whole, int e, int[] place)
    {
        int at = 4 * e;
        Add(
            whole.Kind[e], place[whole.Focus[e]], place[whole.FocusEnd[e]], Placed(whole.Carriers[at], place),
            Placed(whole.Carriers[at + 1], place), Placed(whole.Carriers[at + 2], place),
            Placed(whole.Carriers[at + 3], place), whole.Configuration[e]);
    }

    private static int Placed(int atom, int[] place) => atom < 0 ? atom : place[atom];
}
