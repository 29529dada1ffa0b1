using DepthStress.Cli;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Cli;

public class CliMethodsTests
{
    private const string Results = "shale_volume, density, porosity, vs, youngs_static, poisson_static, ucs, friction_angle, tensile_strength, toughness, brittleness, biot, mean_density_above, shallow_density, pp, c66, c11, c13, comparison_shmin";

    private static (int Code, string Output, string Error) Run(int width, params string[] args)
    {
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        var terminal = new Terminal(output, error, Path.GetTempPath(), Width: width);
        var code = Application.RunAsync(["methods", .. args], terminal, CancellationToken.None).GetAwaiter().GetResult();
        return (code, output.ToString(), error.ToString());
    }

    private static string Shown(params string[] args)
    {
        var (code, output, error) = Run(100, args);
        Assert.Equal((0, ""), (code, error));
        return output;
    }

    private static string Refused(params string[] args)
    {
        var (code, output, error) = Run(100, args);
        Assert.Equal((1, ""), (code, output));
        return error;
    }

    private static string[] Ids(string list) =>
        [.. list.Split('\n').Where(l => l.StartsWith("    ", StringComparison.Ordinal) || l.StartsWith("  * ", StringComparison.Ordinal))
            .Select(l => l[4..].Split(' ')[0]).Where(w => MethodCatalogue.Find(w) is not null)];

    [Fact]
    public void The_whole_list_is_as_it_was() => Golden.Match("methods.txt", Shown());

    [Theory]
    [InlineData("wang-2000-soft")]
    [InlineData("lal-1999-shale-friction")]
    public void A_method_shown_whole_is_as_it_was(string id) => Golden.Match($"methods-{id}.txt", Shown(id));

    [Theory]
    [InlineData(80)]
    [InlineData(100)]
    [InlineData(120)]
    public void No_line_is_wider_than_the_terminal(int width)
    {
        var pages = MethodCatalogue.All.Select(l => Run(width, l.Id).Output).Prepend(Run(width).Output);
        Assert.All(pages.SelectMany(p => p.Split('\n')), line => Assert.True(line.Length < width, line));
    }

    [Fact]
    public void The_list_names_every_method_once() =>
        Assert.Equal(MethodCatalogue.All.Select(l => l.Id).Order(), Ids(Shown()).Order());

    [Fact]
    public void A_property_and_a_rock_narrow_the_list()
    {
        Assert.Equal(
            ["militzer-stoll-1973-carbonate", "golubev-rabinovich-1976-carbonate", "rzhevsky-novik-1971-carbonate", "middle-east-carbonate-porosity", "carbonate-porosity", "dolomite-modulus"],
            Ids(Shown("--for", "ucs", "--rock", "dolomite")));
        Assert.Equal(["equal-to-dynamic"], Ids(Shown("--for", "poisson_static")));
        Assert.Equal("no method for biot of crystalline\n", Shown("--for", "biot", "--rock", "crystalline"));
    }

    [Fact]
    public void The_key_of_the_well_file_names_a_property_too() =>
        Assert.Equal(Shown("--for", "youngs_static"), Shown("--for", "static_youngs"));

    [Fact]
    public void Wrong_words_are_refused_with_the_nearest_right_one()
    {
        Assert.Equal($"error: found \"ucss\", expected --for one of {Results}; did you mean \"ucs\"?\n", Refused("--for", "ucss"));
        Assert.Equal("error: found \"shales\", expected --rock one of sandstone, shale, limestone, dolomite, crystalline, evaporite; did you mean \"shale\"?\n", Refused("--rock", "shales"));
        Assert.Equal("error: found the unknown method \"lal-1999-shales\", expected one of the list that \"depthstress methods\" prints; did you mean \"lal-1999-shale\"?\n", Refused("lal-1999-shales"));
        Assert.Equal("error: found a method ID beside --for or --rock, expected one or the other\n", Refused("lal-1999-shale", "--for", "ucs"));
    }
}
