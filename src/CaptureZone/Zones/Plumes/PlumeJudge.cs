using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Algorithm.Locate;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones.Plumes;

/// <summary>
/// The verdict on a plume. Captured or not is decided without polygons: a dividing streamline bounds when exactly one of its sides
/// goes to a chosen well; the plume is captured when no bounding streamline passes through it and one of its points ends in a
/// chosen well.
/// </summary>
public static class PlumeJudge
{
    /// <summary>A streamline that enters the plume by less than this share of its size touches it only.</summary>
    private const double TouchShare = 1e-5;

    /// <summary>Shares of the plume's area below this are rounding.</summary>
    private const double LeastFraction = 1e-9;

    /// <summary>How far from the plume's middle to its corners a place is looked at: little, so that it lies within the plume.</summary>
    private const double CornerShare = 1e-3;

    /// <summary>Points of the plume, about, from which arrival times are taken.</summary>
    private const int ArrivalPoints = 1000;

    /// <summary>Whether a plume is captured by chosen wells; needs no polygons of zones.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="plume">The plume.</param>
    /// <param name="isChosen">Tells whether a destination is a chosen well.</param>
    public static bool IsCaptured(FlowTopology topology, Plume plume, Func<Fate, bool> isChosen)
    {
        double touch = TouchShare * plume.Outline.EnvelopeInternal.Diameter;
        Geometry core = plume.Outline.Buffer(-touch);
        foreach (DividingBranch branch in Bounding(topology, isChosen))
        {
            if (Line(branch) is var line && line.EnvelopeInternal.Intersects(core.EnvelopeInternal) && line.Intersects(core))
            {
                return false;
            }
        }

        return isChosen(FateWithin(topology, plume.Outline));
    }

    /// <summary>
    /// Where water of a plume goes through which no bounding streamline passes. A streamline that ends in a stagnation point does not
    /// tell: symmetry may put one through the plume's middle, so that the way from there to its corners is looked at as well.
    /// </summary>
    private static Fate FateWithin(FlowTopology topology, Polygon outline)
    {
        Complex middle = GeometryKit.ToComplex(outline.InteriorPoint.Coordinate);
        return outline.ExteriorRing.Coordinates
            .Select(corner => middle + (GeometryKit.ToComplex(corner) - middle) * CornerShare)
            .Prepend(middle)
            .Select(at => topology.Tracer.Trace(at, Sense.Downstream, double.PositiveInfinity, null).Fate)
            .FirstOrDefault(fate => fate.Kind != FateKind.Stagnation, new Fate(FateKind.Stagnation));
    }

    /// <summary>The whole verdict with its figures.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="map">Its faces.</param>
    /// <param name="joint">The joint zone of the chosen wells.</param>
    /// <param name="index">Index of the plume.</param>
    /// <param name="plume">The plume.</param>
    /// <param name="isChosen">Tells whether a destination is a chosen well.</param>
    internal static PlumeAnswer Judge(
        FlowTopology topology, FaceMap map, Geometry joint, int index, Plume plume, Func<Fate, bool> isChosen)
    {
        bool captured = IsCaptured(topology, plume, isChosen);
        PlumeShare[] shares =
        [
            .. map.Zones.Select(zone => new PlumeShare(zone.Key, Fraction(plume, zone.Value)))
                .Where(share => share.Fraction > LeastFraction)
                .OrderByDescending(share => share.Fraction)
                .ThenBy(share => share.Fate.Kind)
                .ThenBy(share => share.Fate.Feature),
        ];
        double inside = shares.Where(share => isChosen(share.Fate)).Sum(share => share.Fraction);
        PlumeMargins margins = PlumeMargins.Of(topology, map, joint, plume, captured, isChosen);
        return new PlumeAnswer(
            index,
            captured,
            captured ? 1 : Math.Min(inside, 1),
            margins.Nearest,
            margins.Side,
            margins.Downgradient,
            margins.Share,
            [.. shares.Where(share => isChosen(share.Fate))],
            captured ? [] : [.. shares.Where(share => !isChosen(share.Fate))],
            Arrival(topology, GeometryKit.Intersection(plume.Outline, joint), plume.Retardation, isChosen));
    }

    /// <summary>The branches on exactly one side of which the water goes to a chosen well.</summary>
    private static IEnumerable<DividingBranch> Bounding(FlowTopology topology, Func<Fate, bool> isChosen) =>
        topology.Branches.Where(branch => branch.IsStable && isChosen(branch.Left) != isChosen(branch.Right));

    private static LineString Line(DividingBranch branch) =>
        GeometryKit.Factory.CreateLineString([.. branch.Points.Select(point => GeometryKit.ToCoordinate(point.At))]);

    private static double Fraction(Plume plume, Geometry zone) =>
        !zone.EnvelopeInternal.Intersects(plume.Outline.EnvelopeInternal) ? 0 : Math.Min(GeometryKit.Intersection(plume.Outline, zone).Area / plume.Outline.Area, 1);

    private static ArrivalTimes? Arrival(FlowTopology topology, Geometry captured, double retardation, Func<Fate, bool> isChosen)
    {
        if (captured.IsEmpty)
        {
            return null;
        }

        List<double> times = [];
        double spacing = Math.Sqrt(captured.Area / ArrivalPoints);
        IndexedPointInAreaLocator locator = new(captured);
        Envelope box = captured.EnvelopeInternal;
        for (double y = box.MinY + spacing / 2; y < box.MaxY; y += spacing)
        {
            for (double x = box.MinX + spacing / 2; x < box.MaxX; x += spacing)
            {
                if (locator.Locate(new Coordinate(x, y)) == Location.Interior)
                {
                    PathEnd end = topology.Scout.Trace(new Complex(x, y), Sense.Downstream, double.PositiveInfinity, null);
                    if (isChosen(end.Fate))
                    {
                        times.Add(end.Time * retardation);
                    }
                }
            }
        }

        times.Sort();
        return times.Count == 0 ? null : new ArrivalTimes(Quantile(times, 0.05), Quantile(times, 0.5), Quantile(times, 0.95));
    }

    private static double Quantile(List<double> sorted, double share)
    {
        double place = share * (sorted.Count - 1);
        int below = (int)place;
        int above = Math.Min(below + 1, sorted.Count - 1);
        return sorted[below] + (place - below) * (sorted[above] - sorted[below]);
    }
}
