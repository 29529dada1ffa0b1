using System.Runtime.InteropServices;
using System.Text;

namespace DepthStress.Files.Writing;

/// <summary>Puts a finished folder in the place of an earlier one.</summary>
internal static class FolderSwap
{
    private const int CurrentFolder = -100; // AT_FDCWD, linux/fcntl.h
    private const uint Exchange = 2; // RENAME_EXCHANGE, linux/fs.h

    /// <summary>Swaps in one step where the system can, else by two renames.</summary>
    public static void Swap(ResultPaths paths)
    {
        if (!Directory.Exists(paths.Target)) Directory.Move(paths.Incoming, paths.Target);
        else if (!TryExchange(paths.Incoming, paths.Target)) TwoRenames(paths);
    }

    /// <summary>
    /// Sets the earlier results aside, then moves the new ones in. Between the two there are no results in place;
    /// <see cref="Recover"/> of the next run puts the earlier ones back.
    /// </summary>
    public static void TwoRenames(ResultPaths paths)
    {
        Directory.Move(paths.Target, paths.Former);
        try
        {
            Directory.Move(paths.Incoming, paths.Target);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            Directory.Move(paths.Former, paths.Target);
            throw;
        }
    }

    /// <summary>Undoes or finishes what an earlier run, now dead, left half done, and removes what it left behind.</summary>
    public static void Recover(ResultPaths paths)
    {
        if (Directory.Exists(paths.Former) && !Directory.Exists(paths.Target)) Directory.Move(paths.Former, paths.Target);
        ResultManifest.Remove(paths.Former);
        ResultManifest.Remove(paths.Incoming);
    }

    /// <summary>Exchanges two names in one step; false where the system or the file system cannot.</summary>
    public static bool TryExchange(string one, string other)
    {
        if (!OperatingSystem.IsLinux()) return false;
        try
        {
            return RenameAt2(CurrentFolder, Bytes(one), CurrentFolder, Bytes(other), Exchange) == 0;
        }
        catch (Exception e) when (e is EntryPointNotFoundException or DllNotFoundException)
        {
            return false; // a C library older than the call
        }
    }

    private static byte[] Bytes(string path) => Encoding.UTF8.GetBytes(path + "\0");

    [DllImport("libc", EntryPoint = "renameat2")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static extern int RenameAt2(int oldFolder, byte[] oldPath, int newFolder, byte[] newPath, uint flags);
}
