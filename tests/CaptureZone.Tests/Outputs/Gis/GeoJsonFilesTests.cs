using System.Text.Json;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Gis;
using NetTopologySuite.Features;
using NetTopologySuite.Geometries;
using NetTopologySuite.IO.Converters;

namespace CaptureZone.Tests.Outputs.Gis;

public sealed class GeoJsonFilesTests
{
    private static readonly JsonSerializerOptions Reading = new() { Converters = { new GeoJsonConverterFactory() } };
    private static readonly Report Sample = SampleReport.Create();

    public static TheoryData<string> Names => [.. SiteLayers.Computed(Sample).Select(layer => layer.Name)];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_file_reads_back_as_valid_shapes_wound_by_the_right_hand_rule(string name)
    {
        FeatureCollection features = JsonSerializer.Deserialize<FeatureCollection>(Text(Sample, name), Reading)!;
        Assert.Equal(SiteLayers.Computed(Sample).Single(layer => layer.Name == name).Features.Length, features.Count);
        foreach (IFeature feature in features)
        {
            Assert.True(feature.Geometry.IsValid);
            GridProjectionTests.AssertWound(feature.Geometry);
            Assert.All(feature.Geometry.Coordinates, at => Assert.InRange(at.X, -98.3, -98.2));
            Assert.All(feature.Geometry.Coordinates, at => Assert.InRange(at.Y, 41.79, 41.84));
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Places_have_at_most_seven_decimals(string name)
    {
        JsonNode root = JsonNode.Parse(Text(Sample, name))!;
        string[] numbers =
        [
            .. root["features"]!.AsArray().SelectMany(
                feature => Regex.Matches(feature!["geometry"]!["coordinates"]!.ToJsonString(), @"[^\[\],]+").Select(match => match.Value)),
        ];
        Assert.All(numbers, number => Assert.Matches(@"^-?\d+(\.\d{1,7})?$", number));
        Assert.Contains(numbers, number => Regex.IsMatch(number, @"\.\d{7}$"));
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void A_file_has_only_the_members_that_the_standard_names(string name)
    {
        JsonObject root = JsonNode.Parse(Text(Sample, name))!.AsObject();
        Assert.Equal(["type", "features"], root.Select(member => member.Key));
        Assert.All(
            root["features"]!.AsArray(),
            feature => Assert.Equal(["type", "properties", "geometry"], feature!.AsObject().Select(member => member.Key)));
    }

    [Fact]
    public void A_ring_ends_where_it_begins()
    {
        JsonNode root = JsonNode.Parse(Text(Sample, "capture_zones"))!;
        int rings = 0;
        foreach (JsonNode? feature in root["features"]!.AsArray())
        {
            Assert.Equal("Polygon", (string?)feature!["geometry"]!["type"]);
            foreach (JsonNode? ring in feature["geometry"]!["coordinates"]!.AsArray())
            {
                Assert.True(ring!.AsArray().Count >= 4);
                Assert.True(JsonNode.DeepEquals(ring[0], ring.AsArray()[^1]));
                rings++;
            }
        }

        Assert.Equal(5, rings);
    }

    [Fact]
    public void A_zone_names_its_well_and_keeps_its_place_and_area()
    {
        JsonNode zone = JsonNode.Parse(Text(Sample, "capture_zones"))!["features"]![1]!;
        Assert.Equal("RW-2", (string?)zone["properties"]!["well"]);
        Assert.True((bool)zone["properties"]!["open"]!);
        Assert.Null(zone["properties"]!["area_m2"]);

        FeatureCollection read = JsonSerializer.Deserialize<FeatureCollection>(Text(Sample, "capture_zones"), Reading)!;
        double area = read[1].Geometry.Area * SampleProjectedSystem.MetresPerDegreeEast * SampleProjectedSystem.MetresPerDegreeNorth;
        Assert.Equal(Sample.Answers.Wells[1].Zone!.InExtent.Area, area, 50.0);
        var at = Sample.Site.Frame;
        (double longitude, double latitude) = Sample.Site.Coordinates.ToLonLat(at.OriginX + 38, at.OriginY - 15);
        Assert.True(read[1].Geometry.Covers(new Point(longitude, latitude)));
    }

    [Fact]
    public void Local_coordinates_are_told_as_such()
    {
        Report local = SampleReport.Create(SampleLocalSystem.Create("ft"));
        JsonObject root = JsonNode.Parse(Text(local, "stagnation_points"))!.AsObject();
        Assert.Equal(["type", "coordinates", "unit", "features"], root.Select(member => member.Key));
        Assert.Equal("local", (string?)root["coordinates"]);
        Assert.Equal("ft", (string?)root["unit"]);
        JsonNode place = root["features"]![0]!["geometry"]!["coordinates"]!;
        Assert.Equal(5000 + local.Answers.StagnationPoints[0].At.Real / 0.3048, (double)place[0]!, 6e-4);
        Assert.Equal(5000 + local.Answers.StagnationPoints[0].At.Imaginary / 0.3048, (double)place[1]!, 6e-4);
    }

    [Fact]
    public void A_report_without_findings_gives_whole_files_without_features()
    {
        Report empty = Sample with { Answers = Sample.Answers with { Wells = [], Paths = [], Contours = [], StagnationPoints = [] } };
        foreach (Layer layer in SiteLayers.Computed(empty))
        {
            Assert.Empty(JsonNode.Parse(Text(empty, layer.Name))!["features"]!.AsArray());
        }
    }

    [Fact]
    public void A_name_with_marks_of_json_reads_back()
    {
        string name = "well \"A\\B\" <ö>";
        Report marked = Sample with
        {
            Site = Sample.Site with
            {
                Model = Sample.Site.Model with { Elements = [Sample.Site.Model.Wells[0] with { Name = name }] },
            },
            Answers = Sample.Answers with { Wells = [Sample.Answers.Wells[0]], Paths = [] },
        };
        Assert.Equal(name, (string?)JsonNode.Parse(Text(marked, "capture_zones"))!["features"]![0]!["properties"]!["well"]);
    }

    private static string Text(Report report, string name)
    {
        using TemporaryFolder folder = new();
        GeoJsonFiles.Write(report, folder.Path);
        return File.ReadAllText(folder[name + ".geojson"]);
    }
}
