using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

namespace DepthStress.Core.Model;

/// <summary>Brings the columns and parameters that a law needs.</summary>
internal static class LawColumns
{
    private static readonly double[] Missing = [double.NaN];

    /// <summary>The inputs of a law for one run of samples.</summary>
    public static LawInputs For(Law law, PropertyTable table, SettingsRun run) => For(law, table, run, p => p);

    /// <summary>The inputs of a law for one run of samples, each from the column that stands in for its own.</summary>
    public static LawInputs For(Law law, PropertyTable table, SettingsRun run, Func<Property, Property> standIn)
    {
        var inputs = default(LawInputs);
        foreach (var input in law.Inputs) inputs.Add(Column(standIn(input.Property), table, run));
        return inputs;
    }

    /// <summary>The inputs of a law for some samples of a run.</summary>
    public static LawInputs At(Law law, PropertyTable table, SettingsRun run, int[] samples)
    {
        var inputs = default(LawInputs);
        foreach (var input in law.Inputs)
        {
            var column = Column(input.Property, table, run);
            if (column.Length != run.Length || LawParameters.Of(input.Property) is not null)
            {
                inputs.Add(column);
                continue;
            }

            var gathered = new double[samples.Length];
            for (var k = 0; k < gathered.Length; k++) gathered[k] = column[samples[k] - run.Start];
            inputs.Add(gathered);
        }

        return inputs;
    }

    /// <summary>Makes the slowness columns that a law of these runs asks for.</summary>
    public static void Derive(PropertyTable table, IReadOnlyList<SettingsRun> runs)
    {
        var wanted = runs.Select(r => r.Settings).Distinct<StageSettings>(ReferenceEqualityComparer.Instance)
            .SelectMany(s => LawSlots.All.Select(slot => slot.Choice(s)).Where(c => c.IsSet))
            .SelectMany(c => c.Value.Inputs).Select(i => i.Property).ToHashSet();
        foreach (var settings in runs.Select(r => r.Settings.PorePressure).Distinct(ReferenceEqualityComparer.Instance).Cast<PorePressureSettings>())
        {
            if (settings.Method.IsSet && ShaleMethod.Of(settings.Method.Value) is { } method) wanted.Add(method.Log);
        }

        Derive(table, wanted);
    }

    /// <summary>Makes every slowness column, for laws that nobody has chosen yet.</summary>
    public static void DeriveAll(PropertyTable table) => Derive(table, [Property.CompressionalSlowness, Property.ShearSlowness]);

    private static void Derive(PropertyTable table, HashSet<Property> wanted)
    {
        Invert(table, Property.Vp, Property.CompressionalSlowness, wanted);
        Invert(table, Property.Vs, Property.ShearSlowness, wanted);
    }

    /// <summary>The column of a property for one run of samples, or the one value of a parameter; missing when there is none.</summary>
    public static ReadOnlySpan<double> Column(Property property, PropertyTable table, SettingsRun run)
    {
        if (LawParameters.Of(property) is { } parameter) return new[] { parameter.Value(run.Settings) };
        return table.Has(property) ? table.Read(property).Slice(run.Start, run.Length) : Missing;
    }

    private static void Invert(PropertyTable table, Property velocity, Property slowness, HashSet<Property> wanted)
    {
        if (!wanted.Contains(slowness) || !table.Has(velocity)) return;
        var from = table.Read(velocity);
        var to = table.Write(slowness);
        for (var i = 0; i < to.Length; i++) to[i] = 1 / from[i];
    }
}
