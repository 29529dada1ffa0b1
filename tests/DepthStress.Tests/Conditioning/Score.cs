using DepthStress.Core.Conditioning;
using SampleWell.Logging;

namespace DepthStress.Tests.Conditioning;

/// <summary>Counts what conditioning marked against what was spoilt.</summary>
internal sealed class Score
{
    private static readonly ConditioningSettings Settings = Scored.Settings(threshold: 5);
    private readonly Dictionary<(string Step, string Curve), (int Right, int Wrong)> _marked = [];
    private readonly List<(DamageKind Kind, string Curve, double Size, bool Found)> _spoilt = [];

    public void Add(GradedRun run)
    {
        var result = Scored.Condition(Scored.Table(run.Spoilt), Settings);
        var spoilt = Scored.Spoilt(run);
        foreach (var step in result.Steps)
        {
            var curve = Scored.Name(step.Property);
            var (right, wrong) = Marked(step.Name, curve);
            for (var i = 0; i < step.Samples.Length; i++)
            {
                if (!step.Samples[i]) continue;
                if (spoilt[curve][i]) right++;
                else wrong++;
            }

            _marked[(step.Name, curve)] = (right, wrong);
        }

        foreach (var record in run.Damage)
        {
            var steps = result.Steps.Where(s => Scored.Name(s.Property) == record.Curve).ToArray();
            for (var i = record.First; i < record.First + record.Count; i++)
            {
                var size = record.Kind == DamageKind.Washout ? Math.Abs(run.Spoilt.Curves[record.Curve][i] - run.Clean.Curves[record.Curve][i]) : record.Size;
                _spoilt.Add((record.Kind, record.Curve, size, steps.Any(s => s.Samples[i])));
            }
        }
    }

    /// <summary>Samples a step marked that were spoilt, and that were not.</summary>
    public (int Right, int Wrong) Marked(string step, string curve) => _marked.GetValueOrDefault((step, curve));

    /// <summary>Spoilt samples of a range of sizes that some step marked, and all of them.</summary>
    public (int Found, int Total) Found(DamageKind kind, string curve, double from, double below)
    {
        var those = _spoilt.Where(s => s.Kind == kind && s.Curve == curve && s.Size >= from && s.Size < below).ToArray();
        return (those.Count(s => s.Found), those.Length);
    }
}
