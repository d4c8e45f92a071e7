using System;
using System.Buffers;

namespace RadicalSites.Perception;

/// <summary>A rented block of integers that goes back to the pool when the scope ends.</summary>
internal readonly ref struct ScratchInts
{
    private readonly int[] rented;

    internal ScratchInts(int length)
    {
        rented = ArrayPool<int>.Shared.Rent(length);
        Span = rented.AsSpan(0, length);
    }

    /// <summary>The block; its content is not cleared.</summary>
    internal Span<int> Span { get; }

    /// <summary>Gives the block back.</summary>
    public void Dispose() => ArrayPool<int>.Shared.Return(rented);
}
