using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>Zones whose beds the hole crosses obliquely.</summary>
public sealed class BeddingFindingTests
{
    private const double Degree = Math.PI / 180;

    private static readonly WellSetup Slanted = Setup with { Trajectory = Bent(new SurveyStation(0, 30 * Degree, 90 * Degree)) };

    private static string[] Found(WellSetup setup, params Curve[] curves) =>
        [.. Run(setup, LogsWith(curves)).Texts().Where(t => t.StartsWith("sonic along", StringComparison.Ordinal))];

    [Fact]
    public void In_flat_beds_the_angle_is_the_inclination()
    {
        var model = Run(Slanted, LogsWith());
        Assert.All(model.Column(Property.BeddingAngle), angle => Assert.Equal(30, angle / Degree, 1e-9)); // rounding
        Assert.Equal(["sonic along the hole is not the vertical velocity in the well (mean angle to the normal of the beds 30.0 deg)"], Found(Slanted));
        Assert.Empty(Found(Setup));
    }

    [Fact]
    public void Beds_that_the_hole_crosses_squarely_are_let_pass()
    {
        Assert.Empty(Found(Slanted with { Bedding = new Bedding(30 * Degree, 270 * Degree) }));
        Assert.Empty(Found(Setup with { Bedding = new Bedding(19.9 * Degree, 0) }));
        Assert.Equal(
            ["sonic along the hole is not the vertical velocity in the well (mean angle to the normal of the beds 20.1 deg)"],
            Found(Setup with { Bedding = new Bedding(20.1 * Degree, 0) }));
    }

    [Fact]
    public void Each_zone_has_its_own_mean_over_the_samples_with_sonic()
    {
        var setup = Setup with
        {
            Trajectory = Bent(new(0, 0, 0), new(200, 0, 0), new(400, 40 * Degree, 0)),
            Zones = [new("upper", 100, null, DepthKind.Measured, new(), WellFile), new("lower", 250, null, DepthKind.Measured, new(), WellFile)],
        };
        var finding = Assert.Single(Run(setup, LogsWith()).Findings, f => f.Text.Format.StartsWith("sonic along", StringComparison.Ordinal));
        Assert.Equal(
            "sonic along the hole is not the vertical velocity in zone \"lower\" (mean angle to the normal of the beds 30.0 deg)",
            UnitSystem.Metric.Show(finding.Text)); // 20 deg at 300 m, 40 deg at 400 m
        Assert.Equal((Severity.Note, 2), (finding.Severity, finding.Samples));
        Assert.Empty(Found(setup, Curve(Property.Vp, 4000, 4000, 4000, 4000, double.NaN))); // 20 deg are not more than 20
    }
}
