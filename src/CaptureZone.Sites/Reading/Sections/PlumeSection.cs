using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>A plume as the file gives it.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Outline">A valid polygon, in the site's coordinates.</param>
/// <param name="Retardation">Retardation factor.</param>
/// <param name="Path">The path of its outline's value.</param>
internal sealed record PlumeDraft(string? Name, Polygon? Outline, double? Retardation, string Path);

/// <summary>Reads one [[plume]].</summary>
internal static class PlumeSection
{
    private static readonly Field Name = new("name", "", "Cr(VI) above 50 ug/L") { Required = true };
    private static readonly Field Outline = new("outline", "Plume outline", "[[x, y], [x, y], [x, y]]");
    private static readonly Field File = new("file", "Plume outline", "plume.geojson");
    private static readonly Field Retardation =
        new("retardation", "Retardation factor", "1.4") { Limit = Limit.OneOrMore, Usual = UsualRange.Retardation };

    /// <summary>The plume.</summary>
    /// <param name="table">The table.</param>
    public static PlumeDraft Read(TableReader table)
    {
        string? name = table.Text(Name);
        Coordinate[]? corners = table.Places(Outline, least: 3);
        Geometry? shape = table.ShapeFile(File);
        double? retardation = table.Has(Retardation.Key) ? table.Number(Retardation, QuantityKind.Ratio) : 1;
        if (table.Has(Outline.Key) && table.Has(File.Key))
        {
            table.Error(File.Key, "[[plume]] has both outline and file; leave one of the two out");
        }
        else if (!table.Has(Outline.Key) && !table.Has(File.Key))
        {
            table.Missing(Outline.Key, "[[plume]] lacks its outline; add outline = [[x, y], [x, y], [x, y]], or file = \"plume.geojson\"");
        }

        Polygon? outline = FromCorners(table, corners) ?? FromFile(table, shape);
        table.Finish();
        string used = table.Has(File.Key) ? File.Key : Outline.Key;
        return new PlumeDraft(name, outline, retardation, table.PathOf(used));
    }

    private static Polygon? FromCorners(TableReader table, Coordinate[]? corners)
    {
        if (corners is null)
        {
            return null;
        }

        Polygon? polygon = SiteGeometry.Outline(corners, out string problem);
        if (polygon is null)
        {
            table.Error(Outline.Key, $"the outline {problem}");
            return null;
        }

        Note(table, Outline, polygon, $"{Words.Number(polygon.Shell.NumPoints - 1)} corners");
        return polygon;
    }

    private static Polygon? FromFile(TableReader table, Geometry? shape)
    {
        if (shape is null)
        {
            return null;
        }

        if (shape is not Polygon polygon)
        {
            table.Error(File.Key, $"a plume is one polygon; the file holds {Holds(shape)}: give every polygon a [[plume]] of its own");
            return null;
        }

        Note(table, File, polygon, table.Text(File) ?? "");
        return polygon;
    }

    private static string Holds(Geometry shape) =>
        shape.NumGeometries > 1 ? $"{Words.Number(shape.NumGeometries)} shapes" : $"a {shape.GeometryType}";

    private static void Note(TableReader table, Field field, Polygon polygon, string written)
    {
        double unit = table.Site.Coordinates?.MetresPerUnit ?? 1;
        table.Input(field, QuantityKind.Area, written, polygon.Area * unit * unit);
    }
}
