using System.Globalization;
using System.Text;
using System.Xml.Linq;
using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report;

namespace DepthStress.Tests.Report;

public class PictureTests
{
    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";

    [Fact]
    public void Pictures_have_the_same_bytes_in_every_run_and_culture()
    {
        var model = PictureModels.Full(900);
        var (tracks, stress) = (Tracks(model), Stress(model));
        Assert.Equal(tracks, Tracks(model));
        var before = CultureInfo.CurrentCulture;
        try
        {
            var comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
            comma.NumberFormat.NumberDecimalSeparator = ",";
            comma.NumberFormat.NegativeSign = "~";
            CultureInfo.CurrentCulture = comma;
            Assert.Equal(tracks, Tracks(PictureModels.Full(900)));
            Assert.Equal(stress, Stress(PictureModels.Full(900)));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void A_picture_with_two_tracks_is_as_agreed()
    {
        var md = PictureModels.Depths(6, 1000, 1005);
        var model = PictureModels.Small(
            md, "Golden 1", [PictureModels.Zone("upper", 900), PictureModels.Zone("lower", 1002.5)],
            ("density", [2200, 2250, 2300, double.NaN, 2400, 3000]), ("gamma_ray", [40, 80, 120, 160, 90, 60]));
        Golden.Match("tracks.svg", Tracks(model, UnitSystem.Metric, "gamma_ray", "density"));
    }

    [Fact]
    public void Pictures_stay_small_however_many_samples_there_are()
    {
        var (few, many) = (PictureModels.Full(15_000), PictureModels.Full(150_000));
        Assert.InRange(Encoding.UTF8.GetByteCount(Tracks(few)), 100_000, 600_000);
        Assert.InRange(Encoding.UTF8.GetByteCount(Tracks(many)), 100_000, 600_000);
        Assert.InRange(Encoding.UTF8.GetByteCount(Stress(many)), 20_000, 400_000);
    }

    [Fact]
    public void Names_with_markup_and_control_characters_stay_text()
    {
        const string Name = "A_{b}^c <i>&\"x\"</i>\u0001\u0085\ud800 \u202e\u00e9 \ud83d\ude00";
        var model = PictureModels.Small([1000, 1001], Name, [PictureModels.Zone("z<1>&_{2}\u0000", 900)], ("density", [2300, 2310]));
        foreach (var svg in new[] { Tracks(model), Stress(model), Polygon(model) })
        {
            var texts = XDocument.Parse(svg).Descendants(Svg + "text").Select(t => t.Value).ToList();
            Assert.Contains(texts, t => t.StartsWith("A_{b}^c <i>&\"x\"</i> \u00e9 \ud83d\ude00 \u00b7", StringComparison.Ordinal));
            Assert.Contains("z<1>&_{2}", texts);
            Assert.Empty(XDocument.Parse(svg).Descendants(Svg + "i"));
        }
    }

    [Fact]
    public void Tracks_without_a_value_are_left_out_and_the_rest_stays()
    {
        var model = PictureModels.Small([1000, 1001, 1002], "one curve", [], ("density", [2300, 2310, 2320]));
        var texts = Texts(Tracks(model));
        Assert.Contains("bulk density", texts);
        Assert.Contains("Sv, vertical", texts);
        foreach (var absent in new[] { "caliper", "gamma ray", "shear", "neutron", "Young's", "Shmin, least", "unconfined, UCS", "Zone" }) Assert.DoesNotContain(absent, texts);
        Assert.DoesNotContain("Shmin, least horizontal stress", Texts(Stress(model)));
    }

    [Fact]
    public void A_model_without_any_value_gives_a_page_that_says_so()
    {
        var full = PictureModels.Full(50, zones: []);
        var empty = new PropertyTable(full.Count);
        empty.Adopt(Property.MeasuredDepth, full.Logs.Depths);
        empty.Write(Property.TrueVerticalDepth);
        empty.Write(Property.Vp);
        var model = full with { Values = empty };
        Assert.Contains("No curve of these tracks has a value.", Texts(Tracks(model)));
        Assert.Contains("Example 1 \u00b7 stress over depth", Texts(Stress(model)));
    }

    [Fact]
    public void One_sample_is_drawn()
    {
        var model = PictureModels.Small([1000], "one sample", [], ("density", [2300]));
        var lines = XDocument.Parse(Tracks(model, UnitSystem.Metric, "density")).Descendants(Svg + "polyline").ToList();
        Assert.Contains(lines, l => l.Attribute("style")!.Value.Contains("stroke:rgb(107,63,160)", StringComparison.Ordinal) && l.Attribute("points")!.Value.Split(' ').Length == 2);
    }

    [Fact]
    public void The_options_choose_tracks_and_their_order()
    {
        var texts = Texts(Tracks(PictureModels.Full(100), UnitSystem.Metric, "stress", "gamma_ray"));
        Assert.True(texts.IndexOf("Pp, pore") < texts.IndexOf("gamma ray"));
        Assert.DoesNotContain("caliper", texts);
        Assert.Throws<ArgumentException>(() => Tracks(PictureModels.Full(100), UnitSystem.Metric, "gama_ray"));
    }

    [Fact]
    public void An_offshore_well_names_its_sea_surface()
    {
        var model = PictureModels.Full(100);
        model = model with { Setup = model.Setup with { Frame = new DepthFrame(DatumKind.SeaLevel, 0, null, 95, null) } };
        var texts = Texts(Stress(model));
        Assert.Contains("Datum at mean sea level; water depth 95.0 m", texts);
        Assert.Contains("True vertical depth below mean sea level, m", texts);
        Assert.Contains("reference: water of 1.04 g/cm3 below the sea surface", texts);
    }

    [Fact]
    public void True_vertical_depths_stand_where_the_samples_pass_them()
    {
        var sheet = TracksPicture.Draw(PictureModels.Full(3000), UnitSystem.Field, [TrackTable.All[1]]);
        var labels = sheet.Texts.Where(t => t.Box.Left > 70 && t.Box.Right < 120 && double.TryParse(t.Text, CultureInfo.InvariantCulture, out _)).Select(t => t.Text);
        Assert.Equal(["3000", "4000", "5000", "6000", "7000", "8000", "9000", "10000"], labels);
    }

    [Fact]
    public void A_level_hole_still_shows_its_true_vertical_depth()
    {
        var model = PictureModels.Full(500);
        model.Values.Write(Property.TrueVerticalDepth).Fill(2500.3);
        var sheet = TracksPicture.Draw(model, UnitSystem.Metric, [TrackTable.All[1]]);
        Assert.InRange(sheet.Texts.Count(t => t.Text == "2500.3"), 3, 10);
    }

    [Fact]
    public void Track_ids_are_distinct_and_every_scale_has_a_width()
    {
        Assert.Equal(TrackTable.All.Count, TrackTable.All.Select(t => t.Id).Distinct(StringComparer.Ordinal).Count());
        foreach (var curve in TrackTable.All.SelectMany(t => t.Curves))
        {
            Assert.NotEqual(curve.Metric.Left, curve.Metric.Right);
            Assert.NotEqual(curve.Field.Left, curve.Field.Right);
        }
    }

    private static List<string> Texts(string svg) => [.. XDocument.Parse(svg).Descendants(Svg + "text").Select(t => t.Value)];

    private static string Tracks(EarthModel model, UnitSystem units = UnitSystem.Metric, params string[] tracks)
    {
        using var stream = new MemoryStream();
        TracksPicture.Write(model, new PictureOptions(units, tracks.Length == 0 ? null : tracks), stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    private static string Polygon(EarthModel model)
    {
        using var stream = new MemoryStream();
        PolygonPicture.Write(model, new PictureOptions(UnitSystem.Metric), stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }

    private static string Stress(EarthModel model)
    {
        using var stream = new MemoryStream();
        StressPicture.Write(model, new PictureOptions(UnitSystem.Metric), stream);
        return Encoding.UTF8.GetString(stream.ToArray());
    }
}
