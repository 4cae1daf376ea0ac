using System.Numerics;
using CaptureZone.Topology;

namespace CaptureZone.Tracing;

/// <summary>A stagnation point, and the distance within which a path has met it.</summary>
/// <param name="At">The stagnation point, m.</param>
/// <param name="Radius">The distance, m.</param>
/// <param name="Index">Its index among the field's stagnation points.</param>
internal readonly record struct Snare(Complex At, double Radius, int Index)
{
    /// <summary>A path that passes with less than this flow between itself and the point, as a share of the site's total rate, meets it.</summary>
    private const double ConnectionShare = 1e-9;

    /// <summary>Distance at which the flow near the point is probed, as a share of that to the nearest singular place.</summary>
    private const double ProbeShare = 1e-3;

    /// <summary>A path has met the point only when it is nearer to it than this share of the distance to the next one.</summary>
    private const double ShareOfNext = 0.3;

    /// <summary>
    /// Near a point of multiplicity m the discharge is c d^m, so that a flow of c d^(m+1) / (m+1) passes between a streamline at
    /// distance d and those that end in the point.
    /// </summary>
    /// <param name="stops">The field and where paths in it end.</param>
    /// <param name="point">The stagnation point.</param>
    /// <param name="index">Its index.</param>
    internal static Snare About(PathStops stops, StagnationPoint point, int index)
    {
        double probe = Math.Min(
            ProbeShare * stops.Field.DistanceToSingular(point.At), ShareOfNext * DistanceToNext(stops.Stagnation, index));
        double speed = Complex.Abs(stops.Field.DischargeAt(point.At + probe));
        int power = point.Multiplicity + 1;
        double radius = probe * Math.Pow(ConnectionShare * stops.TotalRate * power / (speed * probe), 1.0 / power);
        return new Snare(point.At, Math.Min(radius, probe), index);
    }

    private static double DistanceToNext(StagnationSet stagnation, int index)
    {
        double nearest = double.PositiveInfinity;
        for (int i = 0; i < stagnation.Points.Length; i++)
        {
            if (i != index)
            {
                nearest = Math.Min(nearest, Complex.Abs(stagnation.Points[i].At - stagnation.Points[index].At));
            }
        }

        return nearest;
    }
}
