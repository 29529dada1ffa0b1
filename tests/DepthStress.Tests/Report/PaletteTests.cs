using System.Globalization;
using DepthStress.Core.Logs;
using DepthStress.Report;
using DepthStress.Report.Drawing;

namespace DepthStress.Tests.Report;

/// <summary>
/// Colours seen by readers with protanopia and deuteranopia: simulation in the cone space of Vienot, Brettel and Mollon 1999
/// (Color Research and Application 24:243-252; coefficients from memory), distances in CIELAB 1976.
/// </summary>
public class PaletteTests
{
    /// <summary>A distance of 2.3 is just noticeable side by side (common practice); thin lines need several times that.</summary>
    private const double ApartAsLines = 15;

    private const double ApartAsAreas = 9;

    public static TheoryData<string> Sights() => ["normal", "protanopia", "deuteranopia"];

    [Theory]
    [MemberData(nameof(Sights))]
    public void Curves_of_a_track_stay_apart(string sight)
    {
        foreach (var track in TrackTable.All.Append(TrackTable.StressPanels.Stress))
        {
            var colours = track.Curves.Select(c => c.Pen.Colour).ToList();
            foreach (var (a, b) in Pairs(colours)) AssertApart(a, b, sight, ApartAsLines);
        }
    }

    [Theory]
    [MemberData(nameof(Sights))]
    public void Origins_stay_apart(string sight)
    {
        foreach (var (a, b) in Pairs([.. Enum.GetValues<SampleOrigin>().Select(OriginRibbon.Colour)]))
            AssertApart(a, b, sight, ApartAsAreas);
    }

    private static void AssertApart(int a, int b, string sight, double least)
    {
        var distance = Distance(a, b, sight);
        Assert.True(distance > least, string.Create(CultureInfo.InvariantCulture, $"{a:X6} and {b:X6} are only {distance:F1} apart"));
    }

    private static IEnumerable<(int A, int B)> Pairs(List<int> colours) =>
        from i in Enumerable.Range(0, colours.Count)
        from j in Enumerable.Range(i + 1, colours.Count - i - 1)
        select (colours[i], colours[j]);

    private static double Distance(int a, int b, string sight)
    {
        var (p, q) = (Lab(Seen(Linear(a), sight)), Lab(Seen(Linear(b), sight)));
        return Math.Sqrt(p.Zip(q).Sum(x => (x.First - x.Second) * (x.First - x.Second)));
    }

    private static double[] Linear(int rgb) => [.. new[] { rgb >> 16, (rgb >> 8) & 255, rgb & 255 }
        .Select(c => c / 255.0).Select(c => c <= 0.04045 ? c / 12.92 : Math.Pow((c + 0.055) / 1.055, 2.4))];

    private static double[] Seen(double[] rgb, string sight)
    {
        if (sight == "normal") return rgb;
        var l = (17.8824 * rgb[0]) + (43.5161 * rgb[1]) + (4.11935 * rgb[2]);
        var m = (3.45565 * rgb[0]) + (27.1554 * rgb[1]) + (3.86714 * rgb[2]);
        var s = (0.0299566 * rgb[0]) + (0.184309 * rgb[1]) + (1.46709 * rgb[2]);
        if (sight == "protanopia") l = (2.02344 * m) - (2.52581 * s);
        else m = (0.494207 * l) + (1.24827 * s);
        return
        [
            (0.0809444479 * l) - (0.130504409 * m) + (0.116721066 * s),
            (-0.0102485335 * l) + (0.0540193266 * m) - (0.113614708 * s),
            (-0.000365296938 * l) - (0.00412161469 * m) + (0.693511405 * s),
        ];
    }

    private static double[] Lab(double[] rgb)
    {
        var x = F(((0.4124 * rgb[0]) + (0.3576 * rgb[1]) + (0.1805 * rgb[2])) / 0.9505);
        var y = F((0.2126 * rgb[0]) + (0.7152 * rgb[1]) + (0.0722 * rgb[2]));
        var z = F(((0.0193 * rgb[0]) + (0.1192 * rgb[1]) + (0.9505 * rgb[2])) / 1.089);
        return [(116 * y) - 16, 500 * (x - y), 200 * (y - z)];
    }

    private static double F(double t) => t > 0.008856 ? Math.Cbrt(t) : (7.787 * t) + (16.0 / 116);
}
