using System.Globalization;
using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Tests.Sites.Coordinates;

public sealed class CoordinateSystemsTests : IDisposable
{
    private readonly SiteFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Theory]
    [InlineData("local m", "m", 1.0)]
    [InlineData("local ft", "ft", 0.3048)]
    public void Local_coordinates_have_a_unit_and_no_place_on_earth(string stated, string unit, double metres)
    {
        Assert.True(CoordinateSystems.TryRead(stated, _folder.Files, out CoordinateSystem? system, out _));
        Assert.Equal((stated, unit, metres, true), (system.Stated, system.Unit, system.MetresPerUnit, system.IsLocal));
        Assert.Equal((null, string.Empty, string.Empty), (system.Epsg, system.Wkt, system.PrjText));
        Assert.Null(system.ProblemWith(-98, 41));
        Assert.Throws<InvalidOperationException>(() => system.ToLonLat(0, 0));
    }

    [Theory]
    [InlineData("EPSG:32601", "WGS 84 / UTM zone 1N", -177)]
    [InlineData("EPSG:32760", "WGS 84 / UTM zone 60S", 177)]
    [InlineData("epsg:26923", "NAD83 / UTM zone 23N", -45)]
    [InlineData("EPSG:25828", "ETRS89 / UTM zone 28N", -15)]
    [InlineData(" EPSG:25838 ", "ETRS89 / UTM zone 38N", 45)]
    public void A_UTM_code_gives_the_zone(string stated, string name, double centralMeridian)
    {
        ProjectedSystem system = _folder.System(stated);
        Assert.Equal((stated.Trim(), name, "m"), (system.Stated, system.Name, system.Unit));
        Assert.Equal(centralMeridian, system.Definition["central_meridian"]);
        Assert.EndsWith(system.Epsg!.Value.ToString(CultureInfo.InvariantCulture), system.Stated, StringComparison.Ordinal);
    }

    /// <summary>Texts as PROJ 9.1.1 (Debian proj-bin) prints them: <c>projinfo -o WKT1_GDAL EPSG:26914</c>, <c>-o WKT1_ESRI</c>.</summary>
    [Fact]
    public void A_UTM_zone_is_defined_in_both_forms_of_well_known_text()
    {
        ProjectedSystem system = _folder.System("EPSG:26914");
        Assert.Equal(Definitions.Utm14North, system.PrjText);
        Assert.Equal(
            "PROJCS[\"NAD83 / UTM zone 14N\",GEOGCS[\"NAD83\",DATUM[\"North_American_Datum_1983\",SPHEROID[\"GRS 1980\",6378137,298.257222101,"
            + "AUTHORITY[\"EPSG\",\"7019\"]],AUTHORITY[\"EPSG\",\"6269\"]],PRIMEM[\"Greenwich\",0,AUTHORITY[\"EPSG\",\"8901\"]],"
            + "UNIT[\"degree\",0.0174532925199433,AUTHORITY[\"EPSG\",\"9122\"]],AUTHORITY[\"EPSG\",\"4269\"]],PROJECTION[\"Transverse_Mercator\"],"
            + "PARAMETER[\"latitude_of_origin\",0],PARAMETER[\"central_meridian\",-99],PARAMETER[\"scale_factor\",0.9996],"
            + "PARAMETER[\"false_easting\",500000],PARAMETER[\"false_northing\",0],UNIT[\"metre\",1,AUTHORITY[\"EPSG\",\"9001\"]],"
            + "AXIS[\"Easting\",EAST],AXIS[\"Northing\",NORTH],AUTHORITY[\"EPSG\",\"26914\"]]",
            system.Wkt);
    }

    [Fact]
    public void A_prj_file_stands_in_outputs_as_it_was_given_and_a_known_zone_is_recognized()
    {
        ProjectedSystem zone = _folder.System(Definitions.Utm14North);
        Assert.Equal((Definitions.Utm14North, 26914, "NAD83 / UTM zone 14N"), (zone.PrjText, zone.Epsg, zone.Name));
        Assert.Equal(_folder.System("EPSG:26914").Wkt, zone.Wkt);

        ProjectedSystem plane = _folder.System(Definitions.ColoradoNorth);
        Assert.Equal((Definitions.ColoradoNorth, (int?)null, "ftUS"), (plane.PrjText, plane.Epsg, plane.Unit));
        Assert.Equal(1200.0 / 3937, plane.MetresPerUnit);
    }

    [Theory]
    [InlineData(Definitions.ColoradoNorth)]
    [InlineData(Definitions.ColoradoNorthWkt1)]
    [InlineData(Definitions.IllinoisEast)]
    [InlineData(Definitions.Albers)]
    [InlineData(Definitions.OregonLambert)]
    [InlineData("EPSG:32719")]
    public void Both_written_forms_read_back_as_the_same_system(string definition)
    {
        ProjectedSystem system = _folder.System(definition);
        Assert.True(system.Definition.SameSystem(_folder.System(system.Wkt).Definition));
        Assert.True(system.Definition.SameSystem(_folder.System(system.PrjText).Definition));
    }

    [Fact]
    public void A_WKT1_file_keeps_its_text_and_gets_a_prj_form()
    {
        ProjectedSystem system = _folder.System(Definitions.ColoradoNorthWkt1);
        Assert.Equal(Definitions.ColoradoNorthWkt1, system.Wkt);
        Assert.StartsWith("PROJCS[\"NAD83_Colorado_North_ftUS\",GEOGCS[\"GCS_North_American_1983\",", system.PrjText, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("D_NAD_1983_2011", "NAD83(2011)")]
    [InlineData("NAD83 (National Spatial Reference System 2011)", "NAD83(2011)")]
    [InlineData("D_NAD_1983_NSRS2007", "NAD83(NSRS2007)")]
    [InlineData("D_North_American_1983_HARN", "NAD83(HARN)")]
    [InlineData("D_North_American_1983_CSRS", "NAD83(CSRS)")]
    [InlineData("D_NAD_1983_CORS96", "NAD83(CORS96)")]
    [InlineData("D_ETRS_1989", "ETRS89")]
    public void Every_checked_datum_is_known_by_the_names_that_files_give_it(string written, string name)
    {
        string definition = Definitions.ColoradoNorth.Replace("D_North_American_1983", written, StringComparison.Ordinal);
        Assert.Equal(name, _folder.System(definition).Definition.Datum.Name);
    }

    [Fact]
    public void Systems_that_state_the_same_are_equal()
    {
        Assert.Equal(_folder.System("EPSG:26914"), _folder.System("EPSG:26914"));
        Assert.NotEqual(_folder.System("EPSG:26914"), _folder.System("EPSG:26915"));
    }

    [Fact]
    public void The_frame_has_a_whole_origin_so_that_written_coordinates_stay_exact()
    {
        SiteFrame frame = CoordinateSystems.FrameFor(_folder.System(Definitions.ColoradoNorth), 3167844.39, 1279842.76);
        Assert.Equal(new SiteFrame(3167844, 1279843, 1200.0 / 3937), frame);
    }

    [Theory]
    [InlineData(-98.2, 41.9, "EPSG:32614 (WGS 84 / UTM zone 14N)")]
    [InlineData(-70.65, -33.45, "EPSG:32719 (WGS 84 / UTM zone 19S)")]
    [InlineData(-180, 0, "EPSG:32601 (WGS 84 / UTM zone 1N)")]
    [InlineData(180, 0, "EPSG:32601 (WGS 84 / UTM zone 1N)")]
    [InlineData(179.99, -0.01, "EPSG:32760 (WGS 84 / UTM zone 60S)")]
    [InlineData(0, 84.5, null)]
    [InlineData(200, 10, null)]
    [InlineData(double.NaN, 10, null)]
    public void The_fitting_UTM_zone_is_suggested(double longitude, double latitude, string? expected) =>
        Assert.Equal(expected, CoordinateSystems.UtmSuggestion(longitude, latitude));

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("fa-IR")]
    public void Reading_and_writing_are_the_same_in_every_culture(string culture)
    {
        string prj = _folder.System(Definitions.ColoradoNorthWkt1).PrjText;
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            ProjectedSystem system = _folder.System(Definitions.ColoradoNorthWkt1);
            Assert.Equal(prj, system.PrjText);
            Assert.Equal(-104.9, system.ToLonLat(3167844.3938206141, 1279842.2566404599).Longitude, 1e-9);
            Assert.StartsWith("(-98.25, 41.5) looks like", system.ProblemWith(-98.25, 41.5), StringComparison.Ordinal);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
