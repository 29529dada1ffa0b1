using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report;

/// <summary>Columns that pictures show beside those of the depth results: logs as they are plotted by habit.</summary>
internal static class LogColumns
{
    private static readonly ColumnUnit Inches = new(Units.Inch, 2);
    private static readonly ColumnUnit GammaUnits = new(Units.GammaApi, 1);
    private static readonly ColumnUnit Fractions = ColumnUnits.Fractions.Metric;

    public static NumberColumn<EarthModel> Caliper { get; } = Stored("caliper", "hole diameter", "d", Inches, Property.Caliper);

    public static NumberColumn<EarthModel> BitSize { get; } = Stored("bit_size", "bit diameter", "d_bit", Inches, Property.BitSize);

    public static NumberColumn<EarthModel> GammaRay { get; } = Stored("gamma_ray", "gamma ray", "GR", GammaUnits, Property.GammaRay);

    public static NumberColumn<EarthModel> Neutron { get; } = Stored("neutron", "neutron porosity", "phi_N", Fractions, Property.NeutronPorosity);

    public static NumberColumn<EarthModel> CompressionalSlowness { get; } =
        Slowness("compressional_slowness", "compressional slowness", "dt_p", Property.Vp);

    public static NumberColumn<EarthModel> ShearSlowness { get; } = Slowness("shear_slowness", "shear slowness", "dt_s", Property.Vs);

    public static NumberColumn<EarthModel> PickedSlowness { get; } = new(
        "trend_shale", "slowness of the shale that the normal trend was fitted to", "dt_sh", ColumnUnits.Slownesses.Metric, ColumnUnits.Slownesses.Field, "smoothed log",
        (model, start, destination) => Copy(model, Property.PickedSlowness, start, destination));

    private static NumberColumn<EarthModel> Stored(string id, string title, string symbol, ColumnUnit unit, Property property) =>
        new(id, title, symbol, unit, unit, "log", (model, start, destination) => Copy(model, property, start, destination));

    private static NumberColumn<EarthModel> Slowness(string id, string title, string symbol, Property velocity) =>
        new(id, title, symbol, ColumnUnits.Slownesses.Metric, ColumnUnits.Slownesses.Field, "1 / velocity", (model, start, destination) =>
        {
            Copy(model, velocity, start, destination);
            for (var i = 0; i < destination.Length; i++) destination[i] = 1 / destination[i];
        });

    private static void Copy(EarthModel model, Property property, int start, Span<double> destination)
    {
        var values = model.Values.Read(property);
        if (values.IsEmpty) destination.Fill(double.NaN);
        else values.Slice(start, destination.Length).CopyTo(destination);
    }
}
