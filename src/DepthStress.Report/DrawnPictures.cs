using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Report.Drawing;

namespace DepthStress.Report;

/// <summary>The pictures of a run; those that stand both in files of their own and on the report page are drawn once, when first asked for.</summary>
/// <param name="model">The model.</param>
/// <param name="options">Units, tracks, scales and depths.</param>
public sealed class DrawnPictures(EarthModel model, PictureOptions options)
{
    private readonly Picture _tracks = new(() => TracksPicture.Draw(model, options));
    private readonly Picture _stress = new(() => StressPicture.Draw(model, options.Units));
    private readonly Picture _polygon = new(() => PolygonPicture.Draw(model, options));

    /// <summary>The depth tracks as SVG.</summary>
    public ReadOnlySpan<byte> Tracks => _tracks.Svg;

    /// <summary>Stresses and gradients over depth as SVG.</summary>
    public ReadOnlySpan<byte> Stress => _stress.Svg;

    /// <summary>The stress polygons as SVG.</summary>
    public ReadOnlySpan<byte> Polygon => _polygon.Svg;

    /// <summary>
    /// Writes every picture of the run as a PDF, each on a page of A4: tracks, stress, layers, polygons. Letters outside
    /// those of Western Europe become question marks. The same pictures give the same bytes.
    /// </summary>
    /// <param name="layers">The layers the model was cut into.</param>
    /// <param name="settings">What counts as a stress barrier.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public void WritePdf(LayerTable layers, LayerSettings settings, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(layers);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(destination);
        Sheet[] pages = [_tracks.Sheet, _stress.Sheet, LayersPicture.Draw(model, layers, settings, options.Units), _polygon.Sheet];
        PdfBook.Write(pages, $"{model.Setup.Name}: pictures", destination);
    }

    private sealed class Picture(Func<Sheet> draw)
    {
        private readonly Lazy<Sheet> _sheet = new(draw);
        private byte[]? _svg;

        public Sheet Sheet => _sheet.Value;

        public byte[] Svg => LazyInitializer.EnsureInitialized(ref _svg, Write);

        private byte[] Write()
        {
            using var bytes = new MemoryStream();
            SvgPaper.Write(Sheet, bytes);
            return bytes.ToArray();
        }
    }
}
