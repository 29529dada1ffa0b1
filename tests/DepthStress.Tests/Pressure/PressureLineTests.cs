using DepthStress.Core.Depth;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

public class PressureLineTests
{
    private const double G = 9.80665; // standard gravity, exact

    private static PressureLine Line(PorePressureSettings settings, DepthFrame frame) =>
        PressureLine.Prepare(settings, frame, 1030, (depth, kind) => kind == DepthKind.TrueVerticalSubsea ? frame.FromSubsea(depth) : depth);

    private static PressureLine Hydrostatic(DepthFrame frame) =>
        Line(new() { Method = Chosen(PorePressureMethod.Hydrostatic), FluidDensity = Chosen(1000.0) }, frame);

    private static PressureLine Gradient(DepthReference reference, DepthFrame frame) => Line(
        new() { Method = Chosen(PorePressureMethod.Gradient), Gradient = Chosen(1200.0), Reference = Chosen(reference) }, frame);

    private static PressureLine Table(DepthKind kind, params (double Depth, double Pressure)[] points) => Line(
        new()
        {
            Method = Chosen(PorePressureMethod.Table),
            DepthKind = Chosen(kind),
            Points = Chosen<IReadOnlyList<PressurePoint>>([.. points.Select(p => new PressurePoint(p.Depth, p.Pressure))]),
        },
        Sea);

    // Weight of the fluid column (self-computed); tolerance: rounding.
    [Fact]
    public void Hydrostatic_pressure_starts_at_the_water_table_onshore()
    {
        var line = Hydrostatic(new DepthFrame(DatumKind.RotaryTable, 110, 100, null, 40));
        Assert.Equal(0, line.At(50));
        Assert.Equal(0, line.At(20));
        Assert.Equal(1000 * G * 950, line.At(1000), 1e-6);
    }

    [Fact]
    public void Hydrostatic_pressure_starts_at_sea_level_offshore() =>
        Assert.Equal(1000 * G * 975, Hydrostatic(Sea).At(1000), 1e-6);

    [Theory]
    [InlineData(DepthReference.Datum, 1200 * G * 1000)]
    [InlineData(DepthReference.SeaSurface, 1200 * G * 975)]
    [InlineData(DepthReference.Mudline, (1030 * G * 100) + (1200 * G * 875))]
    public void A_gradient_counts_from_its_reference(DepthReference reference, double expected) =>
        Assert.Equal(expected, Gradient(reference, Sea).At(1000), 1e-6);

    [Fact]
    public void A_gradient_from_the_ground_starts_there() =>
        Assert.Equal(1200 * G * 990, Gradient(DepthReference.Ground, new DepthFrame(DatumKind.RotaryTable, 110, 100, null, null)).At(1000), 1e-6);

    [Fact]
    public void A_table_joins_its_points_by_straight_lines_and_ends_with_them()
    {
        var line = Table(DepthKind.TrueVertical, (1000, 10e6), (2000, 30e6), (2500, 30e6));
        Assert.Equal([10e6, 20e6, 30e6, 30e6, 30e6], new[] { 1000, 1500, 2000, 2250, 2500.0 }.Select(line.At));
        Assert.True(double.IsNaN(line.At(999.999)));
        Assert.True(double.IsNaN(line.At(2500.001)));
    }

    [Fact]
    public void A_table_of_subsea_depths_is_moved_to_the_datum() =>
        Assert.Equal(15e6, Table(DepthKind.TrueVerticalSubsea, (975, 10e6), (1975, 20e6)).At(1500), 1e-6);

    [Fact]
    public void A_table_of_one_point_knows_that_depth_alone()
    {
        var line = Table(DepthKind.TrueVertical, (1000, 10e6));
        Assert.Equal(10e6, line.At(1000));
        Assert.True(double.IsNaN(line.At(1001)));
    }

    [Fact]
    public void Samples_are_filled_one_by_one_and_a_missing_depth_stays_missing()
    {
        var pressure = new double[3];
        var line = Hydrostatic(Sea);
        line.Fill([100, double.NaN, 300], pressure);
        Assert.Equal([line.At(100), double.NaN, line.At(300)], pressure);
        Assert.Throws<ArgumentException>(() => line.Fill([1, 2], new double[1]));
    }
}
