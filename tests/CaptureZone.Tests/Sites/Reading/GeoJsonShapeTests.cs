using CaptureZone.Sites;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Sites.Reading;

public sealed class GeoJsonShapeTests
{
    private const string Outline = "outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]";

    private const string Ring = "[[-98.254,41.922],[-98.249,41.921],[-98.249,41.922],[-98.254,41.922]]";

    private const string Wrapped =
        """{"type":"FeatureCollection","features":[{"type":"Feature","properties":{},"geometry":{"type":"Polygon","coordinates":[RING]}}]}""";

    [Fact]
    public void Longitude_and_latitude_land_where_the_projection_puts_them()
    {
        SiteDocument site = Plume(Wrapped.Replace("RING", Ring, StringComparison.Ordinal)).Document!;
        Coordinate corner = site.Questions.Plumes.Single().Outline.Coordinates[0];
        System.Numerics.Complex local = new(corner.X, corner.Y);
        (double longitude, double latitude) = site.Coordinates.ToLonLat(site.Frame.SiteX(local), site.Frame.SiteY(local));
        Assert.Equal(-98.254, longitude, 1e-9);
        Assert.Equal(41.922, latitude, 1e-9);
        Assert.Equal("plume.geojson", site.Inputs.Single(input => input.Key == "plume.Cr.file").Written);
    }

    [Theory]
    [InlineData("""{"type":"Feature","properties":null,"geometry":{"type":"Polygon","coordinates":[RING]}}""")]
    [InlineData("""{"type":"Polygon","coordinates":[RING]}""")]
    [InlineData("""{"type":"MultiPolygon","coordinates":[[RING]]}""")]
    [InlineData("""{"type":"GeometryCollection","geometries":[{"type":"Polygon","coordinates":[RING]}]}""")]
    [InlineData("""{"type":"Polygon","coordinates":[RING],"crs":{"type":"name","properties":{"name":"urn:ogc:def:crs:OGC:1.3:CRS84"}}}""")]
    [InlineData("""{"type":"FeatureCollection","features":[{"type":"Feature","geometry":null},{"type":"Feature","geometry":{"type":"Polygon","coordinates":[RING]}}]}""")]
    public void One_polygon_in_any_wrapping_is_a_plume(string json) =>
        Assert.Empty(Plume(json.Replace("RING", Ring, StringComparison.Ordinal)).Complaints.Select(complaint => complaint.Text));

    [Theory]
    [InlineData("", "is not JSON: see its line 1")]
    [InlineData("{\n\"type\":\n", "is not JSON: see its line 3")]
    [InlineData("[]", "is not GeoJSON: it holds no object")]
    [InlineData("""{"a":1}""", "is not GeoJSON: an object without \"type\"")]
    [InlineData("""{"type":"Topology"}""", "is not GeoJSON: unknown type \"Topology\"")]
    [InlineData("""{"type":"FeatureCollection"}""", "is not GeoJSON: \"features\" is missing")]
    [InlineData("""{"type":"FeatureCollection","features":{}}""", "is not GeoJSON: \"features\" must be a list")]
    [InlineData("""{"type":"FeatureCollection","features":[]}""", "holds no shape")]
    [InlineData("""{"type":"Feature","geometry":null}""", "holds no shape")]
    [InlineData("""{"type":"Polygon","coordinates":[]}""", "has a polygon without an outline")]
    [InlineData("""{"type":"Polygon","coordinates":[[[-98.25,41.92],[-98.24,41.92],[-98.24,41.93]]]}""", "has an outline of fewer than four positions, the first repeated at the end")]
    [InlineData("""{"type":"Polygon","coordinates":[[[-98.25,41.92],[-98.24,41.92],[-98.24,41.93],[-98.25,41.93]]]}""", "has an outline that is not closed; repeat its first position at the end")]
    [InlineData("""{"type":"Polygon","coordinates":[[[-98.25,41.92],[-98.24,1e400],[-98.24,41.93],[-98.25,41.92]]]}""", "has a position that is not two numbers: [-98.24,1e400]")]
    [InlineData("""{"type":"Polygon","coordinates":[[[-98.25,41.92],["x",41.92],[-98.24,41.93],[-98.25,41.92]]]}""", "has a position that is not two numbers: [\"x\",41.92]")]
    [InlineData("""{"type":"Polygon","coordinates":[[[-98.25,41.92],[NaN,41.92],[-98.24,41.93],[-98.25,41.92]]]}""", "is not JSON: see its line 1")]
    [InlineData("""{"type":"Polygon","coordinates":[[[562000,4641000],[562100,4641000],[562100,4641100],[562000,4641000]]]}""", "has (562000, 4641000), which is no longitude and latitude; export it as RFC 7946 (WGS 84) has it")]
    [InlineData("""{"type":"Polygon","coordinates":[],"crs":{"type":"name","properties":{"name":"EPSG:26914"}}}""", "states a coordinate system (\"crs\"); RFC 7946 knows longitude and latitude on WGS 84 only: export it again as such")]
    [InlineData("""{"type":"FeatureCollection","coordinates":"local","features":[]}""", "has local coordinates, but the site is in NAD83 / UTM zone 14N; export it in longitude and latitude")]
    public void A_file_that_would_put_a_shape_in_the_wrong_place_is_refused(string json, string problem) =>
        Assert.Equal([$"33:8: error: the file \"plume.geojson\" {problem}"], SmallSite.Complaints(Plume(json)));

