using System.Text;
using DepthStress.Core.Depth;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>What the depths of a result count from, in words and numbers.</summary>
internal static class DepthStatement
{
    /// <summary>The depth kinds that results carry: the part of the column name, and what it means.</summary>
    public static IReadOnlyList<(string Name, string Meaning)> Kinds { get; } =
    [
        ("md", "measured depth: along the hole below the datum"),
        ("tvd", "true vertical depth: vertically below the datum"),
        ("tvdss", "true vertical depth below mean sea level, positive downwards"),
    ];

    /// <summary>The datum in plain words.</summary>
    public static string Name(this DatumKind datum) => datum switch
    {
        DatumKind.RotaryTable => "rotary table",
        DatumKind.Ground => "ground",
        DatumKind.SeaLevel => "mean sea level",
        _ => throw new ArgumentOutOfRangeException(nameof(datum)),
    };

    /// <summary>The surfaces of a well that have a value: a short name, what it is, the value in m.</summary>
    public static IEnumerable<(string Name, string Meaning, double Metres)> Surfaces(DepthFrame frame)
    {
        yield return ("datum_elevation", "elevation of the datum above mean sea level", frame.DatumElevation);
        if (frame.GroundElevation is { } ground) yield return ("ground_elevation", "elevation of the ground above mean sea level", ground);
        if (frame.WaterDepth is { } water) yield return ("water_depth", "sea surface to sea floor", water);
        if (frame.WaterTableDepth is { } table) yield return ("water_table_depth", "ground to water table", table);
    }

    /// <summary>The unit of lengths.</summary>
    public static ColumnUnit Length(UnitSystem units) => units == UnitSystem.Metric ? ColumnUnits.Depths.Metric : ColumnUnits.Depths.Field;

    /// <summary>A number in a unit with fixed decimals; empty when it is missing.</summary>
    public static string Show(double si, ColumnUnit unit)
    {
        Span<byte> bytes = stackalloc byte[FixedPoint.MaxLength];
        FixedPoint.TryFormat(unit.Unit.FromSi(si), unit.Decimals, bytes, out var written);
        return Encoding.ASCII.GetString(bytes[..written]);
    }
}
