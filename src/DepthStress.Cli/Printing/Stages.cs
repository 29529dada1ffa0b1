using Spectre.Console;

namespace DepthStress.Cli.Printing;

/// <summary>Shows on a terminal what the program is at, so that long work does not look like a hang.</summary>
internal static class Stages
{
    /// <summary>Does the work while its stages are shown; silent where nobody looks.</summary>
    public static async Task ShowAsync(Terminal terminal, Func<Action<string>, Task> work)
    {
        if (!terminal.Progress)
        {
            await work(_ => { });
            return;
        }

        await terminal.Messages().Status().StartAsync("starting", context => work(stage => context.Status(Markup.Escape(stage))));
    }
}
