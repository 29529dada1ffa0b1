using System.Globalization;
using DepthStress.Core.Calibration;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report;
using DepthStress.Report.Drawing;
using DepthStress.Tests.Calibration;

namespace DepthStress.Tests.Report;

/// <summary>What the pictures have in common.</summary>
public class PictureConsistencyTests
{
    public static TheoryData<string> Names => [.. Drawers.Keys];

    private static EarthModel Model => PictureModels.Full(400);

    private static Dictionary<string, Func<UnitSystem, Sheet>> Drawers { get; } = new(StringComparer.Ordinal)
    {
        ["tracks"] = u => TracksPicture.Draw(Model, u, TrackTable.All),
        ["one track"] = u => TracksPicture.Draw(Model, u, [TrackTable.All[1]]),
        ["stress"] = u => StressPicture.Draw(Model, u),
        ["layers"] = u => LayersPicture.Draw(Model, PictureModels.Layers(Model, 150), new LayerSettings(), u),
        ["polygon"] = u => PolygonPicture.Draw(Model, new PictureOptions(u)),
        ["compare"] = u => ComparePicture.Draw(PictureModels.Pair(Model), u),
        ["calibration"] = u => CalibrationPicture.Draw(Calibrated(1), u),
        ["calibration of groups"] = u => CalibrationPicture.Draw(Calibrated(5), u),
    };

    private static CalibrationResult Calibrated(int groups)
    {
        var truth = CalibrationWell.Run(CalibrationWell.Setup());
        var result = CalibrationWell.Calibrate(CalibrationWell.Setup(5e-5, 3e-4) with { Observations = CalibrationWell.Closures(truth, 0.5e6, i => i % 2 == 0 ? 3e5 : -3e5) });
        return groups == 1 ? result : result with
        {
            AfterFit = [],
            Strains = [.. Enumerable.Repeat(result.Strains[0] with { Separated = false }, groups)],
            Covariances = [.. Enumerable.Repeat(result.Covariances[0], groups)],
        };
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Texts_lie_clear_of_each_other_and_are_legible_on_A4(string picture)
    {
        foreach (var units in Enum.GetValues<UnitSystem>())
        {
            var sheet = Drawers[picture](units);
            SheetChecks.NoTextOverlapsOrIsCutOff(sheet);
            SheetChecks.IsLegibleOnA4(sheet);
        }
    }

    [Theory]
    [InlineData("tracks", "MD, ft below rotary table", "TVD, ft below rotary table")]
    [InlineData("stress", "True vertical depth below rotary table, ft")]
    [InlineData("layers", "True vertical depth below rotary table, ft")]
    [InlineData("compare", "True vertical depth below rotary table, ft")]
    [InlineData("calibration", "True vertical depth below ground, ft", "MD, ft below ground")]
    public void Every_depth_has_its_kind_unit_and_datum(string picture, params string[] texts)
    {
        var written = string.Join(' ', Drawers[picture](UnitSystem.Field).Texts.Select(t => t.Text));
        Assert.All(texts, t => Assert.Contains(t, written, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("stress", ", ")]
    [InlineData("layers", "")]
    [InlineData("calibration", "")]
    [InlineData("compare", ", ")]
    public void Stresses_stand_in_one_order_in_every_legend(string picture, string after)
    {
        string[] order = ["Sv", "Shmin", "SHmax", "Pp"];
        var texts = Drawers[picture](UnitSystem.Metric).Texts.Select(t => t.Text).ToList();
        Assert.Equal(order, texts.Where(t => order.Any(o => after.Length > 0 ? t.StartsWith(o + after, StringComparison.Ordinal) : t == o)).Select(t => t.Split(',')[0]));
    }

    [Theory]
    [InlineData("tracks")]
    [InlineData("stress")]
    [InlineData("layers")]
    public void The_strip_of_zones_has_a_head(string picture) => Assert.Single(Drawers[picture](UnitSystem.Metric).Texts, t => t.Text == "Zone");

    [Fact]
    public void A_panel_without_a_value_leaves_its_room_to_the_others()
    {
        var model = PictureModels.Small(PictureModels.Depths(50, 1000, 1100), "density", [], ("density", [.. Enumerable.Range(0, 50).Select(i => 2300.0 + i)]));
        var sheet = LayersPicture.Draw(model, PictureModels.Layers(model, 20), new LayerSettings(), UnitSystem.Metric);
        var titles = sheet.Texts.Where(t => t.Style is { Bold: true, Size: 9.5 } && t.Box.Width > t.Box.Height).Select(t => (t.Text, Middle: (t.Box.Left + t.Box.Right) / 2)).ToList();
        Assert.Equal(["Bulk density, g/cm3", "Total stress and pore pressure, MPa"], titles.Select(t => t.Text));
        Assert.InRange(titles[0].Middle, 200, 350); // the first third of the page
        Assert.InRange(titles[1].Middle, 650, 850);
    }

    [Fact]
    public void No_value_lies_beyond_a_scale_made_around_it()
    {
        for (var n = 0; n < 300; n++)
        {
            for (var m = 1; m < 100; m++)
            {
                var (low, high) = (n / 100.0, (n + m) / 100.0); // 46 steps of 0.05 are more than 2.3
                var scale = RoundSteps.Around(low, high, 4);
                Assert.True(scale.Low <= low && high <= scale.High, string.Create(CultureInfo.InvariantCulture, $"{low} to {high}"));
            }
        }
    }

    [Fact]
    public void Only_curves_that_share_a_panel_are_named_where_samples_are_off_its_scale()
    {
        Assert.Equal(["3 off scale"], Closed("sv"));
        Assert.Equal(["Sv: 3 off scale, Pp: 3 off scale"], Closed("sv", "pp"));

        static IEnumerable<string> Closed(params string[] ids)
        {
            var sheet = new Sheet(500, 500, "panel");
            var tally = new ScaleTally(new CurveScale(0, 1));
            foreach (var value in (double[])[0.5, -1, 2, 3]) tally.Add(value);
            var traces = ids.Select(id => new CurveTrace(TrackTable.StressPanels.Stress.Curves.First(c => c.Column.Id == id), [], tally)).ToList();
            PanelFrame.Close(sheet, new Panel(20, 400, new CurveScale(0, 1), new DepthAxis(0, 1, 20, 400)), traces);
            return sheet.Texts.Select(t => t.Text);
        }
    }
}
