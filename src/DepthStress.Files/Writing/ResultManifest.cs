using System.Buffers;

namespace DepthStress.Files.Writing;

/// <summary>
/// The list of files of a result folder that the program wrote, kept in the folder. Only listed files are ever deleted, and a
/// folder is only ever removed when nothing else is left in it.
/// </summary>
internal static class ResultManifest
{
    /// <summary>The list's name in the folder.</summary>
    public const string FileName = ".depthstress-files";

    private const string Draft = FileName + ".draft";

    private static readonly SearchValues<char> Special = SearchValues.Create("/\\:*?\"<>|");

    /// <summary>Files that file browsers leave behind; nobody's work.</summary>
    private static readonly string[] Litter = [".DS_Store", "Thumbs.db", "desktop.ini"];

    /// <summary>True for a plain, visible file name that every file system takes.</summary>
    public static bool IsPlain(string name) =>
        name.Length > 0 && name[0] != '.' && !name.AsSpan().ContainsAny(Special) && !name.Any(char.IsControl);

    /// <summary>Adds a file to the list, before it is made.</summary>
    public static void Add(string folder, string name) => File.AppendAllText(Path.Combine(folder, FileName), name + "\n");

    /// <summary>Puts the list in order, so that it does not depend on the order of writing.</summary>
    public static void Sort(string folder)
    {
        var draft = Path.Combine(folder, Draft);
        File.WriteAllText(draft, string.Concat(Listed(folder).Order(StringComparer.Ordinal).Select(n => n + "\n")));
        File.Move(draft, Path.Combine(folder, FileName), overwrite: true);
    }

    /// <summary>The first entry that the program did not write, or null.</summary>
    public static string? Foreign(string folder)
    {
        var own = Own(folder);
        return Directory.EnumerateFileSystemEntries(folder)
            .Select(e => (Name: Path.GetFileName(e), Own: own.Contains(Path.GetFileName(e)) && !Directory.Exists(e)))
            .Where(e => !e.Own).Select(e => e.Name).Order(StringComparer.Ordinal).FirstOrDefault();
    }

    /// <summary>Deletes a folder the program wrote.</summary>
    /// <exception cref="ResultFolderException">Something else is in it; nothing is deleted.</exception>
    public static void Remove(string folder)
    {
        if (!Directory.Exists(folder)) return;
        if (Foreign(folder) is { } foreign) throw Refused(folder, foreign);
        foreach (var name in Own(folder).Where(n => n != FileName)) File.Delete(Path.Combine(folder, name));
        File.Delete(Path.Combine(folder, FileName));
        Directory.Delete(folder, recursive: false);
    }

    /// <summary>Says that a folder holds something the program did not write.</summary>
    public static ResultFolderException Refused(string folder, string foreign) => new(
        $"found \"{foreign}\" in \"{folder}\", expected only files of an earlier run: the folder is replaced as a whole, so move it elsewhere or choose another folder");

    private static HashSet<string> Own(string folder) => [.. Listed(folder), .. Litter, FileName, Draft];

    /// <summary>The listed names; a line that is not a plain file name lists nothing.</summary>
    private static IEnumerable<string> Listed(string folder)
    {
        var path = Path.Combine(folder, FileName);
        return File.Exists(path) ? File.ReadAllLines(path).Where(IsPlain).Distinct(StringComparer.Ordinal) : [];
    }
}
