using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Finds what is wrong with the choice of comparison relations.</summary>
internal static class ComparisonCheck
{
    /// <summary>Reports the problems of one scope.</summary>
    public static void Report(CheckScope scope)
    {
        var compare = scope.Settings.HorizontalStress.Compare;
        if (!compare.IsSet) return;
        var seen = new HashSet<string>();
        foreach (var choice in compare.Value)
        {
            if (!choice.Method.IsSet)
            {
                scope.Error(choice.Position, $"{LawSlots.Comparison.Key}: method is not set; expected one of {MethodCatalogue.Choices(Property.ComparisonShmin)}");
                continue;
            }

            var law = choice.Method.Value;
            if (!seen.Add(law.Id)) scope.Error(choice.Position, $"{LawSlots.Comparison.Key}: found \"{law.Id}\" twice, expected each method once");
            SetupCheck.ReportRecalled(scope.Setup, LawSlots.Comparison, law, choice.Position, scope.Error);
            var ratio = law.Inputs.FirstOrDefault(i => i.Property == Property.MatrixStressRatio);
            if (ratio is null && choice.Ratio.IsSet)
                scope.Error(choice.Position, $"{LawSlots.Comparison.Key}: found a ratio for \"{law.Id}\", expected none: it takes no ratio");
            else if (ratio is not null && !choice.Ratio.IsSet)
                scope.Error(choice.Position, $"{LawSlots.Comparison.Key}: \"{law.Id}\" needs a ratio of your own, as in {{ method = \"{law.Id}\", ratio = ... }}");
            else if (ratio is not null && !ratio.Domain.Contains(choice.Ratio.Value))
                scope.Error(choice.Position, FormattableString.Invariant($"{LawSlots.Comparison.Key}: found a ratio of {choice.Ratio.Value} for \"{law.Id}\", expected one from {ratio.Domain.Low} to {ratio.Domain.High}"));
        }
    }
}
