using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Running;
using BenchmarkDotNet.Toolchains.InProcess.Emit;

// In process: the harness's own builds do not find projects whose output lies in a shared artifacts folder.
var config = DefaultConfig.Instance
    .AddJob(Job.ShortRun.WithToolchain(InProcessEmitToolchain.Instance))
    .WithArtifactsPath(Path.Combine(Path.GetTempPath(), "depthstress-benchmarks"));
BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args, config);
