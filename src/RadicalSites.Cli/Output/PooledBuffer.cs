using System;
using System.Buffers;
using System.Text;

namespace RadicalSites.Cli.Output;

/// <summary>A growing buffer that keeps its memory from batch to batch.</summary>
internal sealed class PooledBuffer : IBufferWriter<byte>
{
    private const int Largest = 1 << 22;

    private byte[] bytes = new byte[1 << 14];

    internal int Length { get; private set; }

    internal ReadOnlySpan<byte> Written => bytes.AsSpan(0, Length);

    public void Advance(int count) => Length += count;

    public Memory<byte> GetMemory(int sizeHint = 0)
    {
        Reserve(sizeHint);
        return bytes.AsMemory(Length);
    }

    public Span<byte> GetSpan(int sizeHint = 0)
    {
        Reserve(sizeHint);
        return bytes.AsSpan(Length);
    }

    internal void Append(ReadOnlySpan<byte> text) => text.CopyTo(Take(text.Length));

    internal void Append(ReadOnlySpan<char> text)
    {
        if (!text.IsEmpty)
        {
            Length += Encoding.UTF8.GetBytes(text, GetSpan(Encoding.UTF8.GetMaxByteCount(text.Length)));
        }
    }

    internal void Append(byte value) => Take(1)[0] = value;

    /// <summary>Appends a line of SMILES, number and name, separated by tabs.</summary>
    internal void AppendLine(string smiles, double? number, string? name) => Append(string.Create(
        System.Globalization.CultureInfo.InvariantCulture, $"{smiles}\t{number}\t{name}\n"));

    /// <summary>Takes back what a record that failed half-way has written.</summary>
    internal void Truncate(int length) => Length = length;

    internal void Clear()
    {
        Length = 0;
        if (bytes.Length > Largest)
        {
            bytes = new byte[1 << 14];
        }
    }

    private Span<byte> Take(int count)
    {
        Reserve(count);
        Span<byte> room = bytes.AsSpan(Length, count);
        Length += count;
        return room;
    }

    private void Reserve(int count)
    {
        count = Math.Max(count, 256);
        if (Length + count > bytes.Length)
        {
            Array.Resize(ref bytes, (int)Math.Min(Array.MaxLength, Math.Max(2L * bytes.Length, (long)Length + count)));
        }
    }
}
