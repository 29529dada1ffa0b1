namespace SampleWell.Hidden;

/// <summary>
/// Pore pressure above hydrostatic: none down to the second shale, growing through that shale to the value of the limestone below it,
/// then growing again in the top 150 m of the lowest shale.
/// </summary>
internal static class ExcessPressure
{
    /// <summary>Along the fine grid, MPa.</summary>
    public static double[] Along(WellPlan plan, FineGrid grid) => [.. grid.Md.Select(md => At(plan, plan.Path.Tvd(md)))];

    /// <summary>At a true vertical depth, MPa.</summary>
    public static double At(WellPlan plan, double tvd)
    {
        var shale = Ramp(plan, 3);
        var deep = plan.Path.Tvd(plan.Span(5).Top);
        return plan.Excess.Limestone * Physics.Smooth(shale.Top, shale.Base, tvd)
            + (plan.Excess.Deep - plan.Excess.Limestone) * Physics.Smooth(deep, deep + 150, tvd);
    }

    private static (double Top, double Base) Ramp(WellPlan plan, int formation)
    {
        var (top, bottom) = plan.Span(formation);
        return (plan.Path.Tvd(top), plan.Path.Tvd(bottom));
    }
}
