using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

public class LayerColumnsTests
{
    private static readonly LayerTable Table = Layered(Run(), AtMost(250));

    private static double[] Read(string id)
    {
        var values = new double[Table.Layers.Count];
        LayerColumns.All.OfType<NumberColumn<LayerTable>>().Single(c => c.Id == id).Fill(Table, 0, UnitSystem.Metric, values);
        return values;
    }

    [Fact]
    public void Ids_are_unique_and_free_of_units()
    {
        var ids = LayerColumns.All.Select(c => c.Id).ToArray();
        Assert.Equal(ids.Length, ids.Distinct().Count());
        Assert.All(ids, id => Assert.Matches("^[a-z][a-z0-9_]*$", id));
    }

    [Fact]
    public void Thicknesses_are_the_differences_of_the_edges()
    {
        Assert.Equal([1, 2], Read("layer"));
        Assert.Equal(Read("base_tvd").Zip(Read("top_tvd"), (b, t) => b - t), Read("thickness_tvd"));
        Assert.Equal(Read("base_md").Zip(Read("top_md"), (b, t) => b - t), Read("thickness_md"));
        Assert.Equal(400, Read("thickness_tvd").Sum(), 1e-9);
    }

    // E 17.55 GPa and nu 0.21875 give G 7.2 GPa exactly (14.4 / 2), K 10.4, lambda 5.6, and E/(1 - nu^2) 18.4320 GPa.
    [Fact]
    public void Elastic_constants_follow_from_the_means()
    {
        Assert.Equal(7.2, Read("shear_static")[0], 1e-9);
        Assert.Equal(10.4, Read("bulk_static")[0], 1e-9);
        Assert.Equal(5.6, Read("lame_lambda_static")[0], 1e-9);
        Assert.Equal(18.4320, Read("plane_strain_static")[0], 5e-5);
    }

    [Fact]
    public void Rows_are_read_from_a_start_on()
    {
        var column = LayerColumns.All.OfType<NumberColumn<LayerTable>>().Single(c => c.Id == "top_tvd");
        var last = new double[1];
        column.Fill(Table, 1, UnitSystem.Field, last);
        Assert.Equal(Table.Layers[1].TopTvd / 0.3048, last[0], 1e-9);
        Assert.Equal("top_tvd_ft", column.Header(UnitSystem.Field));
    }

    [Fact]
    public void Contrasts_are_differences_of_means()
    {
        var means = Read("shmin_mean");
        Assert.Equal(means[1] - means[0], Read("shmin_contrast_below")[0], 1e-9);
        Assert.Equal(means[0] - means[1], Read("shmin_contrast_above")[1], 1e-9);
        Assert.Equal(Table.Layers[0].Profile(Property.MinHorizontalStress).Mean / 1e6, means[0], 1e-12);
    }
}
