using DepthStress.Core.Model;
using static DepthStress.Core.Model.ColumnUnits;

namespace DepthStress.Core.Calibration;

/// <summary>One row of the spread of choices.</summary>
/// <param name="Zone">The zone's name.</param>
/// <param name="Trial">The combination.</param>
/// <param name="Chosen">True for the one of the run.</param>
/// <param name="Change">Its Shmin less that of the run, Pa.</param>
public sealed record SpreadRow(string Zone, ChoiceTrial Trial, bool Chosen, double Change)
{
    /// <summary>Every combination of every zone.</summary>
    public static IReadOnlyList<SpreadRow> Of(EarthModel model, IReadOnlyList<ChoiceSpread> spreads)
    {
        ArgumentNullException.ThrowIfNull(model);
        return [.. spreads.SelectMany(s => s.Trials.Select((t, k) => new SpreadRow(model.ZoneName(s.Zone), t, k == 0, t.Shmin - s.Chosen)))];
    }
}

/// <summary>The column table of the spread of choices: every column once, in the order it is written.</summary>
public static class SpreadColumns
{
    /// <summary>Every column.</summary>
    public static IReadOnlyList<Column<IReadOnlyList<SpreadRow>>> All { get; } =
    [
        Word("zone", "zone", r => r.Zone),
        Word("static_youngs", "what gives static Young's modulus", r => r.Trial.StaticYoungs),
        Word("static_poisson", "what gives static Poisson's ratio", r => r.Trial.StaticPoisson),
        Word("biot", "what gives Biot's coefficient", r => r.Trial.Biot),
        Word("chosen", "yes for the choices of the run", r => r.Chosen ? "yes" : ""),
        Number("shmin", "mean Shmin of the zone", r => r.Trial.Shmin),
        Number("shmin_change", "the same less that of the run", r => r.Change),
    ];

    private static NumberColumn<IReadOnlyList<SpreadRow>> Number(string id, string title, Func<SpreadRow, double> value) =>
        new(id, title, "", Stresses.Metric, Stresses.Field, "run --spread", (rows, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = value(rows[start + i]);
        });

    private static TextColumn<IReadOnlyList<SpreadRow>> Word(string id, string title, Func<SpreadRow, string> word) =>
        new(id, title, "run --spread", (rows, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = word(rows[start + i]);
        });
}
