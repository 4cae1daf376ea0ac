using System.Globalization;
using CaptureZone.Sites;
using CaptureZone.Sites.Coordinates;
using Microsoft.Data.Sqlite;
using NetTopologySuite.Geometries;
using NetTopologySuite.IO;

namespace CaptureZone.Outputs.Gis;

/// <summary>
/// Writes all layers as one GeoPackage (OGC 12-128r18, version 1.3) in the site's own coordinate system. The same report gives the same
/// bytes on any day.
/// </summary>
public static class GeoPackageFile
{
    /// <summary>Number of the undefined Cartesian system that the standard demands: for local coordinates.</summary>
    private const int UndefinedCartesian = -1;

    /// <summary>Number within the file for a system without an EPSG code; above all codes that EPSG gives out.</summary>
    private const int OwnSystem = 100_000;

    /// <summary>Time of last change, which the standard demands: fixed, since no clock is read.</summary>
    private const string LastChange = "2000-01-01T00:00:00.000Z";

    private const string Tables = """
        PRAGMA journal_mode = OFF;
        PRAGMA synchronous = OFF;
        PRAGMA application_id = 0x47504B47;
        PRAGMA user_version = 10300;
        CREATE TABLE gpkg_spatial_ref_sys (
          srs_name TEXT NOT NULL, srs_id INTEGER NOT NULL PRIMARY KEY, organization TEXT NOT NULL,
          organization_coordsys_id INTEGER NOT NULL, definition TEXT NOT NULL, description TEXT);
        CREATE TABLE gpkg_contents (
          table_name TEXT NOT NULL PRIMARY KEY, data_type TEXT NOT NULL, identifier TEXT UNIQUE, description TEXT DEFAULT '',
          last_change DATETIME NOT NULL DEFAULT (strftime('%Y-%m-%dT%H:%M:%fZ','now')),
          min_x DOUBLE, min_y DOUBLE, max_x DOUBLE, max_y DOUBLE, srs_id INTEGER,
          CONSTRAINT fk_gc_r_srs_id FOREIGN KEY (srs_id) REFERENCES gpkg_spatial_ref_sys(srs_id));
        CREATE TABLE gpkg_geometry_columns (
          table_name TEXT NOT NULL, column_name TEXT NOT NULL, geometry_type_name TEXT NOT NULL, srs_id INTEGER NOT NULL,
          z TINYINT NOT NULL, m TINYINT NOT NULL,
          CONSTRAINT pk_geom_cols PRIMARY KEY (table_name, column_name), CONSTRAINT uk_gc_table_name UNIQUE (table_name),
          CONSTRAINT fk_gc_tn FOREIGN KEY (table_name) REFERENCES gpkg_contents(table_name),
          CONSTRAINT fk_gc_srs FOREIGN KEY (srs_id) REFERENCES gpkg_spatial_ref_sys(srs_id));
        INSERT INTO gpkg_spatial_ref_sys VALUES
          ('Undefined Cartesian SRS', -1, 'NONE', -1, 'undefined', 'undefined Cartesian coordinate reference system'),
          ('Undefined geographic SRS', 0, 'NONE', 0, 'undefined', 'undefined geographic coordinate reference system'),
          ('WGS 84 geodetic', 4326, 'EPSG', 4326,
           'GEOGCS["WGS 84",DATUM["WGS_1984",SPHEROID["WGS 84",6378137,298.257223563,AUTHORITY["EPSG","7030"]],AUTHORITY["EPSG","6326"]],PRIMEM["Greenwich",0,AUTHORITY["EPSG","8901"]],UNIT["degree",0.0174532925199433,AUTHORITY["EPSG","9122"]],AUTHORITY["EPSG","4326"]]',
           'longitude and latitude in degrees on the WGS 84 spheroid');
        """;

    /// <summary>Writes the file, in place of one that is there.</summary>
    /// <param name="report">The report.</param>
    /// <param name="path">The file.</param>
    /// <exception cref="IOException">The file cannot be replaced.</exception>
    /// <exception cref="SqliteException">The file cannot be written.</exception>
    public static void Write(Report report, string path)
    {
        File.Delete(path);
        using SqliteConnection database = new(new SqliteConnectionStringBuilder { DataSource = path, Pooling = false }.ToString());
        database.Open();
        Run(database, Tables);
        using SqliteTransaction all = database.BeginTransaction();
        int srid = AddSystem(database, report.Site.Coordinates);
        GridProjection projection = SiteProjection.Of(report.Site, srid);
        foreach (Layer layer in SiteLayers.All(report))
        {
            Add(database, layer, report.Site, projection, srid);
        }

        all.Commit();
    }

