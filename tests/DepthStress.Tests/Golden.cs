using System.Reflection;
using System.Text;

namespace DepthStress.Tests;

/// <summary>
/// Compares whole texts with files kept under Golden/. DEPTHSTRESS_UPDATE_GOLDEN=1 rewrites them on a developer's machine,
/// never where CI=true.
/// </summary>
internal static class Golden
{
    /// <summary>The root of the repository.</summary>
    public static string RepoRoot { get; } =
        typeof(Golden).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(a => a.Key == "RepoRoot").Value!;

    /// <summary>True when kept files are to be rewritten.</summary>
    public static bool Updating { get; } = Environment.GetEnvironmentVariable("DEPTHSTRESS_UPDATE_GOLDEN") == "1";

    private static readonly string Folder = Path.Combine(RepoRoot, "tests", "DepthStress.Tests", "Golden");

    public static void Match(string name, string text)
    {
        var path = Path.Combine(Folder, name);
        if (Updating)
        {
            Assert.NotEqual("true", Environment.GetEnvironmentVariable("CI"));
            Directory.CreateDirectory(Folder);
            File.WriteAllText(path, text, new UTF8Encoding(false));
        }

        Assert.True(File.Exists(path), $"There is no golden file {name}.");
        Assert.Equal(File.ReadAllText(path), text);
    }
}
