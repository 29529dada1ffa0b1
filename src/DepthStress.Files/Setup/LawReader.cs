using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Prediction;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Setup;

/// <summary>The keys of a law whose coefficients the user gives.</summary>
internal sealed record LawParts(
    Setting<string> Shape,
    Setting<double> Factor,
    Setting<double> Exponent,
    Setting<double> Offset,
    Setting<Property> Input,
    Setting<string> InputUnit,
    Setting<string> Unit);

/// <summary>
/// Reads the choice of a law: a catalogue id, a constant, or a table with the user's own coefficients
/// (<c>{ law = "linear", factor, offset, input }</c> or <c>{ law = "power", factor, exponent, input, input_unit, unit }</c>).
/// </summary>
internal static class LawReader
{
    private static readonly (string Word, string Value)[] Shapes = [("linear", "linear"), ("power", "power")];

    private static readonly string[] OfPowerLaws = ["exponent", "input_unit"];

    private static readonly string[] OfLinearLaws = ["offset"];

    /// <summary>Reads one choice; null when it is wrong, with the reason reported.</summary>
    public static Law? Read(TomlNode node, string key, Property predicts, DiagnosticBag diagnostics)
    {
        switch (node)
        {
            case TomlText text when Words.StartsNumber(text.Value):
                return Constant(text, key, predicts, diagnostics);
            case TomlText text:
                return FromCatalogue(text, key, predicts, diagnostics);
            case TomlNumber number when PropertyNames.Dimension(predicts) is Dimension.None or Dimension.Fraction:
                return Constant(number, key, predicts, Units.Of(PropertyNames.Dimension(predicts)).First(), number.Value, diagnostics);
            case TomlTable table:
                var section = new ReadingSection(table, key, diagnostics, new WrongKeys());
                var law = UserGiven(section, key, predicts, diagnostics);
                section.ReportUnknown();
                return law;
            default:
                diagnostics.Error(node.Position, $"found {node.Kind}, expected {key} = a method id, {ConstantWords(predicts)} or a table with law = \"linear\" or \"power\"");
                return null;
        }
    }

    /// <summary>Declares the keys of a law of the user's own.</summary>
    public static LawParts Parts(ISection s, Property predicts) => Parts(s, predicts, t => t.Choice(
        "input",
        Setting.Default(PropertyNames.UsualInput(predicts)),
        [.. PropertyNames.LawInputsBefore(predicts).Select(p => (PropertyNames.Name(p), p))],
        $"the property it starts from, by default {PropertyNames.Name(PropertyNames.UsualInput(predicts))}"));

    private static LawParts Parts(ISection s, Property predicts, Func<ISection, Setting<Property>> input) => new(
        s.Choice("law", default, Shapes, "shape of the relation"),
        s.Number("factor", default, Interval.All, "the factor"),
        s.Number("exponent", default, Interval.All, "the exponent of a power law"),
        s.Quantity("offset", default, Sign.Any, PropertyNames.Dimension(predicts), "what a linear law adds"),
        input(s),
        s.Text("input_unit", default, "power: the unit of the input that the factor holds for"),
        s.Text("unit", default, "the unit of the result; a power law's factor holds for it"));

    private static Law? FromCatalogue(TomlText text, string key, Property predicts, DiagnosticBag diagnostics)
    {
        if (TrainedRelation.For(predicts) is { } trained && text.Value == trained.Id) return trained;
        var ids = MethodCatalogue.For(predicts).Select(l => l.Id).Append(TrainedRelation.For(predicts)?.Id).OfType<string>().ToList();
        if (MethodCatalogue.Find(text.Value) is { } law)
        {
            if (law.Predicts == predicts) return law;
            diagnostics.Error(text.Position, $"found \"{law.Id}\", which gives {PropertyNames.Title(law.Predicts)}; expected {key} = a method for {PropertyNames.Title(predicts)}: {MethodCatalogue.Choices(predicts)}");
            return null;
        }

        diagnostics.Error(text.Position, $"found the unknown method \"{Words.Short(text.Value)}\", expected {key} = one of {MethodCatalogue.Choices(predicts)}{NearestName.Hint(text.Value, ids)}");
        return null;
    }

    private static Law? Constant(TomlText text, string key, Property predicts, DiagnosticBag diagnostics)
    {
        var dimension = PropertyNames.Dimension(predicts);
        if (!QuantityText.TryParse(text.Value, [dimension], out var si, out var unit, out var problem))
        {
            diagnostics.Error(text.Position, $"{key}: {problem}");
            return null;
        }

        return Constant(text, key, predicts, unit, unit.FromSi(si), diagnostics);
    }

    private static Law? Constant(TomlNode node, string key, Property predicts, Unit unit, double value, DiagnosticBag diagnostics)
    {
        var law = UserLaw.Constant(predicts, unit, value);
        if (law.ResultDomain.Contains(value)) return law;
        diagnostics.Error(node.Position, $"found {node.Kind}, expected {key} {Words.Within(law.ResultDomain)}");
        return null;
    }

