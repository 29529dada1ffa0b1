using DepthStress.Core.Diagnostics;

namespace DepthStress.Tests.Diagnostics;

public class DiagnosticTests
{
    [Theory]
    [InlineData("well.toml", 12, 5, "well.toml(12,5): error: found X, expected Y")]
    [InlineData("well.toml", 12, 0, "well.toml(12): error: found X, expected Y")]
    [InlineData("well.toml", 0, 0, "well.toml: error: found X, expected Y")]
    [InlineData("well.toml", 0, 5, "well.toml: error: found X, expected Y")]
    [InlineData("", 0, 0, "error: found X, expected Y")]
    public void An_error_says_where_as_far_as_it_is_known(string file, int line, int column, string text) =>
        Assert.Equal(text, new Diagnostic(Severity.Error, new(file, line, column), "found X, expected Y").ToString());

    [Theory]
    [InlineData(Severity.Error, "error: t")]
    [InlineData(Severity.Warning, "warning: t")]
    [InlineData(Severity.Note, "note: t")]
    public void The_severity_is_written_as_a_word(Severity severity, string text)
    {
        Assert.Equal(text, new Diagnostic(severity, SourcePosition.None, "t").ToString());
        Assert.Equal(text, new Diagnostic(severity, default, "t").ToString());
    }

    [Fact]
    public void Severities_rise_in_order() => Assert.Equal([Severity.Note, Severity.Warning, Severity.Error], Enum.GetValues<Severity>().Order());

    [Fact]
    public void The_bag_keeps_every_message_in_order()
    {
        var bag = new DiagnosticBag();
        bag.Note(new("a", 3), "first");
        bag.Error(new("a", 2), "second");
        bag.Warning(new("a", 1), "third");
        bag.Error(new("a", 2), "second");
        Assert.Equal(["a(3): note: first", "a(2): error: second", "a(1): warning: third", "a(2): error: second"], bag.Items.Select(d => d.ToString()));
    }

    [Fact]
    public void Only_an_error_makes_the_bag_one_with_errors()
    {
        var bag = new DiagnosticBag();
        bag.Note(SourcePosition.None, "n");
        bag.Warning(SourcePosition.None, "w");
        Assert.False(bag.HasErrors);
        bag.Error(SourcePosition.None, "e");
        Assert.True(bag.HasErrors);
        bag.Note(SourcePosition.None, "n");
        Assert.True(bag.HasErrors);
    }

    [Fact]
    public void Nothing_at_all_is_not_a_message() => Assert.Throws<ArgumentNullException>(() => new DiagnosticBag().Add(null!));
}
