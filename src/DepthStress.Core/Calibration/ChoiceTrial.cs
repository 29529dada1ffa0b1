namespace DepthStress.Core.Calibration;

/// <summary>Mean Shmin of a zone with one combination of choices.</summary>
/// <param name="StaticYoungs">What gives static Young's modulus.</param>
/// <param name="StaticPoisson">What gives static Poisson's ratio.</param>
/// <param name="Biot">What gives Biot's coefficient.</param>
/// <param name="Shmin">Mean Shmin over the zone, Pa.</param>
public sealed record ChoiceTrial(string StaticYoungs, string StaticPoisson, string Biot, double Shmin);
