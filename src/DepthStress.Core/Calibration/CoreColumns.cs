using DepthStress.Core.Model;
using static DepthStress.Core.Model.ColumnUnits;

namespace DepthStress.Core.Calibration;

/// <summary>The columns of the core table: one row for each plug.</summary>
public static class CoreColumns
{
    /// <summary>Every column. Later ones are appended.</summary>
    public static IReadOnlyList<Column<CoreComparison>> All { get; } =
    [
        Number("core_md", "measured depth as the core table has it", Depths, r => r.Plug.Depth),
        Number("depth_shift", "what was added to it", Depths, r => r.Depth - r.Plug.Depth),
        Number("md", "measured depth on the log", Depths, r => r.Depth),
        Word("orientation", "how the plug was cut", r => r.Plug.OrientationWord),
        Number("angle_to_bedding", "angle between its axis and the bedding", Angles, r => r.Plug.AngleToBedding),
        Number("confining_pressure", "confining pressure of the test", Stresses, r => r.Plug.ConfiningPressure),
        Word("group", "what its modulus is pooled with", r => r.Plug.Group),
        Number("youngs_static_plug", "static Young's modulus of the plug", Moduli, r => r.Plug.YoungsStatic),
        Number("youngs_static_model", "static Young's modulus of the model", Moduli, r => r.Youngs),
        Number("youngs_dynamic", "dynamic Young's modulus of the model", Moduli, r => r.Dynamic),
        Number("youngs_static_residual", "model minus plug", Moduli, r => r.Youngs - r.Plug.YoungsStatic),
        Number("poisson_static_plug", "static Poisson's ratio of the plug", Numbers, r => r.Plug.PoissonStatic),
        Number("poisson_static_model", "static Poisson's ratio of the model", Numbers, r => r.Poisson),
        Number("poisson_static_residual", "model minus plug", Numbers, r => r.Poisson - r.Plug.PoissonStatic),
        Number("ucs_plug", "unconfined compressive strength of the plug", Stresses, r => r.Plug.Ucs),
        Number("ucs_model", "unconfined compressive strength of the model", Stresses, r => r.Ucs),
        Number("ucs_residual", "model minus plug", Stresses, r => r.Ucs - r.Plug.Ucs),
    ];

    private static NumberColumn<CoreComparison> Number(string id, string title, (ColumnUnit Metric, ColumnUnit Field) units, Func<PlugRow, double> read) =>
        new(id, title, "", units.Metric, units.Field, "[core] files, and the model at the plug's depth", (core, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = read(core.Rows[start + i]);
        });

    private static TextColumn<CoreComparison> Word(string id, string title, Func<PlugRow, string> read) =>
        new(id, title, "[core] files", (core, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = read(core.Rows[start + i]);
        });
}