    private static Law? UserGiven(ReadingSection section, string key, Property predicts, DiagnosticBag diagnostics)
    {
        var (shape, factor, exponent, offset, input, inputSymbol, symbol) = Parts(section, predicts, s => InputProperty(s, key, predicts, diagnostics));
        var inputUnit = Unit(inputSymbol, "input_unit", PropertyNames.Dimension(input.Value), diagnostics);
        var unit = Unit(symbol, "unit", PropertyNames.Dimension(predicts), diagnostics);
        if (!shape.IsSet && section.SourceOf("law") == SettingSource.NotSet) Missing("law", "\"linear\" or \"power\"");
        if (!factor.IsSet && section.SourceOf("factor") == SettingSource.NotSet) Missing("factor", "a number");
        if (!shape.IsSet) return null;
        foreach (var unused in shape.Value == "linear" ? OfPowerLaws : OfLinearLaws)
        {
            if (section.SourceOf(unused) is { Kind: not SettingKind.NotSet } source)
                diagnostics.Error(source.Position, $"{key}: found {unused}, which a {shape.Value} law does not have");
        }

        if (shape.Value == "linear")
        {
            if (PropertyNames.Dimension(input.Value) != PropertyNames.Dimension(predicts))
            {
                var (found, wanted) = (PropertyNames.Dimension(input.Value), PropertyNames.Dimension(predicts));
                diagnostics.Error(section.Position, $"{key}: found a linear law from {PropertyNames.Title(input.Value)} ({QuantityText.Name(found)}), expected an input of the same kind as the result ({QuantityText.Name(wanted)}), or law = \"power\" with input_unit and unit");
                return null;
            }

            if (!factor.IsSet) return null;

            var si = Units.Of(PropertyNames.Dimension(predicts)).First();
            var shown = unit ?? si;
            return UserLaw.Linear(predicts, shown, Input(input.Value, shown), factor.Value, offset.IsSet ? shown.FromSi(offset.Value) : 0);
        }

        if (PropertyNames.Dimension(predicts) == Dimension.None) unit ??= Units.One;
        if (PropertyNames.Dimension(input.Value) == Dimension.None) inputUnit ??= Units.One;
        if (section.SourceOf("exponent") == SettingSource.NotSet) Missing("exponent", "a number");
        if (inputUnit is null && section.SourceOf("input_unit") == SettingSource.NotSet) Missing("input_unit", $"a unit, since the factor depends on it: {Units.Symbols(PropertyNames.Dimension(input.Value))}");
        if (unit is null && section.SourceOf("unit") == SettingSource.NotSet) Missing("unit", $"a unit, since the factor depends on it: {Units.Symbols(PropertyNames.Dimension(predicts))}");
        if (!factor.IsSet || !exponent.IsSet || unit is null || inputUnit is null) return null;

        return UserLaw.Power(predicts, unit, Input(input.Value, inputUnit), factor.Value, exponent.Value);

        void Missing(string part, string expected) => diagnostics.Error(section.Position, $"{key}: {part} is not set; expected {expected}");
    }

    private static LawInput Input(Property property, Unit unit) => new(PropertyNames.Name(property), property, unit);

    private static Unit? Unit(Setting<string> text, string key, Dimension dimension, DiagnosticBag diagnostics)
    {
        if (!text.IsSet) return null;
        if (Units.Find(text.Value, dimension) is { } unit) return unit;
        diagnostics.Error(text.Source.Position, $"found the unit \"{text.Value}\", expected {key} = one of {Units.Symbols(dimension)}");
        return null;
    }

    /// <summary>What a law starts from: anything the chain knows before the law's result.</summary>
    private static Setting<Property> InputProperty(ISection section, string key, Property predicts, DiagnosticBag diagnostics)
    {
        var usual = Setting.Default(PropertyNames.UsualInput(predicts));
        var text = section.Text("input", default, "the property it starts from");
        if (!text.IsSet) return usual;
        var known = PropertyNames.LawInputsBefore(predicts).ToList();
        var names = known.ConvertAll(PropertyNames.Name);
        if (PropertyNames.Find(text.Value) is not { } property)
        {
            diagnostics.Error(text.Source.Position, $"found \"{text.Value}\", expected input = one of {Words.Quoted(names)}{NearestName.Hint(text.Value, names)}");
            return usual;
        }

        if (known.Contains(property)) return new Setting<Property>(property, text.Source);
        var reason = property == predicts ? "which is what the law gives" : $"which is not known yet where {PropertyNames.Title(predicts)} is computed";
        diagnostics.Error(text.Source.Position, $"{key}: found the input \"{text.Value}\", {reason}; expected one of {Words.Quoted(names)}");
        return usual;
    }

    private static string ConstantWords(Property predicts) =>
        PropertyNames.Dimension(predicts) is Dimension.None or Dimension.Fraction
            ? "a number"
            : $"a quantity with a unit ({Units.Symbols(PropertyNames.Dimension(predicts))})";
}
