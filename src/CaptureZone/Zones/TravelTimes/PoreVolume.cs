using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Flow;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;
using NetTopologySuite.Triangulate.Polygon;

namespace CaptureZone.Zones.TravelTimes;

/// <summary>Water in the pores under an area: the integral of porosity x saturated thickness.</summary>
internal static class PoreVolume
{
    /// <summary>Triangles are halved until they are this small, as a share of the area.</summary>
    private const double TriangleShare = 1e-5;

    /// <summary>The volume, m3. Exact where the aquifer is confined all over the area; else by quadrature.</summary>
    /// <param name="area">The area.</param>
    /// <param name="field">The field.</param>
    /// <param name="screen">The screen at which the potential is lowest within the area.</param>
    internal static double Of(Geometry area, FlowField field, Screen screen)
    {
        Aquifer aquifer = field.Parameters.Aquifer;
        if (aquifer.IsConfined(PotentialAt(field, screen.At + screen.Radius))
            && area.Coordinates.All(corner => aquifer.IsConfined(PotentialAt(field, GeometryKit.ToComplex(corner)))))
        {
            return aquifer.Porosity * aquifer.Thickness * area.Area;
        }

        double volume = 0;
        Geometry triangles = ConstrainedDelaunayTriangulator.Triangulate(area);
        for (int i = 0; i < triangles.NumGeometries; i++)
        {
            Coordinate[] corners = triangles.GetGeometryN(i).Coordinates;
            volume += OfTriangle(
                GeometryKit.ToComplex(corners[0]),
                GeometryKit.ToComplex(corners[1]),
                GeometryKit.ToComplex(corners[2]),
                field,
                TriangleShare * area.Area);
        }

        return volume;
    }

    /// <summary>The volume within a screen, m3: paths end at its rim, outlines go round it.</summary>
    /// <param name="screen">The screen.</param>
    /// <param name="field">The field.</param>
    internal static double Within(Screen screen, FlowField field)
    {
        Aquifer aquifer = field.Parameters.Aquifer;
        double thickness = aquifer.SaturatedThickness(PotentialAt(field, screen.At + screen.Radius));
        return aquifer.Porosity * thickness * Math.PI * screen.Radius * screen.Radius;
    }

    /// <summary>The rule of the three midpoints of the sides, exact for quadratics, on ever smaller triangles.</summary>
    private static double OfTriangle(Complex a, Complex b, Complex c, FlowField field, double smallest)
    {
        Complex ab = (a + b) / 2, bc = (b + c) / 2, ca = (c + a) / 2;
        double area = Math.Abs(((b - a) * Complex.Conjugate(c - a)).Imaginary) / 2;
        return area > smallest
            ? OfTriangle(a, ab, ca, field, smallest) + OfTriangle(ab, b, bc, field, smallest)
                + OfTriangle(ca, bc, c, field, smallest) + OfTriangle(ab, bc, ca, field, smallest)
            : area * (WaterColumn(field, ab) + WaterColumn(field, bc) + WaterColumn(field, ca)) / 3;
    }

    private static double WaterColumn(FlowField field, Complex at)
    {
        Aquifer aquifer = field.Parameters.Aquifer;
        return aquifer.Porosity * aquifer.SaturatedThickness(PotentialAt(field, at));
    }

    private static double PotentialAt(FlowField field, Complex at) => field.FlowAt(at).Potential;
}
