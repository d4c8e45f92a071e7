using System;

namespace RadicalSites.Molecules;

/// <summary>Perceived properties of an atom, one bit each.</summary>
[Flags]
internal enum AtomFlags : byte
{
    None = 0,
    Aromatic = 1,
    Ring = 2,
}
