using System.Reflection;
using DepthStress.Cli;

namespace DepthStress.Tests.Cli;

/// <summary>Wrong choices of a law in a well file, and what check says of a well's methods.</summary>
public sealed class CliLawChoiceTests : IDisposable
{
    private const string Before =
        "\"vp\", \"vs\", \"density\", \"gamma_ray\", \"neutron\", \"deep_resistivity\", \"compressional_slowness\", \"shear_slowness\", \"gamma_ray_index\", \"shale_volume\", \"matrix_density\", \"fluid_density\", \"matrix_slowness\", \"fluid_slowness\", \"matrix_velocity\", \"fluid_velocity\", \"compaction_factor\", \"porosity\", \"youngs_dynamic\", \"poisson_dynamic\"";

    private readonly string folder = Directory.CreateTempSubdirectory("law-choice-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    private static string Samples => Path.Combine(
        typeof(CliLawChoiceTests).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(a => a.Key == "RepoRoot").Value!, "sample-logs");

    private (int Code, string Output, string Error) Check(string line, string replacement)
    {
        foreach (var file in Directory.GetFiles(Samples, "quillback-4*")) File.Copy(file, Path.Combine(folder, Path.GetFileName(file)), overwrite: true);
        var well = Path.Combine(folder, "quillback-4.toml");
        var text = File.ReadAllText(well);
        Assert.Contains(line, text, StringComparison.Ordinal);
        File.WriteAllText(well, text.Replace(line, replacement, StringComparison.Ordinal));
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        var code = Application.RunAsync(["check", "quillback-4.toml"], new Terminal(output, error, folder, Width: 100), CancellationToken.None).GetAwaiter().GetResult();
        return (code, output.ToString(), error.ToString());
    }

    private void Refuses(string value, string message)
    {
        var (code, _, error) = Check("static_youngs = \"lacy-1997-combined\"", $"static_youngs = {value}");
        Assert.Equal(2, code);
        Assert.Contains(error.Split('\n'), l => l.StartsWith("quillback-4.toml(121,", StringComparison.Ordinal) && l.EndsWith($": error: {message}", StringComparison.Ordinal));
    }

    [Fact]
    public void A_law_cannot_start_from_its_own_result() => Refuses(
        "{ law = \"linear\", input = \"youngs_static\", factor = 0.7 }",
        $"static_youngs: found the input \"youngs_static\", which is what the law gives; expected one of {Before}");

    [Fact]
    public void A_law_cannot_start_from_what_comes_later() => Refuses(
        "{ law = \"linear\", input = \"ucs\", factor = 0.7 }",
        $"static_youngs: found the input \"ucs\", which is not known yet where static Young's modulus is computed; expected one of {Before}");

    [Fact]
    public void An_unknown_input_is_answered_with_the_nearest() => Refuses(
        "{ law = \"linear\", input = \"young_dynamic\", factor = 0.7 }",
        $"found \"young_dynamic\", expected input = one of {Before}; did you mean \"youngs_dynamic\"?");

    [Fact]
    public void An_unknown_method_is_answered_with_the_nearest() => Refuses(
        "\"lacy-1997-combine\"",
        "found the unknown method \"lacy-1997-combine\", expected static_youngs = one of lacy-1997-sandstone, lacy-1997-shale, lacy-1997-combined, ohen-2003-shale and others, see \"depthstress methods --for youngs_static\"; did you mean \"lacy-1997-combined\"?");

    [Fact]
    public void A_method_for_something_else_is_refused() => Refuses(
        "\"lal-1999-shale\"",
        "found \"lal-1999-shale\", which gives unconfined compressive strength; expected static_youngs = a method for static Young's modulus: lacy-1997-sandstone, lacy-1997-shale, lacy-1997-combined, ohen-2003-shale and others, see \"depthstress methods --for youngs_static\"");

    [Fact]
    public void Check_marks_what_is_chosen_and_names_what_others_lack()
    {
        var (code, output, _) = Check("fluid_density = \"1.03 g/cm3\"", "fluid_density = \"1.03 g/cm3\"");
        Assert.Equal(0, code);
        var lines = output.Split('\n').Select(l => l.Trim()).ToList();
        Assert.Contains("methods that these curves and settings can feed (> chosen, * recalled):", lines);
        var porosity = lines.IndexOf("[porosity] porosity");
        Assert.Equal(">density-porosity", lines[porosity + 1]);
        Assert.Equal("2 more with [porosity] matrix_slowness and [porosity] fluid_slowness; 1 more with [porosity]", lines[porosity + 2]);
        var biot = lines.IndexOf("[biot] coefficient");
        Assert.Equal(">constant (your own), krief-1990-biot*, consolidated-rock-biot*, lee-2003-unconsolidated", lines[biot + 1]);
        Assert.All(output.Split('\n').SkipWhile(l => !l.StartsWith("methods that", StringComparison.Ordinal)).TakeWhile(l => l.Length > 0), l => Assert.True(l.Length < 100, l));
    }
}
