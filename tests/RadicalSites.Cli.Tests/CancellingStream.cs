using System;
using System.IO;
using System.Text;
using System.Threading;

namespace RadicalSites.Cli.Tests;

/// <summary>Hands out a text in small pieces and cancels the run after a part of it.</summary>
internal sealed class CancellingStream(string text, double part, CancellationTokenSource cancellation)
    : MemoryStream(Encoding.UTF8.GetBytes(text))
{
    private bool isCancelled;

    public override int Read(byte[] buffer, int offset, int count)
    {
        if (Position > Length * part && !isCancelled)
        {
            isCancelled = true;
            cancellation.Cancel();
        }

        return base.Read(buffer, offset, Math.Min(count, 1000));
    }
}
