namespace DepthStress.Files.Writing;

/// <summary>A result folder and the hidden names beside it that belong to it alone.</summary>
/// <param name="Target">The result folder, absolute; where a link points to.</param>
/// <param name="Parent">The folder that holds it.</param>
internal sealed record ResultPaths(string Target, string Parent)
{
    /// <summary>Where a run writes; after the swap, the earlier results.</summary>
    public string Incoming => Beside("new");

    /// <summary>The earlier results while two renames take the place of a swap.</summary>
    public string Former => Beside("old");

    /// <summary>The file a run holds open while it works on this folder.</summary>
    public string Lock => Beside("lock");

    /// <summary>Makes the paths of a target.</summary>
    /// <exception cref="ResultFolderException">The target is a file, or the root of a file system.</exception>
    public static ResultPaths Of(string target)
    {
        var full = Path.TrimEndingDirectorySeparator(Path.GetFullPath(target));
        var folder = new DirectoryInfo(full);
        if (folder.LinkTarget is not null) full = folder.ResolveLinkTarget(returnFinalTarget: true)!.FullName;
        if (File.Exists(full)) throw new ResultFolderException($"found a file at \"{target}\", expected a folder or nothing");
        return Path.GetDirectoryName(full) is { } parent
            ? new ResultPaths(full, parent)
            : throw new ResultFolderException($"found the root of a file system, \"{target}\", expected a folder below it");
    }

    private string Beside(string part) => Path.Combine(Parent, $".{Path.GetFileName(Target)}.depthstress-{part}");
}
