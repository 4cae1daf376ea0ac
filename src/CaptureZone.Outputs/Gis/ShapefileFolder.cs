using System.Collections.Immutable;
using System.Text;
using CaptureZone.Sites;
using NetTopologySuite.Geometries;
using NetTopologySuite.IO.Esri;
using NetTopologySuite.IO.Esri.Dbf.Fields;
using NetTopologySuite.IO.Esri.Shapefiles.Writers;

namespace CaptureZone.Outputs.Gis;

/// <summary>
/// Writes all layers as Shapefiles in the site's own coordinate system, each with .prj (not for local coordinates) and .cpg (UTF-8).
/// Column names are at most 10 characters long, as the format demands. The same report gives the same bytes on any day.
/// </summary>
public static class ShapefileFolder
{
    /// <summary>Longest text that the format holds, bytes.</summary>
    private const int LongestText = 254;

    /// <summary>Digits of a whole number.</summary>
    private const int WholeDigits = 9;

    /// <summary>Digits of a number, and how many of them are decimals.</summary>
    private const int NumberDigits = 19, Decimals = 6;

    /// <summary>
    /// Where a dBASE table keeps the date of its last change, as year less 1900, month and day. It is set to the first day of 2000, since
    /// the bytes must not depend on the day.
    /// </summary>
    private const int DateOffset = 1;

    private static readonly UTF8Encoding Utf8 = new(encoderShouldEmitUTF8Identifier: false);

    /// <summary>Writes the files into a folder that exists. Layers without features give no file.</summary>
    /// <param name="report">The report.</param>
    /// <param name="folder">The folder.</param>
    /// <exception cref="IOException">A file cannot be written.</exception>
    public static void Write(Report report, string folder)
    {
        GridProjection projection = SiteProjection.Of(report.Site, srid: 0);
        foreach (Layer layer in SiteLayers.All(report))
        {
            Row[] rows = [.. layer.Features.SelectMany(feature => Rows(projection, layer, feature))];
            if (rows.Length > 0)
            {
                Write(layer, rows, report.Site, Path.Combine(folder, layer.Name));
            }
        }
    }

    private static IEnumerable<Row> Rows(GridProjection projection, Layer layer, Feature feature)
    {
        if (projection.Bring(feature.Shape, layer.Shape) is { } shape)
        {
            yield return new Row(shape, feature.Cells);
        }
    }

    private static void Write(Layer layer, Row[] rows, SiteDocument site, string path)
    {
        ShapefileWriterOptions options = new(Kind(layer.Shape)) { Encoding = Utf8 };
        for (int i = 0; i < layer.Columns.Length; i++)
        {
            options.Fields.Add(Field(layer.Columns[i], rows.Select(row => row.Cells[i])));
        }

        using MemoryStream shapes = new(), index = new(), table = new(), projection = new();
        using (ShapefileWriter writer = Shapefile.OpenWrite(shapes, index, table, projection, options))
        {
            foreach (Row row in rows)
            {
                Write(writer, options.Fields, row);
            }
        }

        byte[] dbf = table.ToArray();
        ReadOnlySpan<byte> date = [100, 1, 1];
        date.CopyTo(dbf.AsSpan(DateOffset));
        File.WriteAllBytes(path + ".shp", shapes.ToArray());
        File.WriteAllBytes(path + ".shx", index.ToArray());
        File.WriteAllBytes(path + ".dbf", dbf);
        File.WriteAllText(path + ".cpg", "UTF-8", Utf8);
        if (!site.Coordinates.IsLocal)
        {
            File.WriteAllText(path + ".prj", site.Coordinates.PrjText, Utf8);
        }
    }

    private static void Write(ShapefileWriter writer, List<DbfField> fields, Row row)
    {
        writer.Geometry = row.Shape;
        for (int i = 0; i < fields.Count; i++)
        {
            Set(fields[i], row.Cells[i]);
        }

        writer.Write();
    }

    private static ShapeType Kind(ShapeKind shape) => shape switch
    {
        ShapeKind.Point => ShapeType.Point,
        ShapeKind.Line => ShapeType.PolyLine,
        _ => ShapeType.Polygon,
    };

    private static DbfField Field(Column column, IEnumerable<Cell> cells) => column.Kind switch
    {
        ColumnKind.Text => new DbfCharacterField(column.Short, Math.Max(1, cells.Max(cell => Utf8.GetByteCount(Cut(cell.Text))))),
        ColumnKind.Whole => new DbfNumericInt32Field(column.Short, WholeDigits),
        ColumnKind.Number => new DbfNumericDoubleField(column.Short, NumberDigits, Decimals),
        _ => new DbfLogicalField(column.Short),
    };

    private static void Set(DbfField field, Cell cell)
    {
        switch (field)
        {
            case DbfCharacterField text:
                text.StringValue = Cut(cell.Text);
                break;
            case DbfNumericInt32Field whole:
                whole.NumericValue = (int?)cell.Number;
                break;
            case DbfNumericDoubleField number:
                number.NumericValue = cell.Number;
                break;
            case DbfLogicalField flag:
                flag.LogicalValue = cell.Flag;
                break;
        }
    }

    /// <summary>The text as far as the format holds it, cut between characters.</summary>
    private static string Cut(string? text)
    {
        StringBuilder kept = new();
        int bytes = 0;
        foreach (Rune rune in (text ?? "").EnumerateRunes())
        {
            bytes += rune.Utf8SequenceLength;
            if (bytes > LongestText)
            {
                break;
            }

            kept.Append(rune.ToString());
        }

        return kept.ToString();
    }

    private sealed record Row(Geometry Shape, ImmutableArray<Cell> Cells);
}
