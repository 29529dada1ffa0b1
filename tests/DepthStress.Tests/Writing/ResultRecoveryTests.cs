using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

/// <summary>What the next run makes of the state that a killed run left behind.</summary>
public sealed class ResultRecoveryTests : IDisposable
{
    private readonly string _root = Directory.CreateTempSubdirectory("depthstress-test-").FullName;
    private readonly ResultPaths _paths;

    public ResultRecoveryTests() => _paths = ResultPaths.Of(Path.Combine(_root, "results"));

    public void Dispose() => Directory.Delete(_root, recursive: true);

    /// <summary>A folder as a run leaves it.</summary>
    private static void Leave(string folder, params (string Name, string Text)[] files)
    {
        Directory.CreateDirectory(folder);
        foreach (var (name, text) in files)
        {
            ResultManifest.Add(folder, name);
            File.WriteAllText(Path.Combine(folder, name), text);
        }
    }

    private void BeginAndEnd() => ResultFolder.Begin(_paths.Target).Dispose();

    private string Text(string name) => File.ReadAllText(Path.Combine(_paths.Target, name));

    private void OnlyTheTarget() => Assert.Equal([_paths.Target], Directory.GetFileSystemEntries(_root));

    [Fact]
    public void Killed_while_writing_the_unfinished_folder_and_the_lock_are_cleaned()
    {
        Leave(_paths.Target, ("x.csv", "old"));
        Leave(_paths.Incoming, ("x.csv", "half"), ("y.csv", ""));
        ResultManifest.Add(_paths.Incoming, "listed-but-never-made.csv");
        File.WriteAllText(_paths.Lock, "");
        BeginAndEnd();
        Assert.Equal("old", Text("x.csv"));
        OnlyTheTarget();
    }

    [Fact]
    public void Killed_before_the_first_file_the_empty_folder_is_cleaned()
    {
        Leave(_paths.Target, ("x.csv", "old"));
        Directory.CreateDirectory(_paths.Incoming);
        BeginAndEnd();
        OnlyTheTarget();
    }

    [Fact]
    public void Killed_between_the_two_renames_the_earlier_results_come_back()
    {
        Leave(_paths.Former, ("x.csv", "old"));
        Leave(_paths.Incoming, ("x.csv", "new"));
        BeginAndEnd();
        Assert.Equal("old", Text("x.csv"));
        OnlyTheTarget();
    }

    [Fact]
    public void Killed_after_the_second_rename_the_new_results_stay()
    {
        Leave(_paths.Target, ("x.csv", "new"));
        Leave(_paths.Former, ("x.csv", "old"), ("gone.csv", "old"));
        BeginAndEnd();
        Assert.Equal("new", Text("x.csv"));
        OnlyTheTarget();
    }

    [Fact]
    public void Leftovers_of_other_targets_are_not_touched()
    {
        var other = ResultPaths.Of(Path.Combine(_root, "other"));
        Leave(other.Incoming, ("x.csv", "half"));
        Leave(other.Former, ("x.csv", "old"));
        BeginAndEnd();
        Assert.Equal(2, Directory.GetDirectories(_root).Length);
        Assert.Equal("half", File.ReadAllText(Path.Combine(other.Incoming, "x.csv")));
    }

    [Fact]
    public void A_leftover_with_a_file_of_somebody_else_is_refused_and_kept()
    {
        Leave(_paths.Incoming, ("x.csv", "half"));
        File.WriteAllText(Path.Combine(_paths.Incoming, "notes.txt"), "mine");
        Assert.Contains("notes.txt", Assert.Throws<ResultFolderException>(BeginAndEnd).Message, StringComparison.Ordinal);
        Assert.Equal("mine", File.ReadAllText(Path.Combine(_paths.Incoming, "notes.txt")));
        Assert.False(File.Exists(_paths.Lock));
    }

    /// <summary>Elsewhere than on Linux two renames take its place.</summary>
    [Fact]
    public void On_linux_two_folders_change_places_in_one_step()
    {
        Leave(_paths.Target, ("x.csv", "old"));
        Leave(_paths.Incoming, ("x.csv", "new"));
        Assert.Equal(OperatingSystem.IsLinux(), FolderSwap.TryExchange(_paths.Incoming, _paths.Target));
        Assert.Equal(OperatingSystem.IsLinux() ? "new" : "old", Text("x.csv"));
        Assert.True(Directory.Exists(_paths.Incoming));
    }

    [Fact]
    public void A_swap_that_is_refused_says_so() =>
        Assert.False(FolderSwap.TryExchange(_paths.Incoming, _paths.Target));

    [Fact]
    public void Two_renames_put_the_new_results_in_place_and_set_the_earlier_ones_aside()
    {
        Leave(_paths.Target, ("x.csv", "old"));
        Leave(_paths.Incoming, ("x.csv", "new"));
        FolderSwap.TwoRenames(_paths);
        Assert.Equal("new", Text("x.csv"));
        Assert.Equal("old", File.ReadAllText(Path.Combine(_paths.Former, "x.csv")));
        Assert.False(Directory.Exists(_paths.Incoming));
    }

    [Fact]
    public void Two_renames_that_fail_half_way_bring_the_earlier_results_back()
    {
        Leave(_paths.Target, ("x.csv", "old"));
        Assert.ThrowsAny<IOException>(() => FolderSwap.TwoRenames(_paths));
        Assert.Equal("old", Text("x.csv"));
        OnlyTheTarget();
    }
}
