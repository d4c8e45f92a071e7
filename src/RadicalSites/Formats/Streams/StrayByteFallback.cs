using System.Text;

namespace RadicalSites.Formats.Streams;

/// <summary>Reads bytes that are no UTF-8 as Latin-1, each for itself, so that no byte is lost.</summary>
internal sealed class StrayByteFallback : DecoderFallback
{
    public override int MaxCharCount => 4;

    public override DecoderFallbackBuffer CreateFallbackBuffer() => new Buffer();

    private sealed class Buffer : DecoderFallbackBuffer
    {
        private byte[] bytes = [];
        private int next;

        public override int Remaining => bytes.Length - next;

        public override bool Fallback(byte[] bytesUnknown, int index)
        {
            bytes = bytesUnknown;
            next = 0;
            return bytes.Length > 0;
        }

        public override char GetNextChar() => next < bytes.Length ? (char)bytes[next++] : '\0';

        public override bool MovePrevious()
        {
            if (next == 0)
            {
                return false;
            }

            next--;
            return true;
        }

        public override void Reset()
        {
            bytes = [];
            next = 0;
        }
    }
}
