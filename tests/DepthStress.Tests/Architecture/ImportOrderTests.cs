using System.Text.RegularExpressions;
using NetArchTest.Rules;

namespace DepthStress.Tests.Architecture;

/// <summary>Imports inside Core run one way. Checked twice: in the compiled types, and in the sources, since constants are inlined.</summary>
public partial class ImportOrderTests
{
    private const string Core = "DepthStress.Core.";

    /// <summary>The folders, each group above the ones before it; folders of one group do not import each other.</summary>
    private static readonly string[][] Order =
    [
        ["Diagnostics", "Quantities"], ["Depth"], ["Logs"], ["Catalogue"], ["Conditioning"], ["Lithology"], ["Prediction"], ["Rock"], ["Pressure"],
        ["Stress"], ["Borehole"], ["Model"], ["Calibration", "Layers", "Fracture"], ["Uncertainty"],
    ];

    public static TheoryData<string> Folders => [.. Order.SelectMany(g => g)];

    private static string[] Forbidden(string folder) =>
        [.. Order.SkipWhile(g => !g.Contains(folder)).SelectMany(g => g).Where(f => f != folder)];

    private static bool Keeps(string folder, params string[] forbidden) => forbidden.Length == 0 || Types
        .InAssembly(typeof(Core.Model.Chain).Assembly)
        .That().ResideInNamespace(Core + folder)
        .ShouldNot().HaveDependencyOnAny([.. forbidden.Select(f => Core + f)])
        .GetResult().IsSuccessful;

    /// <summary>Names of Core folders in a line of code, by their namespaces.</summary>
    private static IEnumerable<string> Named(string line) =>
        Namespace().Matches(line).Select(m => m.Groups[1].Value);

    [Theory]
    [MemberData(nameof(Folders))]
    public void Compiled_types_depend_on_earlier_folders_only(string folder) => Assert.True(Keeps(folder, Forbidden(folder)), folder);

    [Theory]
    [MemberData(nameof(Folders))]
    public void Sources_name_earlier_folders_only(string folder)
    {
        var files = Sources.Of("DepthStress.Core").Where(f => f.Path.StartsWith($"src/DepthStress.Core/{folder}/", StringComparison.Ordinal));
        Assert.Empty(Sources.Find(files, line => Named(line).Intersect(Forbidden(folder)).Any()));
    }

    [Fact]
    public void The_order_names_every_folder_of_Core()
    {
        var folders = Directory.GetDirectories(Path.Combine(Sources.Root, "src", "DepthStress.Core")).Select(d => Path.GetFileName(d)!);
        Assert.Empty(folders.Except(Order.SelectMany(g => g)));
    }

    // Both checks must be able to fail: these imports exist and run the right way, so forbidding them must be noticed.
    [Theory]
    [InlineData("Model", "Catalogue")]
    [InlineData("Layers", "Model")]
    [InlineData("Rock", "Quantities")]
    [InlineData("Depth", "Depth")]
    public void A_forbidden_import_is_noticed(string folder, string imported) => Assert.False(Keeps(folder, imported));

    [Theory]
    [InlineData("using DepthStress.Core.Model;", "Model")]
    [InlineData("using static DepthStress.Core.Model.ColumnUnits;", "Model")]
    [InlineData("var x = DepthStress.Core.Layers.LayerBuilder.Build(model);", "Layers")]
    [InlineData("using Core = DepthStress.Core.Stress.StrainModel;", "Stress")]
    public void A_planted_import_is_seen_in_the_source(string line, string folder) => Assert.Equal([folder], Named(line));

    [Fact]
    public void The_source_check_sees_the_imports_that_exist() => Assert.NotEmpty(
        Sources.Find(Sources.Of("DepthStress.Core/Model"), line => Named(line).Contains("Catalogue")));

    [GeneratedRegex(@"DepthStress\.Core\.([A-Z]\w*)")]
    private static partial Regex Namespace();
}
