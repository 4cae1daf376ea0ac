namespace CaptureZone.Tests.Sites.Coordinates;

/// <summary>
/// Definitions as a GIS writes them. Their constants are those of EPSG's data set, as PROJ 9.1.1 (Debian proj-bin) prints them with
/// <c>projinfo -o WKT1_ESRI EPSG:code</c> and <c>projinfo -o WKT1_GDAL EPSG:code</c>.
/// </summary>
internal static class Definitions
{
    /// <summary>Longitude and latitude on NAD83, in the form of .prj files.</summary>
    public const string Nad83 =
        """
        GEOGCS["GCS_North_American_1983",DATUM["D_North_American_1983",SPHEROID["GRS_1980",6378137.0,298.257222101]],PRIMEM["Greenwich",0.0],UNIT["Degree",0.0174532925199433]]
        """;

    /// <summary>EPSG:26914, whose name in such files is its own.</summary>
    public const string Utm14North =
        $"""
        PROJCS["NAD_1983_UTM_Zone_14N",{Nad83},PROJECTION["Transverse_Mercator"],PARAMETER["False_Easting",500000.0],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",-99.0],PARAMETER["Scale_Factor",0.9996],PARAMETER["Latitude_Of_Origin",0.0],UNIT["Meter",1.0]]
        """;

    /// <summary>EPSG:2231: Lambert with two parallels, US survey feet.</summary>
    public const string ColoradoNorth =
        $"""
        PROJCS["NAD_1983_StatePlane_Colorado_North_FIPS_0501_Feet",{Nad83},PROJECTION["Lambert_Conformal_Conic"],PARAMETER["False_Easting",3000000.0],PARAMETER["False_Northing",1000000.0],PARAMETER["Central_Meridian",-105.5],PARAMETER["Standard_Parallel_1",40.7833333333333],PARAMETER["Standard_Parallel_2",39.7166666666667],PARAMETER["Latitude_Of_Origin",39.3333333333333],UNIT["US survey foot",0.304800609601219]]
        """;

    /// <summary>EPSG:3435: transverse Mercator, US survey feet.</summary>
    public const string IllinoisEast =
        $"""
        PROJCS["NAD_1983_StatePlane_Illinois_East_FIPS_1201_Feet",{Nad83},PROJECTION["Transverse_Mercator"],PARAMETER["False_Easting",984250.0],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",-88.3333333333333],PARAMETER["Scale_Factor",0.999975],PARAMETER["Latitude_Of_Origin",36.6666666666667],UNIT["Foot_US",0.3048006096012192]]
        """;

    /// <summary>EPSG:5070: Albers, metres.</summary>
    public const string Albers =
        $"""
        PROJCS["NAD_1983_Contiguous_USA_Albers",{Nad83},PROJECTION["Albers"],PARAMETER["False_Easting",0.0],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",-96.0],PARAMETER["Standard_Parallel_1",29.5],PARAMETER["Standard_Parallel_2",45.5],PARAMETER["Latitude_Of_Origin",23.0],UNIT["Meter",1.0]]
        """;

    /// <summary>EPSG:2992: Lambert with two parallels, international feet.</summary>
    public const string OregonLambert =
        $"""
        PROJCS["NAD_1983_Oregon_Statewide_Lambert_Feet_Intl",{Nad83},PROJECTION["Lambert_Conformal_Conic"],PARAMETER["False_Easting",1312335.958],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",-120.5],PARAMETER["Standard_Parallel_1",43.0],PARAMETER["Standard_Parallel_2",45.5],PARAMETER["Latitude_Of_Origin",41.75],UNIT["foot",0.3048]]
        """;

    /// <summary>EPSG:2231 again, as WKT1 with codes, over several lines.</summary>
    public const string ColoradoNorthWkt1 =
        """
        PROJCS["NAD83 / Colorado North (ftUS)",
            GEOGCS["NAD83",
                DATUM["North_American_Datum_1983",
                    SPHEROID["GRS 1980",6378137,298.257222101,AUTHORITY["EPSG","7019"]],
                    TOWGS84[0,0,0,0,0,0,0],
                    AUTHORITY["EPSG","6269"]],
                PRIMEM["Greenwich",0,AUTHORITY["EPSG","8901"]],
                UNIT["degree",0.0174532925199433,AUTHORITY["EPSG","9122"]],
                AUTHORITY["EPSG","4269"]],
            PROJECTION["Lambert_Conformal_Conic_2SP"],
            PARAMETER["latitude_of_origin",39.3333333333333],
            PARAMETER["central_meridian",-105.5],
            PARAMETER["standard_parallel_1",40.7833333333333],
            PARAMETER["standard_parallel_2",39.7166666666667],
            PARAMETER["false_easting",3000000],
            PARAMETER["false_northing",1000000],
            UNIT["US survey foot",0.304800609601219,AUTHORITY["EPSG","9003"]],
            AXIS["Easting",EAST],
            AXIS["Northing",NORTH],
            AUTHORITY["EPSG","2231"]]
        """;
}
