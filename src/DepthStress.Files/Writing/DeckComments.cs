using System.Globalization;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>The comments of a deck, in ASCII: what each block is, and the caution.</summary>
internal static class DeckComments
{
    private const int Width = 100;

    public static void Head(StreamWriter text, SolverColumn column, WellSetup setup, DeckStart start, bool layered)
    {
        var azimuth = setup.Settings.HorizontalStress.ShmaxAzimuth;
        var heading = azimuth.IsSet
            ? $"{Units.Degree.FromSi(azimuth.Value).ToString("F3", CultureInfo.InvariantCulture)} degrees from the north of the survey"
            : "at an azimuth that the well file does not state";
        Block(text, $"DepthStress, {CellText.Ascii(setup.Name)}: layers of {(layered ? "rock with flat beds" : "isotropic rock")} as a column for CalculiX.");
        Block(text, $"Caution. {Caution.Text} Total stresses by the thermal analogy, linear elasticity only.");
        Block(text, $"SI units (m, kg, s, Pa), tension positive; only temperature, which stands for pore pressure, is in MPa. Axis 1 runs along SHmax, {heading}; axis 2 along Shmin; axis 3 points up, its zero is the datum ({setup.Frame.Datum.Name()}).");
        Block(text, start == DeckStart.FromLoads
            ? "Stress arises from weight, pore pressure and one pair of lateral strains."
            : "Stress is there from the beginning, in balance with weight and pore pressure, and the sides are held: nothing moves until more is loaded. To change pore pressure, add *TEMPERATURE with the new pressures in MPa to the step.");
        Block(text, column.Strains.Known
            ? $"Lateral strains, compression positive: {DeckNumber.Exact(column.Strains.AlongShmax)} along SHmax, {DeckNumber.Exact(column.Strains.AlongShmin)} along Shmin."
            : "No lateral strains are chosen: the column has none, and its stress along axis 1 is no estimate of SHmax.");
        if (column.Blocks.Count > 1)
            Block(text, "Layers without values are left out: the column stands in several stretches, each with the profile's vertical stress on its top.");
    }

    public static void Material(StreamWriter text, bool layered) => Block(text, layered
        ? "Materials: Young's moduli along axes 1, 2, 3; Poisson's ratios 12, 13, 23 (vertical strain under horizontal load: nu_v Eh/Ev); shear moduli 12, 13, 23. Expansion per MPa of pressure is 1e6 times a_h (1 - nu_hh)/Eh - a_v nu_v/Ev along the beds and (a_v - 2 nu_v a_h)/Ev across them, a being Biot's coefficient."
        : "Materials: Young's modulus and Poisson's ratio that carry the layer's mean horizontal stress. Expansion per MPa of pressure is 1e6 times Biot's coefficient over three bulk moduli.");

    public static void Initial(StreamWriter text, DeckStart start) => Block(text, start == DeckStart.FromLoads
        ? "Before loading there is no pressure. Where the profile's stress is not that of the one pair of strains (strains of a zone's own, heat, a stress ratio, salt), initial stress closes the gap; layers.csv states it."
        : "Before loading: pressure, MPa, as temperature, and total stress at the eight points of every element (11, 22, 33, 12, 13, 23).");

    public static void Step(StreamWriter text, FarField strains, DeckStart start) => Block(text, start == DeckStart.FromLoads && strains.Known
        ? "The step: base held vertically, top free to move vertically, sides moved by the lateral strains."
        : "The step: base held vertically, top free to move vertically, sides held.");

    public static void Block(StreamWriter text, string comment)
    {
        var line = "**";
        foreach (var word in comment.Split(' '))
        {
            if (line.Length + 1 + word.Length > Width)
            {
                text.WriteLine(line);
                line = "**";
            }

            line += " " + word;
        }

        text.WriteLine(line);
    }
}
