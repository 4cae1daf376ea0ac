using CaptureZone.Outputs;
using CaptureZone.Outputs.Gis;
using NetTopologySuite.IO.Esri;
using Feature = NetTopologySuite.Features.Feature;

namespace CaptureZone.Tests.Outputs.Gis;

public sealed class ShapefileFolderTests
{
    private static readonly Report Sample = SampleReport.Create();

    [Fact]
    public void Every_layer_has_its_five_files_and_reads_back()
    {
        using TemporaryFolder folder = new();
        ShapefileFolder.Write(Sample, folder.Path);
        foreach (Layer layer in SiteLayers.All(Sample))
        {
            Assert.Equal(
                [".cpg", ".dbf", ".prj", ".shp", ".shx"],
                Directory.EnumerateFiles(folder.Path, layer.Name + ".*").Select(Path.GetExtension).Order());
            Assert.Equal("UTF-8", File.ReadAllText(folder[layer.Name + ".cpg"]));
            Assert.Equal(Sample.Site.Coordinates.PrjText, File.ReadAllText(folder[layer.Name + ".prj"]));
            Feature[] features = Read(folder, layer.Name);
            Assert.Equal(layer.Features.Length, features.Length);
            Assert.All(layer.Features.Zip(features), pair =>
            {
                Assert.True(pair.Second.Geometry.IsValid);
                Assert.Equal(pair.First.Shape.Area, pair.Second.Geometry.Area, 2.0);
                Assert.Equal(562_300 + pair.First.Shape.EnvelopeInternal.MinX, pair.Second.Geometry.EnvelopeInternal.MinX, 1e-3);
            });
        }
    }

    [Fact]
    public void Attributes_read_back_and_none_carries_over_from_the_row_before()
    {
        using TemporaryFolder folder = new();
        ShapefileFolder.Write(Sample, folder.Path);
        Feature[] wells = Read(folder, "wells");
        Assert.Equal(["RW-1", "RW-2", "RW-3", "IW-1", "SW-1"], wells.Select(well => (string)well.Attributes["well"]));
        Assert.Equal([150.0, 160, 140, -180, 250], wells.Select(well => (double)well.Attributes["rate_m3_d"]));
        Assert.Equal([1900.0, 1800, 1700, null, 1500], wells.Select(well => (double?)well.Attributes["largest_m3"]));
        Feature[] zones = Read(folder, "capture_zones");
        Assert.Equal([true, true, true, false], zones.Select(zone => (bool)zone.Attributes["open"]));
        Assert.Null(zones[0].Attributes["area_m2"]);
        Assert.Equal(4, Read(folder, "stagnation_points").Sum(point => (int)point.Attributes["multiplic"]));
    }

    [Fact]
    public void A_text_longer_than_the_format_holds_is_cut_between_characters()
    {
        string name = new('ö', 200);
        Report wordy = Sample with { Site = Sample.Site with { Backdrops = [Sample.Site.Backdrops[0] with { Name = name }] } };
        using TemporaryFolder folder = new();
        ShapefileFolder.Write(wordy, folder.Path);
        Assert.Equal(name[..127], Read(folder, "backdrop_areas").Single().Attributes["name"]);
    }

    [Fact]
    public void Local_coordinates_have_no_projection_file_and_a_layer_without_features_no_file()
    {
        Report local = SampleReport.Create(SampleLocalSystem.Create("m"));
        using TemporaryFolder folder = new();
        ShapefileFolder.Write(local with { Answers = local.Answers with { Paths = [] } }, folder.Path);
        Assert.Empty(Directory.EnumerateFiles(folder.Path, "*.prj"));
        Assert.Empty(Directory.EnumerateFiles(folder.Path, "paths.*"));
        Assert.NotEmpty(Directory.EnumerateFiles(folder.Path, "wells.*"));
    }

    [Fact]
    public void A_table_bears_a_fixed_date()
    {
        using TemporaryFolder folder = new();
        ShapefileFolder.Write(Sample, folder.Path);
        Assert.All(
            Directory.EnumerateFiles(folder.Path, "*.dbf"), path => Assert.Equal([100, 1, 1], File.ReadAllBytes(path)[1..4]));
    }

    private static Feature[] Read(TemporaryFolder folder, string name) => Shapefile.ReadAllFeatures(folder[name + ".shp"]);
}
