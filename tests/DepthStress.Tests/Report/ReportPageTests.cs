using System.Buffers.Binary;
using System.Globalization;
using System.Text;
using System.Text.Json;
using System.Text.RegularExpressions;
using CsCheck;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report;
using DepthStress.Report.Page;

namespace DepthStress.Tests.Report;

/// <summary>The report page: what it carries, that markup stays text, that it asks the network for nothing. The browser tests look at how it behaves.</summary>
public sealed partial class ReportPageTests
{
    private const int Limit = 6_000_000;

    [GeneratedRegex("(src|href|action|data)\\s*=\\s*\"(?!data:|#|\\|)[^\"]*[:/]", RegexOptions.IgnoreCase)]
    private static partial Regex Outside();

    [Fact]
    public void The_page_has_its_parts_in_order_with_the_summary_first()
    {
        var page = Write(Content(PictureModels.Full()) with { Barriers = ["the barrier line"] });
        string[] parts = ["Content-Security-Policy", "<h1>Example 1</h1>", "the barrier line", "The stress, as value / depth below ground: Shmin ", "What it rests on, by", "Caution.", "id=\"viewer\"", "id=\"pictures\"",
            "<table id=\"zones\">", "<table id=\"choices\">", "<table id=\"spread\">", "There are no layers.", "none was solved", "There are no observations", "id=\"findings-title\"", "<table id=\"curves\">", "<table id=\"methods\">", "id=\"data\""];
        var places = parts.Select(p => page.IndexOf(p, StringComparison.Ordinal)).ToList();
        Assert.All(places, p => Assert.True(p >= 0));
        Assert.Equal(places.Order(), places);
    }

    // By hand from the model's own columns, apart from the page's chunks.
    [Fact]
    public void The_stress_in_words_has_the_means_and_ends_of_the_gradients_and_the_shares_of_the_regimes()
    {
        var model = PictureModels.Full(5000);
        var column = DepthColumns.Get("shmin_gradient");
        var values = new double[model.Count];
        column.Fill(model, 0, UnitSystem.Field, values);
        var known = values.Where(double.IsFinite).ToList();
        var words = StressWords.Of(model, UnitSystem.Field);
        Assert.Contains(string.Create(CultureInfo.InvariantCulture, $"Shmin {known.Average():F3} psi/ft on average ({known.Min():F3} to {known.Max():F3})"), words, StringComparison.Ordinal);
        var regimes = new string[model.Count];
        DepthColumns.All.OfType<TextColumn<EarthModel>>().First(c => c.Id == "regime").Read(model, 0, regimes);
        var named = regimes.Where(r => r.Length > 0).ToList();
        Assert.NotEmpty(named);
        foreach (var regime in named.Distinct())
            Assert.Contains(string.Create(CultureInfo.InvariantCulture, $"{regime} in {100.0 * named.Count(r => r == regime) / named.Count:F1} %"), words, StringComparison.Ordinal);
    }

    [Fact]
    public void Names_with_markup_stay_text()
    {
        const string Bad = "<script>alert(1)</script><img src=x onerror=alert(1)>";
        var page = Write(Content(PictureModels.Full(200, Bad, [PictureModels.Zone(Bad, 900)])) with { Barriers = [Bad], Findings = [Bad], Inputs = [(Bad, Bad)] });
        Assert.DoesNotContain("<script>alert", page, StringComparison.Ordinal);
        Assert.DoesNotContain("<img src=x", page, StringComparison.Ordinal);
        Assert.Contains("&lt;script&gt;alert(1)", page, StringComparison.Ordinal);
        Assert.Equal(2, Regex.Count(page, "<script[ >]")); // the data and the program
    }

    [Fact]
    public void Nothing_on_the_page_points_outside()
    {
        var page = Write(Content(PictureModels.Full(500)));
        Assert.Contains("default-src 'none'", page, StringComparison.Ordinal);
        Assert.DoesNotMatch(Outside(), page[..page.IndexOf("<script", StringComparison.Ordinal)]);
        Assert.DoesNotContain("fetch(", page, StringComparison.Ordinal);
        Assert.DoesNotContain("@import", page, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(15_000)] // the size that is promised
    [InlineData(100_000)] // in bins
    public void The_page_stays_below_its_size(int samples) => Assert.InRange(Write(Content(PictureModels.Full(samples))).Length, 100_000, Limit);

    [Fact]
    public void The_same_content_gives_the_same_bytes()
    {
        var content = Content(PictureModels.Full(300));
        Assert.Equal(Write(content), Write(content));
    }

    [Theory]
    [InlineData(UnitSystem.Metric)]
    [InlineData(UnitSystem.Field)]
    public void The_page_carries_the_printed_digits_of_every_sample(UnitSystem units)
    {
        var model = PictureModels.Full(700);
        using var data = Data(Write(Content(model, units)));
        var packed = data.RootElement.GetProperty("columns").EnumerateArray().Single(c => c.GetProperty("id").GetString() == "shmin");
        var column = DepthColumns.Get("shmin");
        var (values, decimals) = (new double[model.Count], column.In(units).Decimals);
        column.Fill(model, 0, units, values);
        var bytes = packed.GetProperty("low").GetBytesFromBase64();
        Assert.Equal(4 * model.Count, bytes.Length);
        for (var i = 0; i < values.Length; i++)
        {
            var digits = BinaryPrimitives.ReadInt32LittleEndian(bytes.AsSpan(4 * i));
            var printed = values[i].ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture).Replace(".", "", StringComparison.Ordinal);
            Assert.Equal(double.IsNaN(values[i]) ? PackedColumn.Missing : int.Parse(printed, CultureInfo.InvariantCulture), digits);
        }
    }

