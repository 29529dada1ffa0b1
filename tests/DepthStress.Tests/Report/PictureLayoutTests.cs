using System.Globalization;
using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report;
using DepthStress.Report.Drawing;

namespace DepthStress.Tests.Report;

public class PictureLayoutTests
{
    private const string LongName = "a well whose name goes on and on, with a second part that is longer than the first one, and a third";

    public static TheoryData<string, UnitSystem> Cases()
    {
        var cases = new TheoryData<string, UnitSystem>();
        foreach (var name in new[] { "full", "no strains", "many zones", "very many zones", "long names", "two samples", "density only", "comparisons", "targets" })
        {
            cases.Add(name, UnitSystem.Metric);
            cases.Add(name, UnitSystem.Field);
        }

        return cases;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void No_two_texts_overlap_and_all_lie_on_the_page(string name, UnitSystem units)
    {
        var model = Model(name);
        foreach (var sheet in Sheets(model, units)) SheetChecks.NoTextOverlapsOrIsCutOff(sheet);
    }

    [Theory]
    [InlineData(UnitSystem.Metric)]
    [InlineData(UnitSystem.Field)]
    public void All_tracks_fit_on_A4_without_a_shortened_text(UnitSystem units)
    {
        var sheet = TracksPicture.Draw(PictureModels.Full(layered: true), units, TrackTable.All);
        Assert.Equal(PageFrame.LongSide, sheet.Width, 0.1); // placed to a tenth of 1/96 inch
        Assert.Equal(PageFrame.ShortSide, sheet.Height);
        Assert.DoesNotContain(sheet.Texts, t => t.Text.Contains('\u2026', StringComparison.Ordinal));
        // This well has no tensile strength and no normal trend.
        string[] absent = ["tensile_strength", "trend_shale", "normal_slowness", "normal_porosity"];
        foreach (var curve in TrackTable.All.SelectMany(t => t.Curves).Where(c => !absent.Contains(c.Column.Id)))
            Assert.Contains(sheet.Texts, t => t.Text == curve.Label);
    }

    [Theory]
    [InlineData(1, 0)]
    [InlineData(10, 120)]
    [InlineData(30, 0)]
    public void Every_track_lies_within_the_page_and_beside_the_others(int count, double zoneWidth)
    {
        var layout = new TracksLayout([.. Enumerable.Repeat(2, count)], zoneWidth);
        var left = layout.ZoneRight;
        for (var i = 0; i < count; i++)
        {
            Assert.True(layout.Tracks[i].Left >= left);
            Assert.True(layout.Tracks[i].Right > layout.Tracks[i].Left + 70);
            left = layout.RibbonLeft(i, 1) + OriginRibbon.Width;
        }

        Assert.True(left <= layout.Right + 1e-9); // sums of the same widths in another order
        Assert.True(layout.Right <= layout.PageWidth - PageFrame.Margin + 1e-9);
    }

    [Fact]
    public void Zones_without_room_for_a_name_are_counted()
    {
        var sheet = TracksPicture.Draw(Model("very many zones"), UnitSystem.Metric, TrackTable.All);
        var named = sheet.Texts.Count(t => t.Text.EndsWith(" bed", StringComparison.Ordinal));
        Assert.InRange(named, 40, 119);
        Assert.Contains(sheet.Texts, t => t.Text == Numbered(120 - named, " unnamed"));
    }

    [Fact]
    public void Titles_name_the_well_the_datum_and_the_units()
    {
        var tracks = TracksPicture.Draw(PictureModels.Full(), UnitSystem.Field, TrackTable.All);
        var stress = StressPicture.Draw(PictureModels.Full(), UnitSystem.Metric);
        Assert.Contains(tracks.Texts, t => t.Text == "Example 1 \u00b7 depth tracks");
        Assert.Contains(tracks.Texts, t => t.Text == "Rotary table at 1024.9 ft above mean sea level; ground at 1001.3 ft above mean sea level");
        Assert.Contains(tracks.Texts, t => t.Text == "MD, ft");
        Assert.Contains(tracks.Texts, t => t.Text == "psi");
        Assert.Contains(stress.Texts, t => t.Text == "True vertical depth below rotary table, m");
        Assert.Contains(stress.Texts, t => t.Text == "Total stress and pore pressure, MPa");
        Assert.Contains(stress.Texts, t => t.Text == "Gradient: value / depth below ground, kPa/m");
        Assert.Contains("licensed engineer", string.Join(" ", stress.Texts.Select(t => t.Text)), StringComparison.Ordinal);
    }

    private static IEnumerable<Sheet> Sheets(EarthModel model, UnitSystem units)
    {
        yield return TracksPicture.Draw(model, units, TrackTable.All);
        yield return TracksPicture.Draw(model, units, [TrackTable.All[1]]);
        yield return TracksPicture.Draw(model, units, [.. TrackTable.All, .. TrackTable.All]);
        yield return StressPicture.Draw(model, units);
        yield return LayersPicture.Draw(model, PictureModels.Layers(model, 1e4), new LayerSettings(), units);
        yield return LayersPicture.Draw(model, PictureModels.Layers(model, 17), new LayerSettings(), units);
        yield return PolygonPicture.Draw(model, new PictureOptions(units));
        yield return ComparePicture.Draw(PictureModels.Pair(model), units);
        foreach (var count in new[] { 1, 2, 3, 4, 5, 6 })
        {
            var (top, bottom) = (model.Values.Read(Property.MeasuredDepth)[0], model.Values.Read(Property.MeasuredDepth)[^1]);
            yield return PolygonPicture.Draw(model, new PictureOptions(units, Depths: [.. Enumerable.Range(0, count).Select(i => (top + ((bottom - top) * (i + 0.3) / count), DepthKind.Measured))]));
        }
    }

    private static EarthModel Model(string name) => name switch
    {
        "no strains" => PictureModels.Full(800, strains: false),
        "many zones" => PictureModels.Full(800, zones: [.. Enumerable.Range(0, 40).Select(i => PictureModels.Zone(Numbered(i, " formation"), 900 + (60 * i)))]),
        "very many zones" => PictureModels.Full(1200, zones: [.. Enumerable.Range(0, 120).Select(i => PictureModels.Zone(Numbered(i, " bed"), 900 + (20 * i)))]),
        "long names" => PictureModels.Full(800, LongName, [PictureModels.Zone(LongName, 900), PictureModels.Zone("Unbreakablenamewithoutanyblankinit", 920)]),
        "two samples" => PictureModels.Small([1000, 1000.5], "two", [PictureModels.Zone("one", 900)], ("density", [2300, 2310])),
        "density only" => PictureModels.Small(PictureModels.Depths(300, 10, 3000), "density", [], ("density", [.. Enumerable.Range(0, 300).Select(i => 2000.0 + i)])),
        "targets" => PictureModels.Full(800, zones: [.. Enumerable.Range(0, 12).Select(i => PictureModels.Zone(Numbered(i, " formation"), 900 + (210 * i)) with { Target = i % 2 == 1 })]),
        "comparisons" => PictureModels.Full(800, comparisons: true),
        _ => PictureModels.Full(800),
    };

    private static string Numbered(int number, string text) => number.ToString(CultureInfo.InvariantCulture) + text;
}
