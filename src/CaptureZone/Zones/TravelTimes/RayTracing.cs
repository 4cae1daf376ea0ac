using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;

namespace CaptureZone.Zones.TravelTimes;

/// <summary>Follows the rays of one well; times are met exactly, whatever a ray is launched from.</summary>
/// <param name="topology">The dividing streamlines.</param>
/// <param name="screen">The well's screen.</param>
/// <param name="times">The times asked, d, increasing.</param>
internal sealed class RayTracing(FlowTopology topology, Screen screen, ImmutableArray<double> times)
{
    /// <summary>Courses tell how far neighbours are apart: a coarse resolution will do.</summary>
    private static readonly PathResolution CourseResolution = new(0.03, double.PositiveInfinity);

    private readonly Tracer _tracer = topology.Scout;

    /// <summary>A ray that is launched from the screen.</summary>
    /// <param name="angle">Where it enters, radians counter-clockwise from east.</param>
    internal Ray FromScreen(double angle) =>
        From(screen.At + Complex.FromPolarCoordinates(screen.Radius, angle), angle, 0);

    /// <summary>The ray through a place; null when water from there does not reach the well.</summary>
    /// <param name="at">The place, m.</param>
    internal Ray? Through(Complex at)
    {
        PathEnd end = _tracer.Trace(at, Sense.Downstream, double.PositiveInfinity, null);
        return end.Fate == new Fate(FateKind.Well, screen.Well)
            ? From(at, (end.At - screen.At).Phase, end.Time)
            : null;
    }

    /// <summary>The ray that a dividing branch is: its fronts stop short of its stagnation point.</summary>
    /// <param name="branch">A branch that arrives at the well.</param>
    /// <param name="angle">Where it enters, radians; on the turn of the stretch that it bounds.</param>
    internal Ray Along(DividingBranch branch, double angle)
    {
        double age = branch.End.Time;
        ImmutableArray<PathPoint> course = [.. branch.Points.Reverse().Select(point => point with { Time = age - point.Time })];
        Ray ray = new(angle, branch.Launch, age, branch, [], double.PositiveInfinity, course);
        return ray with { Fronts = [.. times.Select(time => PlaceAt(ray, time))] };
    }

    /// <summary>The place on a ray from which water needs a time, exactly.</summary>
    /// <param name="ray">The ray.</param>
    /// <param name="time">Travel time to the well, d.</param>
    internal Complex PlaceAt(Ray ray, double time)
    {
        if (time <= ray.AnchorTime)
        {
            return _tracer.Trace(ray.Anchor, Sense.Downstream, ray.AnchorTime - time, null, ray.Side?.Saddle ?? -1).At;
        }

        return ray.Side is { } branch
            ? BeforeStagnation(branch, time - ray.AnchorTime)
            : _tracer.Trace(ray.Anchor, Sense.Upstream, time - ray.AnchorTime, null).At;
    }

    /// <summary>Toward a point of multiplicity m the speed falls as the m-th power of the distance.</summary>
    private Complex BeforeStagnation(DividingBranch branch, double time)
    {
        StagnationPoint point = topology.Points[branch.Saddle];
        Complex offset = branch.Launch - point.At;
        double distance = Complex.Abs(offset);
        Aquifer aquifer = topology.Field.AquiferAt(point.At);
        FlowAt flow = topology.Field.FlowAt(branch.Launch);
        double rate = Complex.Abs(flow.Discharge) / (aquifer.Porosity * aquifer.SaturatedThickness(flow.Potential) * distance);
        int power = point.Multiplicity - 1;
        double share = power == 0 ? Math.Exp(-rate * time) : Math.Pow(1 + power * rate * time, -1.0 / power);
        return point.At + share * offset;
    }

    private Ray From(Complex start, double angle, double age)
    {
        Complex[] fronts = new Complex[times.Length];
        List<PathPoint> course = [];
        Complex at = start;
        double reached = age, whole = double.PositiveInfinity;
        for (int i = 0; i < times.Length; i++)
        {
            if (times[i] <= age)
            {
                fronts[i] = _tracer.Trace(start, Sense.Downstream, age - times[i], null).At;
            }
            else if (double.IsInfinity(whole))
            {
                PathRecorder recorder = new(CourseResolution);
                PathEnd end = _tracer.Trace(at, Sense.Upstream, times[i] - reached, recorder);
                double since = reached;
                course.AddRange(recorder.ToPoints().Select(point => point with { Time = since + point.Time }));
                at = end.Fate.Kind == FateKind.Injection ? topology.Field.System.Wells[end.Fate.Feature].At : end.At;
                fronts[i] = at;
                whole = end.Fate.Kind == FateKind.Injection ? reached + end.Time : double.PositiveInfinity;
                reached = times[i];
                if (end.Fate.Kind == FateKind.Stagnation)
                {
                    Array.Fill(fronts, at, i, times.Length - i);
                    break;
                }
            }
            else
            {
                fronts[i] = at;
            }
        }

        if (course.Count == 0)
        {
            course.Add(new PathPoint(start, age));
        }

        return new Ray(angle, start, age, null, [.. fronts], whole, [.. course]);
    }
}
