using System.Collections.Immutable;
using NetTopologySuite.Geometries;

namespace CaptureZone.Flow;

/// <summary>Lines of equal head and the interval between them.</summary>
/// <param name="Contours">From low to high; a head without a line within the extent is left out.</param>
/// <param name="Interval">Interval between the heads, m; 0 where the head is the same everywhere or the aquifer dry.</param>
public sealed record HeadContourMap(ImmutableArray<HeadContour> Contours, double Interval);

/// <summary>
/// Lines of equal head in a frame, at round heads. Every vertex lies on its head to <see cref="LevelLine.Residual"/>; none lies
/// where the aquifer is dry.
/// </summary>
public static class HeadContours
{
    /// <summary>How many contours a map should have, about: enough to read, few enough to label.</summary>
    private const double Wanted = 14;

    /// <summary>Share of the nodes at either end that has no say in the interval: the cones at the screens.</summary>
    private const double IntervalTail = 0.02;

    /// <summary>Share of the nodes at either end beyond which no contour is drawn: rings too tight to be told apart.</summary>
    private const double ContourTail = 0.002;

    /// <summary>A range of heads, m, that no water level can show: no contours.</summary>
    private const double LeastRange = 1e-6;

    /// <summary>Finds the contours.</summary>
    /// <param name="field">The flow.</param>
    /// <param name="extent">The frame, m.</param>
    /// <param name="headUnit">The unit in which the heads should be round, m: 1 or 0.3048.</param>
    public static HeadContourMap Find(FlowField field, Envelope extent, double headUnit)
    {
        if (extent.IsNull || extent.Width <= 0 || extent.Height <= 0)
        {
            return new HeadContourMap([], 0);
        }

        HeadGrid grid = HeadGrid.Over(field, extent);
        double[] heads = grid.SortedHeads();
        if (heads.Length == 0 || Quantile(heads, 1 - IntervalTail) - Quantile(heads, IntervalTail) < LeastRange)
        {
            return new HeadContourMap([], 0);
        }

        RoundInterval interval = RoundInterval.Closest(
            (Quantile(heads, 1 - IntervalTail) - Quantile(heads, IntervalTail)) / headUnit / Wanted);
        LevelLines lines = new(field, grid);
        return new HeadContourMap(
            [
                .. interval.Multiples(Quantile(heads, ContourTail) / headUnit, Quantile(heads, 1 - ContourTail) / headUnit)
                    .Select(head => new HeadContour(head * headUnit, lines.At(head * headUnit)))
                    .Where(contour => !contour.Lines.IsEmpty),
            ],
            interval.Value * headUnit);
    }

    private static double Quantile(double[] sorted, double share) => sorted[(int)(share * (sorted.Length - 1))];
}
