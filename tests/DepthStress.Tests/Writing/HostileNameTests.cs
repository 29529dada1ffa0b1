using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

public sealed class HostileNameTests
{
    private static string FirstRow(string zone) =>
        TinyWell.Text(s => DepthCsv.Write(TinyWell.Model(upper: zone), UnitSystem.Metric, s)).Split('\n')[1];

    /// <summary>Quoting as RFC 4180, section 2, rules 5 to 7 ask; formula cells as common practice neutralises them.</summary>
    [Theory]
    [InlineData("plain zone", ",plain zone,")]
    [InlineData("a,b", ",\"a,b\",")]
    [InlineData("a\"b", ",\"a\"\"b\",")]
    [InlineData("=HYPERLINK(1)", ",'=HYPERLINK(1),")]
    [InlineData("+1", ",'+1,")]
    [InlineData("-1", ",'-1,")]
    [InlineData("@x", ",'@x,")]
    [InlineData("=a,b", ",\"'=a,b\",")]
    [InlineData("\t=1", ",'=1,")]
    [InlineData("\u0001=1", ",'=1,")]
    [InlineData(" =1", ",' =1,")]
    [InlineData(" a", ",\" a\",")]
    [InlineData("a\r\nb\u0000c\u007f\u0085d\u2028e", ",abcde,")]
    [InlineData("Sk\u00e5l \u4e95", ",Sk\u00e5l \u4e95,")]
    [InlineData("a-b+c=d@e", ",a-b+c=d@e,")]
    public void A_zone_name_is_one_harmless_field(string zone, string expected) =>
        Assert.Contains(expected, FirstRow(zone), StringComparison.Ordinal);

    /// <summary>Apart from the theory, whose data cannot carry half a pair.</summary>
    [Fact]
    public void Half_a_surrogate_pair_becomes_the_replacement_character() =>
        Assert.Contains(",lone \ufffd half,", FirstRow("lone \ud83d half"), StringComparison.Ordinal);

    [Fact]
    public void A_name_longer_than_any_buffer_is_written_whole()
    {
        var zone = new string('z', 300_000);
        Assert.Contains($",{zone},", FirstRow(zone), StringComparison.Ordinal);
    }

    [Fact]
    public void The_guide_and_the_las_header_keep_a_hostile_well_name_on_one_line()
    {
        var model = TinyWell.Model(name: "W\n~ASCII\n1 2 3: x \u00e9");
        var las = TinyWell.Text(s => ResultsLas.Write(model, UnitSystem.Metric, s));
        Assert.Single(las.Split('\n'), l => l.StartsWith("~A", StringComparison.Ordinal));
        Assert.Single(las.Split('\n'), l => l.StartsWith(" WELL ", StringComparison.Ordinal) && l.Contains("W~ASCII1 2 3: x ?", StringComparison.Ordinal));
        Assert.StartsWith(
            "DepthStress results: W~ASCII1 2 3: x \u00e9\n", TinyWell.Text(s => ResultGuide.Write(model.Setup, UnitSystem.Metric, s)), StringComparison.Ordinal);
    }
}
