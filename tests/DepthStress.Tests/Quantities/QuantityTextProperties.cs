using System.Globalization;
using CsCheck;
using DepthStress.Core.Quantities;

namespace DepthStress.Tests.Quantities;

public class QuantityTextProperties
{
    private static readonly Gen<Unit> AnyUnit = Gen.Int[0, Units.All.Count - 1].Select(i => Units.All[i]);

    [Fact]
    public void What_is_written_with_a_unit_reads_back_as_the_same_SI_value() =>
        Gen.Select(AnyUnit, Gen.Double[-1e6, 1e6]).Sample((unit, value) =>
        {
            var text = string.Create(CultureInfo.InvariantCulture, $"{value:R} {unit.Symbol}");
            Assert.True(QuantityText.TryParse(text, [unit.Dimension], out var si, out var read, out var problem), problem);
            Assert.Same(unit, read);
            Assert.Equal(unit.ToSi(value), si, 0); // shortest round-trip digits: exactly the same number
        });

    [Fact]
    public void Every_alias_reads_as_its_unit() =>
        Gen.Select(AnyUnit, Gen.Int[0, 100], Gen.Bool).Sample((unit, pick, upper) =>
        {
            if (unit.Aliases.Length == 0) return;
            var alias = unit.Aliases[pick % unit.Aliases.Length];
            var text = "1 " + (upper ? alias.ToUpperInvariant() : alias);
            Assert.True(QuantityText.TryParse(text, [unit.Dimension], out var si, out var found, out var problem), problem);
            Assert.Same(unit, found);
            Assert.Equal(unit.ToSi(1), si, 0); // the same conversion
        });

    [Fact]
    public void There_and_back_gives_the_value() =>
        Gen.Select(AnyUnit, Gen.Double[-1e6, 1e6]).Sample((unit, value) =>
        {
            // Tolerance: rounding of the two conversions, at the size of the value or of the temperature offset.
            var size = Math.Max(Math.Abs(value), Math.Abs(unit.Offset / unit.Factor));
            Assert.Equal(value, unit.FromSi(unit.ToSi(value)), 1e-15 * Math.Max(size, 1e-300) * 4);
        });

    [Fact]
    public void Any_text_is_read_or_refused_with_a_reason() =>
        Gen.Select(Gen.String, AnyUnit).Sample((text, unit) =>
        {
            var read = QuantityText.TryParse(text, [unit.Dimension], out var si, out _, out var problem);
            Assert.Equal(read, problem is null);
            Assert.Equal(read, double.IsFinite(si));
        });
}
