using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Tests.Outputs;

/// <summary>
/// A stand-in for a projected system: says that it is EPSG:26914, but maps to degrees by a plain linear rule, so that tests of
/// outputs need no projection.
/// </summary>
public sealed record SampleProjectedSystem : CoordinateSystem
{
    public const double MetresPerDegreeEast = 83_000;
    public const double MetresPerDegreeNorth = 111_000;

    public override bool IsLocal => false;

    public static SampleProjectedSystem Create() => new()
    {
        Stated = "EPSG:26914",
        Name = "NAD83 / UTM zone 14N",
        Unit = "m",
        MetresPerUnit = 1,
        Epsg = 26914,
        Wkt = """
            PROJCS["NAD83 / UTM zone 14N",GEOGCS["NAD83",DATUM["North_American_Datum_1983",SPHEROID["GRS 1980",6378137,298.257222101,AUTHORITY["EPSG","7019"]],AUTHORITY["EPSG","6269"]],PRIMEM["Greenwich",0,AUTHORITY["EPSG","8901"]],UNIT["degree",0.0174532925199433,AUTHORITY["EPSG","9122"]],AUTHORITY["EPSG","4269"]],PROJECTION["Transverse_Mercator"],PARAMETER["latitude_of_origin",0],PARAMETER["central_meridian",-99],PARAMETER["scale_factor",0.9996],PARAMETER["false_easting",500000],PARAMETER["false_northing",0],UNIT["metre",1,AUTHORITY["EPSG","9001"]],AXIS["Easting",EAST],AXIS["Northing",NORTH],AUTHORITY["EPSG","26914"]]
            """,
        PrjText = """
            PROJCS["NAD_1983_UTM_Zone_14N",GEOGCS["GCS_North_American_1983",DATUM["D_North_American_1983",SPHEROID["GRS_1980",6378137.0,298.257222101]],PRIMEM["Greenwich",0.0],UNIT["Degree",0.0174532925199433]],PROJECTION["Transverse_Mercator"],PARAMETER["False_Easting",500000.0],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",-99.0],PARAMETER["Scale_Factor",0.9996],PARAMETER["Latitude_Of_Origin",0.0],UNIT["Meter",1.0]]
            """,
    };

    public override (double Longitude, double Latitude) ToLonLat(double x, double y) =>
        (-99 + (x - 500_000) / MetresPerDegreeEast, y / MetresPerDegreeNorth);
}

/// <summary>Local coordinates in feet or metres.</summary>
public sealed record SampleLocalSystem : CoordinateSystem
{
    public override bool IsLocal => true;

    public static SampleLocalSystem Create(string unit) => new()
    {
        Stated = $"local {unit}",
        Name = "local coordinates",
        Unit = unit,
        MetresPerUnit = unit == "ft" ? 0.3048 : 1,
        Epsg = null,
        Wkt = "",
        PrjText = "",
    };

    public override (double Longitude, double Latitude) ToLonLat(double x, double y) =>
        throw new InvalidOperationException("Local coordinates are tied to no place on earth.");
}