    [Fact]
    public void Bins_lose_no_extreme_and_the_page_says_so()
    {
        var model = PictureModels.Full(50_000);
        var bins = Bins.Of(model.Count);
        Assert.True(bins.PerRow > 1);
        var page = Write(Content(model));
        Assert.Contains("in " + bins.Rows.ToString(CultureInfo.InvariantCulture) + " bins of ", page, StringComparison.Ordinal);
        foreach (var column in new[] { "shmin", "density", "youngs_static" }.Select(DepthColumns.Get))
        {
            var values = new double[model.Count];
            column.Fill(model, 0, UnitSystem.Metric, values);
            var known = values.Where(double.IsFinite).Select(v => ScaledDigits.Of(v, column.Metric.Decimals)).ToList();
            var packed = PackedColumn.Of(model, column, UnitSystem.Metric, bins)!;
            Assert.Equal(known.Min(), Digits(packed.Low).Min());
            Assert.Equal(known.Max(), Digits(packed.High!).Max());
        }
    }

    [Fact]
    public void A_well_of_two_samples_and_one_curve_has_a_page()
    {
        var page = Write(Content(PictureModels.Small([1000, 1000.5], "Tiny", [], ("density", [2400, 2410]))));
        using var data = Data(page);
        Assert.Equal(2, data.RootElement.GetProperty("rows").GetInt32());
        Assert.Equal(0, data.RootElement.GetProperty("zones").GetArrayLength());
        Assert.Contains("by the weakest log under each sample&#x27;s stress: measured 100.0 %", page, StringComparison.Ordinal);
    }

    [Fact]
    public void Modules_of_the_script_share_no_name()
    {
        var names = Regex.Matches(WebFiles.Script, @"^(?:async )?(?:function|const|let|class) (?<name>\w+)", RegexOptions.Multiline).Select(m => m.Groups["name"].Value).ToList();
        Assert.True(names.Count > 40);
        Assert.Equal(names.Distinct(), names);
    }

    [Fact]
    public void Digits_are_those_that_the_base_library_prints() => Gen.Select(Gen.Double[-1e7, 1e7], Gen.Int[0, 5]).Sample((value, decimals) =>
    {
        var text = value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return ScaledDigits.Of(value, decimals) == double.Parse(text.Replace(".", "", StringComparison.Ordinal), CultureInfo.InvariantCulture);
    });

    [Theory]
    [InlineData(0.5, 0)]
    [InlineData(2.5, 0)]
    [InlineData(0.125, 2)]
    [InlineData(-0.00001, 4)]
    [InlineData(250000.12345, 5)]
    [InlineData(1e13, 3)]
    public void Digits_at_ties_and_ends(double value, int decimals) => Assert.Equal(value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture).Replace("-0.0000", "0.0000", StringComparison.Ordinal), ScaledDigits.Show(value, decimals));

    private static IEnumerable<double> Digits(byte[] bytes) => Enumerable.Range(0, bytes.Length / 4)
        .Select(i => BinaryPrimitives.ReadInt32LittleEndian(bytes.AsSpan(4 * i))).Where(v => v != PackedColumn.Missing).Select(v => (double)v);

    private static ReportContent Content(EarthModel model, UnitSystem units = UnitSystem.Metric) => new(model, new LayerTable([]), new PictureOptions(units));

    private static JsonDocument Data(string page)
    {
        const string Start = "id=\"data\">";
        var from = page.IndexOf(Start, StringComparison.Ordinal) + Start.Length;
        return JsonDocument.Parse(page[from..page.IndexOf("</script>", from, StringComparison.Ordinal)]);
    }

    private static string Write(ReportContent content)
    {
        using var bytes = new MemoryStream();
        ReportPage.Write(content, bytes);
        return Encoding.UTF8.GetString(bytes.ToArray());
    }
}
