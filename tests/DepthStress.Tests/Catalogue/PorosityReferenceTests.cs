using CsCheck;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using static DepthStress.Tests.Catalogue.Laws;

namespace DepthStress.Tests.Catalogue;

public class PorosityReferenceTests
{
    // A public log-interpretation chart reads 18 porosity units at 80 us/ft on the quartz line (matrix 55.5 us/ft). The fluid,
    // 189 us/ft, is from memory. Tolerance: half a unit; self-computed value 0.183521.
    [Fact]
    public void Wyllies_porosity_meets_the_printed_quartz_line()
    {
        var porosity = InUnits("wyllie-1956", 80, 55.5, 189);
        Assert.Equal(0.18, porosity, 0.005);
        Assert.Equal(0.183521, porosity, 5e-7);
        Assert.Equal(porosity / 1.2, InUnits("wyllie-1956-compaction", 80, 55.5, 189, 1.2), 1e-12);
    }

    // Identity: Wyllie's mean of slownesses, 1/V = phi/Vf + (1 - phi)/Vm, returned. Tolerance: rounding.
    [Fact]
    public void Wyllies_porosity_inverts_his_mean() => Gen.Double[0, 1].Sample(porosity =>
    {
        var (matrix, fluid) = (1 / 5490.0, 1 / 1600.0);
        Assert.Equal(porosity, Apply("wyllie-1956", (porosity * fluid) + ((1 - porosity) * matrix), matrix, fluid), 1e-12);
    });

    // Identity: V = (1 - phi)^2 Vm + phi Vf (Dvorkin 2008) returned up to 37 %. Vm 5486, Vf 1600, phi 0.2 gives 3831.04 m/s
    // (self-computed; half the last digit). Tolerance of the inverse: rounding of a root.
    [Fact]
    public void Raymers_porosity_inverts_his_relation()
    {
        static double Velocity(double porosity) => ((1 - porosity) * (1 - porosity) * 5486) + (porosity * 1600);
        Assert.Equal(3831.04, Velocity(0.2), 5e-3);
        Gen.Double[0, 0.3699].Sample(porosity => Assert.Equal(porosity, Apply("raymer-1980", Velocity(porosity) - 1e-9, 5486, 1600), 1e-9));
        Assert.True(double.IsNaN(Apply("raymer-1980", Velocity(0.371), 5486, 1600)));
    }

    // Self-computed: 2.40 g/cm3 in quartz and fresh water. Half the last digit.
    [Fact]
    public void Density_porosity_of_a_quartz_sandstone() => Assert.Equal(0.151515, Apply("density-porosity", 2400, 2650, 1000), 5e-7);

    // Faster than the matrix: no porosity, no result.
    [Theory]
    [InlineData("wyllie-1956", 55.4, 55.5, 189.0)]
    [InlineData("raymer-1980-short", 55.4, 55.5)]
    public void Rock_faster_than_its_matrix_has_no_porosity(string id, params double[] inputs) => Assert.True(double.IsNaN(InUnits(id, inputs)));

    // One key, [porosity] matrix_slowness, feeds laws of slowness and of velocity. Tolerance: rounding.
    [Fact]
    public void Slowness_and_velocity_are_one_setting()
    {
        var settings = new StageSettings
        {
            Porosity = new PorositySettings { MatrixSlowness = new(1 / 5486.0, new SettingSource(SettingKind.WellFile, SourcePosition.None)) },
        };
        Assert.Equal(1 / 5486.0, LawParameters.Of(Property.MatrixSlowness)!.Value(settings));
        Assert.Equal(5486, LawParameters.Of(Property.MatrixVelocity)!.Value(settings), 1e-9);
        Assert.Equal(double.NaN, LawParameters.Of(Property.FluidVelocity)!.Value(settings));
        Assert.Null(LawParameters.Of(Property.Vp));
    }
}
