namespace DepthStress.Core.Borehole;

/// <summary>Whether the fluid enters the rock before the hole wall breaks down.</summary>
public enum BreakdownFluid
{
    /// <summary>It stays in the hole (mud with a filter cake, or tight rock): Hubbert and Willis 1957.</summary>
    NonPenetrating,

    /// <summary>It flows into the rock and loads its pores: Haimson and Fairhurst 1967.</summary>
    Penetrating,
}
