using System.Collections.Immutable;

namespace CaptureZone.Sites.Coordinates;

/// <summary>A geodetic datum with the names that definitions give it.</summary>
/// <param name="Name">Name of its longitude/latitude system, such as "NAD83(2011)".</param>
/// <param name="WktName">Its own name in well-known text.</param>
/// <param name="EsriName">Its name in .prj files, without the leading "D_".</param>
/// <param name="EsriGeographic">Name of its longitude/latitude system in .prj files.</param>
/// <param name="Ellipsoid">Its ellipsoid.</param>
/// <param name="Epsg">EPSG code of the datum.</param>
/// <param name="GeographicEpsg">EPSG code of its longitude/latitude system.</param>
public sealed record Datum(
    string Name, string WktName, string EsriName, string EsriGeographic, Ellipsoid Ellipsoid, int Epsg, int GeographicEpsg)
{
    /// <summary>World Geodetic System 1984.</summary>
    public static Datum Wgs84 { get; } = new("WGS 84", "WGS_1984", "WGS_1984", "GCS_WGS_1984", Ellipsoid.Wgs84, 6326, 4326);

    /// <summary>North American Datum of 1983, its first realization.</summary>
    public static Datum Nad83 { get; } = new(
        "NAD83", "North_American_Datum_1983", "North_American_1983", "GCS_North_American_1983", Ellipsoid.Grs1980, 6269, 4269);

    /// <summary>European Terrestrial Reference System 1989.</summary>
    public static Datum Etrs89 { get; } = new(
        "ETRS89", "European_Terrestrial_Reference_System_1989", "ETRS_1989", "GCS_ETRS_1989", Ellipsoid.Grs1980, 6258, 4258);

    /// <summary>
    /// The datums that were checked. Each is taken as itself: longitude and latitude on it are written as they are, without a
    /// shift to WGS 84, from which all of these differ by at most a metre or two (common practice of GIS, no source).
    /// </summary>
    public static ImmutableArray<Datum> Checked { get; } =
    [
        Wgs84,
        Nad83,
        new(
            "NAD83(HARN)",
            "NAD83_High_Accuracy_Reference_Network",
            "North_American_1983_HARN",
            "GCS_North_American_1983_HARN",
            Ellipsoid.Grs1980,
            6152,
            4152),
        new(
            "NAD83(CORS96)",
            "NAD83_Continuously_Operating_Reference_Station_1996",
            "NAD_1983_CORS96",
            "GCS_NAD_1983_CORS96",
            Ellipsoid.Grs1980,
            1133,
            6783),
        new(
            "NAD83(NSRS2007)",
            "NAD83_National_Spatial_Reference_System_2007",
            "NAD_1983_NSRS2007",
            "GCS_NAD_1983_NSRS2007",
            Ellipsoid.Grs1980,
            6759,
            4759),
        new(
            "NAD83(2011)",
            "NAD83_National_Spatial_Reference_System_2011",
            "NAD_1983_2011",
            "GCS_NAD_1983_2011",
            Ellipsoid.Grs1980,
            1116,
            6318),
        new(
            "NAD83(CSRS)",
            "NAD83_Canadian_Spatial_Reference_System",
            "North_American_1983_CSRS",
            "GCS_North_American_1983_CSRS",
            Ellipsoid.Grs1980,
            6140,
            4617),
        Etrs89,
    ];

    /// <summary>The checked datum of a name as definitions write it; null when there is none.</summary>
    /// <param name="name">Such as "D_North_American_1983" or "NAD83 (National Spatial Reference System 2011)".</param>
    public static Datum? Find(string name)
    {
        string plain = Plain(name.StartsWith("D_", StringComparison.Ordinal) ? name[2..] : name);
        return Checked.FirstOrDefault(
            datum => plain == Plain(datum.WktName) || plain == Plain(datum.EsriName) || plain == Plain(datum.Name));
    }

    private static string Plain(string name) => string.Concat(name.Where(char.IsAsciiLetterOrDigit)).ToUpperInvariant();
}
