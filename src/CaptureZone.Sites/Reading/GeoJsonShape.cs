using System.Text.Json;
using CaptureZone.Sites.Coordinates;
using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading;

/// <summary>
/// The shape in a GeoJSON file (RFC 7946), in the site's coordinates. Read by hand: what a library takes without a word (another
/// coordinate system, an empty collection, an open ring, infinite numbers) would put a polygon in the wrong place.
/// </summary>
internal sealed class GeoJsonShape
{
    /// <summary>A shape in degrees is smaller than this; one in metres or feet is larger.</summary>
    private const double LargestInDegrees = 1;

    private readonly ProjectedSystem? _projected;

    /// <summary>For a site in a projected system; null for one in local coordinates.</summary>
    private GeoJsonShape(ProjectedSystem? projected) => _projected = projected;

    /// <summary>Reads a file: longitude and latitude, or local coordinates for a site that has those.</summary>
    /// <param name="bytes">The file's bytes.</param>
    /// <param name="system">The site's coordinate system.</param>
    /// <param name="problem">Why it cannot be used, in words that follow the file's name; empty when it can.</param>
    public static Geometry? Read(byte[] bytes, CoordinateSystem system, out string problem)
    {
        try
        {
            ReadOnlyMemory<byte> text = bytes.AsSpan().StartsWith("\uFEFF"u8) ? bytes.AsMemory(3) : bytes;
            using JsonDocument document = JsonDocument.Parse(text);
            Geometry shape = new GeoJsonShape(system as ProjectedSystem).Root(document.RootElement);
            problem = "";
            return shape;
        }
        catch (JsonException failure)
        {
            string line = Words.Number((failure.LineNumber ?? 0) + 1);
            problem = $"is not JSON: see its line {line}";
        }
        catch (UnusableException failure)
        {
            problem = failure.Message;
        }

        return null;
    }

    private Geometry Root(JsonElement root)
    {
        if (root.ValueKind != JsonValueKind.Object)
        {
            throw new UnusableException("is not GeoJSON: it holds no object");
        }

        CheckSystem(root);
        Geometry shape = Shape(root);
        if (shape.IsEmpty)
        {
            throw new UnusableException("holds no shape");
        }

        if (_projected is null && LooksLikeDegrees(shape.EnvelopeInternal))
        {
            throw new UnusableException("seems to be in longitude and latitude, but the site has local coordinates; write it in those");
        }

        return shape;
    }

    private void CheckSystem(JsonElement root)
    {
        if (root.TryGetProperty("crs", out JsonElement crs) && !crs.GetRawText().Contains("CRS84", StringComparison.Ordinal))
        {
            throw new UnusableException(
                "states a coordinate system (\"crs\"); RFC 7946 knows longitude and latitude on WGS 84 only: export it again as such");
        }

        if (_projected is not null && root.TryGetProperty("coordinates", out JsonElement kind) && kind.ValueKind == JsonValueKind.String)
        {
            throw new UnusableException(
                $"has local coordinates, but the site is in {_projected.Name}; export it in longitude and latitude");
        }
    }

    private Geometry Shape(JsonElement json)
    {
        return TypeOf(json) switch
        {
            "FeatureCollection" => Collect(List(json, "features").Select(Shape)),
            "Feature" => json.TryGetProperty("geometry", out JsonElement inner) && inner.ValueKind != JsonValueKind.Null
                ? Shape(inner)
                : Collect([]),
            "GeometryCollection" => Collect(List(json, "geometries").Select(Shape)),
            "Point" => SiteGeometry.Factory.CreatePoint(Position(Member(json, "coordinates"))),
            "MultiPoint" => Collect(List(json, "coordinates").Select(point => SiteGeometry.Factory.CreatePoint(Position(point)))),
            "LineString" => Line(Member(json, "coordinates")),
            "MultiLineString" => Collect(List(json, "coordinates").Select(Line)),
            "Polygon" => Polygon(Member(json, "coordinates")),
            "MultiPolygon" => Collect(List(json, "coordinates").Select(Polygon)),
            { } type => throw new UnusableException($"is not GeoJSON: unknown type {Words.Quote(type)}"),
        };
    }

