namespace SampleWell.Writing;

/// <summary>One row of the observations file; empty text where a column does not apply.</summary>
/// <param name="Top">Top of the interval, m.</param>
/// <param name="Base">Base of the interval, m.</param>
/// <param name="DepthKind">md or tvd, below the rotary table.</param>
/// <param name="Kind">What was observed.</param>
/// <param name="Value">Value with unit.</param>
/// <param name="PressureAt">surface or downhole.</param>
/// <param name="FluidDensity">Density of the fluid in the hole with unit.</param>
/// <param name="Sigma">Standard deviation with unit.</param>
/// <param name="PorePressure">Pore pressure with unit where it was measured.</param>
/// <param name="Date">Day.</param>
/// <param name="Note">What a user would want to know.</param>
internal sealed record Observation(
    double Top, double Base, string DepthKind, string Kind, string Value, string PressureAt, string FluidDensity, string Sigma,
    string PorePressure, string Date, string Note)
{
    /// <summary>Writes a file of observations.</summary>
    public static void Write(string path, IEnumerable<Observation> observations)
    {
        using var text = new FixedText(path);
        text.Add("top_m,base_m,depth_kind,kind,value,pressure_at,fluid_density,sigma,pore_pressure,date,note\n");
        foreach (var row in observations)
        {
            text.Add(row.Top, 1).Add(",").Add(row.Base, 1).Add($",{row.DepthKind},{row.Kind},{row.Value},{row.PressureAt},{row.FluidDensity}");
            text.Add($",{row.Sigma},{row.PorePressure},{row.Date},{row.Note}\n");
        }
    }
}
