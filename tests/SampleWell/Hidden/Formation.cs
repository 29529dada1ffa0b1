namespace SampleWell.Hidden;

/// <summary>What a formation mostly is; it chooses the laws of the hidden rock.</summary>
public enum RockKind
{
    /// <summary>Mudrock.</summary>
    Shale,

    /// <summary>Quartz sandstone with shale beds.</summary>
    Sand,

    /// <summary>Lime mud and clay.</summary>
    Marl,

    /// <summary>Limestone with tight and porous beds.</summary>
    Limestone,
}

/// <summary>The recipe of one formation.</summary>
/// <param name="Name">Its invented name.</param>
/// <param name="Kind">What it mostly is.</param>
/// <param name="Top">Measured depth of its top, m.</param>
/// <param name="Shale">Mean shale volume of its ordinary beds.</param>
/// <param name="ShaleSpread">Standard deviation of the shale volume from bed to bed.</param>
/// <param name="ShaleTrend">Change of the mean shale volume from top to base.</param>
/// <param name="BedThickness">Median thickness of a bed along the hole, m.</param>
/// <param name="OddShare">Share of beds that are something else: sandy in shale, shaly in sand and limestone.</param>
/// <param name="OddShale">Mean shale volume of those beds.</param>
/// <param name="Porosity">Mean porosity of its shale-free part.</param>
/// <param name="PorositySpread">Standard deviation of that porosity from bed to bed.</param>
/// <param name="Calcite">Share of calcite in its shale-free solid; the rest is quartz.</param>
/// <param name="Biot">Mean of Biot's coefficient.</param>
public sealed record Formation(
    string Name, RockKind Kind, double Top, double Shale, double ShaleSpread, double ShaleTrend, double BedThickness,
    double OddShare, double OddShale, double Porosity, double PorositySpread, double Calcite, double Biot);
