using System.Diagnostics;

namespace DepthStress.Tests.Solver;

/// <summary>Programs of others that tests run where they are installed, and always in CI.</summary>
internal static class Outside
{
    /// <summary>CalculiX, an open-source finite-element program (Debian package calculix-ccx).</summary>
    public static string? Ccx { get; } = OnPath("ccx");

    /// <summary>A Python that has meshio, a reader of mesh files (Debian package python3-meshio).</summary>
    public static string? PythonWithMeshio { get; } =
        new[] { OnPath("python3"), "/usr/bin/python3" }.FirstOrDefault(p => p is not null && File.Exists(p) && Run(p, ".", "-c", "import meshio").Code == 0);

    public static bool InCi { get; } = Environment.GetEnvironmentVariable("CI") == "true";

    public static (int Code, string Output) Run(string program, string folder, params string[] arguments)
    {
        var start = new ProcessStartInfo(program, arguments) { WorkingDirectory = folder, RedirectStandardOutput = true, RedirectStandardError = true };
        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, output + error.Result);
    }

    private static string? OnPath(string name) => (Environment.GetEnvironmentVariable("PATH") ?? "")
        .Split(Path.PathSeparator, StringSplitOptions.RemoveEmptyEntries).Select(folder => Path.Combine(folder, name)).FirstOrDefault(File.Exists);
}

/// <summary>A test on CalculiX; skipped, and said so, where it is not installed, but never in CI.</summary>
[AttributeUsage(AttributeTargets.Method)]
internal sealed class SolverTheoryAttribute : TheoryAttribute
{
    public SolverTheoryAttribute()
    {
        if (Outside.Ccx is null && !Outside.InCi) Skip = "needs CalculiX (ccx, Debian package calculix-ccx) on the path, which is not there";
    }
}

/// <summary>The same for a test without cases.</summary>
[AttributeUsage(AttributeTargets.Method)]
internal sealed class SolverFactAttribute : FactAttribute
{
    public SolverFactAttribute() => Skip = new SolverTheoryAttribute().Skip;
}

/// <summary>A test on meshio; skipped, and said so, where it is not installed, but never in CI.</summary>
[AttributeUsage(AttributeTargets.Method)]
internal sealed class MeshioFactAttribute : FactAttribute
{
    public MeshioFactAttribute()
    {
        if (Outside.PythonWithMeshio is null && !Outside.InCi) Skip = "needs Python with meshio (Debian package python3-meshio), which is not there";
    }
}
