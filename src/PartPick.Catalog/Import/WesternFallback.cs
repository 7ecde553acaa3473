using System.Text;

namespace PartPick.Catalog.Import;

/// <summary>
/// Reads bytes that are no UTF-8 as the western single-byte set: Latin-1, with the marks that Windows puts where Latin-1 has
/// control characters. So one reader takes both encodings, in one pass.
/// </summary>
internal sealed class WesternFallback : DecoderFallback
{
    // Windows code page 1252, 0x80 to 0x9F (from the table at unicode.org); a hyphen where it has nothing.
    private const string Windows = "€-‚ƒ„…†‡ˆ‰Š‹Œ-Ž--‘’“”•–—˜™š›œ-žŸ";

    /// <summary>Whether any byte was read so.</summary>
    public bool WasUsed { get; private set; }

    public override int MaxCharCount => 4;

    public override DecoderFallbackBuffer CreateFallbackBuffer() => new Letters(this);

    private sealed class Letters(WesternFallback owner) : DecoderFallbackBuffer
    {
        private readonly char[] _letters = new char[8];
        private int _count;
        private int _next;

        public override int Remaining => _count - _next;

        public override bool Fallback(byte[] bytesUnknown, int index)
        {
            owner.WasUsed = true;
            (_count, _next) = (0, 0);
            foreach (byte unknown in bytesUnknown)
            {
                _letters[_count++] = unknown is >= 0x80 and < 0xA0 ? Windows[unknown - 0x80] : (char)unknown;
            }

            return _count > 0;
        }

        public override char GetNextChar() => _next < _count ? _letters[_next++] : '\0';

        public override bool MovePrevious()
        {
            if (_next == 0)
            {
                return false;
            }

            _next--;
            return true;
        }

        public override void Reset() => (_count, _next) = (0, 0);
    }
}
