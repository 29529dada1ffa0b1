namespace DepthStress.Files.Reading;

/// <summary>Reads a stream line by line as bytes; a line ends with LF, CR LF or CR. A UTF-8 byte-order mark is left out.</summary>
internal sealed class LineReader(Stream stream)
{
    private byte[] _buffer = new byte[1 << 18];
    private int _start, _end;
    private bool _ended, _afterReturn;

    /// <summary>Number of the line read last, from 1; 0 before the first.</summary>
    public int Line { get; private set; }

    /// <summary>True when reading stopped at a line beyond <see cref="LogSource.MaxLine"/>.</summary>
    public bool TooLong { get; private set; }

    /// <summary>Gives the next line without its end, valid until the next call; false at the end or at a line that is too long.</summary>
    public bool TryRead(out ReadOnlySpan<byte> line)
    {
        line = default;
        if (Line == 0) SkipMark();
        var searched = 0;
        while (true)
        {
            if (_afterReturn && _start < _end)
            {
                if (_buffer[_start] == (byte)'\n') _start++;
                _afterReturn = false;
            }

            var rest = _buffer.AsSpan(_start, _end - _start);
            var found = rest[searched..].IndexOfAny((byte)'\n', (byte)'\r');
            if (found >= 0)
            {
                line = rest[..(searched + found)];
                _afterReturn = rest[line.Length] == (byte)'\r';
                _start += line.Length + 1;
                Line++;
                return true;
            }

            if (_ended)
            {
                if (rest.IsEmpty) return false;
                line = rest;
                _start = _end;
                Line++;
                return true;
            }

            searched = rest.Length;
            if (searched > LogSource.MaxLine)
            {
                TooLong = true;
                return false;
            }

            Fill();
        }
    }

    private void SkipMark()
    {
        while (_end < 3 && !_ended) Fill();
        if (_buffer.AsSpan(_start, _end - _start).StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF])) _start += 3;
    }

    private void Fill()
    {
        if (_start > 0)
        {
            _buffer.AsSpan(_start, _end - _start).CopyTo(_buffer);
            _end -= _start;
            _start = 0;
        }

        if (_end == _buffer.Length) Array.Resize(ref _buffer, 2 * _buffer.Length);
        var n = stream.Read(_buffer.AsSpan(_end));
        _ended = n == 0;
        _end += n;
    }
}
