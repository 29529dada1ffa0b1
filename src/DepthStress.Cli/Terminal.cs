using Spectre.Console;

namespace DepthStress.Cli;

/// <summary>Where a command writes: results to one writer, messages and progress to another.</summary>
/// <param name="Output">Results.</param>
/// <param name="Error">Messages and progress.</param>
/// <param name="Folder">The folder that relative paths start from.</param>
/// <param name="Colour">True when results go to a terminal that shows colour.</param>
/// <param name="Progress">True when messages go to a terminal that can show progress.</param>
/// <param name="Width">Columns for tables.</param>
public sealed record Terminal(TextWriter Output, TextWriter Error, string Folder, bool Colour = false, bool Progress = false, int Width = 120)
{
    /// <summary>The terminal of this process; no colour and no progress where NO_COLOR is set or nobody looks.</summary>
    public static Terminal OfProcess()
    {
        var plain = !string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR"));
        return new Terminal(
            Console.Out,
            Console.Error,
            Environment.CurrentDirectory,
            !plain && !Console.IsOutputRedirected,
            !plain && !Console.IsErrorRedirected,
            Console.IsOutputRedirected ? 120 : Math.Max(80, Console.WindowWidth));
    }

    /// <summary>A console for tables on the results' writer.</summary>
    public IAnsiConsole Tables() => Make(Output, Colour);

    /// <summary>A console for progress on the messages' writer.</summary>
    public IAnsiConsole Messages() => Make(Error, Progress);

    private IAnsiConsole Make(TextWriter writer, bool rich)
    {
        var console = AnsiConsole.Create(new AnsiConsoleSettings
        {
            Out = new AnsiConsoleOutput(writer),
            Ansi = rich ? AnsiSupport.Detect : AnsiSupport.No,
            ColorSystem = rich ? ColorSystemSupport.Detect : ColorSystemSupport.NoColors,
            Interactive = rich ? InteractionSupport.Detect : InteractionSupport.No,
        });
        console.Profile.Width = Width;
        console.Profile.Capabilities.Unicode = true;
        return console;
    }
}
