using System.Globalization;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

public sealed class ResultFolderTests : IDisposable
{
    private readonly string _root = Directory.CreateTempSubdirectory("depthstress-test-").FullName;

    private string Target => Path.Combine(_root, "well-results");

    public void Dispose() => Directory.Delete(_root, recursive: true);

    private static void Put(ResultFolder folder, string name, string text)
    {
        using var writer = new StreamWriter(folder.Create(name));
        writer.Write(text);
    }

    private static void Run(string target, params (string Name, string Text)[] files)
    {
        using var folder = ResultFolder.Begin(target);
        foreach (var (name, text) in files) Put(folder, name, text);
        folder.Commit();
    }

    /// <summary>The visible files of a folder and their texts.</summary>
    private static Dictionary<string, string> Files(string folder) => Directory.GetFiles(folder)
        .Where(f => !Path.GetFileName(f).StartsWith('.')).ToDictionary(f => Path.GetFileName(f), File.ReadAllText);

    private void OnlyTargets(params string[] names) =>
        Assert.Equal(names.Order(StringComparer.Ordinal), Directory.GetFileSystemEntries(_root).Select(e => Path.GetFileName(e)).Order(StringComparer.Ordinal));

    private static string Refused(Action act)
    {
        var message = Assert.Throws<ResultFolderException>(act).Message;
        Assert.Matches("^found .*, expected .*", message);
        return message;
    }

    [Fact]
    public void A_first_run_puts_its_files_in_place()
    {
        Run(Target, ("depth.csv", "a"), ("run.json", "b"));
        Assert.Equal(new() { ["depth.csv"] = "a", ["run.json"] = "b" }, Files(Target));
        OnlyTargets("well-results");
    }

    [Fact]
    public void Folders_above_the_target_are_made()
    {
        Run(Path.Combine(_root, "a", "b", "c") + Path.DirectorySeparatorChar, ("x.csv", "x"));
        Assert.Equal("x", File.ReadAllText(Path.Combine(_root, "a", "b", "c", "x.csv")));
    }

    [Fact]
    public void The_earlier_results_stay_whole_until_the_commit_and_are_gone_after_it()
    {
        Run(Target, ("depth.csv", "old"), ("old.svg", "old"));
        using var folder = ResultFolder.Begin(Target);
        Put(folder, "depth.csv", "new");
        Assert.Equal(new() { ["depth.csv"] = "old", ["old.svg"] = "old" }, Files(Target));
        folder.Commit();
        Assert.Equal(new() { ["depth.csv"] = "new" }, Files(Target));
        folder.Dispose();
        OnlyTargets("well-results");
    }

    [Fact]
    public void A_run_that_fails_leaves_the_earlier_results_whole_and_nothing_else()
    {
        Run(Target, ("depth.csv", "old"));
        using (var folder = ResultFolder.Begin(Target))
        {
            Put(folder, "depth.csv", "new");
            folder.Create("half.csv").WriteByte(1);
        }

        Assert.Equal(new() { ["depth.csv"] = "old" }, Files(Target));
        OnlyTargets("well-results");
    }

    [Fact]
    public void A_file_still_open_stops_the_commit()
    {
        Run(Target, ("depth.csv", "old"));
        using var folder = ResultFolder.Begin(Target);
        using var open = folder.Create("depth.csv");
        Assert.Contains("depth.csv", Assert.Throws<InvalidOperationException>(folder.Commit).Message, StringComparison.Ordinal);
        Assert.Equal("old", File.ReadAllText(Path.Combine(Target, "depth.csv")));
        open.Dispose();
        folder.Commit();
        Assert.Equal("", File.ReadAllText(Path.Combine(Target, "depth.csv")));
    }

    [Fact]
    public void Two_targets_in_one_folder_are_written_at_the_same_time()
    {
        var other = Path.Combine(_root, "well-results.depthstress-new");
        using (var one = ResultFolder.Begin(Target))
        using (var two = ResultFolder.Begin(other))
        {
            Put(one, "x.csv", "one");
            Put(two, "x.csv", "two");
            two.Commit();
            Put(one, "y.csv", "one");
            one.Commit();
        }

        Assert.Equal(new() { ["x.csv"] = "one", ["y.csv"] = "one" }, Files(Target));
        Assert.Equal(new() { ["x.csv"] = "two" }, Files(other));
        OnlyTargets("well-results", "well-results.depthstress-new");
    }

    [Fact]
    public void Many_runs_on_many_targets_meet_nowhere()
    {
        string[] names = [.. Enumerable.Range(0, 40).Select(i => "w" + i.ToString(CultureInfo.InvariantCulture))];
        Parallel.ForEach(names, name =>
        {
            foreach (var text in new[] { "1", "2", "3" }) Run(Path.Combine(_root, name), ("x.csv", name + text));
        });
        OnlyTargets(names);
        Assert.All(names, name => Assert.Equal(name + "3", Files(Path.Combine(_root, name))["x.csv"]));
    }

