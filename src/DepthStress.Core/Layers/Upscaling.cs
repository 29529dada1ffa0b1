using DepthStress.Core.Rock;

namespace DepthStress.Core.Layers;

/// <summary>
/// Thin flat layers as one rock. Stiffness by Backus 1962 for layers that are themselves alike in every direction along the beds
/// (an identity; Berryman, Grechka and Berge 1997 for isotropic ones), with &lt; &gt; the mean over thickness:
/// <c>C33 = 1/&lt;1/c33&gt;, C13 = &lt;c13/c33&gt; C33, C11 = &lt;c11 - c13^2/c33&gt; + C13^2/C33</c>, C12 likewise,
/// <c>C44 = 1/&lt;1/c44&gt;, C66 = &lt;c66&gt;</c>. Biot's coefficients carry the layers' mean of a p (identity):
/// <c>A_v = &lt;a_v p/c33&gt; / (&lt;1/c33&gt; &lt;p&gt;), A_h = (&lt;a_h p&gt; - &lt;c13 a_v p/c33&gt;)/&lt;p&gt; + &lt;c13/c33&gt; A_v</c>. Under one
/// vertical stress and one pair of lateral strains the rock then carries the mean horizontal stresses of its layers exactly.
/// </summary>
public sealed class Upscaling
{
    private double _weight, _compliance, _ratio, _plane11, _plane12, _shearCompliance, _shear;
    private double _pressure, _pressureCompliance, _pressureRatio, _pressureAlong;
    private double _plainCompliance, _plainRatio, _plainAlong;

    /// <summary>Adds a thin layer.</summary>
    /// <param name="thickness">True vertical thickness, m; above 0.</param>
    /// <param name="c">Its stiffness, Pa.</param>
    /// <param name="biotVertical">Biot's coefficient across the beds.</param>
    /// <param name="biotHorizontal">Biot's coefficient along the beds.</param>
    /// <param name="pore">Pore pressure, Pa.</param>
    public void Add(double thickness, VtiStiffness c, double biotVertical, double biotHorizontal, double pore)
    {
        var ratio = c.C13 / c.C33;
        _weight += thickness;
        _compliance += thickness / c.C33;
        _ratio += thickness * ratio;
        _plane11 += thickness * (c.C11 - (c.C13 * ratio));
        _plane12 += thickness * (c.C12 - (c.C13 * ratio));
        _shearCompliance += thickness / c.C44;
        _shear += thickness * c.C66;
        _pressure += thickness * pore;
        _pressureCompliance += thickness * biotVertical * pore / c.C33;
        _pressureRatio += thickness * ratio * biotVertical * pore;
        _pressureAlong += thickness * biotHorizontal * pore;
        _plainCompliance += thickness * biotVertical / c.C33;
        _plainRatio += thickness * ratio * biotVertical;
        _plainAlong += thickness * biotHorizontal;
    }

    /// <summary>The rock of the layers added so far; null when there is none or its stiffness is not stable.</summary>
    public PorousRock? Result()
    {
        var c33 = _weight / _compliance;
        var ratio = _ratio / _weight;
        var c13 = ratio * c33;
        var c11 = (_plane11 / _weight) + (c13 * ratio);
        var c66 = _shear / _weight;
        var stiffness = new VtiStiffness(c11, c13, c33, _weight / _shearCompliance, c66);
        // A mean pressure of zero gives no weight to a p; the coefficients are then those of equal pressure.
        var (across, along, cross, by) = _pressure != 0
            ? (_pressureCompliance, _pressureAlong, _pressureRatio, _pressure)
            : (_plainCompliance, _plainAlong, _plainRatio, _weight);
        var vertical = across * _weight / (_compliance * by);
        var rock = new PorousRock(stiffness, vertical, ((along - cross) / by) + (ratio * vertical));
        return _weight > 0 && stiffness.IsStable && double.IsFinite(rock.BiotVertical) && double.IsFinite(rock.BiotHorizontal) ? rock : null;
    }
}
