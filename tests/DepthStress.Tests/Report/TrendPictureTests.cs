using DepthStress.Core.Quantities;
using DepthStress.Report;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Report;

/// <summary>The normal trend and the shale it was fitted to, in the slowness track.</summary>
public class TrendPictureTests
{
    [Fact]
    public void The_trend_and_its_shale_are_drawn_and_named()
    {
        var sheet = TracksPicture.Draw(PressureWell.Computed(PressureWell.Eaton), UnitSystem.Metric, [TrackTable.Find("slowness")!]);
        Assert.Contains(sheet.Texts, t => t.Text == "shale of the trend");
        Assert.Contains(sheet.Texts, t => t.Text == "normal trend");
    }
}
