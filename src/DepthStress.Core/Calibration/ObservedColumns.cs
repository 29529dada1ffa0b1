using DepthStress.Core.Model;
using static DepthStress.Core.Model.ColumnUnits;

namespace DepthStress.Core.Calibration;

/// <summary>The column table of the observations beside the model: every column once, in the order it is written.</summary>
public static class ObservedColumns
{
    /// <summary>Every column.</summary>
    public static IReadOnlyList<Column<IReadOnlyList<Comparison>>> All { get; } =
    [
        Words("kind", "what was observed", "observations file", c => c.Reading.Interval.Observation.Kind.Word()),
        Number("top_md", "top, measured depth", "", Depths, "observations file, survey", c => c.Reading.Interval.Top),
        Number("base_md", "base, measured depth", "", Depths, "observations file, survey", c => c.Reading.Interval.Base),
        Number("middle_tvd", "middle, true vertical depth", "", Depths, "survey", c => c.Reading.Interval.MiddleTvd),
        Words("compared_with", "what of the model it is compared with", "kind", c => c.Reading.Subject),
        Words("meaning", "what it says of the model's value", "kind, [observations]", c => Word(c.Reading)),
        Number("observed", "observed, as the quantity compared", "", Stresses, "value, with the fluid column where read at surface", c => c.Measured),
        Number("modelled", "the model's value", "", Stresses, "mean over the interval; least margin over open hole", c => c.Modelled),
        Number("sigma", "standard deviation of the comparison", "", Stresses, "sigma, with the model's error where it was estimated", c => c.Sigma),
        Number("residual", "model less observation in standard deviations; for a bound what is beyond it", "", Numbers, "(modelled - observed) / sigma", c => c.Residual),
        Number("left_out", "the same, fitted without this observation", "", Numbers, "calibrate", c => c.LeftOut),
        Words("problem", "why it is not compared", "", c => c.Reading.Problem ?? ""),
        Words("date", "day", "observations file", c => c.Reading.Interval.Observation.Date),
        Words("note", "note", "observations file", c => c.Reading.Interval.Observation.Note),
    ];

    private static string Word(Reading reading) => reading.Meaning switch
    {
        Meaning.Value => "value",
        Meaning.UpperBound => "upper bound",
        Meaning.LowerBound => "lower bound",
        _ => "nothing",
    };

    private static NumberColumn<IReadOnlyList<Comparison>> Number(
        string id, string title, string symbol, (ColumnUnit Metric, ColumnUnit Field) units, string formula, Func<Comparison, double> value) =>
        new(id, title, symbol, units.Metric, units.Field, formula, (rows, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = value(rows[start + i]);
        });

    private static TextColumn<IReadOnlyList<Comparison>> Words(string id, string title, string formula, Func<Comparison, string> word) =>
        new(id, title, formula, (rows, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = word(rows[start + i]);
        });
}
