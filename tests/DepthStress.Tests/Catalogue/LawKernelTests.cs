using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Tests.Catalogue;

public class LawKernelTests
{
    private static readonly LawInput Velocity =
        new("Vp", Property.Vp, Units.KilometrePerSecond, new Interval(1, 6), new Interval(2, 5));

    private static readonly Law Law = UserLaw.Linear(Property.Ucs, Units.Megapascal, Velocity, 10, -20);

    [Fact]
    public void Samples_are_counted_by_what_became_of_them()
    {
        var result = new double[6];
        double[] velocity = [3000, double.NaN, 500, 5500, 1500, 6000];
        var inputs = default(LawInputs);
        inputs.Add(velocity);
        Assert.Equal(new LawOutcome(3, 1, 2, 2), LawKernel.Apply(Law, inputs, result));
        Assert.Equal([10e6, double.NaN, double.NaN, 35e6, double.NaN, 40e6], result); // 1500 m/s would give a strength below zero
    }

    [Fact]
    public void The_destination_may_be_an_input()
    {
        double[] column = [3000, 4000];
        var inputs = default(LawInputs);
        inputs.Add(column);
        LawKernel.Apply(Law, inputs, column);
        Assert.Equal([10e6, 20e6], column);
    }

    [Fact]
    public void A_result_that_is_not_finite_is_missing()
    {
        var law = UserLaw.Power(Property.Ucs, Units.Megapascal, new LawInput("phi", Property.Porosity, Units.Fraction), 1, -1);
        var result = new double[1];
        var inputs = default(LawInputs);
        inputs.Add([0.0]);
        Assert.Equal(1, LawKernel.Apply(law, inputs, result).OutsideDomain);
        Assert.True(double.IsNaN(result[0]));
    }

    [Fact]
    public void A_missing_input_counts_as_missing_even_beside_one_outside_its_domain()
    {
        var law = Law with { Inputs = [Velocity, Velocity] };
        var inputs = default(LawInputs);
        inputs.Add([500.0]);
        inputs.Add([double.NaN]);
        Assert.Equal(new LawOutcome(0, 1, 0, 0), LawKernel.Apply(law, inputs, new double[1]));
    }

    [Fact]
    public void An_input_outside_its_domain_stays_so_whatever_the_next_one_is()
    {
        var law = Law with { Inputs = [Velocity, Velocity] };
        var inputs = default(LawInputs);
        inputs.Add([500.0]);
        inputs.Add([5500.0]);
        Assert.Equal(new LawOutcome(0, 0, 1, 0), LawKernel.Apply(law with { ResultDomain = Interval.All }, inputs, new double[1]));
    }

    [Fact]
    public void Columns_that_do_not_fit_are_refused()
    {
        Assert.Throws<ArgumentException>(() => LawKernel.Apply(Law, default, new double[1]));
        Assert.Throws<ArgumentException>(() =>
        {
            var inputs = default(LawInputs);
            inputs.Add([1.0, 2.0]);
            LawKernel.Apply(Law, inputs, new double[3]);
        });
    }

    [Fact]
    public void Four_inputs_fit_and_five_do_not() => Assert.Throws<InvalidOperationException>(() =>
    {
        var inputs = default(LawInputs);
        for (var k = 0; k < LawInputs.Most; k++) inputs.Add(new double[] { k });
        Assert.Equal([0.0, 1.0, 2.0, 3.0], [inputs[0][0], inputs[1][0], inputs[2][0], inputs[3][0]]);
        inputs.Add([5.0]);
    });

    [Fact]
    public void A_constant_law_fills_every_sample()
    {
        var result = new double[2];
        LawKernel.Apply(UserLaw.Constant(Property.TensileStrength, Units.Megapascal, 3), default, result);
        Assert.Equal([3e6, 3e6], result);
    }

    // What can exist at all is stated in SI; a law in percent must be judged in SI as well.
    [Fact]
    public void A_law_given_in_percent_keeps_its_results()
    {
        var result = new double[1];
        var outcome = LawKernel.Apply(UserLaw.Constant(Property.Porosity, Units.Percent, 20), default, result);
        Assert.Equal(1, outcome.Evaluated);
        Assert.Equal(0.20, result[0], 1e-15); // one multiplication
        Assert.Equal(1, LawKernel.Apply(UserLaw.Constant(Property.Porosity, Units.Percent, 101), default, result).OutsideDomain);
    }

    // At nu = 0.5 the bulk modulus is infinite, at -1 the shear modulus: results would not be finite.
    [Theory]
    [InlineData(0.5, 0)]
    [InlineData(-1, 0)]
    [InlineData(0.49, 1)]
    public void A_Poissons_ratio_at_its_limits_is_outside_the_domain(double value, int evaluated) =>
        Assert.Equal(evaluated, LawKernel.Apply(UserLaw.Constant(Property.PoissonStatic, Units.One, value), default, new double[1]).Evaluated);

    [Fact]
    public void Outcomes_add_up() =>
        Assert.Equal(new LawOutcome(11, 22, 33, 44), new LawOutcome(1, 2, 3, 4) + new LawOutcome(10, 20, 30, 40));

    [Fact]
    public void An_interval_holds_its_ends_and_never_a_missing_value()
    {
        Assert.True(new Interval(1, 2).Contains(1));
        Assert.True(new Interval(1, 2).Contains(2));
        Assert.False(new Interval(1, 2).Contains(2.0000001));
        Assert.False(Interval.All.Contains(double.NaN));
    }
}
