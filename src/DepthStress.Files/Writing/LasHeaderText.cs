using System.Text;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// The sections of a LAS 2.0 file before its data. Each line is <c>MNEM.UNIT DATA : DESCRIPTION</c>: the first point ends the
/// mnemonic, the unit follows it without a blank, the last colon starts the description.
/// </summary>
internal static class LasHeaderText
{
    /// <summary>The header, up to and with the title of the data section.</summary>
    public static string Of(EarthModel model, IReadOnlyList<NumberColumn<EarthModel>> columns, UnitSystem units)
    {
        var text = new StringBuilder();
        text.Append("~VERSION INFORMATION\n");
        Line(text, "VERS", "", "2.0", "CWLS LOG ASCII STANDARD - VERSION 2.0");
        Line(text, "WRAP", "", "NO", "ONE LINE PER DEPTH STEP");
        Well(text, model, columns[0], units);
        text.Append("~CURVE INFORMATION\n");
        foreach (var column in columns) Line(text, Mnemonic(column), UnitOf(column.In(units).Unit), "", column.Title);
        Parameters(text, model.Setup, units);
        Other(text);
        text.Append("~ASCII LOG DATA\n");
        return text.ToString();
    }

    private static string Mnemonic(NumberColumn<EarthModel> column) => column.Id == "md" ? "DEPT" : column.Id.ToUpperInvariant();

    /// <summary>Lengths in the standard's own spelling, M and FT; all else as the unit table spells it.</summary>
    private static string UnitOf(Unit unit) => unit.Dimension == Dimension.Length ? unit.Symbol.ToUpperInvariant() : unit.Symbol;

    private static void Well(StringBuilder text, EarthModel model, NumberColumn<EarthModel> index, UnitSystem units)
    {
        var unit = UnitOf(index.In(units).Unit);
        var (start, stop, step) = LasIndex.Of(model, index, units);
        text.Append("~WELL INFORMATION\n");
        Line(text, "STRT", unit, start, "START DEPTH");
        Line(text, "STOP", unit, stop, "STOP DEPTH");
        Line(text, "STEP", unit, step, "STEP, 0 WHEN UNEVEN");
        Line(text, "NULL", "", ResultsLas.Null, "NULL VALUE");
        Line(text, "COMP", "", "", "COMPANY");
        Line(text, "WELL", "", CellText.Ascii(model.Setup.Name), "WELL");
        Line(text, "FLD", "", "", "FIELD");
        Line(text, "LOC", "", "", "LOCATION");
        Line(text, "PROV", "", "", "PROVINCE");
        Line(text, "CNTY", "", "", "COUNTY");
        Line(text, "STAT", "", "", "STATE");
        Line(text, "CTRY", "", "", "COUNTRY");
        Line(text, "SRVC", "", "", "SERVICE COMPANY");
        Line(text, "DATE", "", "", "LOG DATE");
        Line(text, "UWI", "", "", "UNIQUE WELL ID");
    }

    private static void Parameters(StringBuilder text, WellSetup setup, UnitSystem units)
    {
        var length = DepthStatement.Length(units);
        text.Append("~PARAMETER INFORMATION\n");
        Line(text, "PDAT", "", "MEAN SEA LEVEL", "permanent datum");
        Line(text, "DATUM", "", setup.Frame.Datum.Name().ToUpperInvariant(), "surface at which DEPT and TVD are zero");
        Line(text, "DEPTH_KIND", "", "MEASURED DEPTH", "what DEPT counts, along the hole below the datum");
        foreach (var (name, meaning, metres) in DepthStatement.Surfaces(setup.Frame))
            Line(text, name.ToUpperInvariant(), UnitOf(length.Unit), DepthStatement.Show(metres, length), meaning);
    }

    private static void Other(StringBuilder text)
    {
        text.Append("~OTHER\n");
        foreach (var sentence in Caution.Text.Split(". "))
            text.Append(' ').Append(sentence).Append(sentence.EndsWith('.') ? "\n" : ".\n");
        text.Append(" Stresses and pressures are total, compression positive.\n");
        foreach (var (name, meaning) in DepthStatement.Kinds)
            text.Append(' ').Append(name == "md" ? "DEPT" : name.ToUpperInvariant()).Append(" is ").Append(meaning).Append(".\n");
    }

    private static void Line(StringBuilder text, string mnemonic, string unit, string data, string description) =>
        text.Append(' ').Append(mnemonic.PadRight(23)).Append('.').Append(unit.PadRight(8)).Append(' ').Append(data.PadRight(16))
            .Append(" : ").Append(description).Append('\n');
}
