namespace DepthStress.Core.Catalogue;

/// <summary>Applies a law to columns: SI in, published units inside, SI out.</summary>
public static class LawKernel
{
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

        Span<double> values = stackalloc double[LawInputs.Most];
        values = values[..inputs.Count];
        int evaluated = 0, missing = 0, outsideDomain = 0, outsideRange = 0;
        for (var i = 0; i < destination.Length; i++)
        {
            var state = Gather(law, inputs, i, values);
            if (state == State.Missing)
            {
                destination[i] = double.NaN;
                missing++;
                continue;
            }

            var result = state == State.OutsideDomain ? double.NaN : law.Evaluate(values);
            if (!law.ResultDomain.Contains(result) || !double.IsFinite(result))
            {
                destination[i] = double.NaN;
                outsideDomain++;
                continue;
            }

            destination[i] = law.Unit.ToSi(result);
            evaluated++;
            if (state == State.OutsideRange) outsideRange++;
        }

        return new LawOutcome(evaluated, missing, outsideDomain, outsideRange);
    }

    private enum State
    {
        Good,
        OutsideRange,
        OutsideDomain,
        Missing,
    }

    private static State Gather(Law law, LawInputs inputs, int sample, Span<double> values)
    {
        var state = State.Good;
        for (var k = 0; k < values.Length; k++)
        {
            var column = inputs[k];
            var si = column.Length == 1 ? column[0] : column[sample];
            if (double.IsNaN(si)) return State.Missing;
            var input = law.Inputs[k];
            var value = input.Unit.FromSi(si);
            values[k] = value;
            if (!input.Domain.Contains(value)) state = State.OutsideDomain;
            else if (state == State.Good && !input.Range.Contains(value)) state = State.OutsideRange;
        }

        return state;
    }
}
