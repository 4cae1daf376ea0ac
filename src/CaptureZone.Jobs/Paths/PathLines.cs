using System.Collections.Immutable;
using System.Globalization;
using System.Numerics;
using System.Text.Encodings.Web;
using System.Text.Json;
using CaptureZone.Outputs.Results;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Topology;

namespace CaptureZone.Jobs.Paths;

/// <summary>
/// Paths as GeoJSON lines (RFC 7946) with the time at each vertex; with local coordinates these stand in place of longitude and
/// latitude, and a member says so.
/// </summary>
public static class PathLines
{
    /// <summary>Decimals of longitude and latitude: a centimetre on the ground.</summary>
    private const int DegreeDecimals = 7;

    private static readonly JsonWriterOptions _options = new() { NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Writes the file.</summary>
    /// <param name="site">The site.</param>
    /// <param name="rows">The paths.</param>
    /// <param name="to">Where to.</param>
    public static void Write(SiteDocument site, ImmutableArray<PathRow> rows, Stream to)
    {
        using Utf8JsonWriter json = new(to, _options);
        json.WriteStartObject();
        json.WriteString("type", "FeatureCollection");
        if (site.Coordinates.IsLocal)
        {
            json.WriteString("coordinates", "local");
            json.WriteString("unit", site.Coordinates.Unit);
        }

        json.WriteStartArray("features");
        foreach (PathRow row in rows)
        {
            WriteFeature(json, site, row);
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteFeature(Utf8JsonWriter json, SiteDocument site, PathRow row)
    {
        json.WriteStartObject();
        json.WriteString("type", "Feature");
        json.WriteStartObject("properties");
        json.WriteString("name", row.Start.Name);
        json.WriteString("fate", FateText.Token(row.End.Fate, site.Model));
        json.WriteValue("time_d", row.End.Time);
        json.WriteValue("length_m", row.End.Length);
        json.WriteStartArray("times_d");
        foreach (PathPoint point in row.Points)
        {
            json.WriteValue(point.Time);
        }

        json.WriteEndArray();
        json.WriteEndObject();
        WriteLine(json, site, row);
        json.WriteEndObject();
    }

    private static void WriteLine(Utf8JsonWriter json, SiteDocument site, PathRow row)
    {
        const int ShortestLine = 2;
        if (row.Points.Length < ShortestLine)
        {
            json.WriteNull("geometry");
            return;
        }

        json.WriteStartObject("geometry");
        json.WriteString("type", "LineString");
        json.WriteStartArray("coordinates");
        foreach (PathPoint point in row.Points)
        {
            WritePlace(json, site, point.At);
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WritePlace(Utf8JsonWriter json, SiteDocument site, Complex at)
    {
        double x = site.Frame.SiteX(at), y = site.Frame.SiteY(at);
        json.WriteStartArray();
        if (site.Coordinates.IsLocal)
        {
            json.WriteValue(x);
            json.WriteValue(y);
        }
        else
        {
            (double longitude, double latitude) = site.Coordinates.ToLonLat(x, y);
            json.WriteRawValue(longitude.ToString($"F{DegreeDecimals}", CultureInfo.InvariantCulture));
            json.WriteRawValue(latitude.ToString($"F{DegreeDecimals}", CultureInfo.InvariantCulture));
        }

        json.WriteEndArray();
    }
}
