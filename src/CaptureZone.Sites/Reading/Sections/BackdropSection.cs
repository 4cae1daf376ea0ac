using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>Reads one [[backdrop]].</summary>
internal static class BackdropSection
{
    private static readonly Field Name = new("name", "", "Property line") { Required = true };
    private static readonly Field Outline = new("outline", "", "[[x, y], [x, y], [x, y]]");
    private static readonly Field Line = new("line", "", "[[x, y], [x, y]]");
    private static readonly Field Points = new("points", "", "[[x, y]]");
    private static readonly Field File = new("file", "", "roads.geojson");

    /// <summary>Its name and its shape in the site's coordinates; null when it has none.</summary>
    /// <param name="table">The table.</param>
    public static (string Name, Geometry Shape)? Read(TableReader table)
    {
        string? name = table.Text(Name);
        Geometry? shape = Outlined(table);
        shape = table.Places(Line, least: 2) is { } line ? SiteGeometry.Factory.CreateLineString(line) : shape;
        shape = table.Places(Points, least: 1) is { } points ? SiteGeometry.Factory.CreateMultiPointFromCoords(points) : shape;
        shape = table.ShapeFile(File) ?? shape;
        string[] given = [.. new[] { Outline, Line, Points, File }.Select(field => field.Key).Where(table.Has)];
        if (given.Length == 0)
        {
            table.Missing("line", "[[backdrop]] lacks its shape; add one of outline, line, points or file");
        }
        else if (given.Length > 1)
        {
            table.Error(given[1], $"[[backdrop]] has both {given[0]} and {given[1]}; leave one of the two out");
        }

        table.Finish();
        return name is not null && shape is not null ? (name, shape) : null;
    }

    private static Polygon? Outlined(TableReader table)
    {
        if (table.Places(Outline, least: 3) is not { } corners)
        {
            return null;
        }

        Polygon? polygon = SiteGeometry.Outline(corners, out string problem);
        if (polygon is null)
        {
            table.Error(Outline.Key, $"the outline {problem}");
        }

        return polygon;
    }
}
