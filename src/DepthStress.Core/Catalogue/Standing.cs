namespace DepthStress.Core.Catalogue;

/// <summary>What a method's coefficients rest on.</summary>
public enum Standing
{
    /// <summary>The coefficients were read in the named source.</summary>
    Confirmed,

    /// <summary>The relation follows from algebra or from a definition.</summary>
    Identity,

    /// <summary>The coefficients were recalled, not read; usable only with <c>accept_unverified = true</c>.</summary>
    FromMemory,

    /// <summary>The user gave the coefficients.</summary>
    UserGiven,

    /// <summary>The coefficients were fitted to the well's own samples.</summary>
    Trained,
}

/// <summary>The rocks a method was made for.</summary>
[Flags]
public enum RockKinds
{
    /// <summary>Sandstone.</summary>
    Sandstone = 1,

    /// <summary>Shale and other mudrock.</summary>
    Shale = 2,

    /// <summary>Limestone.</summary>
    Limestone = 4,

    /// <summary>Dolomite.</summary>
    Dolomite = 8,

    /// <summary>Any sedimentary rock.</summary>
    Any = Sandstone | Shale | Limestone | Dolomite,

    /// <summary>Igneous and metamorphic rock.</summary>
    Crystalline = 16,

    /// <summary>Anhydrite and salt.</summary>
    Evaporite = 32,
}

/// <summary>What the expected number of a worked example rests on.</summary>
public enum ExampleBasis
{
    /// <summary>Printed in the named source.</summary>
    Printed,

    /// <summary>Follows from algebra, whatever the coefficients' source.</summary>
    Identity,

    /// <summary>Computed from the formula as written; checks the code, not the formula.</summary>
    SelfComputed,
}
