using System.Text.RegularExpressions;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Catalogue;

public partial class CatalogueTests
{
    public static TheoryData<string> Ids => [.. MethodCatalogue.All.Select(l => l.Id)];

    [Fact]
    public void Ids_are_unique_and_in_lower_case_kebab()
    {
        Assert.Equal(MethodCatalogue.All.Count, MethodCatalogue.All.DistinctBy(l => l.Id).Count());
        Assert.All(MethodCatalogue.All, l => Assert.Matches(Kebab(), l.Id));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void An_entry_is_found_by_its_id_and_by_what_it_gives(string id)
    {
        var law = MethodCatalogue.Find(id);
        Assert.Equal(id, law?.Id);
        Assert.Contains(law, MethodCatalogue.For(law!.Predicts));
    }

    [Fact]
    public void An_unknown_id_finds_nothing() => Assert.Null(MethodCatalogue.Find("Lacy-1997-Shale"));

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_example_comes_out_to_its_digits(string id)
    {
        var law = MethodCatalogue.Find(id)!;
        Assert.NotNull(law.Example);
        Assert.Equal(law.Inputs.Count, law.Example.Inputs.Length);
        Assert.Equal(law.Example.Result, law.Evaluate(law.Example.Inputs), HalfLastDigit(law.Example));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_kernel_gives_the_example_in_SI(string id)
    {
        var law = MethodCatalogue.Find(id)!;
        var inputs = default(LawInputs);
        for (var k = 0; k < law.Inputs.Count; k++)
        {
            var si = law.Inputs[k].Unit.ToSi(law.Example!.Inputs[k]);
            inputs.Add(k == 0 ? new[] { si, double.NaN, si } : new[] { si });
        }

        var result = new double[3];
        var outcome = LawKernel.Apply(law, inputs, result);
        Assert.Equal(new LawOutcome(Evaluated: 2, InputMissing: 1, OutsideDomain: 0, OutsideRange: 0), outcome);
        Assert.Equal(law.Example!.Result, law.Unit.FromSi(result[2]), HalfLastDigit(law.Example));
        Assert.Equal(result[2], result[0]);
        Assert.True(double.IsNaN(result[1]));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void Every_coefficient_stands_in_the_text_and_moves_the_result(string id)
    {
        var law = MethodCatalogue.Find(id)!;
        var result = law.Evaluate(law.Example!.Inputs);
        foreach (var coefficient in law.Coefficients)
        {
            Assert.Contains($"{{{coefficient.Symbol}}}", law.Template, StringComparison.Ordinal);
            var moved = law with
            {
                Coefficients = [.. law.Coefficients.Select(c => c == coefficient ? c with { Value = 1.01 * c.Value } : c)],
            };
            Assert.NotEqual(result, moved.Evaluate(law.Example.Inputs));
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_text_is_whole_and_names_every_input(string id)
    {
        var law = MethodCatalogue.Find(id)!;
        Assert.DoesNotContain('{', law.Text);
        Assert.DoesNotContain('}', law.Text);
        Assert.All(law.Inputs, i => Assert.Contains(i.Symbol, law.Text, StringComparison.Ordinal));
        Assert.All(new[] { law.Title, law.Validity, law.Source, law.Example!.Source }, t => Assert.False(string.IsNullOrWhiteSpace(t)));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_example_is_inside_the_domain_and_the_units_fit(string id)
    {
        var law = MethodCatalogue.Find(id)!;
        Assert.All(law.Inputs.Zip(law.Example!.Inputs), p => Assert.True(p.First.Domain.Contains(p.Second)));
        Assert.True(law.ResultDomain.Contains(law.Example.Result));
        Assert.InRange(law.Inputs.Count, 1, LawInputs.Most);
    }

    [Fact]
    public void The_formula_text_carries_the_published_numbers() =>
        Assert.Equal("Es = 0.0428 Ed^2 + 0.2334 Ed", MethodCatalogue.Find("lacy-1997-shale")!.Text);

    private static double HalfLastDigit(WorkedExample example) =>
        0.5 * Math.Pow(10, Math.Floor(Math.Log10(Math.Abs(example.Result))) - example.Digits + 1);

    [GeneratedRegex("^[a-z0-9]+(-[a-z0-9]+)*$")]
    private static partial Regex Kebab();
}
