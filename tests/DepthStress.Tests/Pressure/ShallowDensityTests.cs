using CsCheck;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

/// <summary>What is assumed above the log: densities, their mass, and how they meet the log.</summary>
public class ShallowDensityTests
{
    private const double G = 9.80665; // standard gravity, exact

    public static TheoryData<string> Kinds => ["mean", "exponential", "points", "traugott", "miller"];

    private static ShallowDensity Of(string kind) => kind switch
    {
        "mean" => ShallowDensity.Mean(2100),
        "exponential" => new ExponentialDensity(1900, 2700),
        "points" => new PointDensity([new(20, 1800), new(120, 2100), new(200, 2200)]),
        "traugott" => new MeanDensityLaw(Method("traugott-1997")),
        _ => new LocalDensityLaw(Method("miller-gulf")),
    };

    private static ShallowDensity Tied(string kind, double depth = 300, double density = 2300) => Of(kind).Tie(depth, density, out _);

    /// <summary>An independent quadrature: the trapezoidal rule with many steps.</summary>
    private static double Trapezoid(ShallowDensity density, double depth, int steps = 200_000)
    {
        var sum = 0.5 * (density.DensityAt(0) + density.DensityAt(depth));
        for (var i = 1; i < steps; i++) sum += density.DensityAt(depth * i / steps);
        return sum * depth / steps;
    }

    [Fact]
    public void A_tied_exponential_runs_from_the_surface_to_the_log()
    {
        var tied = new ExponentialDensity(1900, 2700).Tie(800, 2350, out var problem);
        Assert.Null(problem);
        Assert.Equal(1900, tied.DensityAt(0), 1e-9);
        Assert.Equal(2350, tied.DensityAt(800), 1e-9); // rounding
        Assert.True(tied.DensityAt(1e6) <= 2700);
        Assert.Equal(Trapezoid(tied, 800), tied.MassAbove(800), 1e-3); // kg/m2 of 1.7e6: the error of the trapezoidal rule
        Assert.Equal(Trapezoid(tied, 137), tied.MassAbove(137), 1e-3);
        Assert.Equal(0, tied.MassAbove(0), 1e-9);
    }

    // The exponential that starts at the first logged value, but for a hair, is a constant: no digits may be lost, and none may be NaN.
    [Theory]
    [InlineData(1e-12)]
    [InlineData(1e-9)]
    [InlineData(1e-4)]
    [InlineData(1)]
    public void An_almost_constant_exponential_keeps_its_mass(double difference)
    {
        var tied = new ExponentialDensity(2100, 2700).Tie(900, 2100 + difference, out var problem);
        Assert.Null(problem);
        Assert.Equal((2100 + (0.5 * difference)) * 900, tied.MassAbove(900), 1e-3 + (0.2 * difference * difference)); // the curvature is left out
    }

    [Theory]
    [InlineData(1800)]
    [InlineData(1900)]
    [InlineData(2700)]
    [InlineData(2800)]
    public void An_exponential_cannot_meet_a_density_outside_its_ends(double density)
    {
        new ExponentialDensity(1900, 2700).Tie(800, density, out var problem);
        Assert.Equal(
            $"the exponential above the log cannot meet the first logged density of {UnitSystem.Metric.Show(new Quantity(density, Dimension.Density))}: it runs from 1.900 g/cm3 to 2.700 g/cm3; change surface_density or matrix_density in [overburden] above_log",
            UnitSystem.Metric.Show(problem!));
    }

