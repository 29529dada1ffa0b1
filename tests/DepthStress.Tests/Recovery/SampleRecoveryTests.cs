using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using SampleWell;

namespace DepthStress.Tests.Recovery;

/// <summary>
/// The spoiled sample well, and others of its kind that nothing was tuned to: what every field shows must hold (common practice).
/// </summary>
public sealed class SampleRecoveryTests
{
    [Theory]
    [InlineData(null)]
    [InlineData(11ul)]
    [InlineData(12ul)]
    [InlineData(13ul)]
    public void The_profile_is_one_that_a_field_could_have(ulong? seed)
    {
        using var folder = new TestFolder();
        if (seed is { } s) SampleLogs.Write(folder.Path, s);
        else SampleLogs.Write(folder.Path);
        var diagnostics = new DiagnosticBag();
        var well = WellFileReader.Read(folder.Of("quillback-4.toml"), diagnostics)!;
        var model = Chain.Run(well.Setup, LogIngest.Read(well, diagnostics)!.Logs, diagnostics)!;
        Assert.False(diagnostics.HasErrors);

        var sv = model.Values.Read(Property.VerticalStress);
        var pp = model.Values.Read(Property.PorePressure);
        var shmin = model.Values.Read(Property.MinHorizontalStress);
        var shmax = model.Values.Read(Property.MaxHorizontalStress);
        var dynamic = model.Values.Read(Property.YoungsDynamic);
        var still = model.Values.Read(Property.YoungsStatic);
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        int stressed = 0, ordered = 0, moduli = 0;
        for (var i = 0; i < model.Count; i++)
        {
            Assert.InRange(sv[i] / (tvd[i] - model.Setup.Frame.SurfaceTvd), 16e3, 27e3); // Pa/m
            if (!double.IsNaN(still[i]))
            {
                moduli++;
                Assert.True(still[i] < dynamic[i], "static below dynamic");
            }

            if (double.IsNaN(shmin[i])) continue;
            stressed++;
            Assert.True(shmin[i] <= shmax[i], "SHmax below Shmin");
            if (pp[i] < shmin[i] && shmin[i] < sv[i]) ordered++;
        }

        Assert.True(moduli > 0.9 * model.Count, "moduli are there");
        Assert.True(stressed > 0.9 * model.Count, "stresses are there");
        Assert.True(ordered >= 0.99 * stressed, FormattableString.Invariant($"{ordered} of {stressed} samples have Pp < Shmin < Sv"));
    }
}
