namespace DepthStress.Core.Model;

/// <summary>The words for kinds of observations, and what kinds have in common.</summary>
public static class ObservationKinds
{
    /// <summary>Every kind with its word.</summary>
    public static IReadOnlyList<(string Word, ObservationKind Kind)> All { get; } =
    [
        ("closure", ObservationKind.Closure), ("reopening", ObservationKind.Reopening), ("shut-in", ObservationKind.ShutIn),
        ("leak-off", ObservationKind.LeakOff), ("integrity", ObservationKind.Integrity), ("losses", ObservationKind.Losses),
        ("breakdown", ObservationKind.Breakdown), ("breakout-width", ObservationKind.BreakoutWidth),
        ("no-breakout", ObservationKind.NoBreakout), ("formation-pressure", ObservationKind.FormationPressure),
    ];

    /// <summary>The word for a kind.</summary>
    public static string Word(this ObservationKind kind) => All.First(k => k.Kind == kind).Word;

    /// <summary>True for what is seen on images of the wall; everything else is a pressure.</summary>
    public static bool IsBreakout(this ObservationKind kind) => kind is ObservationKind.BreakoutWidth or ObservationKind.NoBreakout;

    /// <summary>True for tests that break the wall, whose fluid may enter the rock.</summary>
    public static bool BreaksWall(this ObservationKind kind) => kind is ObservationKind.Breakdown or ObservationKind.Reopening;

    /// <summary>True for tests of the open hole below a casing shoe.</summary>
    public static bool IsBelowShoe(this ObservationKind kind) => kind is ObservationKind.LeakOff or ObservationKind.Integrity;
}
