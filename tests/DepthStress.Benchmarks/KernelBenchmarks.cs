using BenchmarkDotNet.Attributes;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Benchmarks;

/// <summary>The kernels alone, on arrays that are already there.</summary>
[MemoryDiagnoser]
public class KernelBenchmarks
{
    private double[] _tvd = [], _vp = [], _vs = [], _density = [], _a = [], _b = [], _sv = [], _pp = [], _shmin = [], _shmax = [], _biot = [];
    private Law _law = MethodCatalogue.Find("lacy-1997-combined")!;

    [Params(15_000, 1_000_000)]
    public int Samples { get; set; }

    [GlobalSetup]
    public void Setup()
    {
        double[] Make(Func<int, double> value) => [.. Enumerable.Range(0, Samples).Select(value)];
        _tvd = Make(i => 900 + (0.1524 * i));
        _vp = Make(i => 3000 + (i % 977));
        _vs = Make(i => 1600 + (i % 557));
        _density = Make(i => 2300 + (i % 211));
        _sv = Make(i => 20e6 + (3500 * i));
        _pp = Make(i => 9e6 + (1540 * i));
        _biot = Make(_ => 0.85);
        _a = new double[Samples];
        _b = new double[Samples];
        _shmin = new double[Samples];
        _shmax = new double[Samples];
        DynamicModuli.Fill(_vp, _vs, _density, _a, _b);
        _law = MethodCatalogue.Find("lacy-1997-combined")!;
    }

    [Benchmark]
    public void Moduli() => DynamicModuli.Fill(_vp, _vs, _density, _a, _b);

    [Benchmark]
    public LawOutcome StaticYoungsLaw()
    {
        var inputs = default(LawInputs);
        inputs.Add(_a);
        return LawKernel.Apply(_law, inputs, _shmin);
    }

    [Benchmark]
    public OverburdenCarry OverburdenScan()
    {
        var carry = Overburden.Start(0, 0, ShallowDensity.Mean(2100).MassAbove(_tvd[0]), _tvd[0], _density[0]);
        Overburden.Scan(_tvd, _density, _sv, ref carry);
        return carry;
    }

    [Benchmark]
    public void HorizontalStress() => StrainModel.Fill(_a, _b, _biot, _sv, _pp, 150e-6, 400e-6, _shmin, _shmax);
}
