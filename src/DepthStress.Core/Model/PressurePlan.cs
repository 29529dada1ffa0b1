using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

namespace DepthStress.Core.Model;

/// <summary>What one resolved choice of pore pressure needs: its line, or normal pressure, trend and law; and what its sands take.</summary>
/// <param name="Settings">The settings, fitted trend parameters put in.</param>
internal sealed record PressurePlan(StageSettings Settings)
{
    /// <summary>The line of a method that needs no log, else the normal pressure.</summary>
    public PressureLine? Line { get; init; }

    /// <summary>The fluid column, where that is the method.</summary>
    public FluidLine? Fluids { get; init; }

    /// <summary>The method of shale, or null.</summary>
    public ShaleMethod? Method { get; init; }

    /// <summary>Its law.</summary>
    public Law? Law { get; init; }

    /// <summary>Its normal trend.</summary>
    public NormalTrend? Trend { get; init; }

    /// <summary>Effective stress of normal pressure against depth, for the equivalent depth.</summary>
    public NormalStress? Stresses { get; init; }

    /// <summary>The table that sands take.</summary>
    public PressureLine? SandLine { get; init; }

    /// <summary>The fluid column that sands take.</summary>
    public FluidLine? SandFluids { get; init; }

    /// <summary>Fills one run; rock that is not shale stays missing where the method is one of shale.</summary>
    public void Fill(WellSetup setup, PropertyTable table, in SettingsRun run, bool[] shale, List<LawUse> uses)
    {
        var depths = table.Read(Property.TrueVerticalDepth).Slice(run.Start, run.Length);
        var result = table.Write(Property.PorePressure).Slice(run.Start, run.Length);
        if (Law is not { } law)
        {
            if (Fluids is { } fluids) fluids.Fill(depths, result);
            else Line?.Fill(depths, result);
            return;
        }

        var top = setup.Frame.SolidTopTvd;
        if (Method!.NeedsNormalPressure || Settings.PorePressure.AtLeastNormal.Value) Line?.Fill(depths, Column(table, Property.NormalPressure, run));
        Trend?.Fill(depths, top, Column(table, TrendStage.NormalOf(Trend.Quantity), run));
        if (law.Inputs.Any(i => i.Property == Property.DepthBelowSurface))
        {
            var below = Column(table, Property.DepthBelowSurface, run);
            for (var i = 0; i < below.Length; i++) below[i] = depths[i] - top;
        }

        if (Stresses is { } stresses && table.Has(Method.Log))
            stresses.Fill(Trend!, top, table.Read(Method.Log).Slice(run.Start, run.Length), Column(table, Property.EquivalentStress, run));
        uses.Add(new LawUse(LawSlots.PorePressure, law, run.Zone, run.Lithology, Apply(law, table, run with { Settings = Settings }, shale, result)));
    }

    private static LawOutcome Apply(Law law, PropertyTable table, in SettingsRun run, bool[] shale, Span<double> result)
    {
        if (!shale.AsSpan(run.Start, run.Length).Contains(false)) return LawKernel.Apply(law, LawColumns.For(law, table, run), result);
        var samples = new List<int>(run.Length);
        for (var i = run.Start; i < run.End; i++)
        {
            if (shale[i]) samples.Add(i);
        }

        if (samples.Count == 0) return default;
        var values = new double[samples.Count];
        var outcome = LawKernel.Apply(law, LawColumns.At(law, table, run, [.. samples]), values);
        for (var k = 0; k < values.Length; k++) result[samples[k] - run.Start] = values[k];
        return outcome;
    }

    private static Span<double> Column(PropertyTable table, Property property, in SettingsRun run) =>
        table.Write(property).Slice(run.Start, run.Length);
}
