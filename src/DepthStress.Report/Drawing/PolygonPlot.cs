using System.Globalization;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Stress;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>The plot of one depth: what friction allows, and what the model has.</summary>
internal sealed class PolygonPlot
{
    /// <summary>Room for the numbers left of the plot.</summary>
    public const double AxisWidth = 58;

    /// <summary>Room for the numbers below the plot.</summary>
    public const double AxisHeight = 32;

    private static readonly TextStyle Small = new(8);
    private static readonly TextStyle Sector = new(8.5, Palette.FaintText);

    private readonly Sheet _sheet;
    private readonly StressState _state;
    private readonly StressPolygon _polygon;
    private readonly StressPolygon _outer;
    private readonly Unit _unit;
    private readonly OxyRect _box;
    private readonly CurveScale _scale;

    public PolygonPlot(Sheet sheet, StressState state, StressPolygon polygon, StressPolygon outer, UnitSystem units, OxyRect box)
    {
        (_sheet, _state, _polygon, _outer, _box) = (sheet, state, polygon, outer, box);
        _unit = units.UnitFor(Dimension.Pressure).Unit;
        var room = 0.06 * (polygon.HighestShmax - state.Pore);
        double[] values = [state.Pore - room, polygon.HighestShmax + room, state.Shmin, state.Shmax];
        var known = values.Where(double.IsFinite).Select(_unit.FromSi).ToList();
        _scale = RoundSteps.Around(Math.Max(0, known.Min()), known.Max(), 8);
    }

    public void Draw()
    {
        var corners = _polygon.Corners.Select(c => At(c.Shmin, c.Shmax)).ToList();
        _sheet.Fill(corners, Palette.ZoneTint);
        DrawScales();
        DrawLine(Palette.FaintText, 0.6, At(_polygon.LowestShmin, _polygon.Vertical), At(_polygon.Vertical, _polygon.Vertical));
        DrawLine(Palette.FaintText, 0.6, At(_polygon.Vertical, _polygon.Vertical), At(_polygon.Vertical, _polygon.HighestShmax));
        var (low, high) = (_unit.ToSi(_scale.Left), _unit.ToSi(_scale.Right));
        DrawLine(Palette.Grid, 0.8, At(low, low), At(high, high));
        DrawOutline(_outer, PolygonMarks.Outer);
        DrawOutline(_polygon, PolygonMarks.Limit);
        _sheet.Outline(_box, new CurvePen(Palette.Frame, 0.8));
        PolygonMarks.Pore(_sheet, At(_state.Pore, _state.Pore));
        PolygonMarks.Vertical(_sheet, At(_state.Vertical, _state.Vertical));
        DrawState();
        DrawSectors();
        DrawShape();
    }

    private void DrawScales()
    {
        var (step, symbol) = ((_scale.Right - _scale.Left) / _scale.Divisions, _unit.Symbol);
        var each = Math.Max(1, (int)Math.Ceiling(_scale.Divisions * 46 / _box.Width));
        for (var i = 0; i <= _scale.Divisions; i++)
        {
            var value = _scale.Left + (i * step);
            var p = At(_unit.ToSi(value), _unit.ToSi(value));
            _sheet.Line(p.X, _box.Top, p.X, _box.Bottom, new CurvePen(Palette.Grid, 0.5));
            _sheet.Line(_box.Left, p.Y, _box.Right, p.Y, new CurvePen(Palette.Grid, 0.5));
            if (i % each != 0) continue;
            _sheet.Write(new ScreenPoint(p.X, _box.Bottom + 9), RoundSteps.Show(value, step), Small, HorizontalAlignment.Center);
            _sheet.Write(new ScreenPoint(_box.Left - 5, p.Y), RoundSteps.Show(value, step), Small, HorizontalAlignment.Right);
        }

        _sheet.Write(new ScreenPoint(_box.Left + (_box.Width / 2), _box.Bottom + 22), $"Shmin, {symbol}", Small with { Bold = true }, HorizontalAlignment.Center);
        _sheet.Write(new ScreenPoint(_box.Left - AxisWidth + 8, _box.Top + (_box.Height / 2)), $"SHmax, {symbol}", Small with { Bold = true }, HorizontalAlignment.Center, true);
    }

    private void DrawState()
    {
        if (!double.IsNaN(_state.Shmin) && !double.IsNaN(_state.Shmax)) PolygonMarks.State(_sheet, At(_state.Shmin, _state.Shmax));
        else if (_polygon.HighestShmaxAt(_state.Shmin) >= _state.Shmin)
            _sheet.Line([At(_state.Shmin, _state.Shmin), At(_state.Shmin, _polygon.HighestShmaxAt(_state.Shmin))], PolygonMarks.Range);
    }

    /// <summary>The names stand outside the polygon, beside the sector they name, where no stress can be.</summary>
    private void DrawSectors()
    {
        var (sv, low, high) = (_polygon.Vertical, _polygon.LowestShmin, _polygon.HighestShmax);
        var (normal, reverse) = ((low + sv) / 2, (sv + high) / 2);
        Put(At(normal, normal), 8, "normal", HorizontalAlignment.Left);
        Put(At(reverse, reverse), 8, "reverse", HorizontalAlignment.Left);
        Put(At((low + sv) / 2, (sv + high) / 2), -8, "strike-slip", HorizontalAlignment.Right);
    }

    /// <summary>The shape number stands where no stress can be, so that it covers nothing.</summary>
    private void DrawShape()
    {
        var shape = FaultingRegimes.ShapeNumber(_state.Vertical, _state.Shmin, _state.Shmax);
        if (!double.IsFinite(shape)) return;
        var text = string.Create(CultureInfo.InvariantCulture, $"A_phi {shape:F2}");
        var (x, y) = (_box.Right - 8, _box.Bottom - 12);
        var width = PlainText.Width(text, Small.Size, true);
        _sheet.Fill(new OxyRect(x - width - 18, y - 7, width + 20, 14), 0xFFFFFF);
        PolygonMarks.State(_sheet, new ScreenPoint(x - width - 10, y));
        _sheet.Write(new ScreenPoint(x, y), text, Small with { Bold = true, Colour = Palette.Rust }, HorizontalAlignment.Right);
    }

    private void Put(ScreenPoint beside, double away, string text, HorizontalAlignment align)
    {
        var width = PlainText.Width(text, Sector.Size, false);
        var x = align == HorizontalAlignment.Left ? beside.X + away : beside.X + away - width;
        x = Math.Clamp(x, _box.Left + 2, _box.Right - width - 2);
        var box = new OxyRect(x - 1, beside.Y - 5, width + 2, 11);
        _sheet.Fill(box, 0xFFFFFF);
        _sheet.Write(new ScreenPoint(x, beside.Y), text, Sector);
    }

    private void DrawOutline(StressPolygon polygon, CurvePen pen)
    {
        var corners = polygon.Corners.Select(c => At(c.Shmin, c.Shmax)).ToList();
        for (var i = 0; i < corners.Count; i++)
        {
            if (SegmentClip.Inside(_box, corners[i], corners[(i + 1) % corners.Count]) is var (from, to)) _sheet.Line([from, to], pen);
        }
    }

    private void DrawLine(int colour, double width, ScreenPoint from, ScreenPoint to) => _sheet.Line([from, to], new CurvePen(colour, width));

    private ScreenPoint At(double shmin, double shmax) => new(
        _box.Left + ((_unit.FromSi(shmin) - _scale.Left) / (_scale.Right - _scale.Left) * _box.Width),
        _box.Bottom - ((_unit.FromSi(shmax) - _scale.Left) / (_scale.Right - _scale.Left) * _box.Height));
}
