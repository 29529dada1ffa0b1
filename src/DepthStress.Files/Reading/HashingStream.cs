using System.Security.Cryptography;

namespace DepthStress.Files.Reading;

/// <summary>Passes on what is read from a stream and hashes it on the way, so that the hash is that of the very bytes that were read.</summary>
internal sealed class HashingStream(Stream inner) : Stream
{
    private readonly IncrementalHash _hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);

    /// <summary>Number of bytes read so far.</summary>
    public long BytesRead { get; private set; }

    public override bool CanRead => true;

    public override bool CanSeek => false;

    public override bool CanWrite => false;

    public override long Length => inner.Length;

    public override long Position { get => BytesRead; set => throw new NotSupportedException(); }

    /// <summary>SHA-256 of the bytes read since the last call, as lower-case hexadecimal digits.</summary>
    public string TakeHash() => Convert.ToHexStringLower(_hash.GetHashAndReset());

    public override int Read(Span<byte> buffer)
    {
        var n = inner.Read(buffer);
        _hash.AppendData(buffer[..n]);
        BytesRead += n;
        return n;
    }

    public override int Read(byte[] buffer, int offset, int count) => Read(buffer.AsSpan(offset, count));

    public override void Flush()
    {
    }

    public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

    public override void SetLength(long value) => throw new NotSupportedException();

    public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();

    protected override void Dispose(bool disposing)
    {
        if (disposing) _hash.Dispose();
        base.Dispose(disposing);
    }
}
