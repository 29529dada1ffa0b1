using System.Globalization;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>What the model of anisotropy did sample by sample: whom it served, whose velocities it changed, and why not the others.</summary>
internal sealed class AnisotropyTally
{
    private readonly WellSetup _setup;
    private readonly double[] _vpBefore, _vsBefore, _vp, _vs;
    private readonly Dictionary<AnisotropyLack, bool[]> _lacks = [];
    private readonly Dictionary<(short Zone, short Lithology), (AnisotropySettings Settings, int Served, int Missing, int Outside)> _counts = [];

    /// <summary>Starts counting; the velocities given are those that will be changed.</summary>
    public AnisotropyTally(WellSetup setup, PropertyTable table, double[] vp, double[] vs)
    {
        _setup = setup;
        (_vp, _vs) = (vp, vs);
        (_vpBefore, _vsBefore) = (table.Read(Property.Vp).ToArray(), table.Read(Property.Vs).ToArray());
        Changed = new bool[table.Count];
    }

    /// <summary>Samples whose velocities were changed.</summary>
    public bool[] Changed { get; }

    /// <summary>Counts a sample that has velocities and density.</summary>
    public void Add(in SettingsRun run, int sample, AnisotropyLack lack)
    {
        var (_, served, missing, outside) = _counts.GetValueOrDefault((run.Zone, run.Lithology));
        if (lack == AnisotropyLack.None) served++;
        else if (lack is AnisotropyLack.ShaleVolume or AnisotropyLack.Stoneley or AnisotropyLack.ShearLog) missing++;
        else outside++;
        _counts[(run.Zone, run.Lithology)] = (run.Settings.Anisotropy, served, missing, outside);
        if (lack == AnisotropyLack.None) return;
        if (!_lacks.TryGetValue(lack, out var marks)) _lacks.Add(lack, marks = new bool[Changed.Length]);
        marks[sample] = true;
    }

    /// <summary>Adds what was counted to the findings and the methods used.</summary>
    public void Report(LogTable logs, IReadOnlyList<SettingsRun> runs, List<LawUse> uses, List<Finding> findings)
    {
        var isotropic = new bool[Changed.Length];
        foreach (var run in runs) Array.Fill(isotropic, run.Settings.Anisotropy.IsotropicOutside.Value, run.Start, run.Length);
        foreach (var (lack, marks) in _lacks.OrderBy(l => l.Key))
        {
            var words = AnisotropySource.Words(lack);
            Find(Severity.Warning, $"[anisotropy] {words}: no moduli, no horizontal stress; the velocities stay as logged", i => marks[i] && !isotropic[i]);
            Find(Severity.Note, $"[anisotropy] {words}: taken as isotropic, as chosen; the velocities stay as logged", i => marks[i] && isotropic[i]);
        }

        foreach (var group in runs.Where(r => r.Settings.Anisotropy.IsOn).GroupBy(r => (r.Zone, r.Settings.Anisotropy.ShearWave.Value)))
        {
            var marks = new bool[Changed.Length];
            foreach (var run in group) Changed.AsSpan(run.Start, run.Length).CopyTo(marks.AsSpan(run.Start));
            Find(Severity.Note, Change(group.Key.Zone, group.Key.Value, marks), i => marks[i]);
        }

        foreach (var ((zone, lithology), (settings, served, missing, outside)) in _counts)
        {
            var outcome = new LawOutcome(served, missing, outside, 0);
            uses.AddRange(LawsOf(settings).Select(l => new LawUse(l.Slot, l.Law, zone, lithology, outcome)));
        }

        void Find(Severity severity, FormattableString text, Predicate<int> condition)
        {
            if (Finding.About(severity, text, logs.Depths, [.. Enumerable.Range(0, Changed.Length).Select(i => condition(i))]) is { } finding) findings.Add(finding);
        }
    }

    /// <summary>The entries of the catalogue that a choice of settings rests on.</summary>
    public static IEnumerable<(LawSlot Slot, Law Law)> LawsOf(AnisotropySettings settings)
    {
        if (!settings.IsOn || settings.Model.Value == AnisotropyModel.Thomsen) yield break;
        if (settings.C66 is { IsSet: true, Value: BedShearSource.Stoneley }) yield return (LawSlots.BedShear, AnisotropyMethods.Stoneley);
        if (settings.Model.Value == AnisotropyModel.Annie)
        {
            yield return (LawSlots.Anisotropy, AnisotropyMethods.Annie);
            yield break;
        }

        yield return (LawSlots.Anisotropy, AnisotropyMethods.ModifiedC11);
        yield return (LawSlots.Anisotropy, AnisotropyMethods.ModifiedC13);
    }

    private FormattableString Change(short zone, ShearWave wave, bool[] marks)
    {
        var changed = Enumerable.Range(0, marks.Length).Where(i => marks[i]).ToArray();
        if (changed.Length == 0) return $"";
        var place = zone >= 0 ? $"in zone \"{_setup.Zones[zone].Name}\"" : _setup.Zones.Count > 0 ? "outside the zones" : "in the well";
        var name = wave == ShearWave.AlongBeds ? "SH" : "SV";
        return $"velocities along the hole turned into vertical ones {place}: compressional {Percent(changed, _vp, _vpBefore)}, shear, taken as {name}, {Percent(changed, _vs, _vsBefore)} on average";
    }

    private static string Percent(int[] samples, double[] after, double[] before) =>
        string.Create(CultureInfo.InvariantCulture, $"{samples.Average(i => 100 * ((after[i] / before[i]) - 1)):+0.0;-0.0;0.0} %");
}
