using System;
using System.Buffers;
using System.Collections.Generic;
using System.Globalization;
using System.Text;
using RadicalSites.Molecules;

namespace RadicalSites.Reporting;

/// <summary>Writes the fields of CSV rows (RFC 4180, line feed, UTF-8) into a buffer of the caller.</summary>
internal ref struct CsvFields(IBufferWriter<byte> output)
{
    private static readonly SearchValues<char> Quoted = SearchValues.Create(",\"\r\n");

    private readonly IBufferWriter<byte> output = output;
    private bool isInRow;

    internal void Text(ReadOnlySpan<char> text)
    {
        Separate();
        if (text.IndexOfAny(Quoted) < 0 && (text.IsEmpty || (text[0] != ' ' && text[^1] != ' ')))
        {
            Encode(text);
            return;
        }

        Byte((byte)'"');
        while (text.IndexOf('"') is >= 0 and int quote)
        {
            Encode(text[..(quote + 1)]);
            Byte((byte)'"');
            text = text[(quote + 1)..];
        }

        Encode(text);
        Byte((byte)'"');
    }

    internal void Number(double? value)
    {
        Separate();
        if (value is { } number && double.IsFinite(number))
        {
            Span<byte> space = output.GetSpan(32);
            number.TryFormat(space, out int written, default, CultureInfo.InvariantCulture);
            output.Advance(written);
        }
    }

    internal void Number(long? value)
    {
        Separate();
        if (value is { } number)
        {
            Digits(number);
        }
    }

    internal void Flag(bool value) => Text(value ? "true" : "false");

    /// <summary>Writes a list in one field, its members separated by a semicolon.</summary>
    internal void List(IReadOnlyList<int> numbers)
    {
        Separate();
        for (int i = 0; i < numbers.Count; i++)
        {
            if (i > 0)
            {
                Byte((byte)';');
            }

            Digits(numbers[i]);
        }
    }

    /// <summary>Writes atom indices as those of the input.</summary>
    internal void Atoms(Molecule molecule, IReadOnlyList<int> atoms)
    {
        Separate();
        for (int i = 0; i < atoms.Count; i++)
        {
            if (i > 0)
            {
                Byte((byte)';');
            }

            Digits(molecule.InputIndexOf(atoms[i]));
        }
    }

    internal void List<T>(IReadOnlyList<T> members, Func<T, string> text)
    {
        if (members.Count <= 1)
        {
            Text(members.Count == 0 ? "" : text(members[0]));
            return;
        }

        var joined = new StringBuilder();
        for (int i = 0; i < members.Count; i++)
        {
            joined.Append(i > 0 ? ";" : "").Append(text(members[i]));
        }

        Text(joined.ToString());
    }

    internal void Skip(int fields)
    {
        for (int i = 0; i < fields; i++)
        {
            Separate();
        }
    }

    internal void EndRow()
    {
        Byte((byte)'\n');
        isInRow = false;
    }

    private void Separate()
    {
        if (isInRow)
        {
            Byte((byte)',');
        }

        isInRow = true;
    }

    private readonly void Digits(long number)
    {
        Span<byte> space = output.GetSpan(20);
        number.TryFormat(space, out int written, default, CultureInfo.InvariantCulture);
        output.Advance(written);
    }

    private readonly void Encode(ReadOnlySpan<char> text)
    {
        if (!text.IsEmpty)
        {
            Encoding.UTF8.GetBytes(text, output);
        }
    }

    private readonly void Byte(byte value)
    {
        output.GetSpan(1)[0] = value;
        output.Advance(1);
    }
}
