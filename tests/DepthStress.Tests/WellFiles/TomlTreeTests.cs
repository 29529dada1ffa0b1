using DepthStress.Core.Diagnostics;
using DepthStress.Files.Setup;

namespace DepthStress.Tests.WellFiles;

/// <summary>How TOML text becomes nodes with their places.</summary>
public sealed class TomlTreeTests
{
    [Fact]
    public void Every_kind_of_value_keeps_its_place()
    {
        var root = Parse("text = \"a\"\nwhole = 3\nnumber = 2.5e3\nflag = true\nday = 2020-01-02\nlist = [1, \"b\"]\n");
        Assert.Equal(new TomlText("a", At(1, 8)), root.Items["text"].Value);
        Assert.Equal(new TomlNumber(3, "3", At(2, 9)), root.Items["whole"].Value);
        Assert.Equal(new TomlNumber(2500, "2.5e3", At(3, 10)), root.Items["number"].Value);
        Assert.Equal(new TomlFlag(true, At(4, 8)), root.Items["flag"].Value);
        Assert.Equal(new TomlDate(At(5, 7)), root.Items["day"].Value);
        var list = Assert.IsType<TomlArray>(root.Items["list"].Value);
        Assert.Equal([new TomlNumber(1, "1", At(6, 9)), new TomlText("b", At(6, 12))], list.Items);
        Assert.Equal(At(6, 1), root.Items["list"].Key);
    }

    [Theory]
    [InlineData("[a.b]\nc = 1\n")]
    [InlineData("a.b.c = 1\n")]
    [InlineData("[a]\nb.c = 1\n")]
    [InlineData("a = { b = { c = 1 } }\n")]
    [InlineData("[a]\n[a.b]\n\"c\" = 1\n")]
    public void Tables_dotted_keys_and_inline_tables_mean_the_same(string text)
    {
        var a = Assert.IsType<TomlTable>(Parse(text).Items["a"].Value);
        var b = Assert.IsType<TomlTable>(a.Items["b"].Value);
        Assert.Equal(1, Assert.IsType<TomlNumber>(b.Items["c"].Value).Value);
    }

    [Fact]
    public void A_table_below_a_list_of_tables_belongs_to_the_last_of_them()
    {
        var zones = Assert.IsType<TomlArray>(Parse("[[z]]\nn = 1\n[z.m]\nx = 1\n[[z]]\nn = 2\n[z.m]\nx = 2\n").Items["z"].Value);
        Assert.Equal(2, zones.Items.Count);
        for (var k = 0; k < 2; k++)
        {
            var zone = Assert.IsType<TomlTable>(zones.Items[k]);
            Assert.Equal(k + 1, Assert.IsType<TomlNumber>(zone.Items["n"].Value).Value);
            Assert.Equal(k + 1, Assert.IsType<TomlNumber>(Assert.IsType<TomlTable>(zone.Items["m"].Value).Items["x"].Value).Value);
        }
    }

    [Fact]
    public void Syntax_errors_are_reported_from_the_top_and_no_more_than_ten()
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(TomlTree.Parse(string.Concat(Enumerable.Repeat("= 1\n", 50)), "t.toml", diagnostics));
        Assert.Equal(10, diagnostics.Items.Count);
        var lines = diagnostics.Items.Select(d => d.Position.Line).ToList();
        Assert.Equal(lines.Order(), lines);
        Assert.Equal(1, lines[0]);
    }

    [Fact]
    public void A_string_left_open_is_one_message()
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(TomlTree.Parse("a = \"open\nb = \"c\"\nd = \"e\"\n", "t.toml", diagnostics));
        Assert.Equal("t.toml(1,10): error: TOML: found the end of the line inside a text, expected a closing quote", Assert.Single(diagnostics.Items).ToString());
    }

    private static SourcePosition At(int line, int column) => new("t.toml", line, column);

    private static TomlTable Parse(string text)
    {
        var diagnostics = new DiagnosticBag();
        var root = TomlTree.Parse(text, "t.toml", diagnostics);
        Assert.Empty(diagnostics.Items);
        return root!;
    }
}
