namespace DepthStress.Tests;

/// <summary>A folder for the files of one test; it goes away with it.</summary>
internal sealed class TestFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("depthstress-test-").FullName;

    public string Of(string name) => System.IO.Path.Combine(Path, name);

    public string Write(string name, string text)
    {
        var path = Of(name);
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(path)!);
        File.WriteAllText(path, text);
        return path;
    }

    public string Read(string name) => File.ReadAllText(Of(name));

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
