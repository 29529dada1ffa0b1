using DepthStress.Core.Catalogue;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Catalogue;

/// <summary>Catalogue entries as tests use them.</summary>
internal static class Laws
{
    public static Law Get(string id) => MethodCatalogue.Find(id) ?? throw new ArgumentException($"no {id}", nameof(id));

    /// <summary>The formula in published units, without limits.</summary>
    public static double At(string id, params double[] published) => Get(id).Evaluate(published);

    /// <summary>One sample through the kernel: SI in, SI out, NaN where the law has no meaning.</summary>
    public static double Apply(string id, params double[] si)
    {
        var inputs = default(LawInputs);
        for (var k = 0; k < si.Length; k++) inputs.Add(si.AsSpan(k, 1));
        var result = new double[1];
        LawKernel.Apply(Get(id), inputs, result);
        return result[0];
    }

    /// <summary>One sample through the kernel, in published units on both sides.</summary>
    public static double InUnits(string id, params double[] published)
    {
        var law = Get(id);
        return law.Unit.FromSi(Apply(id, [.. law.Inputs.Zip(published, (i, x) => i.Unit.ToSi(x))]));
    }
}
