namespace CaptureZone.Sites.Coordinates;

/// <summary>An ellipsoid of revolution.</summary>
/// <param name="Name">Its name in well-known text, such as "GRS 1980".</param>
/// <param name="SemiMajorAxis">Equatorial radius, m.</param>
/// <param name="InverseFlattening">Equatorial radius over the difference of the radii.</param>
/// <param name="Epsg">EPSG code.</param>
public sealed record Ellipsoid(string Name, double SemiMajorAxis, double InverseFlattening, int Epsg)
{
    /// <summary>WGS 84 (from memory: EPSG 7030).</summary>
    public static Ellipsoid Wgs84 { get; } = new("WGS 84", 6_378_137, 298.257223563, 7030);

    /// <summary>GRS 1980 (from memory: EPSG 7019).</summary>
    public static Ellipsoid Grs1980 { get; } = new("GRS 1980", 6_378_137, 298.257222101, 7019);
}
