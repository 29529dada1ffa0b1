using DepthStress.Core.Depth;

namespace DepthStress.Report;

/// <summary>Two profiles of stress to be drawn over each other, in SI.</summary>
/// <param name="Well">Name of the well.</param>
/// <param name="Frame">What the first profile's depths count from.</param>
/// <param name="Before">What the first is called.</param>
/// <param name="After">What the second is called.</param>
/// <param name="BeforeTvd">True vertical depth of the first one's samples, m.</param>
/// <param name="AfterTvd">True vertical depth of the second one's samples, m.</param>
/// <param name="Curves">The stresses in both.</param>
public sealed record ProfilePair(
    string Well, DepthFrame Frame, string Before, string After, double[] BeforeTvd, double[] AfterTvd, IReadOnlyList<ProfilePairCurve> Curves);

/// <summary>One stress in two profiles, Pa; NaN is missing.</summary>
/// <param name="Column">Id of its column.</param>
/// <param name="Before">At the first one's depths.</param>
/// <param name="After">At the second one's depths.</param>
/// <param name="Difference">The second less the first, at the first one's depths.</param>
public sealed record ProfilePairCurve(string Column, double[] Before, double[] After, double[] Difference);
