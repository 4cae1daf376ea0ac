using System.Collections.Immutable;

namespace CaptureZone.Sites.Coordinates;

/// <summary>
/// A zone of the Universal Transverse Mercator grid. Its constants - zones of 6 degrees from 180 degrees west, scale 0.9996, false
/// easting 500 km, false northing 0 or 10 000 km - and EPSG codes are from memory (J. P. Snyder, Map Projections: A Working Manual,
/// 1987; EPSG's data set).
/// </summary>
/// <param name="Number">1 to 60, from 180 degrees west to the east.</param>
/// <param name="IsSouth">Whether it counts northings for the southern hemisphere.</param>
/// <param name="Datum">Its datum.</param>
/// <param name="Epsg">Its EPSG code.</param>
/// <param name="EsriName">Its name in .prj files.</param>
internal sealed record UtmZone(int Number, bool IsSouth, Datum Datum, int Epsg, string EsriName)
{
    /// <summary>Width of a zone, degrees.</summary>
    private const int ZoneWidth = 6;

    private const double CentralScale = 0.9996;
    private const double FalseEasting = 500_000;
    private const double SouthernFalseNorthing = 10_000_000;

    /// <summary>The grid reaches from 80 degrees south ...</summary>
    private const double SouthernLimit = -80;

    /// <summary>... to 84 degrees north.</summary>
    private const double NorthernLimit = 84;

    private static readonly ImmutableArray<Family> Families =
    [
        new(32600, 1, 60, IsSouth: false, Datum.Wgs84, "WGS_1984"),
        new(32700, 1, 60, IsSouth: true, Datum.Wgs84, "WGS_1984"),
        new(26900, 1, 23, IsSouth: false, Datum.Nad83, "NAD_1983"),
        new(25800, 28, 38, IsSouth: false, Datum.Etrs89, "ETRS_1989"),
    ];

    /// <summary>Its definition, named as in EPSG's data set.</summary>
    public ProjectedDefinition Definition => new(
        $"{Datum.Name} / UTM zone {Label}",
        Datum,
        ProjectionMethod.TransverseMercator,
        [0, Number * ZoneWidth - 183, CentralScale, FalseEasting, IsSouth ? SouthernFalseNorthing : 0],
        GridUnit.Metre);

    private string Label => Text(Number, IsSouth);

    /// <summary>The zone of an EPSG code; null when it is none of those that are known.</summary>
    /// <param name="code">The code.</param>
    public static UtmZone? OfCode(int code) => Families
        .Where(family => code >= family.Base + family.First && code <= family.Base + family.Last)
        .Select(family => family.Zone(code - family.Base))
        .FirstOrDefault();

    /// <summary>The zone that a definition is, under whatever name; null when it is none.</summary>
    /// <param name="definition">The definition.</param>
    public static UtmZone? Matching(ProjectedDefinition definition) => Families
        .Where(family => family.Datum == definition.Datum)
        .SelectMany(family => Enumerable.Range(family.First, family.Last - family.First + 1).Select(family.Zone))
        .FirstOrDefault(zone => zone.Definition.SameSystem(definition));

    /// <summary>The zone on WGS 84 in which a place lies, by meridians alone; null outside the grid.</summary>
    /// <param name="longitude">Degrees, -180 to 180.</param>
    /// <param name="latitude">Degrees, -80 to 84.</param>
    public static UtmZone? At(double longitude, double latitude)
    {
        bool inGrid = longitude is >= -180 and <= 180 && latitude is >= SouthernLimit and <= NorthernLimit;
        return inGrid ? Families[latitude < 0 ? 1 : 0].Zone((int)((longitude + 180) / ZoneWidth) % 60 + 1) : null;
    }

    private static string Text(int number, bool isSouth) =>
        string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{number}{(isSouth ? 'S' : 'N')}");

    private sealed record Family(int Base, int First, int Last, bool IsSouth, Datum Datum, string EsriPrefix)
    {
        public UtmZone Zone(int number) =>
            new(number, IsSouth, Datum, Base + number, $"{EsriPrefix}_UTM_Zone_{Text(number, IsSouth)}");
    }
}
