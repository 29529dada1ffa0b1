using DepthStress.Core.Model;

namespace DepthStress.Report;

/// <summary>The pictures that stand both in files of their own and on the report page, each drawn once, when it is first asked for.</summary>
/// <param name="model">The model.</param>
/// <param name="options">Units, tracks, scales and depths.</param>
public sealed class DrawnPictures(EarthModel model, PictureOptions options)
{
    private readonly Lazy<byte[]> _tracks = new(() => Draw(s => TracksPicture.Write(model, options, s)));
    private readonly Lazy<byte[]> _stress = new(() => Draw(s => StressPicture.Write(model, options, s)));
    private readonly Lazy<byte[]> _polygon = new(() => Draw(s => PolygonPicture.Write(model, options, s)));

    /// <summary>The depth tracks as SVG.</summary>
    public ReadOnlySpan<byte> Tracks => _tracks.Value;

    /// <summary>Stresses and gradients over depth as SVG.</summary>
    public ReadOnlySpan<byte> Stress => _stress.Value;

    /// <summary>The stress polygons as SVG.</summary>
    public ReadOnlySpan<byte> Polygon => _polygon.Value;

    private static byte[] Draw(Action<Stream> write)
    {
        using var bytes = new MemoryStream();
        write(bytes);
        return bytes.ToArray();
    }
}
