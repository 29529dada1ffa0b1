using System.Globalization;
using DepthStress.Core.Calibration;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Page;

/// <summary>The tables of results: zones, choices, layers, observations.</summary>
internal static class ResultTables
{
    private static readonly (ColumnUnit Metric, ColumnUnit Field) Length = (new(Units.Metre, 1), new(Units.Foot, 1));
    private static readonly (ColumnUnit Metric, ColumnUnit Field) Stress = (new(Units.Megapascal, 2), new(Units.Psi, 0));
    private static readonly (ColumnUnit Metric, ColumnUnit Field) Modulus = (new(Units.Gigapascal, 1), new(Units.Mpsi, 2));
    private static readonly (ColumnUnit Metric, ColumnUnit Field) Gradient = (new(Units.KilopascalPerMetre, 2), new(Units.PsiPerFoot, 3));
    private static readonly (ColumnUnit Metric, ColumnUnit Field) Percent = (new(Units.Percent, 0), new(Units.Percent, 0));
    private static readonly (ColumnUnit Metric, ColumnUnit Field) Ratio = (new(Units.One, 3), new(Units.One, 3));

    private const string SpreadNote = "Lowest and highest over the relations of the catalogue that were made for the same rock and that the logs can feed; \"alone\" changes that choice only. "
        + "Static Poisson's ratio is tried 0.05 lower and higher. Strains are those of the run. Relations that were recalled take part only with accept_unverified.";

    /// <summary>Means of every zone.</summary>
    public static string Zones(EarthModel model, IReadOnlyList<ZoneMeans> means, UnitSystem units)
    {
        var md = model.Values.Read(Property.MeasuredDepth);
        var end = md.IsEmpty ? double.NaN : md[^1];
        NumberCells<ZoneMeans> Mean(string title, string id, (ColumnUnit Metric, ColumnUnit Field) unit) => new(title, id, unit, z => z.Mean(DepthColumns.Get(id)));
        PageTable<ZoneMeans> table = new("zones", "Zones: means over the samples that have Shmin",
        [
            new WordCells<ZoneMeans>("Zone", "zone", z => z.Title),
            new NumberCells<ZoneMeans>("Top MD", "top_md", Length, z => z.TopMd),
            new NumberCells<ZoneMeans>("Covered", "covered", Percent, z => z.Covered),
            Mean("Sv", "sv", Stress), Mean("Pp", "pp", Stress), Mean("Shmin", "shmin", Stress), Mean("SHmax", "shmax", Stress),
            Mean("Shmin/z", "shmin_gradient", Gradient), Mean("Pp/z", "pp_gradient", Gradient),
            Mean("E static", "youngs_static", Modulus), Mean("nu static", "poisson_static", Ratio), Mean("Biot", "biot", Ratio),
            Mean("Sv not logged", "sv_unlogged_share", Percent),
        ])
        {
            Place = zone => (zone.TopMd, means.Select(z => z.TopMd).Where(t => t > zone.TopMd).DefaultIfEmpty(end).Min()),
        };
        return table.Write(means, units, "No sample lies in a zone.");
    }

    /// <summary>What the choices that logs cannot settle do to Shmin.</summary>
    public static string Choices(EarthModel model, IReadOnlyList<ShminSensitivity> sensitivities, UnitSystem units)
    {
        static string Shift(string name, double step) => string.Create(CultureInfo.InvariantCulture, $"{name} {step:+0.00;-0.00}");
        var (nu, biot) = (ShminSensitivity.PoissonStep, ShminSensitivity.BiotStep);
        return new PageTable<ShminSensitivity>("choices", "Choices: change of mean Shmin with another static Poisson's ratio or Biot's coefficient",
        [
            new WordCells<ShminSensitivity>("Zone", "zone", s => model.ZoneTitle(s.Zone)),
            new NumberCells<ShminSensitivity>("Shmin", "shmin", Stress, s => s.Shmin),
            new NumberCells<ShminSensitivity>(Shift("nu", -nu), "poisson_lower", Stress, s => s.PoissonLower),
            new NumberCells<ShminSensitivity>(Shift("nu", nu), "poisson_higher", Stress, s => s.PoissonHigher),
            new NumberCells<ShminSensitivity>(Shift("Biot", -biot), "biot_lower", Stress, s => s.BiotLower),
            new NumberCells<ShminSensitivity>(Shift("Biot", biot), "biot_higher", Stress, s => s.BiotHigher),
        ]).Write(sensitivities, units, "There is no Shmin, so no choice can move it.");
    }