    [Fact]
    public void A_plume_of_several_polygons_is_refused()
    {
        string json = $$"""{"type":"MultiPolygon","coordinates":[[{{Ring}}],[{{Ring}}]]}""";
        Assert.Equal(
            ["33:8: error: a plume is one polygon; the file holds 2 shapes: give every polygon a [[plume]] of its own"],
            SmallSite.Complaints(Plume(json)));
    }

    [Fact]
    public void A_plume_that_is_a_line_is_refused() => Assert.Equal(
        ["33:8: error: a plume is one polygon; the file holds a LineString: give every polygon a [[plume]] of its own"],
        SmallSite.Complaints(Plume("""{"type":"LineString","coordinates":[[-98.254,41.922],[-98.249,41.921]]}""")));

    [Fact]
    public void A_polygon_that_crosses_itself_is_refused_with_the_place()
    {
        SiteReading reading = Plume("""{"type":"Polygon","coordinates":[[[-98.25,41.92],[-98.24,41.93],[-98.24,41.92],[-98.25,41.93],[-98.25,41.92]]]}""");
        Assert.StartsWith(
            "the file \"plume.geojson\" has an outline that crosses or touches itself at (", reading.Complaints.Single().Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_plume_may_have_a_hole()
    {
        SiteReading reading = Plume(
            """
            {"type":"Polygon","coordinates":[
              [[-98.26,41.92],[-98.24,41.92],[-98.24,41.93],[-98.26,41.93],[-98.26,41.92]],
              [[-98.255,41.922],[-98.255,41.928],[-98.245,41.928],[-98.245,41.922],[-98.255,41.922]]]}
            """);
        Assert.Equal(1, reading.Document!.Questions.Plumes.Single().Outline.NumInteriorRings);
    }

    [Fact]
    public void Local_sites_take_local_coordinates_and_refuse_degrees()
    {
        string text = SmallSite.With(Outline, "file = \"plume.geojson\"").Replace("EPSG:26914", "local m", StringComparison.Ordinal);
        string local = """{"type":"Polygon","coordinates":[[[561800,4641300],[562200,4641200],[562200,4641300],[561800,4641300]]]}""";
        SiteReading reading = SmallSite.Read(text, ("plume.geojson", local));
        Assert.Equal(20_000, reading.Document!.Questions.Plumes.Single().Outline.Area, 1e-6);
        reading = SmallSite.Read(text, ("plume.geojson", $$"""{"type":"Polygon","coordinates":[{{Ring}}]}"""));
        Assert.Equal(
            "the file \"plume.geojson\" seems to be in longitude and latitude, but the site has local coordinates; write it in those",
            reading.Complaints[0].Text);
    }

    [Fact]
    public void A_backdrop_may_hold_shapes_of_any_kind()
    {
        string text = SmallSite.With("line = [[562000.0, 4641000.0], [562500.0, 4641000.0]]", "file = \"map.geojson\"");
        SiteReading reading = SmallSite.Read(text, ("map.geojson",
            $$"""{"type":"GeometryCollection","geometries":[{"type":"Point","coordinates":[-98.25,41.92]},{"type":"MultiLineString","coordinates":[{{Ring}}]}]}"""));
        Assert.Empty(reading.Complaints);
        Assert.Equal(2, reading.Document!.Backdrops.Single().Shape.NumGeometries);
    }

    private static SiteReading Plume(string json) => SmallSite.Read(SmallSite.With(Outline, "file = \"plume.geojson\""), ("plume.geojson", json));
}