    private static string TypeOf(JsonElement json) =>
        json.ValueKind == JsonValueKind.Object
        && json.TryGetProperty("type", out JsonElement name)
        && name.ValueKind == JsonValueKind.String
            ? name.GetString()!
            : throw new UnusableException("is not GeoJSON: an object without \"type\"");

    /// <summary>One shape as itself, several as a collection of their kind; nested ones laid flat.</summary>
    private static Geometry Collect(IEnumerable<Geometry> shapes)
    {
        Geometry[] all =
        [
            .. shapes.SelectMany(shape => Enumerable.Range(0, shape.NumGeometries).Select(shape.GetGeometryN)).Where(part => !part.IsEmpty),
        ];
        return SiteGeometry.Factory.BuildGeometry(all);
    }

    private LineString Line(JsonElement json)
    {
        Coordinate[] points = Positions(json);
        return points.Length >= 2
            ? SiteGeometry.Factory.CreateLineString(points)
            : throw new UnusableException("has a line of fewer than two points");
    }

    private Polygon Polygon(JsonElement json)
    {
        LinearRing[] rings = [.. Items(json, "a polygon").Select(Ring)];
        if (rings.Length == 0)
        {
            throw new UnusableException("has a polygon without an outline");
        }

        Polygon polygon = SiteGeometry.Factory.CreatePolygon(rings[0], rings[1..]);
        string problem = SiteGeometry.ProblemOf(polygon);
        return problem.Length == 0 ? polygon : throw new UnusableException($"has an outline that {problem}");
    }

    private LinearRing Ring(JsonElement json)
    {
        Coordinate[] points = Positions(json);
        if (points.Length < 4)
        {
            throw new UnusableException("has an outline of fewer than four positions, the first repeated at the end");
        }

        return points[0].Equals2D(points[^1])
            ? SiteGeometry.Factory.CreateLinearRing(points)
            : throw new UnusableException("has an outline that is not closed; repeat its first position at the end");
    }

    private Coordinate[] Positions(JsonElement json) => [.. Items(json, "a list of positions").Select(Position)];

    private Coordinate Position(JsonElement json)
    {
        JsonElement[] numbers = [.. Items(json, "a position")];
        if (numbers.Length < 2 || !TryNumber(numbers[0], out double x) || !TryNumber(numbers[1], out double y))
        {
            throw new UnusableException($"has a position that is not two numbers: {Words.Short(json.GetRawText())}");
        }

        return _projected is null ? new Coordinate(x, y) : FromLonLat(_projected, x, y);
    }

    private static Coordinate FromLonLat(ProjectedSystem system, double longitude, double latitude)
    {
        if (Math.Abs(longitude) > 180 || Math.Abs(latitude) > 90)
        {
            throw new UnusableException(
                $"has {Words.Place(longitude, latitude)}, which is no longitude and latitude; export it as RFC 7946 (WGS 84) has it");
        }

        (double x, double y) = system.FromLonLat(longitude, latitude);
        return double.IsFinite(x) && double.IsFinite(y)
            ? new Coordinate(x, y)
            : throw new UnusableException($"has {Words.Place(longitude, latitude)}, which {system.Name} cannot show");
    }

    private static bool TryNumber(JsonElement json, out double value)
    {
        value = double.NaN;
        return json.ValueKind == JsonValueKind.Number && json.TryGetDouble(out value) && double.IsFinite(value);
    }

    private static bool LooksLikeDegrees(Envelope all) =>
        all.MinX >= -180 && all.MaxX <= 180 && all.MinY >= -90 && all.MaxY <= 90
        && all.Width < LargestInDegrees && all.Height < LargestInDegrees && all.Width + all.Height > 0;

    private static IEnumerable<JsonElement> List(JsonElement json, string member) => Items(Member(json, member), $"\"{member}\"");

    private static JsonElement Member(JsonElement json, string name) =>
        json.TryGetProperty(name, out JsonElement member) ? member : throw new UnusableException($"is not GeoJSON: \"{name}\" is missing");

    private static IEnumerable<JsonElement> Items(JsonElement json, string what) =>
        json.ValueKind == JsonValueKind.Array
            ? json.EnumerateArray()
            : throw new UnusableException($"is not GeoJSON: {what} must be a list");

    private sealed class UnusableException(string message) : Exception(message);
}
