using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Topology;

/// <summary>
/// Stagnation points so close together that the water between them is rounding of the site's water, as one of their number: what
/// no path can tell apart would otherwise decide where paths end.
/// </summary>
internal static class CloseStagnation
{
    /// <summary>Water between two points that no path can tell apart, as a share of the site's total rate: a thousand times its rounding.</summary>
    private const double WaterShare = 1e-12;

    /// <summary>Points that are joined are nearer to each other than this share of the distance to the nearest singular place.</summary>
    private const double NearShare = 1e-2;

    /// <summary>Joins points that are close together.</summary>
    /// <param name="field">The field.</param>
    /// <param name="stagnation">Its stagnation points.</param>
    /// <param name="totalRate">The site's total rate, m3/d.</param>
    internal static StagnationSet Joined(FlowField field, StagnationSet stagnation, double totalRate)
    {
        List<StagnationPoint> points = [.. stagnation.Points];
        for (int i = 0; i < points.Count; i++)
        {
            for (int k = points.Count - 1; k > i; k--)
            {
                if (AreOne(field, points[i].At, points[k].At, WaterShare * totalRate))
                {
                    points[i] = Join(field, points[i], points[k]);
                    points.RemoveAt(k);
                }
            }
        }

        return points.Count == stagnation.Points.Length ? stagnation : stagnation with { Points = [.. points] };
    }

    /// <summary>Between two zeros the discharge is largest about half-way.</summary>
    private static bool AreOne(FlowField field, Complex a, Complex b, double water)
    {
        double apart = Complex.Abs(b - a);
        Complex middle = (a + b) / 2;
        return apart <= NearShare * field.DistanceToSingular(middle) && Complex.Abs(field.DischargeAt(middle)) * apart <= water;
    }

    private static StagnationPoint Join(FlowField field, StagnationPoint a, StagnationPoint b)
    {
        int number = a.Multiplicity + b.Multiplicity;
        Complex mean = (a.Multiplicity * a.At + b.Multiplicity * b.At) / number;
        return a with { At = mean, Multiplicity = number, Head = field.HeadAt(mean) };
    }
}
