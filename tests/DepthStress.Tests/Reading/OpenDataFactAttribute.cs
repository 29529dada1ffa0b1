using System.Reflection;

namespace DepthStress.Tests.Reading;

/// <summary>A test on open data that is no part of the project; skipped, and said so, where the folder is not there.</summary>
[AttributeUsage(AttributeTargets.Method)]
internal sealed class OpenDataFactAttribute : FactAttribute
{
    public OpenDataFactAttribute()
    {
        if (!Directory.Exists(Folder)) Skip = "needs the open data in ../shared/open-data beside the project, which are not there";
    }

    /// <summary>Where the data lie: <c>../shared/open-data</c> beside the root of the project.</summary>
    public static string Folder { get; } = Path.GetFullPath(Path.Combine(
        typeof(OpenDataFactAttribute).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().Single(a => a.Key == "RepoRoot").Value!,
        "..", "shared", "open-data"));
}