    [Fact]
    public void A_second_run_on_the_same_target_is_refused_while_the_first_lasts()
    {
        using (var first = ResultFolder.Begin(Target))
        {
            Put(first, "x.csv", "first");
            Assert.Contains("another run", Refused(() => ResultFolder.Begin(Target)), StringComparison.Ordinal);
            first.Commit();
        }

        Run(Target, ("x.csv", "second"));
        Assert.Equal(new() { ["x.csv"] = "second" }, Files(Target));
    }

    [Fact]
    public void A_target_that_is_a_file_is_refused_and_kept()
    {
        File.WriteAllText(Target, "mine");
        Assert.Contains("found a file", Refused(() => ResultFolder.Begin(Target)), StringComparison.Ordinal);
        Assert.Equal("mine", File.ReadAllText(Target));
        OnlyTargets("well-results");
    }

    [Fact]
    public void A_target_below_a_file_cannot_be_written()
    {
        var file = Path.Combine(_root, "plain");
        File.WriteAllText(file, "mine");
        Refused(() => ResultFolder.Begin(Path.Combine(file, "results")));
        Refused(() => ResultFolder.Begin(Path.Combine(file, "deeper", "results")));
        Assert.Equal("mine", File.ReadAllText(file));
    }

    [Fact]
    public void The_root_of_a_file_system_is_refused() => Refused(() => ResultFolder.Begin(Path.GetPathRoot(_root)!));

    [Theory]
    [InlineData("notes.txt")]
    [InlineData(".hidden")]
    public void A_target_with_a_file_the_program_did_not_write_is_refused_and_kept(string name)
    {
        Run(Target, ("depth.csv", "old"));
        File.WriteAllText(Path.Combine(Target, name), "mine");
        Assert.Contains(name, Refused(() => ResultFolder.Begin(Target)), StringComparison.Ordinal);
        Assert.Equal("mine", File.ReadAllText(Path.Combine(Target, name)));
        Assert.Equal("old", File.ReadAllText(Path.Combine(Target, "depth.csv")));
        OnlyTargets("well-results");
    }

    [Fact]
    public void A_folder_of_the_user_is_refused_and_an_empty_one_is_taken()
    {
        Directory.CreateDirectory(Path.Combine(Target, "inner"));
        Refused(() => ResultFolder.Begin(Target));
        Directory.Delete(Path.Combine(Target, "inner"));
        Run(Target, ("x.csv", "x"));
        Assert.Equal(new() { ["x.csv"] = "x" }, Files(Target));
    }

    [Fact]
    public void A_file_that_appears_during_the_run_stops_the_commit()
    {
        Run(Target, ("x.csv", "old"));
        using (var folder = ResultFolder.Begin(Target))
        {
            Put(folder, "x.csv", "new");
            File.WriteAllText(Path.Combine(Target, "notes.txt"), "mine");
            Refused(folder.Commit);
        }

        Assert.Equal(new() { ["x.csv"] = "old", ["notes.txt"] = "mine" }, Files(Target));
        OnlyTargets("well-results");
    }

    [Fact]
    public void A_list_of_files_cannot_point_outside_its_folder()
    {
        File.WriteAllText(Path.Combine(_root, "mine.txt"), "mine");
        Run(Target, ("x.csv", "old"));
        File.AppendAllText(Path.Combine(Target, ResultManifest.FileName), "../mine.txt\n" + Path.Combine(_root, "mine.txt") + "\n");
        Run(Target, ("x.csv", "new"));
        Assert.Equal("mine", File.ReadAllText(Path.Combine(_root, "mine.txt")));
    }

    [Fact]
    public void A_target_that_is_a_link_is_written_where_it_points()
    {
        var real = Directory.CreateDirectory(Path.Combine(_root, "real")).FullName;
        Directory.CreateSymbolicLink(Target, real);
        Run(Target, ("x.csv", "one"));
        Run(Target, ("x.csv", "two"));
        Assert.NotNull(new DirectoryInfo(Target).LinkTarget);
        Assert.Equal(new() { ["x.csv"] = "two" }, Files(real));
        OnlyTargets("real", "well-results");
    }

    [Theory]
    [InlineData("")]
    [InlineData("a/b")]
    [InlineData("..")]
    [InlineData(".hidden")]
    [InlineData("a\nb")]
    [InlineData("C:x")]
    public void A_name_that_is_not_plain_is_refused(string name)
    {
        using var folder = ResultFolder.Begin(Target);
        Assert.Throws<ArgumentException>(() => folder.Create(name));
    }

    [Fact]
    public void A_name_comes_once_and_nothing_comes_after_the_end()
    {
        using var folder = ResultFolder.Begin(Target);
        Put(folder, "x.csv", "x");
        Assert.Throws<ArgumentException>(() => folder.Create("x.csv"));
        folder.Commit();
        Assert.Throws<ObjectDisposedException>(() => folder.Create("y.csv"));
        Assert.Throws<ObjectDisposedException>(folder.Commit);
    }

    [Fact]
    public void The_list_of_files_does_not_depend_on_the_order_of_writing()
    {
        Run(Target, ("b.csv", ""), ("a.csv", ""), ("C.csv", ""));
        Assert.Equal("C.csv\na.csv\nb.csv\n", File.ReadAllText(Path.Combine(Target, ResultManifest.FileName)));
    }
}
