using DepthStress.Core.Catalogue;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Page;

/// <summary>The tables of what the results rest on: curves, methods, input files.</summary>
internal static class SourceTables
{
    /// <summary>The log curves in use.</summary>
    public static string Curves(EarthModel model, UnitSystem units)
    {
        var length = (new ColumnUnit(Units.Metre, 1), new ColumnUnit(Units.Foot, 1));
        return new PageTable<CurveQuality>("curves", "Log curves in use",
        [
            new WordCells<CurveQuality>("Role", "role", c => c.Role.Id),
            new WordCells<CurveQuality>("From", "source", c => c.Source),
            new NumberCells<CurveQuality>("Present", "present", (new(Units.Percent, 1), new(Units.Percent, 1)), c => c.Present),
            new NumberCells<CurveQuality>("Top MD", "top_md", length, c => c.Top),
            new NumberCells<CurveQuality>("Base MD", "base_md", length, c => c.Base),
            new NumberCells<CurveQuality>("Gaps", "gaps", ColumnUnits.Counts, c => c.Gaps),
            new NumberCells<CurveQuality>("Longest gap", "longest_gap", length, c => c.LongestGap),
            new WordCells<CurveQuality>("Origins", "origins", c => string.Join(", ", c.Origins.Select(o => Core.Logs.SampleOrigins.Name(o.Origin)).Where(n => n.Length > 0).Distinct())),
        ]).Write(CurveQuality.Of(model), units, "There are no curves.");
    }

    /// <summary>The methods that made the results.</summary>
    public static string Methods(EarthModel model, UnitSystem units) => new PageTable<IGrouping<(LawSlot Slot, Law Law), LawUse>>("methods", "Methods in use",
    [
        new WordCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Method", "method", u => u.Key.Law.Id),
        new WordCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Chosen by", "key", u => u.Key.Slot.Key),
        new WordCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Formula", "formula", u => u.Key.Law.Text),
        new WordCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Result in", "unit", u => u.Key.Law.Unit.Symbol),
        new NumberCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Samples", "samples", ColumnUnits.Counts, u => u.Sum(x => (double)x.Outcome.Evaluated)),
        new NumberCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Outside its range", "outside_range", ColumnUnits.Counts, u => u.Sum(x => (double)x.Outcome.OutsideRange)),
        new WordCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Coefficients", "standing", u => Standing(u.Key.Law.Standing)),
        new WordCells<IGrouping<(LawSlot Slot, Law Law), LawUse>>("Source", "source", u => u.Key.Law.Source),
    ]).Write([.. model.LawUses.GroupBy(u => (u.Slot, u.Law))], units, "No method of the catalogue was used.");

    /// <summary>The input files.</summary>
    public static string Inputs(IReadOnlyList<(string Name, string Sha256)> inputs, UnitSystem units) => new PageTable<(string Name, string Sha256)>("inputs", "Input files",
    [
        new WordCells<(string Name, string Sha256)>("File", "file", i => i.Name),
        new WordCells<(string Name, string Sha256)>("SHA-256", "sha256", i => i.Sha256),
    ]).Write(inputs, units, "There are no input files.");

    private static string Standing(Standing standing) => standing switch
    {
        Core.Catalogue.Standing.Confirmed => "read in the source",
        Core.Catalogue.Standing.Identity => "none: an identity",
        Core.Catalogue.Standing.FromMemory => "recalled, not read",
        Core.Catalogue.Standing.Trained => "fitted to the well's own samples",
        _ => "given by the user",
    };
}
