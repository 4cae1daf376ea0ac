using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Tests.Sites.Coordinates;

public sealed class ProjectionTests : IDisposable
{
    /// <summary>What an output may be off on the map, m.</summary>
    private const double OneCentimetre = 0.01;

    /// <summary>Agreement with independent values inside a zone, m; measured: a few micrometres.</summary>
    private const double ForwardTolerance = 1e-4;

    private readonly SiteFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    /// <summary>
    /// Computed with PROJ 9.1.1 (Debian proj-bin), longitude and latitude on the system's own datum:
    /// <c>echo "41.9 -98.2" | cs2cs -f %.10f EPSG:4269 EPSG:26914</c>, and in the same way EPSG:4326 to 32719 and 32632, 4258 to 25832,
    /// 4269 to 2231, 3435, 5070 and 2992.
    /// </summary>
    [Theory]
    [InlineData("EPSG:26914", -98.2, 41.9, 566357.9651171745, 4638982.8310929984)]
    [InlineData("EPSG:26914", -101.75, 30.25, 235385.7940305143, 3349688.5613469286)]
    [InlineData(Definitions.Utm14North, -98.2, 41.9, 566357.9651171745, 4638982.8310929984)]
    [InlineData("EPSG:32719", -70.65, -33.45, 346642.6949988917, 6297606.8324810723)]
    [InlineData("EPSG:32632", 4.2, 63.1, 257867.3040284744, 7005783.4678596873)]
    [InlineData("EPSG:25832", 7.25, 51.5, 378531.9365148036, 5706881.1180179780)]
    [InlineData(Definitions.ColoradoNorth, -104.9, 40.1, 3167844.3938206141, 1279842.2566404599)]
    [InlineData(Definitions.ColoradoNorthWkt1, -104.9, 40.1, 3167844.3938206141, 1279842.2566404599)]
    [InlineData(Definitions.IllinoisEast, -88.1, 41.8, 1047871.2043467324, 1869796.8338464063)]
    [InlineData(Definitions.Albers, -98.2, 41.9, -181228.5275189020, 2101823.2837092462)]
    [InlineData(Definitions.OregonLambert, -123.1, 44.05, 629009.2362305587, 849191.7565399660)]
    public void A_place_gets_the_plane_coordinates_that_an_independent_program_gives(
        string definition, double longitude, double latitude, double x, double y)
    {
        ProjectedSystem system = _folder.System(definition);
        (double X, double Y) found = system.FromLonLat(longitude, latitude);
        Assert.Equal(x, found.X, ForwardTolerance / system.MetresPerUnit);
        Assert.Equal(y, found.Y, ForwardTolerance / system.MetresPerUnit);
        Assert.Null(system.ProblemWith(found.X, found.Y));
    }

    [Theory]
    [InlineData("EPSG:26914", 562310.0, 4641240.0, "m")]
    [InlineData("EPSG:26914", 166021.0, 4641240.0, "m")]
    [InlineData("EPSG:32733", 833900.0, 9999999.0, "m")]
    [InlineData("EPSG:25832", 378531.9, 5706881.1, "m")]
    [InlineData(Definitions.ColoradoNorth, 3167844.39, 1279842.26, "ftUS")]
    [InlineData(Definitions.IllinoisEast, 1047871.2, 1869796.83, "ftUS")]
    [InlineData(Definitions.OregonLambert, 629009.2, 849191.76, "ft")]
    [InlineData(Definitions.Albers, -1_800_000.0, 2_900_000.0, "m")]
    public void A_place_goes_to_longitude_and_latitude_and_back_within_a_centimetre(string definition, double x, double y, string unit)
    {
        ProjectedSystem system = _folder.System(definition);
        (double longitude, double latitude) = system.ToLonLat(x, y);

        // Seven decimals, as RFC 7946 files carry them: half a unit of the last is 6 mm.
        (double backX, double backY) = system.FromLonLat(Math.Round(longitude, 7), Math.Round(latitude, 7));
        Assert.Equal(unit, system.Unit);
        Assert.Equal(x, backX, OneCentimetre / system.MetresPerUnit);
        Assert.Equal(y, backY, OneCentimetre / system.MetresPerUnit);
    }

    [Fact]
    public void Many_threads_share_one_system()
    {
        ProjectedSystem system = _folder.System("EPSG:26914");
        var found = new (double, double)[1000];
        Parallel.For(0, found.Length, i => found[i] = system.ToLonLat(500_000 + i, 4_641_240));
        Assert.All(Enumerable.Range(0, found.Length), i => Assert.Equal(system.ToLonLat(500_000 + i, 4_641_240), found[i]));
    }

    [Theory]
    [InlineData("EPSG:26914", -98.2, 41.9, "(-98.2, 41.9) looks like longitude and latitude; NAD83 / UTM zone 14N takes eastings and northings in m: project the site's coordinates to a plane system, such as EPSG:32614 (WGS 84 / UTM zone 14N)")]
    [InlineData("EPSG:26914", 4641240, 562310, "(4641240, 562310) is far outside NAD83 / UTM zone 14N, where eastings are 0 to 1000000 m and northings 0 to 10000000 m; check the order (easting, northing) and the zone")]
    [InlineData("EPSG:26914", 562310, -5, "(562310, -5) is far outside NAD83 / UTM zone 14N, where eastings are 0 to 1000000 m and northings 0 to 10000000 m; check the order (easting, northing) and the zone")]
    [InlineData("EPSG:26914", double.NaN, 4641240, "(NaN, 4641240) is far outside NAD83 / UTM zone 14N, where eastings are 0 to 1000000 m and northings 0 to 10000000 m; check the order (easting, northing) and the zone")]
    [InlineData(Definitions.IllinoisEast, 1e8, 1869796, "(100000000, 1869796) is outside the area where NAD_1983_StatePlane_Illinois_East_FIPS_1201_Feet can be used; check the coordinates, their order (easting, northing) and their unit (ftUS)")]
    public void A_place_far_outside_the_system_says_so(string definition, double x, double y, string expected) =>
        Assert.Equal(expected, _folder.System(definition).ProblemWith(x, y));

    [Fact]
    public void A_small_local_system_takes_small_coordinates()
    {
        string centred = Definitions.Utm14North
            .Replace("500000.0", "0.0", StringComparison.Ordinal)
            .Replace("\"Latitude_Of_Origin\",0.0", "\"Latitude_Of_Origin\",41.9", StringComparison.Ordinal);
        Assert.Null(_folder.System(centred).ProblemWith(-98.2, 41.9));
    }
}
