namespace DepthStress.Core.Depth;

/// <summary>A vector by its parts north, east and down; of length one when it is the direction of a hole.</summary>
internal readonly record struct Heading(double North, double East, double Down)
{
    public double Length => Math.Sqrt((North * North) + (East * East) + (Down * Down));

    public double Inclination => Math.Atan2(Math.Sqrt((North * North) + (East * East)), Down);

    public double Azimuth => Normalised(Math.Atan2(East, North));

    public static Heading Of(double inclination, double azimuth)
    {
        var (sine, cosine) = Math.SinCos(inclination);
        var (east, north) = Math.SinCos(azimuth);
        return new(sine * north, sine * east, cosine);
    }

    /// <summary>The same direction between 0 (included) and 2 pi (left out).</summary>
    public static double Normalised(double azimuth)
    {
        var turned = azimuth - (Math.Tau * Math.Floor(azimuth / Math.Tau));
        return turned < Math.Tau ? turned : 0;
    }

    public static Heading operator +(Heading a, Heading b) => new(a.North + b.North, a.East + b.East, a.Down + b.Down);

    public static Heading operator -(Heading a, Heading b) => new(a.North - b.North, a.East - b.East, a.Down - b.Down);

    public static Heading operator *(double k, Heading a) => new(k * a.North, k * a.East, k * a.Down);
}
