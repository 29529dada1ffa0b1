using System.Diagnostics;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Model;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Benchmarks;

/// <summary>
/// Dynamic moduli, Lacy's law and both horizontal stresses one after the other, as the chain runs them: what
/// <c>comparison/stress.c</c> does in one loop on the same numbers.
/// </summary>
internal static class FusedKernel
{
    /// <summary>Samples that are worked on in one measurement.</summary>
    private const int Work = 30_000_000;

    private const int Repeats = 9;

    /// <summary>Prints the median time per sample in cache and out of it, and a sum that must equal that of the C program.</summary>
    public static void Print(TextWriter output)
    {
        foreach (var samples in (ReadOnlySpan<int>)[1_000, 15_000, 1_000_000])
        {
            var rock = new Columns(samples);
            for (var k = 0; k < Work / samples; k++) rock.Run();
            var times = new double[Repeats];
            for (var r = 0; r < Repeats; r++)
            {
                var start = Stopwatch.GetTimestamp();
                for (var k = 0; k < Work / samples; k++) rock.Run();
                times[r] = Stopwatch.GetElapsedTime(start).TotalNanoseconds / ((long)samples * (Work / samples));
            }

            Array.Sort(times);
            output.WriteLine(FormattableString.Invariant($"{samples,9} samples {times[Repeats / 2]:F2} ns/sample, sum {rock.Sum():E12}"));
        }
    }

    private sealed class Columns
    {
        private readonly double[] _vp, _vs, _density, _biot, _sv, _pp, _dynamic, _still, _nu, _shmin, _shmax;
        private readonly Law _law = MethodCatalogue.Find("lacy-1997-combined")!;

        public Columns(int samples)
        {
            double[] Make(Func<int, double> value) => [.. Enumerable.Range(0, samples).Select(value)];
            _vp = Make(i => 3000 + (i % 977));
            _vs = Make(i => 1600 + (i % 557));
            _density = Make(i => 2300 + (i % 211));
            _biot = Make(_ => 0.85);
            _sv = Make(i => 20e6 + (20.0 * i));
            _pp = Make(i => 9e6 + (9.0 * i));
            (_dynamic, _still, _nu, _shmin, _shmax) =
                (new double[samples], new double[samples], new double[samples], new double[samples], new double[samples]);
        }

        public void Run()
        {
            DynamicModuli.Fill(_vp, _vs, _density, _dynamic, _nu);
            var inputs = default(LawInputs);
            inputs.Add(_dynamic);
            LawKernel.Apply(_law, inputs, _still);
            StrainModel.Fill(_still, _nu, _biot, _sv, _pp, 150e-6, 400e-6, _shmin, _shmax);
        }

        public double Sum()
        {
            double sum = 0;
            for (var i = 0; i < _shmin.Length; i++) sum += _shmin[i] + _shmax[i] + _still[i] + _nu[i];
            return sum;
        }
    }
}
