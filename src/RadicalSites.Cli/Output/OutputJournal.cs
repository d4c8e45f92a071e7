using System;
using System.Buffers;
using System.Globalization;
using System.IO;
using System.Security.Cryptography;
using System.Text;

namespace RadicalSites.Cli.Output;

/// <summary>Says how far an output is: after each piece its records, failures, length and checksum.</summary>
/// <remarks>
/// One line for each piece, with a checksum of its own. After a crash the longest run of whole lines whose pieces stand
/// unchanged in the output counts; the rest of both files is cut off. Nothing has to reach the disk in order.
/// </remarks>
internal sealed class OutputJournal : IDisposable
{
    private const string Magic = "radicalsites-journal/1 ";

    private readonly string path;
    private readonly FileStream file;

    private OutputJournal(string path, FileStream file)
    {
        this.path = path;
        this.file = file;
    }

    internal long Records { get; private set; }

    internal long Failed { get; private set; }

    internal long Length { get; private set; }

    public void Dispose() => file.Dispose();

    internal static OutputJournal Open(string path, string job, FileStream part, bool resume)
    {
        var file = new FileStream(
            path, resume ? FileMode.OpenOrCreate : FileMode.Create, FileAccess.ReadWrite, FileShare.None, 0);
        var journal = new OutputJournal(path, file);
        try
        {
            string head = Magic + Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(job)));
            long kept = resume ? journal.Replay(head, part) : 0;
            part.SetLength(journal.Length);
            part.Position = journal.Length;
            file.SetLength(kept);
            file.Position = kept;
            if (kept == 0)
            {
                file.Write(Encoding.ASCII.GetBytes(head + "\n"));
            }

            return journal;
        }
        catch
        {
            journal.Dispose();
            throw;
        }
    }

    internal void Add(ReadOnlySpan<byte> data, long records, long failed)
    {
        Length += data.Length;
        Records = records;
        Failed = failed;
        file.Write(Encoding.ASCII.GetBytes(Line(records, failed, Length, data)));
    }

    internal void Delete()
    {
        file.Dispose();
        File.Delete(path);
    }

    private static string Line(long records, long failed, long length, ReadOnlySpan<byte> data)
    {
        Span<byte> hash = stackalloc byte[SHA256.HashSizeInBytes];
        SHA256.HashData(data, hash);
        string text = string.Create(
            CultureInfo.InvariantCulture, $"{records} {failed} {length} {Convert.ToHexStringLower(hash[..8])}");
        SHA256.HashData(Encoding.ASCII.GetBytes(text), hash);
        return text + " " + Convert.ToHexStringLower(hash[..4]) + "\n";
    }

    // Returns the length of the journal up to the last line that holds.
    private long Replay(string head, FileStream part)
    {
        using var reader = new StreamReader(file, Encoding.ASCII, false, 4096, leaveOpen: true);
        string? first = reader.ReadLine();
        if (first is null || !first.StartsWith(Magic, StringComparison.Ordinal) || file.Length <= head.Length)
        {
            return 0;
        }

        if (first != head)
        {
            throw new ToolException(ExitCode.InputOutput, 
                $"{path} belongs to an unfinished run with other inputs, options or data; finish that one, or leave --resume out to start afresh.");
        }

        long kept = head.Length + 1;
        part.Position = 0;
        byte[] piece = ArrayPool<byte>.Shared.Rent(1 << 17);
        while (reader.ReadLine() is { } line)
        {
            string[] fields = line.Split(' ');
            if (fields.Length != 5
                || !long.TryParse(fields[0], NumberStyles.None, CultureInfo.InvariantCulture, out long records)
                || !long.TryParse(fields[1], NumberStyles.None, CultureInfo.InvariantCulture, out long failed)
                || !long.TryParse(fields[2], NumberStyles.None, CultureInfo.InvariantCulture, out long length)
                || kept + line.Length >= file.Length || length < Length || length > part.Length || length - Length > Array.MaxLength)
            {
                break;
            }

            int size = (int)(length - Length);
            if (size > piece.Length)
            {
                ArrayPool<byte>.Shared.Return(piece);
                piece = ArrayPool<byte>.Shared.Rent(size);
            }

            part.ReadExactly(piece, 0, size);
            if (Line(records, failed, length, piece.AsSpan(0, size)) != line + "\n")
            {
                break;
            }

            (Records, Failed, Length) = (records, failed, length);
            kept += line.Length + 1;
        }

        ArrayPool<byte>.Shared.Return(piece);
        return kept;
    }
}
