namespace DepthStress.Report;

/// <summary>
/// The colours of the pictures, 0xRRGGBB. Curves that share a track stay apart for readers with protanopia and deuteranopia,
/// by lightness first, by hue second. A test holds this with the simulation of Vienot, Brettel and Mollon 1999.
/// </summary>
internal static class Palette
{
    public const int Ink = 0x22313F;
    public const int Rust = 0xB5472B;
    public const int Teal = 0x17907F;
    public const int Gold = 0xD3A012;
    public const int Plum = 0x6B3FA0;
    public const int Sky = 0x3E95D6;
    public const int Grey = 0x8A9199;

    public const int Paper = 0xFFFFFF;
    public const int Text = 0x1E2A33;
    public const int FaintText = 0x5A666F;
    public const int Grid = 0xD9DEDF;
    public const int DepthGrid = 0xCBD2D4;
    public const int Frame = 0x7B878D;
    public const int ZoneTint = 0xF4F6F1;
    public const int ZoneMark = 0xB9C4B4;
    public const int ZoneEdge = 0xA7B0A2;

    /// <summary>A colour halfway to paper.</summary>
    public static int Light(int colour) => ((((colour & 0xFEFEFE) >> 1) + 0x7F7F7F) & 0xFFFFFF);
}
