using DepthStress.Core.Logs;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Logs;

public class LogTableTests
{
    [Theory]
    [InlineData(100, 100)]
    [InlineData(200, 100)]
    [InlineData(100, double.NaN)]
    public void Depths_must_increase(double first, double second) =>
        Assert.Throws<ArgumentException>(() => new LogTable([first, second], []));

    [Fact]
    public void A_curve_must_be_as_long_as_the_depths_and_come_once()
    {
        Assert.Throws<ArgumentException>(() => Table([1, 2], Curve(Property.Vp, 3000)));
        Assert.Throws<ArgumentException>(() => Table([1], Curve(Property.Vp, 3000), Curve(Property.Vp, 3100)));
        var track = OriginTrack.Of([1, 2], SampleOrigin.Measured, "");
        Assert.Throws<ArgumentException>(() => Table([1], new Curve(CurveRoles.Of(Property.Vp)!, "", [3000], track)));
    }

    [Fact]
    public void Curves_come_in_the_order_of_the_role_table()
    {
        var table = Table([1], Curve(Property.GammaRay, 80), Curve(Property.Density, 2300), Curve(Property.Vp, 3000));
        Assert.Equal(["compressional", "density", "gamma_ray"], table.Curves.Select(c => c.Role.Id));
        Assert.Equal(1, table.Count);
    }

    [Fact]
    public void A_copy_with_other_curves_leaves_the_first_table_alone()
    {
        var table = Table([1], Curve(Property.Vp, 3000));
        var other = table.With(Curve(Property.Vp, 3500), Curve(Property.Vs, 1500));
        Assert.Equal(3000, table[Property.Vp]!.Values[0]);
        Assert.Null(table[Property.Vs]);
        Assert.Equal((3500, 1500), (other[Property.Vp]!.Values[0], other[Property.Vs]!.Values[0]));
    }

    [Fact]
    public void Roles_are_unique_and_their_mnemonics_belong_to_one_role()
    {
        Assert.Equal(CurveRoles.All.Count, CurveRoles.All.DistinctBy(r => r.Id).Count());
        Assert.Equal(CurveRoles.All.Count, CurveRoles.All.DistinctBy(r => r.Property).Count());
        var names = CurveRoles.All.SelectMany(r => r.Mnemonics).Concat(CurveRoles.DepthMnemonics).ToArray();
        Assert.Equal(names.Length, names.Distinct(StringComparer.OrdinalIgnoreCase).Count());
        Assert.All(CurveRoles.All, r => Assert.True(r.TypicalLow < r.TypicalHigh && r.Dimensions.Length > 0));
    }

    [Fact]
    public void A_role_is_found_by_its_name_or_its_property()
    {
        Assert.All(CurveRoles.All, r => Assert.Same(r, CurveRoles.Find(r.Id)));
        Assert.All(CurveRoles.All, r => Assert.Same(r, CurveRoles.Of(r.Property)));
        Assert.Null(CurveRoles.Find("Shear"));
        Assert.Null(CurveRoles.Of(Property.Ucs));
    }
}
