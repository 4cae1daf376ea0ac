using System.Runtime.Intrinsics;

namespace CaptureZone.Elements.Wells;

/// <summary>
/// Flow of wells across a segment, a lane a well: each sends q / 2 pi times the angle under which it sees the segment. With
/// c = a x b and d = a . b, the ends seen from the well, the angle is atan2(c, d). Where d is not negative for any well its tangent
/// is halved three times, tan(v / 2) = tan v / (1 + sqrt(1 + tan^2 v)), the first by c / (|c + i d| + d), and the rest is the series
/// of the arc tangent: below 0.2, twelve terms give all digits.
/// </summary>
internal static class WellsAcrossSegment
{
    /// <summary>Terms of the series.</summary>
    private const int Terms = 12;

    /// <summary>Three times halved.</summary>
    private const double Halvings = 8;

    /// <summary>The sum of q x angle, radians m3/d.</summary>
    /// <param name="wells">The wells.</param>
    /// <param name="ax">Start east, m.</param>
    /// <param name="ay">Start north, m.</param>
    /// <param name="bx">End east, m.</param>
    /// <param name="by">End north, m.</param>
    /// <param name="strength">Rates, m3/d.</param>
    public static double RateTimesAngle(
        in WellPlaces wells, double ax, double ay, double bx, double by, ReadOnlySpan<double> strength)
    {
        Vector256<double> sum = default;
        for (int j = 0; j < strength.Length; j += WellPlaces.Lanes)
        {
            Vector256<double> x = WellPlaces.Load(wells.X, j), y = WellPlaces.Load(wells.Y, j);
            Vector256<double> fromX = Vector256.Create(ax) - x, fromY = Vector256.Create(ay) - y;
            Vector256<double> toX = Vector256.Create(bx) - x, toY = Vector256.Create(by) - y;
            Vector256<double> cross = fromX * toY - fromY * toX, dot = fromX * toX + fromY * toY;
            Vector256<double> angle = Vector256.GreaterThanAll(dot, Vector256<double>.Zero) ? Acute(cross, dot) : Any(cross, dot);
            sum += WellPlaces.LoadStrength(strength, j) * angle;
        }

        return WellPlaces.Total(sum);
    }

    private static Vector256<double> Acute(Vector256<double> cross, Vector256<double> dot)
    {
        Vector256<double> tangent = cross / (Vector256.Sqrt(cross * cross + dot * dot) + dot);
        tangent = Half(Half(tangent));
        Vector256<double> square = tangent * tangent, series = Vector256<double>.Zero;
        for (int n = Terms - 1; n >= 0; n--)
        {
            series = Vector256.Create((n % 2 == 0 ? 1.0 : -1.0) / (2 * n + 1)) + square * series;
        }

        return Halvings * tangent * series;
    }

    private static Vector256<double> Half(Vector256<double> tangent) =>
        tangent / (Vector256<double>.One + Vector256.Sqrt(Vector256<double>.One + tangent * tangent));

    private static Vector256<double> Any(Vector256<double> cross, Vector256<double> dot) => Vector256.Create(
        Math.Atan2(cross[0], dot[0]), Math.Atan2(cross[1], dot[1]), Math.Atan2(cross[2], dot[2]), Math.Atan2(cross[3], dot[3]));
}
