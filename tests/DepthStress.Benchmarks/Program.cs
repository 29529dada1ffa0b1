using System.Globalization;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Running;
using BenchmarkDotNet.Toolchains.InProcess.Emit;
using DepthStress.Benchmarks;
using SampleWell.Twins;

// The two counterparts of comparison/: a well of any size for chain.py, and the kernel that stress.c times.
if (args is ["well", var folder, var samples])
{
    Console.WriteLine(Large.Write(folder, int.Parse(samples, CultureInfo.InvariantCulture)));
    return;
}

if (args is ["kernel"])
{
    FusedKernel.Print(Console.Out);
    return;
}

// In process: the harness's own builds do not find projects whose output lies in a shared artifacts folder.
var config = DefaultConfig.Instance
    .AddJob(Job.ShortRun.WithToolchain(InProcessEmitToolchain.Instance))
    .WithArtifactsPath(Path.Combine(Path.GetTempPath(), "depthstress-benchmarks"));
BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args, config);
