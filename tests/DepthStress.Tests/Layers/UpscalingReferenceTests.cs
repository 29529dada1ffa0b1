using DepthStress.Core.Layers;
using DepthStress.Core.Rock;

namespace DepthStress.Tests.Layers;

/// <summary>Averages of thin layers against published limits and numbers; the source stands beside each.</summary>
public class UpscalingReferenceTests
{
    private static VtiStiffness Of(double vp, double vs, double density) =>
        new(density * vp * vp, density * ((vp * vp) - (2 * vs * vs)), density * vp * vp, density * vs * vs, density * vs * vs);

    private static PorousRock Stack(params (double Thickness, VtiStiffness C)[] layers)
    {
        var upscaling = new Upscaling();
        foreach (var (thickness, c) in layers) upscaling.Add(thickness, c, 1, 1, 1e7);
        return upscaling.Result()!.Value;
    }

    // The Rock Physics Handbook's example of a Backus average, from memory: Vp 5200, Vs 2700 m/s, 2450 kg/m3, 0.75 m over
    // Vp 2900, Vs 1400 m/s, 2340 kg/m3, 0.5 m. Tolerances: half a unit of the last digit remembered.
    [Fact]
    public void The_handbooks_example_of_two_thin_layers()
    {
        var c = Stack((0.75, Of(5200, 2700, 2450)), (0.5, Of(2900, 1400, 2340))).Stiffness;
        Assert.Equal(45.1, c.C11 / 1e9, 0.05);
        Assert.Equal(20.0, c.C12 / 1e9, 0.05);
        Assert.Equal(34.03, c.C33 / 1e9, 0.005);
        Assert.Equal(16.7, c.C13 / 1e9, 0.05);
        Assert.Equal(8.28, c.C44 / 1e9, 0.005);
        Assert.Equal(12.55, c.C66 / 1e9, 0.005);
    }

    // Layers of one shear modulus are isotropic together (Berryman, Grechka and Berge 1997). Tolerance: rounding.
    [Fact]
    public void Equal_shear_moduli_give_an_isotropic_stack()
    {
        var c = Stack((2, new(30e9, 10e9, 30e9, 10e9, 10e9)), (3, new(45e9, 25e9, 45e9, 10e9, 10e9)), (1, new(21e9, 1e9, 21e9, 10e9, 10e9))).Stiffness;
        Assert.Equal(1, c.C11 / c.C33, 1e-14);
        Assert.Equal(1, c.C12 / c.C13, 1e-14);
        Assert.Equal(1, c.C44 / c.C66, 1e-14);
    }

    // Self-computed: two isotropic layers, shares 0.6 and 0.4, E 30 and 12 GPa, nu 0.2 and 0.35, a 0.6 and 0.85, p 30 MPa,
    // Sv 60 MPa, lateral strain 3e-4 both ways. Tolerances: half a unit of the last digit.
    [Fact]
    public void Two_layers_with_pressure_give_the_mean_of_their_stresses()
    {
        var upscaling = new Upscaling();
        upscaling.Add(0.6, VtiStiffness.Isotropic(30e9, 0.2), 0.6, 0.6, 30e6);
        upscaling.Add(0.4, VtiStiffness.Isotropic(12e9, 0.35), 0.85, 0.85, 30e6);
        var rock = upscaling.Result()!.Value;
        Assert.Equal(0.733929, rock.BiotVertical, 5e-7);
        Assert.Equal(0.695089, rock.BiotHorizontal, 5e-7);
        Assert.Equal(43.696154, rock.Horizontal(60e6, 30e6, 3e-4, 3e-4) / 1e6, 5e-7);
        var pair = rock.Isotropic();
        Assert.Equal(0.267606, pair.Poisson, 5e-7);
        Assert.Equal(21.8873, pair.Youngs / 1e9, 5e-5);
        Assert.Equal(43.696154, pair.ToPorous().Horizontal(60e6, 30e6, 3e-4, 3e-4) / 1e6, 5e-7);
    }
}
