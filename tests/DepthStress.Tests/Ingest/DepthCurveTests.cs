using DepthStress.Core.Logs;

namespace DepthStress.Tests.Ingest;

/// <summary>Depth curves inside log files: found by name, and never in the way.</summary>
public sealed class DepthCurveTests
{
    [Theory]
    [InlineData("TVD", Property.LoggedVerticalDepth)]
    [InlineData("tvdrt", Property.LoggedVerticalDepth)]
    [InlineData("z_loc", Property.LoggedVerticalPosition)]
    [InlineData("TVDSS", Property.LoggedVerticalPosition)]
    public void They_are_found_by_their_usual_names(string name, Property property)
    {
        var (logs, messages) = Ingesting.One(Ingesting.Csv(name + "[ft]", 1000, 1, -3000, -3001));
        Assert.Empty(messages);
        Assert.Equal(-914.4, logs![property]!.Values[0], 1e-9); // 3000 * 0.3048
    }

    [Fact]
    public void Without_a_unit_they_are_left_out_with_a_note() => Assert.Equal(
        ["a.csv(1,9): note: column z_loc (vertical_position): found no unit, expected one of m, ft, in, mm, cm; state it in [logs.curves]: vertical_position = { column = \"z_loc\", unit = \"m\" }; the curve is not used"],
        Ingesting.One(Ingesting.Csv("z_loc", 1000, 1, -3000, -3001)).Messages);

    [Fact]
    public void Of_several_the_first_serves()
    {
        var (logs, messages) = Ingesting.One("DEPT[m],TVDSS[m],z_loc[m]\n1000,960,-961\n1001,961,-962\n");
        Assert.Equal(["a.csv(1,18): note: found 2 columns for the role vertical_position (z_loc in a.csv, TVDSS in a.csv), took the first; another can be named in [logs.curves]"], messages);
        Assert.Equal(-961, logs![Property.LoggedVerticalPosition]!.Values[0]);
    }

    [Fact]
    public void A_column_that_serves_another_role_is_left_to_it()
    {
        var (logs, messages) = Ingesting.One("DEPT[m],Z[v/v]\n1000,0.2\n1001,0.3\n", "porosity = \"Z\"");
        Assert.Empty(messages);
        Assert.Null(logs![Property.LoggedVerticalPosition]);
    }
}
