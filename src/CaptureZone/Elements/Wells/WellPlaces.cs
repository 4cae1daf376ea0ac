using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;

namespace CaptureZone.Elements.Wells;

/// <summary>
/// Where the wells stand, filled up to whole lanes, and what the three ways of summing over them share. Order of summation, the
/// same in all three: well j adds to partial sum j mod 4, in the order of the wells, and the sum is (s0 + s1) + (s2 + s3).
/// Products and sums stay apart (no fused multiply-add), so that every machine gives the same bits.
/// </summary>
/// <param name="x">Eastings, m.</param>
/// <param name="y">Northings, m.</param>
internal readonly ref struct WellPlaces(ReadOnlySpan<double> x, ReadOnlySpan<double> y)
{
    /// <summary>Partial sums, and doubles in a vector.</summary>
    public const int Lanes = 4;

    /// <summary>A squared distance, m2, below which a point is on the axis: keeps the reciprocal finite, so that 0 x 1/r2 is 0.</summary>
    public const double OnAxis = 1e-200;

    /// <summary>Of discharge per rate and reciprocal distance.</summary>
    public const double OneOverTwoPi = 1 / (2 * Math.PI);

    /// <summary>Of potential per rate and logarithm of squared distance.</summary>
    public const double OneOverFourPi = 1 / (4 * Math.PI);

    /// <summary>Eastings, m; a multiple of <see cref="Lanes"/> of them.</summary>
    public ReadOnlySpan<double> X { get; } = x;

    /// <summary>Northings, m.</summary>
    public ReadOnlySpan<double> Y { get; } = y;

    /// <summary>1 / r2, finite on the axis too.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Vector256<double> Reciprocal(Vector256<double> r2) =>
        Vector256<double>.One / Vector256.MaxNative(r2, Vector256.Create(OnAxis));

    /// <summary>(s0 + s1) + (s2 + s3).</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Total(Vector256<double> partial)
    {
        Vector128<double> low = partial.GetLower(), high = partial.GetUpper();
        return (low.GetElement(0) + low.GetElement(1)) + (high.GetElement(0) + high.GetElement(1));
    }

    /// <summary>Four values from an index on.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Vector256<double> Load(ReadOnlySpan<double> from, int j) => Vector256.Create(from.Slice(j, Lanes));

    /// <summary>The strengths of four wells; zero past the last.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Vector256<double> LoadStrength(ReadOnlySpan<double> strength, int j) =>
        j + Lanes <= strength.Length ? Load(strength, j) : LoadLast(strength[j..]);

    private static Vector256<double> LoadLast(ReadOnlySpan<double> rest) => rest.Length switch
    {
        1 => Vector256.CreateScalar(rest[0]),
        2 => Vector128.Create(rest).ToVector256(),
        _ => Vector256.Create(Vector128.Create(rest), Vector128.CreateScalar(rest[2])),
    };
}
