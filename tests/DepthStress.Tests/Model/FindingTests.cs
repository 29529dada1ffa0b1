using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Model;

public class FindingTests
{
    [Fact]
    public void Neighbouring_samples_are_joined_to_intervals()
    {
        var finding = Finding.About(Severity.Warning, $"x", [10, 20, 30, 40, 50], [true, true, false, false, true]);
        Assert.Equal(3, finding!.Samples);
        Assert.Equal([new DepthRange(10, 20), new DepthRange(50, 50)], finding.Where);
    }

    [Fact]
    public void No_sample_gives_no_finding() => Assert.Null(Finding.About(Severity.Warning, $"x", [10, 20], [false, false]));

    [Fact]
    public void The_most_important_comes_first()
    {
        var few = new Finding(Severity.Warning, $"few", 2, []);
        var many = new Finding(Severity.Warning, $"many", 9, []);
        var whole = Finding.General(Severity.Warning, $"whole");
        var note = Finding.General(Severity.Note, $"note");
        var error = new Finding(Severity.Error, $"error", 1, []);
        Assert.Equal([error, whole, many, few, note], FindingRules.Sort([note, few, error, many, whole]));
    }

    [Fact]
    public void Equals_keep_their_order()
    {
        var (first, second) = (new Finding(Severity.Note, $"a", 3, []), new Finding(Severity.Note, $"b", 3, []));
        Assert.Equal([first, second], FindingRules.Sort([first, second]));
        Assert.Equal([second, first], FindingRules.Sort([second, first]));
    }
}
