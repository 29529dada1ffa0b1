using System.Security.Cryptography;

namespace DepthStress.Files.Reading;

/// <summary>
/// Passes on what is read from a stream and hashes it on the way, so that the hash is that of the very bytes that were
/// read. A copy of each block is hashed beside the work on the block itself.
/// </summary>
internal sealed class HashingStream(Stream inner) : Stream
{
    private byte[] _block = [];
    private Task<IncrementalHash> _hashing = Task.Run(() => IncrementalHash.CreateHash(HashAlgorithmName.SHA256));

    /// <summary>Number of bytes read so far.</summary>
    public long BytesRead { get; private set; }

    public override bool CanRead => true;

    public override bool CanSeek => false;

    public override bool CanWrite => false;

    public override long Length => inner.Length;

    public override long Position { get => BytesRead; set => throw new NotSupportedException(); }

    /// <summary>SHA-256 of the bytes read so far, as lower-case hexadecimal digits.</summary>
    public string Sha256() => Convert.ToHexStringLower(_hashing.GetAwaiter().GetResult().GetCurrentHash());

    public override int Read(Span<byte> buffer)
    {
        var n = inner.Read(buffer);
        if (n == 0) return 0;
        BytesRead += n;
        var hash = _hashing.GetAwaiter().GetResult();
        if (_block.Length < n) _block = new byte[buffer.Length];
        buffer[..n].CopyTo(_block);
        _hashing = Task.Run(() =>
        {
            hash.AppendData(_block, 0, n);
            return hash;
        });
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
        if (disposing) _hashing.GetAwaiter().GetResult().Dispose();
        base.Dispose(disposing);
    }
}