    /// <summary>What every admissible choice for the rock makes of mean Shmin, beside what tests and core say.</summary>
    public static string Spread(ReportContent content, UnitSystem units)
    {
        if (content.Spreads is not { } spreads) return Html.Paragraph("So many samples that every choice for the rock is tried on request only: depthstress run --spread.");
        var model = content.Model;
        var table = new PageTable<(ChoiceSpread Choice, SpreadEvidence Evidence)>("spread", "Spread: mean Shmin over every admissible choice for the rock",
        [
            new WordCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>("Zone", "zone", s => model.ZoneTitle(s.Choice.Zone)),
            new NumberCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>("Shmin", "shmin", Stress, s => s.Choice.Chosen),
            .. Range("Every choice", "every_choice", s => s.All),
            .. Range("E static alone", "youngs_static", s => s.ByYoungs),
            .. Range("nu static alone", "poisson_static", s => s.ByPoisson),
            .. Range("Biot alone", "biot", s => s.ByBiot),
            new WordCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>("Moves it most", "dominant", s => s.Choice.Trials.Count > 1 ? s.Choice.Dominant : ""),
            new NumberCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>("Tests less model", "tests_less_model", Stress, s => s.Evidence.TestMiss),
            new NumberCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>("Tests", "tests", ColumnUnits.Counts, s => s.Evidence.Tests),
            new NumberCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>("Plug E over model", "plug_modulus_ratio", (new(Units.One, 2), new(Units.One, 2)), s => s.Evidence.ModulusRatio),
            new NumberCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>("Plugs", "plugs", ColumnUnits.Counts, s => s.Evidence.Plugs),
        ]).Write(
            [.. spreads.Select(s => (s, SpreadEvidence.Of(model, content.Comparisons, content.Core, s.Zone)))], units,
            "No zone has a Shmin by elastic rock, so no choice for the rock can spread it.");
        return spreads.Count > 0 ? table + Html.Paragraph(SpreadNote, "small") : table;

        static NumberCells<(ChoiceSpread Choice, SpreadEvidence Evidence)>[] Range(string title, string id, Func<ChoiceSpread, SpreadRange> range) =>
        [
            new($"{title}, lowest", $"{id}_lowest", Stress, s => range(s.Choice).Low), new($"{title}, highest", $"{id}_highest", Stress, s => range(s.Choice).High),
        ];
    }

    /// <summary>What the program's own finite elements find in the exported layers, beside the profile at log scale.</summary>
    public static string Solved(ClosedLoop loop, UnitSystem units)
    {
        static (ColumnUnit Metric, ColumnUnit Field) Fine() => (new(Units.Megapascal, 3), new(Units.Psi, 1));
        static NumberCells<LoopLayer>[] Pair(string symbol, string id, Property property, Func<LoopLayer, double> difference) =>
        [
            new($"{symbol}, profile", $"{id}_profile", Stress, l => l.Layer.Profile(property).Mean),
            new($"{symbol}, solved less profile", $"{id}_difference", Fine(), difference),
        ];
        return new PageTable<LoopLayer>("solved", "Layers solved: means over each layer beside the profile at log scale",
        [
            new NumberCells<LoopLayer>("Layer", "layer", ColumnUnits.Counts, l => l.Layer.Number),
            new WordCells<LoopLayer>("Zone", "zone", l => l.Layer.Zone),
            .. Pair("Sv", "sv", Property.VerticalStress, l => l.Vertical),
            .. Pair("Shmin", "shmin", Property.MinHorizontalStress, l => l.Shmin),
            .. Pair("SHmax", "shmax", Property.MaxHorizontalStress, l => l.Shmax),
            new NumberCells<LoopLayer>("Shmin off a straight line, mean", "shmin_misfit_mean", Stress, l => l.Layer.Misfit(Property.MinHorizontalStress).Mean),
            new NumberCells<LoopLayer>("Shmin off a straight line, greatest", "shmin_misfit_greatest", Stress, l => l.Layer.Misfit(Property.MinHorizontalStress).Greatest),
            new NumberCells<LoopLayer>("Missing", "share_missing", Percent, l => l.Layer.Missing),
        ])
        {
            Place = l => (l.Layer.TopMd, l.Layer.BaseMd),
        }.Write(loop.Layers, units, "No layer can be solved.");
    }

