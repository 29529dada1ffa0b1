using System.Globalization;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Cli.Printing;

/// <summary>Pieces of the catalogue in words.</summary>
internal static class MethodWords
{
    /// <summary>What marks a method whose coefficients were recalled.</summary>
    public const char RecalledMark = '*';

    /// <summary>The rocks that can be asked for, by word.</summary>
    public static IReadOnlyList<(string Word, RockKinds Rock)> Rocks { get; } =
    [
        ("sandstone", RockKinds.Sandstone), ("shale", RockKinds.Shale), ("limestone", RockKinds.Limestone),
        ("dolomite", RockKinds.Dolomite), ("crystalline", RockKinds.Crystalline),
        ("evaporite", RockKinds.Evaporite),
    ];

    /// <summary>Rocks in words.</summary>
    public static string Of(RockKinds rocks)
    {
        var sedimentary = rocks.HasFlag(RockKinds.Any);
        var words = Rocks.Where(r => rocks.HasFlag(r.Rock) && !(sedimentary && RockKinds.Any.HasFlag(r.Rock))).Select(r => r.Word);
        return string.Join(", ", sedimentary ? words.Prepend("any sedimentary") : words);
    }

    /// <summary>A unit in words.</summary>
    public static string Of(Unit unit) => unit.Symbol.Length == 0 ? "no unit" : unit.Symbol;

    /// <summary>Symbol, meaning and unit of an input.</summary>
    public static string Of(LawInput input) => $"{input.Symbol} {PropertyNames.Title(input.Property)}, {Of(input.Unit)}";

    /// <summary>What a method's coefficients rest on.</summary>
    public static string Of(Standing standing) => standing switch
    {
        Standing.Confirmed => "coefficients read in the source named",
        Standing.Identity => "identity or definition",
        _ => "coefficients recalled, not read: needs accept_unverified = true",
    };

    /// <summary>What a worked number rests on.</summary>
    public static string Of(ExampleBasis basis) => basis switch
    {
        ExampleBasis.Printed => "printed",
        ExampleBasis.Identity => "identity",
        _ => "self-computed",
    };

    /// <summary>A number with a unit.</summary>
    public static string Quantity(double value, Unit unit) => $"{Number(value)} {unit.Symbol}".TrimEnd();

    /// <summary>What lies outside an interval, or null when nothing does; an interval that begins just above zero leaves zero out.</summary>
    public static string? Outside(Interval interval) => (double.IsFinite(interval.Low), double.IsFinite(interval.High)) switch
    {
        (false, false) => null,
        (true, false) when interval.Low == double.Epsilon => "at or below 0",
        (true, false) => $"below {Number(interval.Low)}",
        (false, true) => $"above {Number(interval.High)}",
        (true, true) when interval.Low == double.Epsilon => $"at or below 0 or above {Number(interval.High)}",
        _ => $"below {Number(interval.Low)} or above {Number(interval.High)}",
    };

    /// <summary>An interval that has both ends.</summary>
    public static string Within(Interval interval) => $"{Number(interval.Low)} to {Number(interval.High)}";

    private static string Number(double value) => value.ToString("G7", CultureInfo.InvariantCulture);
}
