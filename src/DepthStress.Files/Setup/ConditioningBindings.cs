using DepthStress.Core.Catalogue;
using DepthStress.Core.Conditioning;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Setup;

/// <summary>Declares the keys of the [conditioning] section.</summary>
internal static class ConditioningBindings
{
    private static readonly (string, WashoutRule)[] Rules =
        [("either", WashoutRule.Either), ("both", WashoutRule.Both), ("none", WashoutRule.None)];

    /// <summary>All of them.</summary>
    public static ConditioningSettings All(ISection s, ConditioningSettings c)
    {
        var shifts = s.Tables(
            "shifts", c.Shifts.IsSet ? c.Shifts.Value : [], (t, shift) => Shift(t, shift, c.Shifts.Source), new("", double.NaN), "curves logged off depth, for the whole well only");
        return c with
        {
            Shifts = shifts.Count > 0 ? new Setting<IReadOnlyList<CurveShift>>(shifts, s.SourceOf("shifts")) : c.Shifts,
            Parked = s.Flag("parked", c.Parked, "true takes out the constant ends that a parked tool leaves"),
            NullSmear = s.Flag("null_smear", c.NullSmear, "true takes out edges of gaps that were averaged with the missing-value code"),
            Spikes = s.Table("spikes", c.Spikes, Spikes, "how spikes are found and taken out"),
            Washout = s.Table("washout", c.Washout, Washout, "where density is taken out as logged in an enlarged hole"),
            FillGaps = s.Quantity("fill_gaps", c.FillGaps, Sign.NotNegative, Dimension.Length, "the longest gap that a straight line bridges"),
        };
    }

    private static CurveShift Shift(ISection s, CurveShift c, SettingSource source)
    {
        var curve = s.Text("curve", c.Curve.Length == 0 ? default : new(c.Curve, source), "the curve, by its role's name");
        var by = s.Quantity("by", double.IsNaN(c.By) ? default : new(c.By, source), Sign.Any, Dimension.Length, "how far down it is moved; negative moves up");
        return new CurveShift(curve.IsSet ? curve.Value : "", by.IsSet ? by.Value : double.NaN);
    }

    private static SpikeSettings Spikes(ISection s, SpikeSettings c) => c with
    {
        Window = s.Quantity("window", c.Window, Sign.Positive, Dimension.Length, "depth over which the usual step from sample to sample is taken"),
        Threshold = s.Number("threshold", c.Threshold, new Interval(2, 100), "how many robust standard deviations a step must exceed"),
        Curves = s.Texts("curves", c.Curves, "the curves that are filtered, by their roles' names; an empty list means none"),
    };

    private static WashoutSettings Washout(ISection s, WashoutSettings c) => c with
    {
        CaliperExcess = s.Quantity("caliper_excess", c.CaliperExcess, Sign.Positive, Dimension.Length, "how much the hole's diameter exceeds the bit's"),
        DensityCorrection = s.Quantity("density_correction", c.DensityCorrection, Sign.Positive, Dimension.Density, "size of the density correction"),
        Rule = s.Choice("rule", c.Rule, Rules, "which of the two must be exceeded to take density out"),
    };
}
