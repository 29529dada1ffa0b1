using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Report.Drawing;

namespace DepthStress.Report;

/// <summary>The pictures of a run, for files of their own, the report page and the PDF; each is drawn once, when first asked for.</summary>
/// <param name="model">The model.</param>
/// <param name="layers">The layers the model was cut into.</param>
/// <param name="settings">What counts as a stress barrier.</param>
/// <param name="options">Units, tracks, scales and depths.</param>
public sealed class DrawnPictures(EarthModel model, LayerTable layers, LayerSettings settings, PictureOptions options)
{
    private readonly Picture _tracks = new(() => TracksPicture.Draw(model, options));
    private readonly Picture _stress = new(() => StressPicture.Draw(model, options.Units));
    private readonly Picture _layers = new(() => LayersPicture.Draw(model, layers, settings, options.Units));
    private readonly Picture _polygon = new(() => PolygonPicture.Draw(model, options));

    /// <summary>The depth tracks as SVG.</summary>
    public ReadOnlySpan<byte> Tracks => _tracks.Svg;

    /// <summary>Stresses and gradients over depth as SVG.</summary>
    public ReadOnlySpan<byte> Stress => _stress.Svg;

    /// <summary>The layers over the profile as SVG.</summary>
    public ReadOnlySpan<byte> Layers => _layers.Svg;

    /// <summary>The stress polygons as SVG.</summary>
    public ReadOnlySpan<byte> Polygon => _polygon.Svg;

    /// <summary>
    /// Writes every picture of the run as a PDF, each on a page of A4: tracks, stress, layers, polygons. Letters outside
    /// those of Western Europe become question marks. The same pictures give the same bytes.
    /// </summary>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public void WritePdf(Stream destination)
    {
        ArgumentNullException.ThrowIfNull(destination);
        PdfBook.Write([_tracks.Sheet, _stress.Sheet, _layers.Sheet, _polygon.Sheet], $"{model.Setup.Name}: pictures", destination);
    }

    private sealed class Picture
    {
        private readonly Lazy<Sheet> _sheet;
        private readonly Lazy<byte[]> _svg;

        public Picture(Func<Sheet> draw)
        {
            _sheet = new(draw);
            _svg = new(Write);
        }

        public Sheet Sheet => _sheet.Value;

        public byte[] Svg => _svg.Value;

        private byte[] Write()
        {
            using var bytes = new MemoryStream();
            SvgPaper.Write(Sheet, bytes);
            return bytes.ToArray();
        }
    }
}
