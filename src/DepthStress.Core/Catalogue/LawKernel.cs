namespace DepthStress.Core.Catalogue;

/// <summary>Applies a law to columns: SI in, published units inside, SI out.</summary>
public static class LawKernel
{
    /// <summary>Samples that are worked on together: what they need stays in the nearest cache.</summary>
    private const int Block = 128;

    /// <summary>
    /// Evaluates the law for every sample. NaN in gives NaN out; a value outside the law's domain gives NaN.
    /// </summary>
    /// <param name="law">The law.</param>
    /// <param name="inputs">Its columns, each as long as the destination or of length one.</param>
    /// <param name="destination">The results, SI; may be one of the input columns.</param>
    /// <returns>How many samples got a result, and why the others did not.</returns>
    /// <exception cref="ArgumentException">The number of columns or their lengths do not fit.</exception>
    public static LawOutcome Apply(Law law, LawInputs inputs, Span<double> destination)
    {
        ArgumentNullException.ThrowIfNull(law);
        if (inputs.Count != law.Inputs.Count) throw new ArgumentException("The law has another number of inputs.", nameof(inputs));
        for (var k = 0; k < inputs.Count; k++)
        {
            if (inputs[k].Length != 1 && inputs[k].Length != destination.Length)
                throw new ArgumentException("A column is not as long as the destination.", nameof(inputs));
        }

        Span<double> values = stackalloc double[LawInputs.Most * Block];
        Span<State> states = stackalloc State[Block];
        var outcome = default(LawOutcome);
        for (var start = 0; start < destination.Length; start += Block)
        {
            var results = destination.Slice(start, Math.Min(Block, destination.Length - start));
            if (inputs.Count == 1 && inputs[0].Length == destination.Length && VectorForms.TryApply(law, inputs[0].Slice(start, results.Length), values, results))
            {
                outcome += new LawOutcome(results.Length, 0, 0, 0);
                continue;
            }

            states.Clear();
            for (var k = 0; k < inputs.Count; k++)
            {
                var column = inputs[k].Length == 1 ? inputs[k] : inputs[k].Slice(start, results.Length);
                Gather(law.Inputs[k], column, values[k..], inputs.Count, states[..results.Length]);
            }

            outcome += Evaluate(law, values, inputs.Count, states, results);
        }

        return outcome;
    }

    private enum State : byte
    {
        Good,
        OutsideRange,
        OutsideDomain,
        Missing,
    }

    /// <summary>Puts one input of a block, in its published unit, beside the others of each sample, and keeps the worst state.</summary>
    private static void Gather(LawInput input, ReadOnlySpan<double> column, Span<double> values, int step, Span<State> states)
    {
        var (unit, domain, range) = (input.Unit, input.Domain, input.Range);
        double offset = unit.Offset, factor = unit.Factor;
        var single = column.Length == 1;
        for (int i = 0, at = 0; i < states.Length; i++, at += step)
        {
            var si = column[single ? 0 : i];
            var value = (si - offset) / factor;
            values[at] = value;
            if (domain.Contains(value) && range.Contains(value)) continue;
            var state = double.IsNaN(si) ? State.Missing : domain.Contains(value) ? State.OutsideRange : State.OutsideDomain;
            if (state > states[i]) states[i] = state;
        }
    }

    private static LawOutcome Evaluate(Law law, ReadOnlySpan<double> values, int step, ReadOnlySpan<State> states, Span<double> results)
    {
        var (formula, domain) = (law.Formula, law.ResultDomain);
        var coefficients = law.Values;
        double offset = law.Unit.Offset, factor = law.Unit.Factor;
        int evaluated = 0, missing = 0, outsideDomain = 0, outsideRange = 0;
        for (int i = 0, at = 0; i < results.Length; i++, at += step)
        {
            var state = states[i];
            if (state < State.OutsideDomain)
            {
                var result = formula(values.Slice(at, step), coefficients);
                if (domain.Contains(result) && double.IsFinite(result))
                {
                    results[i] = (result * factor) + offset;
                    evaluated++;
                    if (state == State.OutsideRange) outsideRange++;
                    continue;
                }
            }

            results[i] = double.NaN;
            if (state == State.Missing) missing++;
            else outsideDomain++;
        }

        return new LawOutcome(evaluated, missing, outsideDomain, outsideRange);
    }
}
