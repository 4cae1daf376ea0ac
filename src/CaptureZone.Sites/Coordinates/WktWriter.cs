using System.Globalization;

namespace CaptureZone.Sites.Coordinates;

/// <summary>Writes a definition in the two forms of well-known text that GIS read: WKT1 with EPSG codes, and that of .prj files.</summary>
internal static class WktWriter
{
    /// <summary>A degree in radians as both forms print it.</summary>
    private const string Degree = "0.0174532925199433";

    /// <summary>Order in which .prj files list parameters.</summary>
    private static readonly string[] EsriOrder =
    [
        "False_Easting",
        "False_Northing",
        "Central_Meridian",
        "Scale_Factor",
        "Standard_Parallel_1",
        "Standard_Parallel_2",
        "Latitude_Of_Origin",
    ];

    /// <summary>WKT1 (OGC 01-009) as for a GeoPackage.</summary>
    /// <param name="definition">The definition.</param>
    /// <param name="epsg">Its EPSG code; null when it has none.</param>
    public static string Wkt1(ProjectedDefinition definition, int? epsg)
    {
        Datum datum = definition.Datum;
        Ellipsoid ellipsoid = datum.Ellipsoid;
        string parameters = string.Concat(definition.Method.Parameters.Select(
            (parameter, i) => $"PARAMETER[\"{parameter.WktName}\",{Number(definition.Values[i])}],"));
        return $"PROJCS[\"{Quoted(definition.Name)}\",GEOGCS[\"{datum.Name}\",DATUM[\"{datum.WktName}\","
            + $"SPHEROID[\"{ellipsoid.Name}\",{Number(ellipsoid.SemiMajorAxis)},{Number(ellipsoid.InverseFlattening)}"
            + $"{Authority(ellipsoid.Epsg)}]"
            + $"{Authority(datum.Epsg)}],PRIMEM[\"Greenwich\",0{Authority(8901)}],UNIT[\"degree\",{Degree}{Authority(9122)}]"
            + $"{Authority(datum.GeographicEpsg)}],PROJECTION[\"{definition.Method.WktName}\"],{parameters}"
            + $"UNIT[\"{definition.Unit.WktName}\",{Number(definition.Unit.Metres)}{Authority(definition.Unit.Epsg)}],"
            + $"AXIS[\"Easting\",EAST],AXIS[\"Northing\",NORTH]{(epsg is { } code ? Authority(code) : string.Empty)}]";
    }

    /// <summary>The form of Shapefiles' .prj files.</summary>
    /// <param name="definition">The definition.</param>
    /// <param name="name">Its name in such files.</param>
    public static string Esri(ProjectedDefinition definition, string name)
    {
        Datum datum = definition.Datum;
        Ellipsoid ellipsoid = datum.Ellipsoid;
        string parameters = string.Concat(definition.Method.Parameters
            .Select((parameter, i) => (parameter.EsriName, Value: definition.Values[i]))
            .OrderBy(parameter => Array.IndexOf(EsriOrder, parameter.EsriName))
            .Select(parameter => $"PARAMETER[\"{parameter.EsriName}\",{Decimal(parameter.Value)}],"));
        return $"PROJCS[\"{Quoted(name)}\",GEOGCS[\"{datum.EsriGeographic}\",DATUM[\"D_{datum.EsriName}\","
            + $"SPHEROID[\"{Underscored(ellipsoid.Name)}\",{Decimal(ellipsoid.SemiMajorAxis)},{Decimal(ellipsoid.InverseFlattening)}]],"
            + $"PRIMEM[\"Greenwich\",0.0],UNIT[\"Degree\",{Degree}]],PROJECTION[\"{definition.Method.EsriName}\"],{parameters}"
            + $"UNIT[\"{definition.Unit.EsriName}\",{Decimal(definition.Unit.Metres)}]]";
    }

    /// <summary>A name as .prj files like it: letters, digits and underscores.</summary>
    /// <param name="name">A name in words.</param>
    public static string Underscored(string name) =>
        string.Join('_', name.Split([.. name.Where(c => !char.IsLetterOrDigit(c))], StringSplitOptions.RemoveEmptyEntries));

    private static string Authority(int code) => string.Create(CultureInfo.InvariantCulture, $",AUTHORITY[\"EPSG\",\"{code}\"]");

    private static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    private static string Decimal(double value)
    {
        string text = Number(value);
        return text.AsSpan().ContainsAny('.', 'E') ? text : $"{text}.0";
    }

    private static string Quoted(string name) => name.Replace("\"", "\"\"", StringComparison.Ordinal);
}
