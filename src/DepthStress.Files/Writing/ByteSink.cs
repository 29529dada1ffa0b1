namespace DepthStress.Files.Writing;

/// <summary>Gathers bytes and hands them to a stream in large pieces.</summary>
internal sealed class ByteSink(Stream destination) : IDisposable
{
    private readonly byte[] _buffer = new byte[128 * 1024];
    private int _used;

    /// <summary>Adds one byte.</summary>
    public void Put(byte value)
    {
        if (_used == _buffer.Length) Flush();
        _buffer[_used++] = value;
    }

    /// <summary>Adds bytes.</summary>
    public void Put(ReadOnlySpan<byte> bytes)
    {
        if (bytes.Length > _buffer.Length - _used) Flush();
        if (bytes.Length > _buffer.Length)
        {
            destination.Write(bytes);
            return;
        }

        bytes.CopyTo(_buffer.AsSpan(_used));
        _used += bytes.Length;
    }

    /// <summary>Adds a number with fixed decimals; one that is not finite adds nothing.</summary>
    public void Put(double value, int decimals)
    {
        if (_buffer.Length - _used < FixedPoint.MaxLength) Flush();
        FixedPoint.TryFormat(value, decimals, _buffer.AsSpan(_used), out var written);
        _used += written;
    }

    /// <summary>Hands over what is left; the stream stays open.</summary>
    public void Dispose() => Flush();

    private void Flush()
    {
        destination.Write(_buffer, 0, _used);
        _used = 0;
    }
}
