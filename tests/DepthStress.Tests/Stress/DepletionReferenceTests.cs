using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Stress;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Stress;

public class DepletionReferenceTests
{
    // Self-computed; half the last digit. The fall of 35 MPa and its 25.0482 MPa likewise.
    [Fact]
    public void The_path_of_a_stiff_sand_is_met()
    {
        Assert.Equal(0.715663, DepletionPath.Coefficient(0.9, 0.17), 5e-7);
        Assert.Equal(-25.0482, -35 * DepletionPath.Coefficient(0.9, 0.17), 5e-5);
    }

    // nu 1/4 and alpha 1 give two thirds: an identity; tolerance: rounding.
    [Fact]
    public void A_quarter_gives_two_thirds() => Assert.Equal(2.0 / 3, DepletionPath.Coefficient(1, 0.25), 1e-15);

    // Zoback 2007, Reservoir Geomechanics, prints 0.67 for a friction of 0.6, from a rounded q of 3.1; .679428 self-computed.
    [Fact]
    public void The_neutral_path_is_met()
    {
        Assert.Equal(0.679428, DepletionPath.Neutral(0.6), 5e-7);
        Assert.Equal(0.67, DepletionPath.Neutral(0.6), 0.01);
    }

    // The path must be the derivative of the stress the program computes, by symmetric difference (exact for a straight line;
    // tolerance: rounding at 1e6 Pa of difference).
    [Fact]
    public void The_path_is_the_slope_of_the_models_own_stress()
    {
        double At(double pore) => StrainModel.Of(20e9, 0.2, 0.8, 60e6, pore, 2e-4, 6e-4);
        Assert.Equal(DepletionPath.Coefficient(0.8, 0.2), (At(31e6) - At(29e6)) / 2e6, 1e-12);
    }

    // The same in layered rock; and equal constants both ways give the isotropic path.
    [Fact]
    public void In_layered_rock_the_path_is_the_slope_of_the_models_own_stress_too()
    {
        double At(double pore) => VtiStrainModel.Of(20e9, 32e9, 0.2, 0.28, 0.8, 0.7, 60e6, pore, 2e-4, 6e-4);
        Assert.Equal(DepletionPath.Coefficient(0.8, 0.7, 1.6, 0.2, 0.28), (At(31e6) - At(29e6)) / 2e6, 1e-12);
        Assert.Equal(DepletionPath.Coefficient(0.8, 0.2), DepletionPath.Coefficient(0.8, 0.8, 1, 0.2, 0.2), 1e-15);
    }

    // By hand from the printed columns of the model: nu 0.21875, Biot 0.8, 10 MPa of fall. Tolerance: rounding of means.
    [Fact]
    public void A_zone_says_where_it_goes_and_the_profile_stays()
    {
        var stress = SmallWell.Strains with { PressureChange = SmallWell.Chosen(-1e6) };
        var model = SmallWell.Run(SmallWell.Setup with { Settings = SmallWell.Settings with { HorizontalStress = stress } }, SmallWell.LogsWith());
        var still = SmallWell.Run(SmallWell.Setup with { Settings = SmallWell.Settings with { HorizontalStress = SmallWell.Strains } }, SmallWell.LogsWith());
        Assert.Equal(still.Column(Property.MinHorizontalStress), model.Column(Property.MinHorizontalStress));
        Assert.Empty(DepletionResult.Of(still));

        var result = Assert.Single(DepletionResult.Of(model));
        var path = 0.8 * (1 - (2 * 0.21875)) / (1 - 0.21875);
        var mean = model.Column(Property.MinHorizontalStress).Average();
        Assert.Equal(path, result.Coefficient, 1e-12);
        Assert.Equal(mean, result.Shmin, 1e-6);
        Assert.Equal(mean - (path * 1e6), result.NewShmin, 1e-6);
        // The limit falls by the neutral path, so the distance changes by the difference of the two.
        Assert.Equal((DepletionPath.Neutral(0.6) - path) * 1e6, result.NewDistance - result.Distance, 1e-6);
        Assert.Equal((5, 2), (result.Samples, result.NegativePressure)); // water of 1000 kg/m3: below 1 MPa at 0 and 100 m
    }
}
