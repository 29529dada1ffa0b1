using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using MathNet.Numerics.Statistics;

namespace DepthStress.Files.Ingest;

/// <summary>Turns a column into SI, and catches a unit that cannot be right.</summary>
internal static class CurveUnits
{
    /// <summary>The unit of a column: the well file's word, else the file's; null when it does not fit, with the reason reported.</summary>
    public static Unit? Find(RoleChoice choice, ColumnChoice column, DiagnosticBag diagnostics)
    {
        var role = choice.Role;
        var stated = column.Source?.Unit ?? default;
        var text = stated.IsSet ? stated.Value : column.Column.Unit;
        var position = stated.IsSet ? stated.Source.Position : column.Column.Position;
        if (role.Dimensions is [Dimension.None]) return Units.One;
        if (text is { Length: > 0 } && Units.Find(text, role.Dimensions) is { } unit) return unit;

        var found = text is { Length: > 0 } ? $"the unit \"{text}\"" : "no unit";
        var message = $"column {column.Column.Name} ({role.Id}): found {found}, expected one of {Units.Symbols(role.Dimensions)}; state it in [logs.curves]: {role.Id} = {{ column = \"{column.Column.Name}\", unit = \"{Units.Of(role.Dimensions[0]).First().Symbol}\" }}";

        // A curve that nobody asked for by name and that the stresses do not rest on is left out instead.
        if (choice.Stated || IsEssential(role)) diagnostics.Error(position, message);
        else if (role.IsPosition) diagnostics.Note(position, message + "; the curve is not used");
        else diagnostics.Warning(position, message + "; the curve is not used");
        return null;
    }

    /// <summary>The column's values in SI; slowness becomes velocity, and what is no slowness is taken out with a warning.</summary>
    public static double[] ToSi(CurveRole role, ColumnChoice column, Unit unit, DiagnosticBag diagnostics)
    {
        var si = (double[])column.Column.Values.Clone();
        unit.ToSi(si);
        if (unit.Dimension != Dimension.Slowness) return si;
        var removed = 0;
        for (var i = 0; i < si.Length; i++)
        {
            if (si[i] <= 0) removed++;
            si[i] = si[i] > 0 ? 1 / si[i] : double.NaN;
        }

        if (removed > 0)
        {
            diagnostics.Warning(
                column.Column.Position,
                string.Create(CultureInfo.InvariantCulture, $"column {column.Column.Name} ({role.Id}): found {removed} slownesses of zero or less, expected them above zero: taken out"));
        }

        return si;
    }

    /// <summary>Reports a curve whose median cannot be right in its unit; an error when another unit would make it right.</summary>
    /// <returns>False when it is an error.</returns>
    public static bool Check(CurveRole role, ColumnChoice column, Unit unit, double[] si, DiagnosticBag diagnostics)
    {
        var known = Array.FindAll(si, double.IsFinite);
        if (known.Length == 0) return true;
        var median = ArrayStatistics.MedianInplace(known);
        if (median >= role.TypicalLow && median <= role.TypicalHigh) return true;

        var printed = FromSi(unit, median);
        var other = role.Dimensions.SelectMany(d => Units.Of(d)).FirstOrDefault(u => Fits(role, u, printed));
        var position = column.Source is { Unit.IsSet: true } s ? s.Unit.Source.Position : column.Column.Position;
        var text = string.Create(
            CultureInfo.InvariantCulture,
            $"column {column.Column.Name} ({role.Id}): its median is {printed:G5} {unit.Symbol}, which no {(role.Property is Property.Caliper or Property.BitSize ? "hole" : "rock")} has ({Typical(role, unit)})");
        if (other is null)
        {
            diagnostics.Warning(position, text);
            return true;
        }

        diagnostics.Error(
            position,
            string.Create(CultureInfo.InvariantCulture, $"{text}; read as {other.Symbol} it would be {FromSi(unit, ToSi(other, printed)):G5} {unit.Symbol}; state the unit in [logs.curves]: {role.Id} = {{ column = \"{column.Column.Name}\", unit = \"{other.Symbol}\" }}"));
        return false;
    }

    private static bool IsEssential(CurveRole role) => role.Property is Property.Vp or Property.Vs or Property.Density;

    private static bool Fits(CurveRole role, Unit unit, double printed)
    {
        var si = ToSi(unit, printed);
        return si >= role.TypicalLow && si <= role.TypicalHigh;
    }

    private static string Typical(CurveRole role, Unit unit)
    {
        var (a, b) = (FromSi(unit, role.TypicalLow), FromSi(unit, role.TypicalHigh));
        return string.Create(CultureInfo.InvariantCulture, $"{Math.Min(a, b):G4} to {Math.Max(a, b):G4} {unit.Symbol}");
    }

    private static double ToSi(Unit unit, double printed) => unit.Dimension == Dimension.Slowness ? 1 / unit.ToSi(printed) : unit.ToSi(printed);

    private static double FromSi(Unit unit, double si) => unit.FromSi(unit.Dimension == Dimension.Slowness ? 1 / si : si);
}