    [Fact]
    public void Points_are_joined_by_straight_lines_and_hold_beyond_their_ends()
    {
        var points = new PointDensity([new(20, 1800), new(120, 2100), new(200, 2200)]);
        Assert.Equal(
            [1800, 1800, 1950, 2100, 2150, 2200, 2200],
            new double[] { 0, 20, 70, 120, 160, 200, 900 }.Select(points.DensityAt), (a, b) => Math.Abs(a - b) < 1e-9);

        // By hand: 20 x 1800; + 50 x 1875; 36000 + 100 x 1950; + 40 x 2125; 231000 + 80 x 2150; + 700 x 2200.
        Assert.Equal(
            [0, 18000, 36000, 129750, 231000, 316000, 403000, 1943000],
            new double[] { 0, 10, 20, 70, 120, 160, 200, 900 }.Select(points.MassAbove), (a, b) => Math.Abs(a - b) < 1e-6);
        Assert.Equal((2345, 2345.0 * 7), (new PointDensity([new(0, 2345)]).DensityAt(7), new PointDensity([new(0, 2345)]).MassAbove(7)));
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void The_mass_grows_by_the_density(string kind)
    {
        var density = Tied(kind);
        Gen.Double[1, 3000].Sample(depth =>
        {
            // A central difference over half a metre; kinks of the points and curvature cost less than the tolerance, kg/m3.
            var slope = (density.MassAbove(depth + 0.25) - density.MassAbove(depth - 0.25)) / 0.5;
            Assert.Equal(slope, density.DensityAt(depth), 0.5);
        });
    }

    // The error of 200,000 steps is far below the tolerance, a millionth, except in the first metres, where Miller's slope is infinite.
    [Theory]
    [MemberData(nameof(Kinds))]
    public void The_mass_is_the_integral_of_the_density(string kind)
    {
        var density = Tied(kind);
        foreach (var depth in new[] { 7.0, 50, 51, 300, 1234 })
            Assert.Equal(Trapezoid(density, depth), density.MassAbove(depth), (1e-6 * depth * 2500) + (kind == "traugott" ? 100 : 0)); // its density near the surface is a mean over half a metre
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Sv_passes_the_top_of_the_log_without_a_jump(string kind)
    {
        double[] depths = [.. Enumerable.Range(1, 600)];
        double[] logged = [.. depths.Select(z => z < 300 ? double.NaN : 2300)];
        var setup = Setup with { Overburden = new OverburdenSettings { AboveLog = Chosen(Of(kind)) } };
        var model = Run(setup, Table(depths, Curve(Property.Density, logged)));
        var sv = model.Column(Property.VerticalStress);
        for (var i = 1; i < sv.Length; i++) Assert.InRange(sv[i] - sv[i - 1], 1500 * G, 2301 * G);

        // Samples above the log change nothing: the log alone starts from the whole mass above it. Half the step from the last
        // assumed to the first logged density is all that the trapezoidal rule may differ by.
        double[] below = [.. depths.Where(z => z >= 300)];
        var alone = Run(setup, Table(below, Curve(Property.Density, Same(2300, below.Length)))).Column(Property.VerticalStress);
        var step = Math.Abs(2300 - Tied(kind).DensityAt(299));
        Assert.Equal(alone[0], sv[299], (G * 0.5 * step) + (2e-5 * alone[0]));
        Assert.Equal(G * Tied(kind).MassAbove(300), alone[0], 1e-3);
        Assert.Equal(1, model.Column(Property.UnloggedShare)[298]);
    }

    [Fact]
    public void A_log_that_starts_at_the_ground_needs_no_exponential()
    {
        var overburden = new OverburdenSettings { AboveLog = Chosen<ShallowDensity>(new ExponentialDensity(1900, 2000)) };
        var model = Run(Setup with { Overburden = overburden }, LogsWith());
        Assert.Equal(2500 * G * 400, model.Column(Property.VerticalStress)[4], 1);
        Assert.DoesNotContain(model.Texts(), t => t.Contains("above the log", StringComparison.Ordinal));
    }

    [Fact]
    public void An_exponential_that_cannot_be_tied_is_an_error_where_it_was_chosen()
    {
        var overburden = new OverburdenSettings { AboveLog = Chosen<ShallowDensity>(new ExponentialDensity(1900, 2000), line: 7) };
        Assert.Equal(
            ["well.toml(7,1): error: the exponential above the log cannot meet the first logged density of 2.500 g/cm3: it runs from 1.900 g/cm3 to 2.000 g/cm3; change surface_density or matrix_density in [overburden] above_log"],
            Errors(Setup with { Overburden = overburden }, Table([100, 200, 300], Curve(Property.Density, Same(2500, 3)))));
    }

    // One wrong first sample must not tilt everything above it: the tie is to the median of the first 10 m.
    [Fact]
    public void The_tie_is_to_the_median_of_the_first_metres()
    {
        var overburden = new OverburdenSettings { AboveLog = Chosen<ShallowDensity>(new ExponentialDensity(1900, 2700)) };
        var model = Run(
            Setup with { Overburden = overburden },
            Table([500, 505, 510, 511], Curve(Property.Density, 2650, 2300, 2310, 2310)));
        Assert.Equal(G * Tied("exponential", 500, 2310).MassAbove(500), model.Column(Property.VerticalStress)[0], 1e-3);
    }
}
