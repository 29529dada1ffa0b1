namespace DepthStress.Core.Rock;

/// <summary>
/// Squares of phase velocities times density at an angle from the normal of the beds: the exact roots of Christoffel's
/// equation (Mavko, Mukerji and Dvorkin 2009, The Rock Physics Handbook, 2nd ed., section on anisotropic elasticity; page from
/// memory). With a stiffness divided by density they are squares of velocities.
/// </summary>
public readonly record struct VtiVelocities
{
    /// <summary>The waves of one direction.</summary>
    /// <param name="c">The stiffness, Pa or m2/s2.</param>
    /// <param name="angle">Angle between the direction and the normal of the beds, rad.</param>
    public VtiVelocities(VtiStiffness c, double angle)
    {
        var (sin, cos) = Math.SinCos(angle);
        var (s, k) = (sin * sin, cos * cos);
        var difference = ((c.C11 - c.C44) * s) - ((c.C33 - c.C44) * k);
        var coupling = c.C13 + c.C44;
        var root = Math.Sqrt((difference * difference) + (4 * coupling * coupling * s * k));
        var sum = (c.C11 * s) + (c.C33 * k) + c.C44;
        Compressional = (sum + root) / 2;
        ShearVertical = (sum - root) / 2;
        ShearHorizontal = (c.C66 * s) + (c.C44 * k);
    }

    /// <summary>Of the compressional wave.</summary>
    public double Compressional { get; }

    /// <summary>Of the shear wave that moves in the plane of the direction and the normal of the beds (SV).</summary>
    public double ShearVertical { get; }

    /// <summary>Of the shear wave that moves along the beds (SH).</summary>
    public double ShearHorizontal { get; }

    /// <summary>Of one of the shear waves.</summary>
    public double Shear(ShearWave wave) => wave == ShearWave.AlongBeds ? ShearHorizontal : ShearVertical;
}

/// <summary>The two shear waves of rock whose beds the hole crosses obliquely; across the beds they are one.</summary>
public enum ShearWave
{
    /// <summary>SH: moves along the beds.</summary>
    AlongBeds,

    /// <summary>SV: moves in the plane of the hole and the normal of the beds.</summary>
    AcrossBeds,
}
