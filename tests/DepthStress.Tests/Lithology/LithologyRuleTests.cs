using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;

namespace DepthStress.Tests.Lithology;

public class LithologyRuleTests
{
    private const double Missing = double.NaN;

    private static LithologyRule Rule(Interval? shale = null, Interval? density = null, Interval? photoelectric = null, params double[] facies) =>
        new("rock", shale, density, photoelectric, facies, SourcePosition.None);

    [Fact]
    public void Every_cut_off_that_is_given_must_hold()
    {
        var rule = Rule(new Interval(0, 0.4), new Interval(2300, 2600));
        Assert.True(rule.Holds(0.4, 2300, Missing, Missing));
        Assert.False(rule.Holds(0.41, 2300, Missing, Missing));
        Assert.False(rule.Holds(0.4, 2601, Missing, Missing));
    }

    [Fact]
    public void A_missing_value_meets_no_cut_off()
    {
        Assert.False(Rule(shale: Interval.All).Holds(Missing, 2500, 3, 1));
        Assert.False(Rule(density: Interval.All).Holds(0.1, Missing, 3, 1));
        Assert.False(Rule(photoelectric: Interval.All).Holds(0.1, 2500, Missing, 1));
        Assert.False(Rule(facies: [1, 2]).Holds(0.1, 2500, 3, Missing));
    }

    [Fact]
    public void A_facies_code_is_met_by_any_of_the_list()
    {
        Assert.True(Rule(facies: [1, 2]).Holds(Missing, Missing, Missing, 2));
        Assert.False(Rule(facies: [1, 2]).Holds(Missing, Missing, Missing, 3));
    }

    [Fact]
    public void The_first_rule_that_holds_decides()
    {
        var table = new PropertyTable(4);
        table.Adopt(Property.ShaleVolume, [0.1, 0.5, 0.9, Missing]);
        table.Adopt(Property.Photoelectric, [5, 5, 3, 5]);
        var index = new short[4];
        LithologyIndex.Fill([Rule(new Interval(0, 0.2)), Rule(new Interval(0, 0.6)), Rule(photoelectric: new Interval(4.5, 6))], table, index);
        Assert.Equal([0, 1, LithologyIndex.None, 2], index);
    }

    [Fact]
    public void A_curve_that_is_not_there_meets_no_cut_off()
    {
        var index = new short[] { 7, 7 };
        LithologyIndex.Fill([Rule(new Interval(0, 1))], new PropertyTable(2), index);
        Assert.Equal([LithologyIndex.None, LithologyIndex.None], index);
        LithologyIndex.Fill([], new PropertyTable(2), index);
        Assert.Equal([LithologyIndex.None, LithologyIndex.None], index);
    }
}
