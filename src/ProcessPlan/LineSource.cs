using System.Buffers;

namespace ProcessPlan;

/// <summary>The lines of a stream as bytes, one after another, through one buffer. Lines end with LF or CR LF; the last one may end without.</summary>
internal sealed class LineSource(Stream input) : IDisposable
{
    /// <summary>A longer line is passed over to its end.</summary>
    public const int MostBytes = 1 << 16;

    private byte[] _buffer = ArrayPool<byte>.Shared.Rent(2 * MostBytes);
    private int _from;
    private int _to;
    private bool _ended;

    /// <summary>Number of the line read last, counted from 1.</summary>
    public long Number { get; private set; }

    /// <summary>Whether the line read last is longer than <see cref="MostBytes"/>; what was returned is then its beginning.</summary>
    public bool IsTooLong { get; private set; }

    /// <summary>Whether the next line is here without waiting for more input.</summary>
    public bool HasBufferedLine => _buffer.AsSpan(_from, _to - _from).Contains((byte)'\n');

    /// <summary>The next line without its end, valid until the next call; false at the end of the input.</summary>
    public bool TryRead(out ReadOnlySpan<byte> line)
    {
        IsTooLong = false;
        int searched = 0;
        while (true)
        {
            int length = _buffer.AsSpan(_from + searched, _to - _from - searched).IndexOf((byte)'\n');
            if (length >= 0)
            {
                line = Take(searched + length, 1);
                return true;
            }

            if (_to - _from > MostBytes)
            {
                // Only its beginning is kept; the rest is read over it.
                IsTooLong = true;
                _to = _from + MostBytes;
            }

            searched = _to - _from;
            if (!Fill())
            {
                bool isLast = searched > 0;
                line = isLast ? Take(searched, 0) : [];
                return isLast;
            }
        }
    }

    public void Dispose()
    {
        ArrayPool<byte>.Shared.Return(_buffer);
        _buffer = [];
    }

    private ReadOnlySpan<byte> Take(int length, int end)
    {
        ReadOnlySpan<byte> line = _buffer.AsSpan(_from, length);
        _from += length + end;
        Number++;
        if (Number == 1 && line.StartsWith("\uFEFF"u8))
        {
            line = line["\uFEFF"u8.Length..];
        }

        IsTooLong |= length > MostBytes;
        return line.EndsWith("\r"u8) ? line[..^1] : line;
    }

    private bool Fill()
    {
        if (_from > 0)
        {
            _buffer.AsSpan(_from, _to - _from).CopyTo(_buffer);
            _to -= _from;
            _from = 0;
        }

        int read = _ended ? 0 : input.Read(_buffer, _to, _buffer.Length - _to);
        _ended |= read == 0;
        _to += read;
        return read > 0;
    }
}
