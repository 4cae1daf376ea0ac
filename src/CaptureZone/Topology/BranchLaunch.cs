using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Topology;

/// <summary>
/// Where the branches of a stagnation point begin. Near a point of multiplicity m, W = c (z - z0)^m, so that the 2 (m + 1) branches
/// leave at angles (k pi - arg c) / (m + 1): even k flow out, odd k flow in.
/// </summary>
internal static class BranchLaunch
{
    /// <summary>Distance of the launch, as a share of the distance to the nearest singular place or other stagnation point.</summary>
    private const double LaunchShare = 1e-2;

    /// <summary>Points on the circle from which the leading coefficient is taken.</summary>
    private const int RingPoints = 16;

    /// <summary>Corrections that put the launch on the dividing streamline.</summary>
    private const int Corrections = 4;

    /// <summary>
    /// A correction by more than this share of the launch's distance is rounding of the flow: so near to the point a streamline is straight.
    /// </summary>
    private const double MostShiftShare = 0.05;

    /// <summary>Flow by which a companion stands off a branch, as a share of the total rate: well above what makes a connection.</summary>
    private const double CompanionShare = 1e-7;

    /// <summary>A companion stands off by no more than this share of the distance between launch and stagnation point.</summary>
    private const double MostCompanionShare = 0.05;

    /// <summary>Where the branches of a stagnation point begin, in their order.</summary>
    /// <param name="field">The field.</param>
    /// <param name="points">All its stagnation points.</param>
    /// <param name="index">The one that is meant.</param>
    internal static Complex[] Of(FlowField field, IReadOnlyList<StagnationPoint> points, int index)
    {
        StagnationPoint point = points[index];
        double distance = LaunchShare * Clearance(field, points, index);
        Complex leading = LeadingCoefficient(field, point, distance);
        int count = 2 * (point.Multiplicity + 1);
        Complex[] launches = new Complex[count];
        for (int k = 0; k < count; k++)
        {
            double angle = (k * Math.PI - leading.Phase) / (point.Multiplicity + 1);
            launches[k] = OnStreamline(field, point.At, point.At + Complex.FromPolarCoordinates(distance, angle));
        }

        return launches;
    }

    /// <summary>A point beside a branch, as far off that a set small share of the site's water passes between.</summary>
    /// <param name="field">The field.</param>
    /// <param name="point">The stagnation point, m.</param>
    /// <param name="launch">Where the branch begins, m.</param>
    /// <param name="totalRate">The site's total rate, m3/d.</param>
    /// <param name="side">1 on the left of the flow, -1 on its right.</param>
    internal static Complex Companion(FlowField field, Complex point, Complex launch, double totalRate, int side)
    {
        Complex discharge = field.DischargeAt(launch);
        double speed = Complex.Abs(discharge);
        double offset = Math.Min(CompanionShare * totalRate / speed, MostCompanionShare * Complex.Abs(launch - point));
        return launch + new Complex(0, side) * discharge / speed * offset;
    }

    private static double Clearance(FlowField field, IReadOnlyList<StagnationPoint> points, int index)
    {
        double clearance = field.DistanceToSingular(points[index].At);
        for (int i = 0; i < points.Count; i++)
        {
            if (i != index)
            {
                clearance = Math.Min(clearance, Complex.Abs(points[i].At - points[index].At));
            }
        }

        return clearance;
    }

    /// <summary>The mean of W / (z - z0)^m over a circle is its Taylor coefficient.</summary>
    private static Complex LeadingCoefficient(FlowField field, StagnationPoint point, double radius)
    {
        Complex sum = Complex.Zero;
        for (int i = 0; i < RingPoints; i++)
        {
            Complex offset = Complex.FromPolarCoordinates(radius, 2 * Math.PI * i / RingPoints);
            sum += Complex.Conjugate(field.DischargeAt(point.At + offset)) / Complex.Pow(offset, point.Multiplicity);
        }

        return sum / RingPoints;
    }

    /// <summary>No water passes between a stagnation point and its dividing streamlines: moves the launch until that is so.</summary>
    private static Complex OnStreamline(FlowField field, Complex point, Complex launch)
    {
        for (int i = 0; i < Corrections; i++)
        {
            Complex discharge = field.DischargeAt(launch);
            double between = field.FluxAcross(point, launch);
            double speed = Complex.Abs(discharge), shift = between / speed;
            if (!(Math.Abs(shift) <= MostShiftShare * Complex.Abs(launch - point)))
            {
                break;
            }

            // The flow across the segment grows by |Q| for each metre that the launch lies to the left of the streamline.
            launch -= Complex.ImaginaryOne * discharge / speed * shift;
        }

        return launch;
    }
}
