using DepthStress.Cli;

return await Application.RunAsync(args, Terminal.OfProcess(), CancellationToken.None);
