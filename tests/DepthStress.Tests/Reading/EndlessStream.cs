namespace DepthStress.Tests.Reading;

/// <summary>A file that is made while it is read: a start, a piece again and again up to a length, an end.</summary>
internal sealed class EndlessStream(byte[] start, byte[] piece, long pieces, byte[] end) : Stream
{
    private readonly byte[] _block = [.. Enumerable.Repeat(piece, Math.Max(1, 65_536 / piece.Length)).SelectMany(p => p)];

    public override bool CanRead => true;

    public override bool CanSeek => true;

    public override bool CanWrite => false;

    public override long Length => start.Length + (piece.Length * pieces) + end.Length;

    public override long Position { get; set; }

    public override int Read(Span<byte> buffer)
    {
        var middle = Length - end.Length;
        var source = Position < start.Length ? start.AsSpan((int)Position)
            : Position >= middle ? end.AsSpan((int)Math.Min(end.Length, Position - middle))
            : _block.AsSpan((int)((Position - start.Length) % piece.Length));
        var left = Position >= start.Length && Position < middle ? middle - Position : source.Length;
        var n = (int)Math.Min(Math.Min(buffer.Length, source.Length), left);
        source[..n].CopyTo(buffer);
        Position += n;
        return n;
    }

    public override int Read(byte[] buffer, int offset, int count) => Read(buffer.AsSpan(offset, count));

    public override void Flush()
    {
    }

    public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

    public override void SetLength(long value) => throw new NotSupportedException();

    public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();
}
