using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Setup;

/// <summary>
/// Reads the choice of a law: a catalogue id, a constant, or a table with the user's own coefficients
/// (<c>{ law = "linear", factor, offset, input }</c> or <c>{ law = "power", factor, exponent, input, input_unit, unit }</c>).
/// </summary>
internal static class LawReader
{
    private static readonly (string Word, string Value)[] Shapes = [("linear", "linear"), ("power", "power")];

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
                var section = new ReadingSection(table, key, diagnostics);
                var law = UserGiven(section, key, predicts, diagnostics);
                section.ReportUnknown();
                return law;
            default:
                diagnostics.Error(node.Position, $"found {node.Kind}, expected {key} = a method id, {ConstantWords(predicts)} or a table with law = \"linear\" or \"power\"");
                return null;
        }
    }

    private static Law? FromCatalogue(TomlText text, string key, Property predicts, DiagnosticBag diagnostics)
    {
        var ids = MethodCatalogue.For(predicts).Select(l => l.Id).ToList();
        if (MethodCatalogue.Find(text.Value) is { } law)
        {
            if (law.Predicts == predicts) return law;
            diagnostics.Error(text.Position, $"found \"{law.Id}\", which gives {PropertyNames.Title(law.Predicts)}; expected {key} = a method for {PropertyNames.Title(predicts)}: {MethodCatalogue.Choices(predicts)}");
            return null;
        }

        diagnostics.Error(text.Position, $"found the unknown method \"{text.Value}\", expected {key} = one of {MethodCatalogue.Choices(predicts)}{NearestName.Hint(text.Value, ids)}");
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
        var shape = section.Choice("law", default, Shapes, "shape of the relation");
        var factor = section.Number("factor", default, Interval.All, "the factor");
        var exponent = section.Number("exponent", default, Interval.All, "the exponent of a power law");
        var offset = section.Quantity("offset", default, Sign.Any, PropertyNames.Dimension(predicts), "what a linear law adds");
        var input = InputProperty(section, key, predicts, diagnostics);
        var inputUnit = Unit(section, "input_unit", PropertyNames.Dimension(input.Value), diagnostics);
        var unit = Unit(section, "unit", PropertyNames.Dimension(predicts), diagnostics);
        if (!shape.IsSet || !factor.IsSet)
        {
            diagnostics.Error(section.Position, $"{key}: expected law = \"linear\" or \"power\", and factor");
            return null;
        }

        if (shape.Value == "linear")
        {
            if (PropertyNames.Dimension(input.Value) != PropertyNames.Dimension(predicts))
            {
                diagnostics.Error(section.Position, $"{key}: a linear law needs an input of the same kind of quantity; use law = \"power\" with input_unit and unit");
                return null;
            }

            var si = Units.Of(PropertyNames.Dimension(predicts)).First();
            var shown = unit ?? si;
            return UserLaw.Linear(predicts, shown, Input(input.Value, shown), factor.Value, offset.IsSet ? shown.FromSi(offset.Value) : 0);
        }

        if (!exponent.IsSet || unit is null || inputUnit is null)
        {
            diagnostics.Error(section.Position, $"{key}: a power law needs exponent, unit and input_unit, since its factor depends on them");
            return null;
        }

        return UserLaw.Power(predicts, unit, Input(input.Value, inputUnit), factor.Value, exponent.Value);
    }

    private static LawInput Input(Property property, Unit unit) => new(PropertyNames.Name(property), property, unit);

    private static Unit? Unit(ReadingSection section, string key, Dimension dimension, DiagnosticBag diagnostics)
    {
        var text = section.Text(key, default, "a unit");
        if (!text.IsSet) return null;
        if (Units.Find(text.Value, dimension) is { } unit) return unit;
        diagnostics.Error(text.Source.Position, $"found the unit \"{text.Value}\", expected {key} = one of {Units.Symbols(dimension)}");
        return null;
    }

    /// <summary>What a law starts from: anything the chain knows before the law's result.</summary>
    private static Setting<Property> InputProperty(ReadingSection section, string key, Property predicts, DiagnosticBag diagnostics)
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
