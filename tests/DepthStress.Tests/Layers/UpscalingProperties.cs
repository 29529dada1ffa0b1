using CsCheck;
using DepthStress.Core.Layers;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Tests.Layers;

/// <summary>What upscaled rock carries, for any stable stack.</summary>
public class UpscalingProperties
{
    private sealed record Thin(double Thickness, VtiConstants Rock, double BiotVertical, double BiotHorizontal, double PressureShare);

    private static readonly Gen<Thin> Layer =
        Gen.Select(Gen.Double[0.01, 10], Gen.Select(Gen.Double[2e9, 80e9], Gen.Double[0.7, 1.6], Gen.Double[0.01, 0.4], Gen.Double[0.01, 0.4], Gen.Double[1e9, 30e9]), Gen.Double[0.2, 1], Gen.Double[0.2, 1], Gen.Double[0.3, 1.7])
            .Select((thickness, e, av, ah, p) => new Thin(thickness, new VtiConstants(e.Item1, e.Item1 * e.Item2, e.Item3, e.Item4, e.Item5), av, ah, p))
            .Where(l => l.Rock.IsStable);

    private static readonly Gen<(Thin[] Layers, double Vertical, double Pore, double Along, double Across)> Stacks =
        Gen.Select(Layer.Array[1, 40], Gen.Double[10e6, 120e6], Gen.Double[0, 60e6], Gen.Double[-1e-3, 1e-3], Gen.Double[-1e-3, 1e-3]);

    // Under one vertical stress and one pair of strains; pressure and Biot's coefficient differ from layer to layer. The fine
    // layers take the profile's own formula in engineering constants. Tolerance: rounding of forty terms.
    [Fact]
    public void The_mean_horizontal_stress_of_thin_layers_is_what_the_upscaled_rock_carries() => Stacks.Sample(s =>
    {
        var upscaling = new Upscaling();
        double mean = 0, size = 0, pore = 0, total = 0;
        foreach (var l in s.Layers)
        {
            var p = l.PressureShare * s.Pore;
            upscaling.Add(l.Thickness, l.Rock.ToStiffness(), l.BiotVertical, l.BiotHorizontal, p);
            var stress = VtiStrainModel.Of(
                l.Rock.Vertical, l.Rock.Horizontal, l.Rock.PoissonVertical, l.Rock.PoissonHorizontal, l.BiotVertical, l.BiotHorizontal, s.Vertical, p, s.Along, s.Across);
            mean += l.Thickness * stress;
            size += l.Thickness * (Math.Abs(stress) + s.Vertical);
            pore += l.Thickness * p;
            total += l.Thickness;
        }

        var rock = upscaling.Result()!.Value;
        Assert.Equal(0, (rock.Horizontal(s.Vertical, pore / total, s.Along, s.Across) - (mean / total)) / (size / total), 1e-12);
        Assert.True(rock.Stiffness.IsStable);
    });

    // Tolerance: rounding.
    [Fact]
    public void The_isotropic_pair_carries_the_mean_of_both_horizontal_stresses() => Stacks.Sample(s =>
    {
        var upscaling = new Upscaling();
        foreach (var l in s.Layers) upscaling.Add(l.Thickness, l.Rock.ToStiffness(), l.BiotVertical, l.BiotHorizontal, l.PressureShare * s.Pore);
        var rock = upscaling.Result()!.Value;
        if (rock.Stiffness.StressRatio > 0.9) return; // a ratio near 1 leaves no isotropic rock
        var pair = rock.Isotropic().ToPorous();
        var size = s.Vertical + Math.Abs(rock.Horizontal(s.Vertical, s.Pore, s.Along, s.Across));
        double Sum(PorousRock r) => r.Horizontal(s.Vertical, s.Pore, s.Along, s.Across) + r.Horizontal(s.Vertical, s.Pore, s.Across, s.Along);
        Assert.Equal(0, (Sum(rock) - Sum(pair)) / size, 1e-11);
    });

    [Fact]
    public void A_stack_that_is_not_stable_gives_no_rock()
    {
        var upscaling = new Upscaling();
        Assert.Null(upscaling.Result());
        upscaling.Add(1, new VtiStiffness(-20e9, 5e9, 20e9, 8e9, 8e9), 0.8, 0.8, 1e7);
        Assert.Null(upscaling.Result());
    }
}
