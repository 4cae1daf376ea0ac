namespace CaptureZone.Topology;

/// <summary>How far rounding can carry what is computed here.</summary>
internal static class Rounding
{
    /// <summary>Distance from 1 to the next double.</summary>
    internal const double Unit = 2.220446049250313e-16;

    /// <summary>Roundings, in units of <see cref="Unit"/>, of one term s / (z - z_j): difference, reciprocal, product, and data.</summary>
    private const double PerTerm = 8;

    /// <summary>Bound on the error of a sum of so many terms, as a share of the sum of their sizes.</summary>
    internal static double OfSum(int terms) => (terms + PerTerm) * Unit;
}
