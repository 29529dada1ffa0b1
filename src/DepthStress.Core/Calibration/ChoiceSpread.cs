using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>The least and greatest mean Shmin of some trials, Pa.</summary>
/// <param name="Low">The least.</param>
/// <param name="High">The greatest.</param>
public readonly record struct SpreadRange(double Low, double High)
{
    /// <summary>Their distance, Pa.</summary>
    public double Width => High - Low;
}

/// <summary>
/// What the choice of static modulus, Poisson's ratio and Biot's coefficient does to the mean Shmin of a zone: every relation of
/// the catalogue that was made for all the rocks the chosen one was made for and that its logs can feed, in every combination, all else as in the run.
/// </summary>
/// <param name="Zone">Number of the zone, or -1.</param>
/// <param name="Chosen">Mean Shmin as chosen, Pa.</param>
/// <param name="All">Over every combination.</param>
/// <param name="ByYoungs">The static modulus alone chosen otherwise.</param>
/// <param name="ByPoisson">Poisson's ratio alone chosen otherwise.</param>
/// <param name="ByBiot">Biot's coefficient alone chosen otherwise.</param>
/// <param name="Trials">Every combination, the chosen one first.</param>
public sealed record ChoiceSpread(
    short Zone, double Chosen, SpreadRange All, SpreadRange ByYoungs, SpreadRange ByPoisson, SpreadRange ByBiot, IReadOnlyList<ChoiceTrial> Trials)
{
    /// <summary>A relation is admissible when it serves at least this share of the samples that the chosen ones serve.</summary>
    private const double LeastServed = 0.9;

    /// <summary>Poisson's ratio has no published relations to choose from; it is tried this much lower and higher.</summary>
    private const double PoissonStep = ShminSensitivity.PoissonStep;

    private static readonly Property[] Written =
    [
        Property.YoungsStatic, Property.PoissonStatic, Property.Biot, Property.YoungsStaticHorizontal, Property.PoissonStaticHorizontal, Property.BiotHorizontal,
        Property.CompressionalSlowness, Property.ShearSlowness,
    ];

    /// <summary>The choice that moves Shmin most, in words.</summary>
    public string Dominant => ByYoungs.Width >= ByPoisson.Width && ByYoungs.Width >= ByBiot.Width ? "E static"
        : ByPoisson.Width >= ByBiot.Width ? "nu static" : "biot";

    /// <summary>The spread of every zone that has a Shmin by elastic rock outside salt, from top to bottom.</summary>
    public static IReadOnlyList<ChoiceSpread> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var scratch = model.Values.Sharing(Written);
        LawColumns.DeriveAll(scratch);
        return
        [
            .. model.Runs.Where(r => !StressStage.IsSalt(model.Setup, r.Lithology) && !r.Settings.HorizontalStress.ByRatio).GroupBy(r => r.Zone)
                .Select(zone => new Zoned(model, scratch, [.. zone]).Spread(zone.Key)).OfType<ChoiceSpread>(),
        ];
    }

    /// <summary>One zone under trial.</summary>
    private sealed class Zoned(EarthModel model, PropertyTable scratch, IReadOnlyList<SettingsRun> runs)
    {
        private readonly double[] _shmin = new double[runs.Max(r => r.Length)];
        private readonly double[] _shmax = new double[runs.Max(r => r.Length)];

        public ChoiceSpread? Spread(short zone)
        {
            var chosen = Mean(null, null, null);
            if (chosen.Count == 0) return null;
            var settings = runs[0].Settings;
            var youngs = Admissible(Property.YoungsStatic, settings.Moduli.StaticYoungs.Value, chosen.Count, law => Mean(law, null, null));
            var biot = Admissible(Property.Biot, settings.Biot.Coefficient.Value, chosen.Count, law => Mean(null, null, law));
            var poisson = settings.Moduli.StaticPoisson.Value is { } ratio ? (Law?[])[null, Shifted(ratio, -PoissonStep), Shifted(ratio, PoissonStep)] : [null];

            var trials = new List<(Law? Youngs, Law? Poisson, Law? Biot, ChoiceTrial Trial)>();
            foreach (var y in youngs)
            {
                foreach (var p in poisson)
                {
                    foreach (var b in biot)
                    {
                        var mean = Mean(y, p, b);
                        if (mean.Count < LeastServed * chosen.Count) continue;
                        trials.Add((y, p, b, new ChoiceTrial(
                            Name(y, settings.Moduli.StaticYoungs.Value), Name(p, settings.Moduli.StaticPoisson.Value), Name(b, settings.Biot.Coefficient.Value), mean.Shmin)));
                    }
                }
            }

            SpreadRange Range(Func<(Law? Youngs, Law? Poisson, Law? Biot, ChoiceTrial Trial), bool> among)
            {
                var values = trials.Where(among).Select(t => t.Trial.Shmin).ToList();
                return new(values.Min(), values.Max());
            }

            return new ChoiceSpread(
                zone, chosen.Shmin, Range(_ => true), Range(t => t.Poisson is null && t.Biot is null), Range(t => t.Youngs is null && t.Biot is null),
                Range(t => t.Youngs is null && t.Poisson is null), [.. trials.Select(t => t.Trial)]);
        }

        /// <summary>The chosen law, as null, and every other one for the same rock whose inputs are there; recalled ones where the user accepts them.</summary>
        private List<Law?> Admissible(Property predicts, Law? chosen, int served, Func<Law, (int Count, double Shmin)> mean)
        {
            var rocks = chosen?.Rocks ?? RockKinds.Any;
            return
            [
                null,
                .. MethodCatalogue.For(predicts)
                    .Where(law => law.Id != chosen?.Id && (law.Rocks & rocks) == rocks && (law.Standing != Standing.FromMemory || model.Setup.AcceptUnverified))
                    .Where(law => mean(law).Count >= LeastServed * served),
            ];
        }

        private (int Count, double Shmin) Mean(Law? youngs, Law? poisson, Law? biot)
        {
            List<SettingsRun> tried = [.. runs.Select(r => r with { Settings = With(r.Settings, youngs, poisson, biot) })];
            RockStage.ApplyElastic(scratch, tried);
            var (count, sum) = (0, 0.0);
            foreach (var run in tried)
            {
                var (shmin, shmax) = (_shmin.AsMemory(0, run.Length), _shmax.AsMemory(0, run.Length));
                HorizontalStress.Fill(scratch, run.Settings, run.Start, run.Length, run.Settings.HorizontalStress.BothStrains(), shmin.Span, shmax.Span);
                foreach (var value in shmin.Span)
                {
                    if (double.IsNaN(value)) continue;
                    count++;
                    sum += value;
                }
            }

            return (count, sum / count);
        }

        private static StageSettings With(StageSettings settings, Law? youngs, Law? poisson, Law? biot) => settings with
        {
            Moduli = settings.Moduli with
            {
                StaticYoungs = youngs is null ? settings.Moduli.StaticYoungs : new(youngs, settings.Moduli.StaticYoungs.Source),
                StaticPoisson = poisson is null ? settings.Moduli.StaticPoisson : new(poisson, settings.Moduli.StaticPoisson.Source),
                // A factor from core belongs to the law it was found with.
                StaticYoungsFactor = youngs is null ? settings.Moduli.StaticYoungsFactor : Diagnostics.Setting.Default(1.0),
            },
            Biot = biot is null ? settings.Biot : settings.Biot with { Coefficient = new(biot, settings.Biot.Coefficient.Source) },
        };

        private static Law Shifted(Law law, double step) => law with
        {
            Id = FormattableString.Invariant($"{law.Id} {step:+0.00;-0.00}"),
            Formula = (x, c) => law.Formula(x, c) + step,
        };

        private static string Name(Law? tried, Law? chosen) => (tried ?? chosen)?.Id ?? "";
    }
}
