using System.CommandLine;
using System.CommandLine.Parsing;
using DepthStress.Cli.Commands;

namespace DepthStress.Cli;

/// <summary>The command line: parses, runs, and turns every outcome into an exit code.</summary>
public static class Application
{
    /// <summary>Runs one command line.</summary>
    /// <param name="args">The arguments.</param>
    /// <param name="terminal">Where to write.</param>
    /// <param name="cancellation">Stops the command; it then ends with 130.</param>
    public static async Task<int> RunAsync(IReadOnlyList<string> args, Terminal terminal, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(terminal);
        var parsed = CommandLineParser.Parse(Root(terminal), args);
        if (parsed.Errors.Count > 0)
        {
            foreach (var error in parsed.Errors) await terminal.Error.WriteLineAsync($"error: {error.Message}");
            await terminal.Error.WriteLineAsync($"Run \"{FullName(parsed.CommandResult)} --help\" for usage.");
            return ExitCodes.Usage;
        }

        try
        {
            var configuration = new InvocationConfiguration
            {
                Output = terminal.Output,
                Error = terminal.Error,
                EnableDefaultExceptionHandler = false,
            };
            return await parsed.InvokeAsync(configuration, cancellation);
        }
        catch (OperationCanceledException)
        {
            await terminal.Error.WriteLineAsync("interrupted; earlier results are as they were");
            return ExitCodes.Interrupted;
        }
        catch (IOException e)
        {
            await terminal.Error.WriteLineAsync($"error: cannot write what the command prints ({e.Message})");
            return ExitCodes.Input;
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            await terminal.Error.WriteLineAsync($"fault of the program, please report it: {e.GetType().Name}: {e.Message}");
            await terminal.Error.WriteLineAsync(e.StackTrace);
            return ExitCodes.Fault;
        }
    }

    private static RootCommand Root(Terminal terminal) => new("Builds a one-dimensional mechanical earth model from well logs.")
    {
        new InitCommand(terminal),
        new CheckCommand(terminal),
        new RunCommand(terminal),
        new CalibrateCommand(terminal),
        new CompareCommand(terminal),
        new MethodsCommand(terminal),
        new SchemaCommand(terminal),
    };

    private static string FullName(CommandResult result) =>
        result.Parent is CommandResult parent ? $"{FullName(parent)} {result.Command.Name}" : "depthstress";
}
