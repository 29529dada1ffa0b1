using DepthStress.Core.Depth;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

/// <summary>Columns of gas, oil and water. Numbers are weights of columns (self-computed); tolerance: rounding of pascals.</summary>
public class FluidLineTests
{
    private const double G = 9.80665; // standard gravity, exact

    private static readonly FluidSettings Column = new()
    {
        GasDensity = Chosen(200.0),
        OilDensity = Chosen(750.0),
        WaterDensity = Chosen(1050.0),
        GasOilContact = Chosen(2000.0),
        OilWaterContact = Chosen(2100.0),
        DepthKind = Chosen(DepthKind.TrueVerticalSubsea),
        Anchor = Chosen(FluidAnchor.Hydrostatic),
    };

    private static FluidLine Line(FluidSettings fluids, PorePressureSettings? pore = null) =>
        FluidLine.Prepare(fluids, pore ?? new(), Sea, (depth, kind) => kind == DepthKind.TrueVerticalSubsea ? Sea.FromSubsea(depth) : depth);

    // Contacts at 2025 and 2125 m below a datum 25 m above the sea.
    [Fact]
    public void Buoyancy_adds_the_difference_of_weights_above_the_contacts()
    {
        var line = Line(Column);
        double Water(double tvd) => 1050 * G * (tvd - 25);
        Assert.Equal(Water(2200), line.At(2200), 1e-6);
        Assert.Equal(Water(2125), line.At(2125), 1e-6);
        Assert.Equal(300 * G * 100, line.At(2025) - Water(2025), 1e-6);
        Assert.Equal((300 * G * 100) + (850 * G * 60), line.At(1965) - Water(1965), 1e-6);
        Assert.True(double.IsNaN(line.At(double.NaN)));
    }

    [Fact]
    public void A_known_pressure_holds_the_column_wherever_it_lies()
    {
        foreach (var depth in new[] { 1900.0, 2050, 2300 })
        {
            var line = Line(Column with { Anchor = Chosen(FluidAnchor.Point), AnchorDepth = Chosen(depth), AnchorPressure = Chosen(30e6) });
            Assert.Equal(30e6, line.At(depth + 25), 1e-6);
            Assert.Equal(1050 * G * 50, line.At(2200) - line.At(2150), 1e-6);
            Assert.Equal(750 * G * 50, line.At(2100) - line.At(2050), 1e-6);
            Assert.Equal(200 * G * 50, line.At(2000) - line.At(1950), 1e-6);
        }
    }

    [Fact]
    public void A_table_gives_the_water_and_the_pressure_at_the_contact()
    {
        var pore = new PorePressureSettings
        {
            DepthKind = Chosen(DepthKind.TrueVertical),
            Points = Chosen<IReadOnlyList<PressurePoint>>([new(1000, 10e6), new(3000, 40e6)]),
        };
        var line = Line(
            Column with { GasOilContact = default, OilWaterContact = default, GasWaterContact = Chosen(1975.0), Anchor = Chosen(FluidAnchor.Table) }, pore);
        Assert.Equal(25e6, line.At(2000), 1e-6);
        Assert.Equal(32.5e6, line.At(2500), 1e-6);
        Assert.Equal(25e6 - (200 * G * 100), line.At(1900), 1e-6);
        Assert.True(double.IsNaN(line.At(3001)));
    }

    [Fact]
    public void Without_contacts_there_is_water_alone()
    {
        var line = Line(new() { WaterDensity = Chosen(1050.0), Anchor = Chosen(FluidAnchor.Hydrostatic) });
        Assert.Equal(0, line.At(10));
        Assert.Equal(1050 * G * 975, line.At(1000), 1e-6);
        var filled = new double[2];
        line.Fill([10, 1000], filled);
        Assert.Equal([line.At(10), line.At(1000)], filled);
        Assert.Throws<ArgumentException>(() => line.Fill([1], filled));
    }
}
