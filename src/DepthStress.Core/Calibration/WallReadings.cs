using DepthStress.Core.Borehole;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Calibration;

/// <summary>
/// Observations of the wall of the hole beside the model: breakdown, reopening and breakouts. Near-vertical holes take the closed
/// forms, others the wall of a hole of any direction.
/// </summary>
internal static class WallReadings
{
    /// <summary>The reading of an observation of the wall.</summary>
    public static Reading Of(EarthModel model, ObservedInterval interval, int first, int count, StrainResponse response)
    {
        var rock = new WallRock(model, interval, first, count);
        var kind = interval.Observation.Kind;
        return kind.IsBreakout() ? OfBreakout(rock, response) : OfBreakdown(rock, response, kind == ObservationKind.Reopening);
    }

    private static Reading OfBreakdown(WallRock rock, StrainResponse response, bool reopening)
    {
        var interval = rock.Interval;
        Reading Refused(string problem) => new(interval, Reading.Breakdown, problem);
        var tensile = reopening ? 0 : rock.Tensile;
        if (double.IsNaN(tensile)) return Refused("no tensile strength at its depth: set [strength] tensile_strength");
        if (double.IsNaN(rock.Pore)) return Refused("no pore pressure at its depth");
        var penetrating = rock.Model.Setup.ObservationSettings.BreakdownFluid.Value == BreakdownFluid.Penetrating;
        if (!rock.IsVertical && (penetrating || reopening)) return Refused("the hole leans by more than 15 deg: formulas for a vertical hole do not hold");
        if (!rock.IsVertical && rock.ShmaxAzimuth is null) return Refused("the hole leans by more than 15 deg: set [horizontal_stress] shmax_azimuth");
        if (penetrating && double.IsNaN(rock.Biot + rock.Poisson)) return Refused("no Biot's coefficient or Poisson's ratio at its depth");

        var eta = BreakdownPressure.Eta(rock.Biot, rock.Poisson);
        WallAnswer Pressure(double shmin, double shmax, double held) => !rock.IsVertical
            ? BreakdownPressure.AnyDirection(rock.FarField(shmin, shmax), rock.Pore, rock.Poisson, held, interval.Inclination, interval.Azimuth)
            : penetrating ? BreakdownPressure.Penetrating(shmin, shmax, rock.Pore, held, eta, interval.Inclination)
            : BreakdownPressure.NonPenetrating(shmin, shmax, rock.Pore, held, interval.Inclination);
        return new(
            interval, Meaning.Value, Reading.Breakdown, interval.Sigma, response, (shmin, shmax, strength) => (interval.Value, Pressure(shmin, shmax, strength * tensile).Value))
        {
            OnStrength = tensile > 0,
        };
    }

    private static Reading OfBreakout(WallRock rock, StrainResponse response)
    {
        var (interval, support) = (rock.Interval, rock.Interval.MudPressure);
        Reading Refused(string problem) => new(interval, Reading.Shmax, problem);
        if (double.IsNaN(support)) return Refused("no density of the mud that supported the wall");
        if (double.IsNaN(rock.Ucs + rock.FrictionAngle)) return Refused("no strength at its depth: set [strength] ucs and friction_angle");
        if (double.IsNaN(rock.Pore)) return Refused("no pore pressure at its depth");
        if (!rock.IsVertical && rock.ShmaxAzimuth is null) return Refused("the hole leans by more than 15 deg: set [horizontal_stress] shmax_azimuth");

        WallAnswer Shmax(double width, double shmin, double strength) => rock.IsVertical
            ? VerticalHole.ShmaxFromWidth(width, shmin, rock.Pore, support, strength * rock.Ucs, rock.FrictionAngle, interval.Inclination)
            : Breakout.ShmaxFromWidth(
                width, shmax => HoleWall.Of(rock.FarField(shmin, shmax), rock.Pore, support, rock.Poisson, interval.Inclination, interval.Azimuth),
                shmin, FrictionalLimit.HighestShmax(rock.Vertical, shmin, rock.Pore, 1), strength * rock.Ucs, rock.FrictionAngle);

        // In a near-vertical hole SHmax is a straight function of Shmin and of the strength; read off where the answer is always known.
        var meaning = interval.Observation.Kind == ObservationKind.NoBreakout ? Meaning.UpperBound : Meaning.Value;
        // Standard deviations are taken where no strain that is to be estimated enters, so that they do not depend on its first guess.
        var (shmin0, _) = response.Mean([]);
        var origin = rock.IsVertical ? rock.Pore : shmin0;
        var at = Shmax(interval.Value, origin, 1);
        if (!at.IsKnown) return Refused(at.Reason!);
        const double Step = 1e3;
        var slope = rock.IsVertical ? (Shmax(interval.Value, origin + Step, 1).Value - at.Value) / Step : 0;
        var perStrength = rock.IsVertical ? Shmax(interval.Value, origin, 2).Value - at.Value : 0;
        double Measured(double shmin, double strength) => rock.IsVertical ? at.Value + (slope * (shmin - origin)) + (perStrength * (strength - 1))
            : Shmax(interval.Value, shmin, strength) is { IsKnown: true } known ? known.Value : at.Value;
        var wider = Shmax(interval.Value + interval.Sigma, shmin0, 1);
        var sigma = Math.Abs((wider.IsKnown ? wider.Value : Shmax(interval.Value + interval.Sigma, origin, 1).Value) - Measured(shmin0, 1));
        return !(sigma > 0)
            ? Refused("its standard deviation gives none of SHmax: the breakout is too wide")
            : new(interval, meaning, Reading.Shmax, sigma, response, (shmin, shmax, strength) => (Measured(shmin, strength), shmax)) { OnStrength = true };
    }

    /// <summary>The rock around an observation, as means over its samples.</summary>
    private sealed class WallRock(EarthModel model, ObservedInterval interval, int first, int count)
    {
        public EarthModel Model => model;

        public ObservedInterval Interval => interval;

        public bool IsVertical => interval.Inclination <= VerticalHole.MaxInclination;

        public double Pore { get; } = interval.Observation.PorePressure ?? SampleMean.Of(model, Property.PorePressure, first, count);

        public double Vertical { get; } = SampleMean.Of(model, Property.VerticalStress, first, count);

        public double Ucs { get; } = SampleMean.Of(model, Property.Ucs, first, count);

        public double FrictionAngle { get; } = SampleMean.Of(model, Property.FrictionAngle, first, count);

        public double Tensile { get; } = SampleMean.Of(model, Property.TensileStrength, first, count);

        public double Poisson { get; } = SampleMean.Of(model, Property.PoissonStatic, first, count);

        public double Biot { get; } = SampleMean.Of(model, Property.Biot, first, count);

        /// <summary>Azimuth of SHmax, rad; null where it is not set.</summary>
        public double? ShmaxAzimuth { get; } =
            model.Runs.First(r => first < r.End).Settings.HorizontalStress.ShmaxAzimuth is { IsSet: true } azimuth ? azimuth.Value : null;

        public FarField FarField(double shmin, double shmax) => new(Vertical, shmax, shmin, ShmaxAzimuth ?? double.NaN);
    }
}
