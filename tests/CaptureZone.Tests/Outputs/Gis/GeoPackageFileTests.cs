using CaptureZone.Outputs;
using CaptureZone.Outputs.Gis;
using Microsoft.Data.Sqlite;
using NetTopologySuite.Geometries;
using NetTopologySuite.IO;

namespace CaptureZone.Tests.Outputs.Gis;

public sealed class GeoPackageFileTests
{
    private static readonly Report Sample = SampleReport.Create();

    [Fact]
    public void A_package_says_what_it_is_in_its_head()
    {
        using TemporaryFolder folder = new();
        GeoPackageFile.Write(Sample, folder["gis.gpkg"]);
        Assert.Equal(0x47504B47L, Assert.Single(Query(folder, "PRAGMA application_id"))[0]);
        Assert.Equal(10300L, Assert.Single(Query(folder, "PRAGMA user_version"))[0]);
        Assert.Equal("ok", Assert.Single(Query(folder, "PRAGMA integrity_check"))[0]);
        Assert.Empty(Query(folder, "PRAGMA foreign_key_check"));
    }

    [Fact]
    public void Every_layer_is_there_with_valid_shapes_in_the_sites_own_system()
    {
        using TemporaryFolder folder = new();
        GeoPackageFile.Write(Sample, folder["gis.gpkg"]);
        GeoPackageGeoReader reader = new() { HandleSRID = true };
        foreach (Layer layer in SiteLayers.All(Sample))
        {
            object[][] rows = [.. Query(folder, $"SELECT geom FROM {layer.Name} ORDER BY fid")];
            Assert.Equal(layer.Features.Length, rows.Length);
            Assert.All(layer.Features.Zip(rows), pair =>
            {
                Geometry shape = reader.Read((byte[])pair.Second[0]);
                Assert.True(shape.IsValid);
                Assert.Equal(26914, shape.SRID);
                Assert.Equal(pair.First.Shape.Area, shape.Area, 2.0);
                Assert.Equal(pair.First.Shape.Length, shape.Length, 0.1);
                Assert.Equal(562_300 + pair.First.Shape.EnvelopeInternal.MinX, shape.EnvelopeInternal.MinX, 1e-3);
                Assert.Equal(4_641_300 + pair.First.Shape.EnvelopeInternal.MinY, shape.EnvelopeInternal.MinY, 1e-3);
            });
        }
    }

    [Fact]
    public void The_contents_name_every_layer_with_its_bounds()
    {
        using TemporaryFolder folder = new();
        GeoPackageFile.Write(Sample, folder["gis.gpkg"]);
        object[][] contents = [.. Query(folder, "SELECT table_name, srs_id, min_x, max_y FROM gpkg_contents ORDER BY rowid")];
        Assert.Equal(SiteLayers.All(Sample).Select(layer => layer.Name), contents.Select(row => (string)row[0]));
        Assert.All(contents, row => Assert.Equal(26914L, row[1]));
        Assert.Equal(561_400, (double)contents[0][2], 1e-3);
    }

    [Fact]
    public void Attributes_read_back_and_what_does_not_exist_is_null()
    {
        using TemporaryFolder folder = new();
        GeoPackageFile.Write(Sample, folder["gis.gpkg"]);
        object[] zone = Query(folder, "SELECT well, purpose, rate_m3_d, open, area_m2, width_upgradient_m FROM capture_zones").First();
        Assert.Equal(["RW-1", "containment", 150.0, 1L, DBNull.Value, 224.0], zone);
        object[] injection = Query(folder, "SELECT rate_m3_d, largest_rate_m3_d FROM wells WHERE well = 'IW-1'").Single();
        Assert.Equal([-180.0, DBNull.Value], injection);
    }

    [Fact]
    public void Local_coordinates_bear_the_number_of_the_undefined_cartesian_system()
    {
        using TemporaryFolder folder = new();
        GeoPackageFile.Write(SampleReport.Create(SampleLocalSystem.Create("ft")), folder["gis.gpkg"]);
        Assert.All(
            Query(folder, "SELECT srs_id, description FROM gpkg_contents"),
            row => Assert.Equal([-1L, "coordinates in ft, local coordinates"], row));
        Assert.Equal([-1L, 0L, 4326L], Query(folder, "SELECT srs_id FROM gpkg_spatial_ref_sys ORDER BY srs_id").Select(row => (long)row[0]));
    }

    [Fact]
    public void A_system_without_a_code_is_defined_in_the_file()
    {
        SampleProjectedSystem own = SampleProjectedSystem.Create() with { Epsg = null, Stated = "site.prj", Name = "Site grid" };
        using TemporaryFolder folder = new();
        GeoPackageFile.Write(SampleReport.Create(own), folder["gis.gpkg"]);
        object[] system = Query(folder, "SELECT srs_name, organization, definition FROM gpkg_spatial_ref_sys WHERE srs_id = 100000").Single();
        Assert.Equal(["Site grid", "NONE", own.Wkt], system);
    }

    [Fact]
    public void A_package_that_is_there_is_replaced()
    {
        using TemporaryFolder folder = new();
        File.WriteAllText(folder["gis.gpkg"], "something else");
        GeoPackageFile.Write(Sample, folder["gis.gpkg"]);
        Assert.Equal(["gis.gpkg"], Directory.EnumerateFiles(folder.Path).Select(Path.GetFileName));
        Assert.Equal(5, Query(folder, "SELECT fid FROM wells").Count());
    }

    [Fact]
    public void A_layer_without_features_is_an_empty_table_without_bounds()
    {
        using TemporaryFolder folder = new();
        GeoPackageFile.Write(Sample with { Answers = Sample.Answers with { Paths = [] } }, folder["gis.gpkg"]);
        Assert.Empty(Query(folder, "SELECT * FROM paths"));
        Assert.Equal([DBNull.Value], Query(folder, "SELECT min_x FROM gpkg_contents WHERE table_name = 'paths'").Single());
    }

    private static IEnumerable<object[]> Query(TemporaryFolder folder, string sql)
    {
        using SqliteConnection database = new($"Data Source={folder["gis.gpkg"]};Pooling=false;Mode=ReadOnly");
        database.Open();
        using SqliteCommand command = database.CreateCommand();
        command.CommandText = sql;
        using SqliteDataReader reader = command.ExecuteReader();
        List<object[]> rows = [];
        while (reader.Read())
        {
            object[] row = new object[reader.FieldCount];
            reader.GetValues(row);
            rows.Add(row);
        }

        return rows;
    }
}
