using System.Numerics;
using CaptureZone.Flow;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones;

/// <summary>The streamline edges of a zone: its boundary without the frame.</summary>
internal static class ZoneEdges
{
    /// <summary>A vertex lies on the frame when its distance from the centre is within this share of the radius.</summary>
    private const double OnFrame = 2e-5;

    // Four-point rule of Gauss and Legendre on 0..1 (any table of quadrature).
    private static ReadOnlySpan<double> Nodes => [0.06943184420297371, 0.33000947820757187, 0.66999052179242813, 0.93056815579702629];

    private static ReadOnlySpan<double> Weights => [0.17392742256872693, 0.32607257743127307, 0.32607257743127307, 0.17392742256872693];

    /// <summary>The edges as lines; empty when the zone has none.</summary>
    /// <param name="zone">The zone.</param>
    /// <param name="map">The circle that frames it.</param>
    internal static Geometry Of(Geometry zone, FaceMap map)
    {
        List<LineString> lines = [];
        for (int i = 0; i < zone.NumGeometries; i++)
        {
            if (zone.GetGeometryN(i) is Polygon { IsEmpty: false } polygon)
            {
                AddEdges(polygon.ExteriorRing.Coordinates, map, lines);
                foreach (LineString hole in polygon.InteriorRings)
                {
                    AddEdges(hole.Coordinates, map, lines);
                }
            }
        }

        return GeometryKit.Factory.CreateMultiLineString([.. lines]);
    }

    /// <summary>Whether a zone reaches the circle that frames it: every closed zone lies well within.</summary>
    /// <param name="zone">The zone.</param>
    /// <param name="map">The circle.</param>
    internal static bool TouchFrame(Geometry zone, FaceMap map) => zone.Coordinates.Any(corner => IsOnFrame(corner, map));

    /// <summary>Whether a place lies on the circle that frames the zones.</summary>
    /// <param name="at">The place, m.</param>
    /// <param name="map">The circle.</param>
    internal static bool IsOnFrame(Coordinate at, FaceMap map) =>
        Math.Abs(Complex.Abs(GeometryKit.ToComplex(at) - map.Centre) - map.Radius) < OnFrame * map.Radius;

    /// <summary>The integral of |normal discharge| along edges, m3/d: what leaks through a polygon that should be tight.</summary>
    /// <param name="edges">The edges.</param>
    /// <param name="field">The field.</param>
    /// <param name="isSingular">Tells whether a place lies within a screen, where edges run to the well's centre.</param>
    internal static double Leak(Geometry edges, FlowField field, Func<Complex, bool> isSingular)
    {
        double leak = 0;
        for (int i = 0; i < edges.NumGeometries; i++)
        {
            Coordinate[] line = edges.GetGeometryN(i).Coordinates;
            for (int k = 1; k < line.Length; k++)
            {
                leak += Leak(GeometryKit.ToComplex(line[k - 1]), GeometryKit.ToComplex(line[k]), field, isSingular);
            }
        }

        return leak;
    }

    private static double Leak(Complex a, Complex b, FlowField field, Func<Complex, bool> isSingular)
    {
        double leak = 0;
        Complex along = b - a;
        for (int i = 0; i < Nodes.Length; i++)
        {
            Complex at = a + Nodes[i] * along;
            if (!isSingular(at))
            {
                Complex discharge = field.DischargeAt(at);
                leak += Weights[i] * Math.Abs(discharge.Real * along.Imaginary - discharge.Imaginary * along.Real);
            }
        }

        return leak;
    }

    private static void AddEdges(Coordinate[] ring, FaceMap map, List<LineString> lines)
    {
        List<Coordinate> run = [];
        for (int i = 1; i < ring.Length; i++)
        {
            if (IsOnFrame(ring[i - 1], map) && IsOnFrame(ring[i], map))
            {
                Close(run, lines);
                continue;
            }

            if (run.Count == 0)
            {
                run.Add(ring[i - 1]);
            }

            run.Add(ring[i]);
        }

        Close(run, lines);
    }

    private static void Close(List<Coordinate> run, List<LineString> lines)
    {
        if (run.Count > 1)
        {
            lines.Add(GeometryKit.Factory.CreateLineString([.. run]));
        }

        run.Clear();
    }
}
