namespace DepthStress.Files.Writing;

/// <summary>
/// Writes the results of a run whole or not at all. Files go to a hidden folder beside the target, which
/// <see cref="Commit"/> swaps in; until then, and after any failure, the earlier results stay as they were.
/// <para>A hidden list in the folder names the files the program wrote. A target that holds anything else is refused, both at
/// the beginning and before the swap: the program neither deletes nor moves what it did not write.</para>
/// <para>One run at a time may write a target; a lock file that the system releases when a process dies guards this, so runs
/// on different targets never meet, and what a killed run left behind is cleaned at the next <see cref="Begin"/>.</para>
/// </summary>
public sealed class ResultFolder : IDisposable
{
    private const string Writable = "a folder that this program may write";

    /// <summary>What the base library reports for a file another process holds: EAGAIN on Linux and on macOS, and the sharing violation of Windows.</summary>
    private static readonly int[] HeldElsewhere = [11, 35, unchecked((int)0x80070020)];

    private readonly ResultPaths _paths;
    private readonly FileStream _lock;
    private readonly List<FileStream> _files = [];
    private readonly Lock _gate = new();
    private bool _done;

    private ResultFolder(ResultPaths paths, FileStream hold) => (_paths, _lock) = (paths, hold);

    /// <summary>Makes ready to write results.</summary>
    /// <param name="target">The result folder; need not exist, nor the folders above it.</param>
    /// <exception cref="ResultFolderException">
    /// The target is a file or cannot be written, holds files the program did not write, or is being written by another run.
    /// </exception>
    public static ResultFolder Begin(string target)
    {
        ArgumentException.ThrowIfNullOrWhiteSpace(target);
        ResultFolder? folder = null;
        ResultFolderException.Guard(target, Writable, () =>
        {
            var paths = ResultPaths.Of(target);
            Directory.CreateDirectory(paths.Parent);
            folder = new ResultFolder(paths, TakeLock(paths));
        });
        try
        {
            ResultFolderException.Guard(target, Writable, folder!.Prepare);
        }
        catch (ResultFolderException)
        {
            folder!._lock.Dispose();
            throw;
        }

        return folder;
    }

    /// <summary>Makes a file of the results; dispose it before the commit. May be called from several threads.</summary>
    /// <param name="fileName">A plain file name, once per run.</param>
    /// <exception cref="ArgumentException">The name is not plain, or was used before.</exception>
    /// <exception cref="ResultFolderException">The file cannot be made.</exception>
    public Stream Create(string fileName)
    {
        ArgumentNullException.ThrowIfNull(fileName);
        if (!ResultManifest.IsPlain(fileName)) throw new ArgumentException($"found \"{fileName}\", expected a plain file name", nameof(fileName));
        lock (_gate)
        {
            ObjectDisposedException.ThrowIf(_done, this);
            var path = Path.Combine(_paths.Incoming, fileName);
            if (File.Exists(path)) throw new ArgumentException($"found a second file \"{fileName}\", expected each once", nameof(fileName));
            ResultFolderException.Guard(path, Writable, () =>
            {
                ResultManifest.Add(_paths.Incoming, fileName);
                _files.Add(new FileStream(path, FileMode.CreateNew, FileAccess.Write, FileShare.Read));
            });
            return _files[^1];
        }
    }

    /// <summary>Puts the results in place, all at once, and removes the earlier ones.</summary>
    /// <exception cref="InvalidOperationException">A file is still open.</exception>
    /// <exception cref="ResultFolderException">The results cannot be put in place; the earlier ones stay.</exception>
    public void Commit()
    {
        lock (_gate)
        {
            ObjectDisposedException.ThrowIf(_done, this);
            if (_files.Find(f => f.CanWrite) is { } open)
                throw new InvalidOperationException($"\"{Path.GetFileName(open.Name)}\" is still open, expected every file closed before the commit.");
            ResultFolderException.Guard(_paths.Target, "a folder that can be replaced", () =>
            {
                ResultManifest.Sort(_paths.Incoming);
                RefuseForeign();
                FolderSwap.Swap(_paths);
            });
            Finish();
        }
    }

    /// <summary>Ends the run; without a commit, what it wrote is removed.</summary>
    public void Dispose()
    {
        lock (_gate)
        {
            if (_done) return;
            foreach (var file in _files) Quietly(file.Dispose); // a full disk fails here once more
            Finish();
        }
    }

    private static FileStream TakeLock(ResultPaths paths)
    {
        try
        {
            return new FileStream(paths.Lock, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None, 1, FileOptions.DeleteOnClose);
        }
        catch (IOException e) when (Array.IndexOf(HeldElsewhere, e.HResult) >= 0)
        {
            throw new ResultFolderException($"found another run writing to \"{paths.Target}\", expected one at a time", e);
        }
    }

    private void Prepare()
    {
        FolderSwap.Recover(_paths);
        RefuseForeign();
        Directory.CreateDirectory(_paths.Incoming);
    }

    private void RefuseForeign()
    {
        if (Directory.Exists(_paths.Target) && ResultManifest.Foreign(_paths.Target) is { } foreign)
            throw ResultManifest.Refused(_paths.Target, foreign);
    }

    /// <summary>Removes what is no longer wanted; what cannot be removed now, the next run removes or names.</summary>
    private void Finish()
    {
        _done = true;
        Quietly(() => ResultManifest.Remove(_paths.Incoming));
        Quietly(() => ResultManifest.Remove(_paths.Former));
        _lock.Dispose();
    }

    private static void Quietly(Action step)
    {
        try
        {
            step();
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
        }
    }
}
