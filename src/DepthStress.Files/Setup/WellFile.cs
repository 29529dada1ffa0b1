using DepthStress.Core.Model;

namespace DepthStress.Files.Setup;

/// <summary>A file that went into a run.</summary>
/// <param name="Name">The file as the well file, or the user, named it.</param>
/// <param name="Sha256">SHA-256 of its bytes, lower-case hexadecimal.</param>
public sealed record InputFile(string Name, string Sha256);

/// <summary>A well file that was read, checked and put together.</summary>
/// <param name="Path">Full path of the file.</param>
/// <param name="Name">The file as the user named it.</param>
/// <param name="Sections">Its sections as bound.</param>
/// <param name="Setup">The setup of the chain.</param>
/// <param name="Inputs">The well file itself, the survey and the observations.</param>
public sealed record WellFile(string Path, string Name, WellFileSections Sections, WellSetup Setup, IReadOnlyList<InputFile> Inputs)
{
    /// <summary>Full path of a file that the well file names.</summary>
    public string Resolve(string file) => System.IO.Path.GetFullPath(file, System.IO.Path.GetDirectoryName(Path)!);
}