    /// <summary>The layers.</summary>
    public static string Layers(LayerTable layers, UnitSystem units)
    {
        static NumberCells<Layer> Mean(string title, string id, (ColumnUnit Metric, ColumnUnit Field) unit, Property property) => new(title, id, unit, l => l.Mean(property));
        static NumberCells<Layer> Profile(string title, string id, Property property) => new(title, id, Stress, l => l.Profile(property).Mean);
        return new PageTable<Layer>("layers", "Layers: means over true vertical thickness",
        [
            new NumberCells<Layer>("Layer", "layer", ColumnUnits.Counts, l => l.Number),
            new WordCells<Layer>("Zone", "zone", l => l.Zone),
            new NumberCells<Layer>("Top MD", "top_md", Length, l => l.TopMd),
            new NumberCells<Layer>("Base MD", "base_md", Length, l => l.BaseMd),
            new NumberCells<Layer>("Top TVD", "top_tvd", Length, l => l.TopTvd),
            new NumberCells<Layer>("Thickness TVD", "thickness_tvd", Length, l => l.BaseTvd - l.TopTvd),
            Mean("Density", "density", (new(Units.GramPerCubicCentimetre, 3), new(Units.GramPerCubicCentimetre, 3)), Property.Density),
            Mean("E static", "youngs_static", Modulus, Property.YoungsStatic),
            Mean("nu static", "poisson_static", Ratio, Property.PoissonStatic),
            Mean("Biot", "biot", Ratio, Property.Biot),
            Profile("Pp", "pp_mean", Property.PorePressure), Profile("Sv", "sv_mean", Property.VerticalStress),
            Profile("Shmin", "shmin_mean", Property.MinHorizontalStress), Profile("SHmax", "shmax_mean", Property.MaxHorizontalStress),
            new NumberCells<Layer>("Shmin above minus here", "shmin_contrast_above", Stress, l => l.ContrastAbove),
            new NumberCells<Layer>("Shmin below minus here", "shmin_contrast_below", Stress, l => l.ContrastBelow),
            new NumberCells<Layer>("Not measured", "share_not_measured", Percent, l => l.NotMeasured),
        ])
        {
            Place = layer => (layer.TopMd, layer.BaseMd),
        }.Write(layers.Layers, units, "There are no layers.");
    }

    /// <summary>The observations beside the model.</summary>
    public static string Observations(IReadOnlyList<Comparison> observations, UnitSystem units) => new PageTable<Comparison>("observations", "Observations beside the model",
    [
        new WordCells<Comparison>("Observed", "kind", o => o.Reading.Interval.Observation.Kind.Word()),
        new NumberCells<Comparison>("Top MD", "top_md", Length, o => o.Reading.Interval.Top),
        new NumberCells<Comparison>("Base MD", "base_md", Length, o => o.Reading.Interval.Base),
        new WordCells<Comparison>("Compared with", "compared_with", o => o.Reading.Subject),
        new WordCells<Comparison>("It is", "meaning", o => MeaningWords.Of(o.Reading)),
        new NumberCells<Comparison>("Observation", "observed", Stress, o => o.Measured),
        new NumberCells<Comparison>("Model", "modelled", Stress, o => o.Modelled),
        new NumberCells<Comparison>("Standard deviation", "sigma", Stress, o => o.Sigma),
        new NumberCells<Comparison>("Residual, standard deviations", "residual", (new(Units.One, 1), new(Units.One, 1)), o => o.Residual),
        new WordCells<Comparison>("Verdict", "verdict", Verdict),
        new WordCells<Comparison>("Note", "note", o => o.Reading.Problem ?? o.Reading.Interval.Observation.Note),
    ])
    {
        Place = o => (o.Reading.Interval.Top, o.Reading.Interval.Base),
    }.Write(observations, units, "There are no observations: nothing but the logs and the choices speaks for these stresses.");

    private static string Verdict(Comparison o) =>
        !double.IsFinite(o.Residual) ? "not compared" : o.Inside ? "met within 95 %" : Math.Abs(o.Residual) > 3 ? "missed by more than 3" : "missed";
}
