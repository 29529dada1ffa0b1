using DepthStress.Core.Catalogue;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Core.Stress;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>Salt: every stress equals the vertical one, and rests on density alone. Facies no rule names.</summary>
public class SaltTests
{
    private const double Gap = double.NaN;

    private static LithologyChoice Rule(string name, bool salt, params double[] facies) =>
        new(new LithologyRule(name, null, null, null, facies, WellFile) { Salt = salt }, new StageSettings());

    private static readonly WellSetup Salty = Setup with
    {
        Settings = SmallWell.Settings with { HorizontalStress = Strains },
        Lithologies = [Rule("halite", true, 7), Rule("sand", false, 1)],
    };

    /// <summary>Salt at 200 and 300 m; the shear log ends above it.</summary>
    private static readonly EarthModel Model = Run(
        Salty, LogsWith(Curve(Property.Facies, 1, 1, 7, 7, 1), Curve(Property.Vs, 2400, 2400, Gap, 2400, 2400)));

    [Fact]
    public void All_stresses_of_salt_are_equal_to_the_last_bit()
    {
        var sv = Model.Column(Property.VerticalStress);
        Assert.Equal([false, false, true, true, false], sv.Zip(Model.Column(Property.MinHorizontalStress), (a, b) => a == b));
        Assert.Equal([false, false, true, true, false], sv.Zip(Model.Column(Property.MaxHorizontalStress), (a, b) => a == b));
    }

    [Fact]
    public void Salt_has_neither_regime_nor_shape_since_nothing_is_greatest()
    {
        var model = Model;
        string Regime(int i) => FaultingRegimes.Of(
            model.Column(Property.VerticalStress)[i], model.Column(Property.MinHorizontalStress)[i], model.Column(Property.MaxHorizontalStress)[i]).Name();
        Assert.Equal(["", ""], new[] { Regime(2), Regime(3) });
        Assert.NotEqual("", Regime(4));
        var shape = DepthColumns.All.OfType<NumberColumn<EarthModel>>().Single(c => c.Id == "a_phi");
        var values = new double[model.Count];
        shape.Fill(model, 0, UnitSystem.Metric, values);
        Assert.Equal([true, true], values[2..4].Select(double.IsNaN));
        Assert.False(double.IsNaN(values[4]));
    }

    [Fact]
    public void The_stresses_of_salt_rest_on_density_alone()
    {
        var vp = Curve(Property.Vp, Same(4000));
        vp = vp with { Origins = vp.Origins.Mark([false, false, true, true, true], SampleOrigin.Predicted, "guess") };
        var model = Run(
            Salty with { Overburden = new OverburdenSettings { Gaps = Chosen(new DensityFill(DensityFillKind.Linear)) } },
            LogsWith(vp, Curve(Property.Facies, 1, 1, 7, 7, 1), Curve(Property.Density, 2500, 2500, 2500, Gap, 2500)));
        Assert.Equal(
            [SampleOrigin.Measured, SampleOrigin.Measured, SampleOrigin.Measured, SampleOrigin.Filled, SampleOrigin.Predicted], model.StressBasis);
    }

    // Salt without a shear log has its stresses all the same: "no horizontal stress" would be wrong there.
    [Fact]
    public void A_log_missing_in_salt_takes_no_stress_away()
    {
        Assert.DoesNotContain(Model.Texts(), t => t.StartsWith("shear log missing", StringComparison.Ordinal));
        Assert.DoesNotContain(double.NaN, Model.Column(Property.MinHorizontalStress));
    }

    [Fact]
    public void Salt_without_density_has_no_stress()
    {
        var model = Run(Salty, LogsWith(Curve(Property.Facies, 1, 1, 1, 1, 7), Curve(Property.Density, 2500, 2500, 2500, 2500, Gap)));
        Assert.True(double.IsNaN(model.Column(Property.MinHorizontalStress)[4]) && double.IsNaN(model.Column(Property.MaxHorizontalStress)[4]));
        Assert.Equal(SampleOrigin.None, model.StressBasis[4]);
    }

    [Fact]
    public void Sensitivities_leave_salt_out()
    {
        var all = Assert.Single(ShminSensitivity.Of(Run(Salty, LogsWith(Curve(Property.Facies, 1, 1, 1, 1, 1)))));
        Assert.NotEqual(0, all.PoissonHigher);
        Assert.Empty(ShminSensitivity.Of(Run(Salty, LogsWith(Curve(Property.Facies, Same(7))))));
        var some = Assert.Single(ShminSensitivity.Of(Model));
        var shmin = Model.Column(Property.MinHorizontalStress);
        Assert.Equal((shmin[0] + shmin[1] + shmin[4]) / 3, some.Shmin, 1e-6);
    }

    [Fact]
    public void Facies_without_a_rule_are_named_and_counted()
    {
        var model = Run(Salty, LogsWith(Curve(Property.Facies, 1, 9, 3, 3, Gap)));
        var finding = Assert.Single(model.Findings, f => f.Text.Format.StartsWith("facies", StringComparison.Ordinal));
        Assert.Equal("facies without a [[lithology]] rule: 3, 9; the zone's settings hold there", UnitSystem.Metric.Show(finding.Text));
        Assert.Equal((3, new DepthRange(100, 300)), (finding.Samples, Assert.Single(finding.Where)));
    }

    [Fact]
    public void Facies_that_another_rule_holds_for_are_not_without_one()
    {
        var rule = new LithologyRule("dense", null, new Interval(2400, 2600), null, [], WellFile);
        var model = Run(Salty with { Lithologies = [.. Salty.Lithologies, new(rule, new StageSettings())] }, LogsWith(Curve(Property.Facies, 1, 9, 3, 3, 1)));
        Assert.DoesNotContain(model.Texts(), t => t.StartsWith("facies", StringComparison.Ordinal));
    }

    [Fact]
    public void A_curve_of_something_else_is_not_listed_value_by_value()
    {
        double[] depths = [.. Enumerable.Range(0, 40)];
        var model = Run(Salty, Table(depths, Curve(Property.Density, Same(2500, 40)), Curve(Property.Facies, [.. depths.Select(d => 100 + (d / 2))])));
        Assert.Contains(
            "facies without a [[lithology]] rule: 100, 100.5, 101, 101.5, 102, 102.5, 103, 103.5, 104, 104.5 and 30 others; the zone's settings hold there", model.Texts());
    }

    [Fact]
    public void Without_a_facies_rule_facies_do_not_matter() => Assert.DoesNotContain(
        Run(Curve(Property.Facies, 1, 9, 3, 3, Gap)).Texts(), t => t.StartsWith("facies", StringComparison.Ordinal));
}
