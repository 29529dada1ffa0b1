using System.Globalization;
using System.Text;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;
using DepthStress.Report.Page;

namespace DepthStress.Report;

/// <summary><c>report.html</c>: results, pictures and what they rest on, in one file that asks the network for nothing.</summary>
public static class ReportPage
{
    /// <summary>Writes the page: UTF-8, the same bytes for the same content.</summary>
    /// <param name="content">What it shows.</param>
    /// <param name="destination">Gets the page; stays open.</param>
    public static void Write(ReportContent content, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(content);
        ArgumentNullException.ThrowIfNull(destination);
        var (model, units) = (content.Model, content.Pictures.Units);
        var bins = Bins.Of(model.Count);
        var parts = new Dictionary<string, string>
        {
            ["script-hash"] = WebFiles.Hash(WebFiles.Script),
            ["style-hash"] = WebFiles.Hash(WebFiles.Style),
            ["style"] = WebFiles.Style,
            ["script"] = WebFiles.Script,
            ["well"] = Html.Text(model.Setup.Name),
            ["extent"] = Html.Text(Extent(model, units)),
            ["surfaces"] = Html.Text(PageTexts.Surfaces(model.Setup.Frame, units)),
            ["caution"] = Html.Text(Caution.Text),
            ["summary"] = Summary(content),
            ["bins"] = bins.PerRow == 1 ? "" : Html.Paragraph(string.Create(CultureInfo.InvariantCulture, $"Too many samples for one page: curves are drawn, and the crosshair reads, in {bins.Rows} bins of {bins.PerRow} samples, each with its least and greatest value. No extreme is lost; depth.csv has every sample."), "notice"),
            ["zones"] = ResultTables.Zones(model, content.Zones, units),
            ["choices"] = ResultTables.Choices(model, content.Sensitivities, units),
            ["spread"] = ResultTables.Spread(content, units),
            ["solver"] = Solver(content),
            ["layers"] = ResultTables.Layers(content.Layers, units),
            ["observations"] = ResultTables.Observations(content.Comparisons, units),
            ["remarks"] = content.Remarks.Count > 0 ? Html.List(content.Remarks, "") : "",
            ["findings"] = Html.List(content.Findings, "Nothing was found that a reader must know."),
            ["curves"] = SourceTables.Curves(model, units),
            ["methods"] = SourceTables.Methods(model, units),
            ["inputs"] = SourceTables.Inputs(content.Inputs, units),
            ["version"] = Html.Text(content.Version),
            ["tracks-picture"] = Picture(content.Drawn.Tracks),
            ["stress-picture"] = Picture(content.Drawn.Stress),
            ["layers-picture"] = Picture(content.Drawn.Layers),
            ["polygon-picture"] = Picture(content.Drawn.Polygon),
            ["data"] = new PageData(content).Write(PageTrack.Of(model, content.Pictures), content.Comparisons),
        };
        using var writer = new StreamWriter(destination, new UTF8Encoding(false), leaveOpen: true) { NewLine = "\n" };
        Fill(WebFiles.Frame, parts, writer);
    }

    /// <summary>Writes the frame with its parts; what a part holds is never looked at for places again.</summary>
    private static void Fill(string frame, Dictionary<string, string> parts, StreamWriter writer)
    {
        var at = 0;
        for (var open = frame.IndexOf("{{", StringComparison.Ordinal); open >= 0; open = frame.IndexOf("{{", at, StringComparison.Ordinal))
        {
            var close = frame.IndexOf("}}", open, StringComparison.Ordinal);
            writer.Write(frame.AsSpan(at, open - at));
            writer.Write(parts[frame[(open + 2)..close]]);
            at = close + 2;
        }

        writer.Write(frame.AsSpan(at));
    }

    private static string Summary(ReportContent content)
    {
        var barriers = content.Barriers.Count > 0
            ? content.Barriers
            : ["No zone is marked as a target, so no stress barriers are looked for (target = true in a zone)."];
        return string.Concat(barriers.Select(b => Html.Paragraph(b, "barrier")))
            + string.Concat(Targets.Uncertainty(content).Select(b => Html.Paragraph(b)))
            + Html.Paragraph(StressWords.Of(content.Model, content.Pictures.Units))
            + Html.Paragraph(Targets.Basis(content.Model))
            + Html.List(content.Observed, "No observation was given: nothing but the logs and the choices speaks for these stresses.");
    }

    private static string Solver(ReportContent content)
    {
        if (content.Solved is not { } blocks) return Html.Paragraph("No layer has all that a solver needs, so none was solved and no deck was written.");
        var loop = ClosedLoop.Of(content.Layers, blocks);
        return string.Concat(SolverWords.Of(loop, blocks, content.Pictures.Units).Select(s => Html.Paragraph(s))) + ResultTables.Solved(loop, content.Pictures.Units);
    }

    private static string Extent(EarthModel model, UnitSystem units)
    {
        var md = model.Values.Read(Property.MeasuredDepth);
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        string Show(double si) => units.Show(Quantity.Length(si));
        return string.Create(CultureInfo.InvariantCulture, $"{model.Count} samples, {Show(md[0])} to {Show(md[^1])} measured depth, {Show(tvd[0])} to {Show(tvd[^1])} true vertical depth below the {PageTexts.Datum(model.Setup.Frame)}");
    }

    private static string Picture(ReadOnlySpan<byte> svg) => "data:image/svg+xml;base64," + Convert.ToBase64String(svg);
}
