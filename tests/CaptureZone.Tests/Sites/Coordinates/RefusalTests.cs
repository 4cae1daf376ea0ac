namespace CaptureZone.Tests.Sites.Coordinates;

public sealed class RefusalTests : IDisposable
{
    private const string UtmHint =
        "use a projected system, such as the site's UTM zone: EPSG:326zz (WGS 84, north), EPSG:327zz (WGS 84, south), EPSG:269zz (NAD83) "
        + "or EPSG:258zz (ETRS89), where zz is 1 + the whole part of (longitude + 180) / 6";

    private const string CodeHint =
        "is not among the codes that are known (UTM zones: EPSG:32601-32660, 32701-32760, 26901-26923, 25828-25838); save the system's "
        + "definition as a .prj file beside the site file and give that file's name, such as crs = \"site.prj\"";

    private const string KnownDatums = "known are WGS 84, NAD83 (also HARN, CORS96, NSRS2007, 2011, CSRS) and ETRS89";
    private const string KnownProjections = "known are Transverse_Mercator, Lambert_Conformal_Conic with two standard parallels, and Albers";

    private readonly SiteFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Theory]
    [InlineData("EPSG:4326", "'EPSG:4326' is longitude/latitude (WGS 84), not a plane system in metres or feet; " + UtmHint)]
    [InlineData("EPSG:4269", "'EPSG:4269' is longitude/latitude (NAD83), not a plane system in metres or feet; " + UtmHint)]
    [InlineData("EPSG:4267", "'EPSG:4267' is longitude/latitude (NAD27), not a plane system in metres or feet; " + UtmHint)]
    [InlineData("EPSG:3857", "'EPSG:3857' is web mercator, whose metres are not metres on the ground; " + UtmHint)]
    [InlineData("EPSG:2231", "'EPSG:2231' " + CodeHint)]
    [InlineData("EPSG:26924", "'EPSG:26924' " + CodeHint)]
    [InlineData("EPSG:32600", "'EPSG:32600' " + CodeHint)]
    [InlineData("EPSG:32661", "'EPSG:32661' " + CodeHint)]
    [InlineData("EPSG:26714", "'EPSG:26714' " + CodeHint)]
    [InlineData("26914", "'26914' is not a coordinate system; write \"EPSG:26914\" if that code is meant")]
    [InlineData("local", "'local' is not a coordinate system; local coordinates are \"local m\" or \"local ft\"")]
    [InlineData("UTM 14N", "'UTM 14N' is not a coordinate system; give an EPSG code such as \"EPSG:32614\", \"local m\", \"local ft\", or the name of a .prj or .wkt file")]
    [InlineData("EPSG:-1", "'EPSG:-1' is not a coordinate system; give an EPSG code such as \"EPSG:32614\", \"local m\", \"local ft\", or the name of a .prj or .wkt file")]
    [InlineData("none.prj", "'none.prj' is not there (looked for from the site file's folder); put the definition there, or give an EPSG code such as \"EPSG:32614\"")]
    public void A_stated_system_that_was_not_checked_is_refused_by_name(string stated, string expected) =>
        Assert.Equal(expected, _folder.Problem(stated));

    /// <summary>Each case changes one thing of a definition that is read.</summary>
    [Theory]
    [InlineData("\"D_North_American_1983\"", "\"D_North_American_1927\"", "has the datum 'D_North_American_1927', which was not checked; " + KnownDatums)]
    [InlineData("\"D_North_American_1983\"", "\"D_NAD_1983_PA11\"", "has the datum 'D_NAD_1983_PA11', which was not checked; " + KnownDatums)]
    [InlineData("298.257222101", "294.978698214", "has another ellipsoid ('GRS_1980') than its datum NAD83 has (GRS 1980); save the definition again")]
    [InlineData("[\"Greenwich\",0.0]", "[\"Paris\",2.33722917]", "has another prime meridian than Greenwich, which was not checked; use a system of Greenwich")]
    [InlineData("\"Degree\",0.0174532925199433", "\"Grad\",0.015707963267949", "gives angles in another unit than degrees, which was not checked; use a system in degrees")]
    [InlineData("298.257222101]", "298.257222101],TOWGS84[1.0,0,0,0,0,0,0]", "has a TOWGS84 shift that is not zero, which was not checked; use the definition without it")]
    [InlineData("298.257222101]", "298.257222101],EXTENSION[\"PROJ4_GRIDS\",\"x\"]", "has the part EXTENSION in DATUM, which was not checked; use the definition without it if the system is the same")]
    [InlineData("[\"Transverse_Mercator\"]", "[\"Hotine_Oblique_Mercator\"]", "has the projection 'Hotine_Oblique_Mercator', which was not checked; " + KnownProjections)]
    [InlineData("[\"Transverse_Mercator\"]", "[\"Mercator_Auxiliary_Sphere\"]", "has the projection 'Mercator_Auxiliary_Sphere', which was not checked; " + KnownProjections)]
    [InlineData("[\"Transverse_Mercator\"]", "[\"Lambert_Conformal_Conic\"]", "has the projection 'Lambert_Conformal_Conic' with one standard parallel, which was not checked; " + KnownProjections)]
    [InlineData("[\"Transverse_Mercator\"]", "[\"Double_Stereographic\"]", "has the projection 'Double_Stereographic', which was not checked; " + KnownProjections)]
    [InlineData("\"Meter\",1.0", "\"Yard\",0.9144", "has the unit 'Yard', which was not checked; known are metres, feet and US survey feet")]
    [InlineData("\"False_Easting\",500000.0", "\"Azimuth\",500000.0", "has the parameter 'Azimuth', which Transverse_Mercator does not have; save the definition again")]
    [InlineData("PARAMETER[\"Scale_Factor\",0.9996],", "", "must give the parameter 'scale_factor' once, as a number; save the definition again")]
    [InlineData("\"Scale_Factor\",0.9996", "\"Scale_Factor\",\"0,9996\"", "must give the parameter 'scale_factor' once, as a number; save the definition again")]
    [InlineData("\"Scale_Factor\",0.9996", "\"Scale_Factor\",-1", "has an impossible value for the parameter 'scale_factor'; save the definition again")]
    [InlineData("\"Central_Meridian\",-99.0", "\"Central_Meridian\",-990", "has an impossible value for the parameter 'central_meridian'; save the definition again")]
    [InlineData("\"Meter\",1.0]]", "\"Meter\",1.0],AXIS[\"Northing\",NORTH],AXIS[\"Easting\",EAST]]", "has its axes toward NORTH and EAST, which was not checked; use a system of easting and northing")]
    [InlineData("\"Meter\",1.0]]", "\"Meter\",1.0],AUTHORITY[\"EPSG\",\"26915\"]]", "says that it is NAD83 / UTM zone 15N by its code, but defines another system; save the definition again")]
    [InlineData("\"Meter\",1.0]]", "\"Meter\",1.0]],VERTCS[\"NAVD_1988\"]", "is not one definition in well-known text (PROJCS[...]); save the system's definition again as .prj, without a vertical system")]
    [InlineData("\"Meter\",1.0]]", "\"Meter\",1.0]", "is not one definition in well-known text (PROJCS[...]); save the system's definition again as .prj, without a vertical system")]
    [InlineData("\"Meter\",1.0]]", "\"Meter", "is not one definition in well-known text (PROJCS[...]); save the system's definition again as .prj, without a vertical system")]
    [InlineData("PROJCS[\"NAD_1983_UTM_Zone_14N\",", "PROJCRS[\"NAD83 / UTM zone 14N\",", "is written in WKT2 (PROJCRS), which is not read; save the definition as WKT1 or as an ESRI .prj")]
    [InlineData("PROJCS[\"NAD_1983_UTM_Zone_14N\",", "COMPD_CS[\"NAD83 + NAVD88\",", "joins a vertical system to the plane one (COMPD_CS); save the plane system alone (its PROJCS[...] part)")]
    [InlineData("PROJCS[\"NAD_1983_UTM_Zone_14N\",", "LOCAL_CS[\"site\",", "is a local system; write crs = \"local m\" or \"local ft\"")]
    [InlineData("PROJCS[\"NAD_1983_UTM_Zone_14N\",", "GEOCCS[\"x\",", "is a GEOCCS, not a projected system (PROJCS); give the definition of the site's plane system")]
    public void A_definition_that_was_not_checked_is_refused_by_name(string part, string changed, string expected)
    {
        Assert.Contains(part, Definitions.Utm14North, StringComparison.Ordinal);
        Assert.Equal($"'site.prj' {expected}", _folder.Problem(Definitions.Utm14North.Replace(part, changed, StringComparison.Ordinal)));
    }

    [Fact]
    public void A_longitude_latitude_definition_is_refused_with_the_way_to_a_UTM_zone() => Assert.Equal(
        $"'site.prj' is longitude/latitude (GCS_North_American_1983), not a plane system in metres or feet; {UtmHint}",
        _folder.Problem(Definitions.Nad83));

    [Fact]
    public void Parallels_that_make_no_cone_are_refused() => Assert.Equal(
        "'site.prj' has standard parallels that make no cone; save the definition again",
        _folder.Problem(Definitions.Albers.Replace("29.5", "-45.5", StringComparison.Ordinal)));

    [Fact]
    public void A_file_that_is_no_definition_is_refused_whatever_it_holds()
    {
        string expected = "'x.wkt' is not one definition in well-known text (PROJCS[...]); save the system's definition again as .prj, without a vertical system";
        string path = Path.Combine(_folder.Path, "x.wkt");
        foreach (string text in new[] { "", " ", "26914", "PROJCS", "PROJCS[", "PROJCS[]", "PROJCS[\"a\",]", string.Concat(Enumerable.Repeat("A[", 20_000)) })
        {
            File.WriteAllText(path, text);
            Assert.Equal(expected, _folder.Problem("x.wkt"));
        }

        File.WriteAllText(path, new string('A', 70_000));
        Assert.Equal(
            "'x.wkt' is too large for the definition of a coordinate system; put the definition there, or give an EPSG code such as \"EPSG:32614\"",
            _folder.Problem("x.wkt"));
    }
}
