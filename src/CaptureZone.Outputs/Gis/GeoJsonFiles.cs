using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using CaptureZone.Sites;
using NetTopologySuite.Geometries;

namespace CaptureZone.Outputs.Gis;

/// <summary>
/// Writes the computed layers as GeoJSON (RFC 7946): longitude and latitude to 7 decimals, outer rings counter-clockwise, one file per
/// layer, one feature per line. With local coordinates, which RFC 7946 does not know: local coordinates, a member
/// <c>"coordinates": "local"</c> and their <c>"unit"</c>.
/// </summary>
public static class GeoJsonFiles
{
    /// <summary>Decimals of a degree: 11 mm at most.</summary>
    private const int DegreeDecimals = 7;

    private static readonly JsonWriterOptions Options = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Writes the files into a folder that exists.</summary>
    /// <param name="report">The report.</param>
    /// <param name="folder">The folder.</param>
    /// <exception cref="IOException">A file cannot be written.</exception>
    public static void Write(Report report, string folder)
    {
        foreach (Layer layer in SiteLayers.Computed(report))
        {
            using FileStream file = File.Create(Path.Combine(folder, layer.Name + ".geojson"));
            Write(layer, report.Site, file);
        }
    }

    /// <summary>Writes one layer.</summary>
    /// <param name="layer">The layer.</param>
    /// <param name="site">The site, for its coordinates.</param>
    /// <param name="to">Where to; stays open.</param>
    /// <exception cref="IOException">The stream cannot be written.</exception>
    public static void Write(Layer layer, SiteDocument site, Stream to)
    {
        GridProjection projection = Projection(site);
        using Utf8JsonWriter json = new(to, Options);
        WriteText(to, site.Coordinates.IsLocal ? LocalHead(site) : """{"type":"FeatureCollection","features":[""");
        string separator = "\n";
        foreach (Feature feature in layer.Features)
        {
            if (projection.Bring(feature.Shape, layer.Shape) is { } shape)
            {
                WriteText(to, separator);
                separator = ",\n";
                Write(json, layer, feature, shape);
                json.Flush();
                json.Reset();
            }
        }

        WriteText(to, "\n]}\n");
    }

    private static string LocalHead(SiteDocument site) =>
        $$"""{"type":"FeatureCollection","coordinates":"local","unit":"{{site.Coordinates.Unit}}","features":[""";

    private static GridProjection Projection(SiteDocument site)
    {
        const int Wgs84 = 4326;
        return site.Coordinates.IsLocal
            ? SiteProjection.Of(site, srid: 0)
            : new GridProjection(
                (x, y) => site.Coordinates.ToLonLat(site.Frame.SiteX(new(x, y)), site.Frame.SiteY(new(x, y))), DegreeDecimals, Wgs84);
    }

    private static void WriteText(Stream to, string text) => to.Write(Encoding.UTF8.GetBytes(text));

    private static void Write(Utf8JsonWriter json, Layer layer, Feature feature, Geometry shape)
    {
        json.WriteStartObject();
        json.WriteString("type", "Feature");
        json.WriteStartObject("properties");
        for (int i = 0; i < layer.Columns.Length; i++)
        {
            json.WritePropertyName(layer.Columns[i].Name);
            Write(json, feature.Cells[i]);
        }

        json.WriteEndObject();
        json.WriteStartObject("geometry");
        Write(json, shape.NumGeometries == 1 ? shape.GetGeometryN(0) : shape);
        json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Cell cell)
    {
        if (cell.Text is { } text)
        {
            json.WriteStringValue(text);
        }
        else if (cell.Number is { } number)
        {
            json.WriteNumberValue(number);
        }
        else if (cell.Flag is { } flag)
        {
            json.WriteBooleanValue(flag);
        }
        else
        {
            json.WriteNullValue();
        }
    }

    private static void Write(Utf8JsonWriter json, Geometry shape)
    {
        json.WriteString("type", shape.GeometryType);
        json.WritePropertyName("coordinates");
        WriteCoordinates(json, shape);
    }

    private static void WriteCoordinates(Utf8JsonWriter json, Geometry shape)
    {
        switch (shape)
        {
            case Point point:
                WriteCoordinate(json, point.Coordinate);
                break;
            case LineString line:
                WriteList(json, line.Coordinates, WriteCoordinate);
                break;
            case Polygon polygon:
                WriteList(json, polygon.InteriorRings.Prepend(polygon.ExteriorRing), WriteCoordinates);
                break;
            default:
                WriteList(json, Enumerable.Range(0, shape.NumGeometries).Select(shape.GetGeometryN), WriteCoordinates);
                break;
        }
    }

    private static void WriteList<T>(Utf8JsonWriter json, IEnumerable<T> items, Action<Utf8JsonWriter, T> write)
    {
        json.WriteStartArray();
        foreach (T item in items)
        {
            write(json, item);
        }

        json.WriteEndArray();
    }

    private static void WriteCoordinate(Utf8JsonWriter json, Coordinate place)
    {
        json.WriteStartArray();
        json.WriteNumberValue(place.X);
        json.WriteNumberValue(place.Y);
        json.WriteEndArray();
    }
}