    private static int AddSystem(SqliteConnection database, CoordinateSystem system)
    {
        if (system.IsLocal)
        {
            return UndefinedCartesian;
        }

        int srid = system.Epsg ?? OwnSystem;
        Run(
            database,
            "INSERT INTO gpkg_spatial_ref_sys VALUES ($name, $srid, $organization, $srid, $definition, $stated)",
            ("$name", system.Name),
            ("$srid", srid),
            ("$organization", system.Epsg is null ? "NONE" : "EPSG"),
            ("$definition", system.Wkt),
            ("$stated", system.Stated));
        return srid;
    }

    private static void Add(SqliteConnection database, Layer layer, SiteDocument site, GridProjection projection, int srid)
    {
        string geometryType = GeometryType(layer.Shape);
        string columns = string.Concat(layer.Columns.Select(column => $", {column.Name} {SqlType(column.Kind)}"));
        Run(database, $"CREATE TABLE {layer.Name} (fid INTEGER PRIMARY KEY AUTOINCREMENT NOT NULL, geom {geometryType}{columns})");
        Envelope bounds = AddFeatures(database, layer, projection);
        Run(
            database,
            "INSERT INTO gpkg_contents VALUES ($table, 'features', $table, $about, $change, $x0, $y0, $x1, $y1, $srid)",
            ("$table", layer.Name),
            ("$about", $"coordinates in {site.Coordinates.Unit}, {site.Coordinates.Name}"),
            ("$change", LastChange),
            ("$x0", Bound(bounds, bounds.MinX)),
            ("$y0", Bound(bounds, bounds.MinY)),
            ("$x1", Bound(bounds, bounds.MaxX)),
            ("$y1", Bound(bounds, bounds.MaxY)),
            ("$srid", srid));
        Run(
            database,
            "INSERT INTO gpkg_geometry_columns VALUES ($table, 'geom', $type, $srid, 0, 0)",
            ("$table", layer.Name),
            ("$type", geometryType),
            ("$srid", srid));
    }

    private static object Bound(Envelope bounds, double value) => bounds.IsNull ? DBNull.Value : value;

    /// <summary>Adds the features of a layer and gives their bounds.</summary>
    private static Envelope AddFeatures(SqliteConnection database, Layer layer, GridProjection projection)
    {
        using SqliteCommand insert = database.CreateCommand();
        string slots = string.Concat(layer.Columns.Select((_, i) => string.Create(CultureInfo.InvariantCulture, $", $c{i}")));
        insert.CommandText = $"INSERT INTO {layer.Name} VALUES (NULL, $geom{slots})";
        SqliteParameter geometry = insert.Parameters.Add("$geom", SqliteType.Blob);
        SqliteParameter[] cells =
        [
            .. layer.Columns.Select((_, i) => insert.Parameters.AddWithValue(
                string.Create(CultureInfo.InvariantCulture, $"$c{i}"), DBNull.Value)),
        ];
        GeoPackageGeoWriter writer = new() { HandleOrdinates = Ordinates.XY };
        Envelope bounds = new();
        foreach (Feature feature in layer.Features)
        {
            if (projection.Bring(feature.Shape, layer.Shape) is not { } shape)
            {
                continue;
            }

            bounds.ExpandToInclude(shape.EnvelopeInternal);
            geometry.Value = writer.Write(shape);
            for (int i = 0; i < cells.Length; i++)
            {
                cells[i].Value = Value(feature.Cells[i], layer.Columns[i].Kind);
            }

            insert.ExecuteNonQuery();
        }

        return bounds;
    }

    private static object Value(Cell cell, ColumnKind kind)
    {
        object? value = kind switch
        {
            ColumnKind.Text => cell.Text,
            ColumnKind.Whole => (long?)cell.Number,
            ColumnKind.Number => cell.Number,
            _ => cell.Flag,
        };
        return value ?? DBNull.Value;
    }

    private static string GeometryType(ShapeKind shape) => shape switch
    {
        ShapeKind.Point => "POINT",
        ShapeKind.Line => "MULTILINESTRING",
        _ => "MULTIPOLYGON",
    };

    private static string SqlType(ColumnKind kind) => kind switch
    {
        ColumnKind.Text => "TEXT",
        ColumnKind.Number => "DOUBLE",
        ColumnKind.Whole => "INTEGER",
        _ => "BOOLEAN",
    };

    private static void Run(SqliteConnection database, string sql, params (string Name, object Value)[] values)
    {
        using SqliteCommand command = database.CreateCommand();
        command.CommandText = sql;
        foreach ((string name, object value) in values)
        {
            command.Parameters.AddWithValue(name, value);
        }

        command.ExecuteNonQuery();
    }
}
