using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;
using NetTopologySuite.Geometries.Utilities;

namespace CaptureZone.Zones.TravelTimes;

/// <summary>The zones from which water reaches a well within given times.</summary>
internal static class TravelTimeZones
{
    /// <summary>Parts and holes below this share of the zone are rounding.</summary>
    private const double SliverShare = 1e-9;

    /// <summary>The zones of one extraction well.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="screen">The well's screen.</param>
    /// <param name="stretches">Stretches of the screen by origin.</param>
    /// <param name="times">The times, d, increasing; may be none.</param>
    internal static ImmutableArray<TravelTimeZone> Of(
        FlowTopology topology, Screen screen, ImmutableArray<ScreenStretch> stretches, ImmutableArray<double> times)
    {
        if (times.IsEmpty)
        {
            return [];
        }

        Aquifer aquifer = topology.Field.AquiferAt(screen.At);

        // Not the thickness at the screen: where that all but runs dry, zones would seem wider than they are and be drawn too coarsely.
        double thickness = aquifer.SaturatedThickness(aquifer.PotentialOf(topology.Field.Parameters.Regional.Head));
        ImmutableArray<double> radii =
            [.. times.Select(time => Math.Sqrt(screen.Rate * time / (Math.PI * aquifer.Porosity * thickness)))];
        RayTracing tracing = new(topology, screen, times);
        RayFan[] fans = [.. stretches.Select(stretch => RayFan.Of(topology, tracing, stretch, times, radii))];
        return [.. times.Select((time, index) => ZoneOf(topology.Field, screen, fans, time, index))];
    }

    private static TravelTimeZone ZoneOf(
        FlowField field, Screen screen, RayFan[] fans, double time, int index)
    {
        Geometry polygon = PolygonOf(fans.SelectMany(fan => fan.Front(index)));
        double expected = fans.Sum(fan => VolumeOf(field, screen, fan, time));
        double volume = PoreVolume.Of(polygon, field, screen) - PoreVolume.Within(screen, field);
        return new TravelTimeZone(time, polygon, polygon.Area, Math.Abs(volume - expected) / expected);
    }

    /// <summary>Water that enters a stretch within a time: rate x time, less what had not yet been injected.</summary>
    private static double VolumeOf(FlowField field, Screen screen, RayFan fan, double time)
    {
        double volume = 0;
        for (int i = 1; i < fan.Rays.Count; i++)
        {
            Ray a = fan.Rays[i - 1], b = fan.Rays[i];
            volume += WaterOrigins.Inflow(field, screen, a.Angle, b.Angle) * (Math.Min(a.Age, time) + Math.Min(b.Age, time)) / 2;
        }

        return volume;
    }

    private static Geometry PolygonOf(IEnumerable<Complex> ring)
    {
        List<Coordinate> corners = [];
        foreach (Complex vertex in ring)
        {
            Coordinate corner = GeometryKit.ToCoordinate(vertex);
            if (corners.Count == 0 || !corner.Equals2D(corners[^1]))
            {
                corners.Add(corner);
            }
        }

        if (!corners[0].Equals2D(corners[^1]))
        {
            corners.Add(corners[0].Copy());
        }

        Geometry polygon = GeometryKit.Factory.CreatePolygon([.. corners]);
        Geometry valid = polygon.IsValid ? polygon : GeometryFixer.Fix(polygon);
        return GeometryKit.Areas(valid, SliverShare * valid.Area);
    }
}
