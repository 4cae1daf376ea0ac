using NetTopologySuite.Algorithm;
using NetTopologySuite.Geometries;
using NetTopologySuite.Precision;

namespace CaptureZone.Outputs.Gis;

/// <summary>
/// Brings shapes from local metres into a file's coordinates and rounds them to a grid, so that they stay valid.
/// </summary>
/// <param name="project">From local metres to the file's coordinates.</param>
/// <param name="decimals">Decimals of the file's coordinates.</param>
/// <param name="srid">The number that geometries bear.</param>
public sealed class GridProjection(Func<double, double, (double X, double Y)> project, int decimals, int srid)
{
    private readonly PrecisionModel _grid = new(Math.Pow(10, decimals));
    private readonly GeometryFactory _factory = new(new PrecisionModel(), srid);

    /// <summary>The shape in the file's coordinates: a point, lines or polygons; null when nothing of it is left.</summary>
    /// <param name="shape">A valid shape, local m.</param>
    /// <param name="kind">What is kept of it.</param>
    public Geometry? Bring(Geometry shape, ShapeKind kind)
    {
        Geometry brought = kind switch
        {
            ShapeKind.Point => _factory.CreatePoint(Round(shape.Coordinate)),
            ShapeKind.Line => _factory.CreateMultiLineString([.. Parts<LineString>(shape).Select(Line).OfType<LineString>()]),
            _ => Polygons(shape),
        };
        return brought.IsEmpty ? null : brought;
    }

    private static IEnumerable<T> Parts<T>(Geometry shape)
        where T : Geometry
    {
        for (int i = 0; i < shape.NumGeometries; i++)
        {
            if (shape.GetGeometryN(i) is T { IsEmpty: false } part)
            {
                yield return part;
            }
        }
    }

    private LineString? Line(LineString line)
    {
        Coordinate[] rounded = Rounded(line.Coordinates);
        return rounded.Length > 1 ? _factory.CreateLineString(rounded) : null;
    }

    private MultiPolygon Polygons(Geometry shape)
    {
        Polygon[] exact = [.. Parts<Polygon>(shape)];
        Polygon[] rounded = [.. exact.Select(Polygon).OfType<Polygon>()];
        MultiPolygon simple = _factory.CreateMultiPolygon(rounded);
        return rounded.Length == exact.Length && simple.IsValid ? simple : Snapped(exact);
    }

    /// <summary>The polygon with every corner rounded; null when one of its rings collapses.</summary>
    private Polygon? Polygon(Polygon polygon)
    {
        const int SmallestRing = 4;
        Coordinate[][] rings = [.. Rings(polygon).Select(ring => Rounded(ring.Coordinates))];
        return rings.All(ring => ring.Length >= SmallestRing) ? Wound(rings) : null;
    }

    /// <summary>
    /// Rounding the corners one by one may make edges cross. Snap rounding (J. D. Hobby, Computational Geometry 13, 1999) moves the
    /// edges along.
    /// </summary>
    private MultiPolygon Snapped(Polygon[] exact)
    {
        Polygon[] projected =
        [
            .. exact.Select(polygon => Wound([.. Rings(polygon).Select(ring => ring.Coordinates.Select(Project).ToArray())])),
        ];
        Geometry snapped = GeometryPrecisionReducer.Reduce(_factory.CreateMultiPolygon(projected), _grid);
        return _factory.CreateMultiPolygon(
            [.. Parts<Polygon>(snapped).Select(polygon => Wound([.. Rings(polygon).Select(ring => ring.Coordinates)]))]);
    }

    private static IEnumerable<LineString> Rings(Polygon polygon) => polygon.InteriorRings.Prepend(polygon.ExteriorRing);

    /// <summary>A polygon whose shell, the first ring, runs counter-clockwise and whose holes run clockwise.</summary>
    private Polygon Wound(Coordinate[][] rings)
    {
        for (int i = 0; i < rings.Length; i++)
        {
            if (Orientation.IsCCW(rings[i]) != (i == 0))
            {
                Array.Reverse(rings[i]);
            }
        }

        return _factory.CreatePolygon(
            _factory.CreateLinearRing(rings[0]), [.. rings.Skip(1).Select(ring => _factory.CreateLinearRing(ring))]);
    }

    /// <summary>The corners rounded, those left out that fall on the one before.</summary>
    private Coordinate[] Rounded(Coordinate[] corners)
    {
        List<Coordinate> rounded = [];
        foreach (Coordinate corner in corners)
        {
            Coordinate next = Round(corner);
            if (rounded.Count == 0 || !rounded[^1].Equals2D(next))
            {
                rounded.Add(next);
            }
        }

        return [.. rounded];
    }

    private Coordinate Round(Coordinate local)
    {
        Coordinate place = Project(local);
        return new Coordinate(_grid.MakePrecise(place.X), _grid.MakePrecise(place.Y));
    }

    private Coordinate Project(Coordinate local)
    {
        (double x, double y) = project(local.X, local.Y);
        return new Coordinate(x, y);
    }
}
