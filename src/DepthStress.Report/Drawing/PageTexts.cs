using System.Globalization;
using DepthStress.Core.Depth;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Drawing;

/// <summary>The words that every picture carries.</summary>
internal static class PageTexts
{
    /// <summary>The surface at which depths are zero.</summary>
    public static string Datum(DepthFrame frame) => frame.Datum switch
    {
        DatumKind.RotaryTable => "rotary table",
        DatumKind.Ground => "ground",
        _ => "mean sea level",
    };

    /// <summary>Where the surfaces around the well lie.</summary>
    public static string Surfaces(DepthFrame frame, UnitSystem units)
    {
        var datum = frame.Datum == DatumKind.SeaLevel ? "Datum at mean sea level" : $"{Sentence(Datum(frame))} at {Level(frame.DatumElevation, units)}";
        var solid = frame.WaterDepth is { } water ? $"water depth {units.Show(Quantity.Length(water))}"
            : frame.GroundElevation is { } ground && frame.Datum != DatumKind.Ground ? $"ground at {Level(ground, units)}" : "";
        return string.Join("; ", new[] { datum, solid }.Where(t => t.Length > 0));
    }

    /// <summary>What gradients are taken over.</summary>
    public static string Gradient(DepthFrame frame) => $"value / depth below {(frame.IsOffshore ? "sea surface" : "ground")}";

    /// <summary>A number of samples in few words.</summary>
    public static string OffScale(int samples) => string.Create(CultureInfo.InvariantCulture, $"{samples} off scale");

    private static string Level(double elevation, UnitSystem units) =>
        $"{units.Show(Quantity.Length(Math.Abs(elevation)))} {(elevation < 0 ? "below" : "above")} mean sea level";

    private static string Sentence(string text) => char.ToUpperInvariant(text[0]) + text[1..];
}
