using CsCheck;
using DepthStress.Core.Rock;

namespace DepthStress.Tests.Rock;

/// <summary>Velocities of layered rock in any direction, and back to those across the beds.</summary>
public sealed class VtiVelocityReferenceTests
{
    private const double Degree = Math.PI / 180;

    /// <summary>Averaged layers of density 2406 kg/m3; velocities self-computed, about as The Rock Physics Handbook prints them (recalled).</summary>
    private static readonly VtiStiffness Backus = new(45.10937e9, 16.67766e9, 34.03363e9, 8.27759e9, 12.55086e9);

    [Fact]
    public void Along_and_across_the_beds_the_velocities_are_the_roots_of_the_stiffnesses()
    {
        Assert.Equal(3761.03, Velocity(0).P, 5e-3);
        Assert.Equal(1854.83, Velocity(0).Sv, 5e-3);
        Assert.Equal(1854.83, Velocity(0).Sh, 5e-3);
        Assert.Equal(4329.98, Velocity(90).P, 5e-3);
        Assert.Equal(2283.96, Velocity(90).Sh, 5e-3);
        Assert.Equal(1854.83, Velocity(90).Sv, 5e-3);
    }

    // The usual inversion for C13 from the compressional velocity at 45 deg, recalled: an equation this code does not use. Rounding.
    [Fact]
    public void The_velocity_at_45_degrees_gives_C13_back()
    {
        var p = 2 * new VtiVelocities(Backus, 45 * Degree).Compressional;
        Assert.Equal(Backus.C13, Math.Sqrt((Backus.C11 + Backus.C44 - p) * (Backus.C33 + Backus.C44 - p)) - Backus.C44, 1);
    }

    // Identity: C and the direction n give Christoffel's matrix; its trace and determinant are sums and products of the roots.
    [Fact]
    public void The_velocities_are_the_roots_of_Christoffels_matrix_at_any_angle() => Gen.Double[0, 90].Sample(degrees =>
    {
        var (sin, cos) = Math.SinCos(degrees * Degree);
        var a = (Backus.C11 * sin * sin) + (Backus.C44 * cos * cos);
        var b = (Backus.C44 * sin * sin) + (Backus.C33 * cos * cos);
        var off = (Backus.C13 + Backus.C44) * sin * cos;
        var waves = new VtiVelocities(Backus, degrees * Degree);
        Assert.Equal(1, (waves.Compressional + waves.ShearVertical) / (a + b), 1e-12); // rounding
        Assert.Equal(1, waves.Compressional * waves.ShearVertical / ((a * b) - (off * off)), 1e-12);
    });

    // Forward with Thomsen's parameters, then back: the velocities across the beds, to 1e-9 of themselves.
    [Fact]
    public void Velocities_across_the_beds_come_back_from_those_along_the_hole_by_Thomsens_parameters() =>
        Gen.Select(Gen.Double[1800, 6000], Gen.Double[1.45, 3], Gen.Double[-0.05, 0.35], Gen.Double[-0.05, 0.45], Gen.Double[-0.1, 0.2], Gen.Double[0, 90], Gen.Bool)
            .Sample((vp, ratio, epsilon, gamma, delta, degrees, along) => Returns(
                vp, vp / ratio, VtiClosure.Thomsen(new(epsilon, gamma, delta)), along ? ShearWave.AlongBeds : ShearWave.AcrossBeds, degrees));

    [Fact]
    public void They_come_back_by_the_three_parameter_shale() =>
        Gen.Select(Gen.Double[1800, 5000], Gen.Double[1.5, 2.5], Gen.Double[0, 0.4], Gen.Double[0.9, 1.15], Gen.Double[0.9, 1.15], Gen.Double[0, 90], Gen.Bool)
            .Sample((vp, ratio, gamma, z, x, degrees, along) => Returns(
                vp, vp / ratio, VtiClosure.AnnieFromGamma(z, x, gamma), along ? ShearWave.AlongBeds : ShearWave.AcrossBeds, degrees));

    // The wave along the beds gives C66, the other shear wave C44.
    [Fact]
    public void They_come_back_with_C66_from_the_wave_along_the_beds() =>
        Gen.Select(Gen.Double[1800, 5000], Gen.Double[1.5, 2.5], Gen.Double[0, 0.4], Gen.Double[60, 90]).Sample((vp, ratio, gamma, degrees) =>
        {
            var (p, s) = (vp * vp, vp * vp / (ratio * ratio));
            var c = VtiClosure.AnnieFromGamma(1, 1, gamma).Of(p, s);
            var waves = new VtiVelocities(c, degrees * Degree);
            var closure = VtiClosure.AnnieFromShear(1, 1, waves.ShearHorizontal, degrees * Degree);
            var (vp0, vs0) = VerticalVelocity.Of(Math.Sqrt(waves.Compressional), Math.Sqrt(waves.ShearVertical), ShearWave.AcrossBeds, degrees * Degree, closure);
            Assert.Equal(1, vp0 / vp, 1e-9);
            Assert.Equal(1, vs0 / (vp / ratio), 1e-9);
        }, iter: 2000);

    [Fact]
    public void Across_the_beds_nothing_changes()
    {
        var closure = VtiClosure.Thomsen(new(0.2, 0.3, 0.1));
        Assert.Equal((3127.3, 1611.9), VerticalVelocity.Of(3127.3, 1611.9, ShearWave.AlongBeds, 0, closure));
        var unlike = VerticalVelocity.Of(3127.3, double.NaN, ShearWave.AlongBeds, 0.5, closure);
        Assert.True(double.IsNaN(unlike.Vp) && double.IsNaN(unlike.Vs));
    }

    // Weak anisotropy by Thomsen 1986: vp(angle) about vp (1 + delta s^2 c^2 + epsilon s^4), vsh about vs (1 + gamma s^2). Second order left out.
    [Fact]
    public void Weak_anisotropy_changes_velocities_as_the_weak_formulas_say()
    {
        var (s, c) = (Math.Sin(35 * Degree) * Math.Sin(35 * Degree), Math.Cos(35 * Degree) * Math.Cos(35 * Degree));
        var (vp, vs) = VerticalVelocity.Of(3000, 1500, ShearWave.AlongBeds, 35 * Degree, VtiClosure.Thomsen(new(0.008, 0.011, 0.002)));
        Assert.Equal(3000 / (1 + (0.002 * s * c) + (0.008 * s * s)), vp, 0.2); // (1e-2)^2 x 3000
        Assert.Equal(1500 / (1 + (0.011 * s)), vs, 0.1);
    }

    private static void Returns(double vp, double vs, VtiClosure closure, ShearWave wave, double degrees)
    {
        var c = closure.Of(vp * vp, vs * vs);
        if (!c.IsStable || c.C11 <= c.C44) return;
        var waves = new VtiVelocities(c, degrees * Degree);
        var (vp0, vs0) = VerticalVelocity.Of(Math.Sqrt(waves.Compressional), Math.Sqrt(waves.Shear(wave)), wave, degrees * Degree, closure);
        Assert.Equal(1, vp0 / vp, 1e-9);
        Assert.Equal(1, vs0 / vs, 1e-9);
    }

    private static (double P, double Sv, double Sh) Velocity(double degrees)
    {
        var waves = new VtiVelocities(Backus, degrees * Degree);
        return (Math.Sqrt(waves.Compressional / 2406), Math.Sqrt(waves.ShearVertical / 2406), Math.Sqrt(waves.ShearHorizontal / 2406));
    }
}
