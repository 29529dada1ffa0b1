using System.Globalization;
using System.Text;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using static DepthStress.Files.Writing.DeckNumber;

namespace DepthStress.Files.Writing;

/// <summary>What a deck starts from.</summary>
public enum DeckStart
{
    /// <summary>Stress arises from weight, pressure and strains.</summary>
    FromLoads,

    /// <summary>Stress is there and in balance with weight and pressure; nothing moves until more is loaded.</summary>
    Balanced,
}

/// <summary>
/// The column as a deck for CalculiX, an open-source finite-element program: <c>column.inp</c> and <c>column-balanced.inp</c>. SI,
/// tension positive. Eight-node elements hold one strain each; under weight and pressure that are straight lines in depth the stress
/// they give is that at their middle, exactly.
/// </summary>
public static class DeckWriter
{
    /// <summary>
    /// Pore pressure that one degree of temperature stands for, Pa. CalculiX keeps the temperatures a deck starts from as whole
    /// millionths in 32 bits (seen in its version 2.20), so pascals would not fit.
    /// </summary>
    private const double PressureDegree = 1e6;

    /// <summary>Writes a deck.</summary>
    /// <param name="column">The column.</param>
    /// <param name="settings">The settings of the layers.</param>
    /// <param name="setup">The well.</param>
    /// <param name="start">What it starts from.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(SolverColumn column, LayerSettings settings, WellSetup setup, DeckStart start, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(column);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(destination);
        using var text = new StreamWriter(destination, new UTF8Encoding(false), 1 << 16, leaveOpen: true) { NewLine = "\n" };
        var (mesh, layered) = (new DeckMesh(column, settings), settings.Deck.Value == SolverRock.Layered);
        DeckComments.Head(text, column, setup, start, layered);
        Nodes(text, mesh);
        Elements(text, mesh);
        Ties(text, mesh);
        Materials(text, column, layered);
        Initial(text, mesh, column, start);
        Step(text, mesh, column.Strains, start);
    }

    private static void Nodes(StreamWriter text, DeckMesh mesh)
    {
        DeckComments.Block(text, "Nodes: number, then m along axis 1, along axis 2, and minus the true vertical depth.");
        text.WriteLine("*NODE, NSET=NALL");
        var number = 0;
        foreach (var plane in mesh.Planes)
        {
            foreach (var (i, j) in mesh.Places())
            {
                var (x, y) = mesh.At(i, j);
                text.WriteLine($"{Whole(++number)}, {InDeck(x)}, {InDeck(y)}, {InDeck(-plane.Depth)}");
            }
        }

        Set(text, "X0", mesh, (i, _) => i == 0);
        Set(text, "X1", mesh, (i, _) => i == mesh.Nx);
        Set(text, "Y0", mesh, (_, j) => j == 0);
        Set(text, "Y1", mesh, (_, j) => j == mesh.Ny);
        Numbers(text, "*NSET, NSET=BASE", mesh.Bases.SelectMany(p => mesh.Places().Select(at => mesh.Node(p, at.I, at.J))));
        Numbers(text, "*NSET, NSET=TOP", mesh.Tops.SelectMany(p => mesh.Places().Select(at => mesh.Node(p.Plane, at.I, at.J))));
    }

    private static void Set(StreamWriter text, string name, DeckMesh mesh, Func<int, int, bool> holds) => Numbers(
        text, "*NSET, NSET=" + name, Enumerable.Range(0, mesh.Planes.Count).SelectMany(p => mesh.Places().Where(at => holds(at.I, at.J)).Select(at => mesh.Node(p, at.I, at.J))));

    private static void Numbers(StreamWriter text, string head, IEnumerable<int> numbers)
    {
        text.WriteLine(head);
        foreach (var line in numbers.Chunk(12)) text.WriteLine(string.Join(", ", line.Select(Whole)) + ",");
    }

    private static void Elements(StreamWriter text, DeckMesh mesh)
    {
        DeckComments.Block(text, $"Elements: {Whole(DeckMesh.SlicesPerLayer)} slices in each layer, a set for each layer, named by its number in layers.csv.");
        var number = 0;
        ColumnLayer? last = null;
        foreach (var slice in mesh.Slices)
        {
            if (slice.Layer != last) text.WriteLine($"*ELEMENT, TYPE=C3D8, ELSET=LAYER{Whole(slice.Layer.Number)}");
            last = slice.Layer;
            foreach (var nodes in mesh.Elements(slice)) text.WriteLine($"{Whole(++number)}, {string.Join(", ", nodes.Select(Whole))}");
        }

        text.WriteLine("*ELSET, ELSET=EALL, GENERATE");
        text.WriteLine($"1, {Whole(number)}, 1");
        var top = 0;
        foreach (var (plane, _) in mesh.Tops)
        {
            var slice = mesh.Slices.TakeWhile(s => s.Above != plane).Count();
            text.WriteLine($"*ELSET, ELSET=UNDERTOP{Whole(++top)}, GENERATE");
            text.WriteLine($"{Whole((slice * mesh.PerSlice) + 1)}, {Whole((slice + 1) * mesh.PerSlice)}, 1");
        }
    }

    private static void Ties(StreamWriter text, DeckMesh mesh)
    {
        if (mesh.Ties.Count == 0) return;
        DeckComments.Block(text, "Pressure jumps between layers, so each has nodes of its own there; these equations make both move as one.");
        text.WriteLine("*EQUATION");
        foreach (var (upper, lower) in mesh.Ties)
        {
            foreach (var (i, j) in mesh.Places())
            {
                for (var axis = 1; axis <= 3; axis++)
                {
                    if ((axis == 1 && (i == 0 || i == mesh.Nx)) || (axis == 2 && (j == 0 || j == mesh.Ny))) continue; // the sides are held there
                    text.WriteLine($"2\n{Whole(mesh.Node(upper, i, j))}, {Whole(axis)}, 1., {Whole(mesh.Node(lower, i, j))}, {Whole(axis)}, -1.");
                }
            }
        }
    }

    private static void Materials(StreamWriter text, SolverColumn column, bool layered)
    {
        DeckComments.Material(text, layered);
        foreach (var layer in column.Layers)
        {
            var number = Whole(layer.Number);
            var rock = VtiConstants.Of(layer.Rock.Stiffness);
            text.WriteLine($"*MATERIAL, NAME=ROCK{number}");
            if (layered)
            {
                var (h, v, cross, g) = (InDeck(rock.Horizontal), InDeck(rock.Vertical), InDeck(rock.PoissonCross), InDeck(rock.ShearVertical));
                text.WriteLine($"*ELASTIC, TYPE=ENGINEERING CONSTANTS\n{h}, {h}, {v}, {InDeck(rock.PoissonHorizontal)}, {cross}, {cross}, {InDeck(layer.Rock.Stiffness.C66)}, {g}\n{g}");
            }
            else
            {
                text.WriteLine($"*ELASTIC\n{InDeck(rock.Vertical)}, {InDeck(rock.PoissonVertical)}");
            }

            text.WriteLine($"*DENSITY\n{InDeck(layer.Density)}");
            text.WriteLine(layered
                ? $"*EXPANSION, TYPE=ORTHO, ZERO=0.\n{InDeck(Along(layer.Rock, rock))}, {InDeck(Along(layer.Rock, rock))}, {InDeck(Across(layer.Rock, rock))}"
                : $"*EXPANSION, ZERO=0.\n{InDeck(Across(layer.Rock, rock))}");
            text.WriteLine($"*SOLID SECTION, ELSET=LAYER{number}, MATERIAL=ROCK{number}");
        }
    }

    /// <summary>Expansion along the beds per degree of pressure: <c>a_h (1 - nu_hh)/Eh - a_v nu_v/Ev</c> (identity).</summary>
    private static double Along(PorousRock porous, VtiConstants rock) => PressureDegree
        * ((porous.BiotHorizontal * (1 - rock.PoissonHorizontal) / rock.Horizontal) - (porous.BiotVertical * rock.PoissonVertical / rock.Vertical));

    /// <summary>Expansion across the beds per degree of pressure: <c>(a_v - 2 nu_v a_h)/Ev</c>, for isotropic rock <c>a/(3 K)</c> (identity).</summary>
    private static double Across(PorousRock porous, VtiConstants rock) => PressureDegree
        * (porous.BiotVertical - (2 * rock.PoissonVertical * porous.BiotHorizontal)) / rock.Vertical;

    private static void Initial(StreamWriter text, DeckMesh mesh, SolverColumn column, DeckStart start)
    {
        DeckComments.Initial(text, start);
        text.WriteLine("*INITIAL CONDITIONS, TYPE=TEMPERATURE");
        if (start == DeckStart.FromLoads) text.WriteLine("NALL, 0.");
        else Pressures(text, mesh);
        if (start == DeckStart.FromLoads && column.Layers.All(l => l.ClosingShmin == 0 && l.ClosingShmax == 0)) return;
        text.WriteLine("*INITIAL CONDITIONS, TYPE=STRESS");
        var number = 0;
        foreach (var slice in mesh.Slices)
        {
            var (layer, middle) = (slice.Layer, 0.5 * (mesh.Planes[slice.Above].Depth + mesh.Planes[slice.Below].Depth));
            var (x, y, z) = start == DeckStart.FromLoads
                ? (-layer.ClosingShmax, -layer.ClosingShmin, 0)
                : (-layer.Shmax(middle, column.Strains), -layer.Shmin(middle, column.Strains), -layer.Vertical(middle));
            var stress = $"{InDeck(x)}, {InDeck(y)}, {InDeck(z)}, 0., 0., 0.";
            for (var e = 0; e < mesh.PerSlice; e++)
            {
                number++;
                for (var point = 1; point <= 8; point++) text.WriteLine($"{Whole(number)}, {Whole(point)}, {stress}");
            }
        }
    }

    private static void Pressures(StreamWriter text, DeckMesh mesh)
    {
        for (var p = 0; p < mesh.Planes.Count; p++)
        {
            foreach (var (i, j) in mesh.Places()) text.WriteLine($"{Whole(mesh.Node(p, i, j))}, {InDeck(mesh.Planes[p].Pore / PressureDegree)}");
        }
    }

    private static void Step(StreamWriter text, DeckMesh mesh, FarField strains, DeckStart start)
    {
        var loads = start == DeckStart.FromLoads;
        DeckComments.Step(text, strains, start);
        text.WriteLine("*STEP\n*STATIC");
        text.WriteLine("*BOUNDARY\nX0, 1, 1, 0.\nY0, 2, 2, 0.\nBASE, 3, 3, 0.");
        text.WriteLine($"X1, 1, 1, {InDeck(loads ? -strains.AlongShmax * mesh.Extent : 0)}");
        text.WriteLine($"Y1, 2, 2, {InDeck(loads ? -strains.AlongShmin * mesh.Extent : 0)}");
        if (loads)
        {
            DeckComments.Block(text, "Pore pressure, MPa, as temperature of the nodes.");
            text.WriteLine("*TEMPERATURE");
            Pressures(text, mesh);
        }

        DeckComments.Block(text, "Weight, and the vertical stress on top of each stretch of layers that touch, Pa.");
        text.WriteLine($"*DLOAD\nEALL, GRAV, {InDeck(Constants.StandardGravity)}, 0., 0., -1.");
        var top = 0;
        foreach (var (_, layer) in mesh.Tops) text.WriteLine($"UNDERTOP{Whole(++top)}, P2, {InDeck(layer.VerticalTop)}");
        DeckComments.Block(text, "Printed: stress at the integration points of every element, the displacement of the tops.");
        text.WriteLine("*EL PRINT, ELSET=EALL\nS, COORD\n*NODE PRINT, NSET=TOP\nU\n*NODE FILE\nU\n*EL FILE\nS\n*END STEP");
    }

    private static string Whole(int value) => value.ToString(CultureInfo.InvariantCulture);
}
