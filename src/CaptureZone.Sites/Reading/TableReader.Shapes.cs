using CaptureZone.Sites.Reading.Toml;
using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading;

/// <summary>Places and shapes; coordinates are bare numbers in the unit of the coordinate system.</summary>
internal sealed partial class TableReader
{
    /// <summary>A place.</summary>
    /// <param name="field">The key.</param>
    public Coordinate? Place(Field field)
    {
        if (Value(field) is not { } node || PlaceOf(field, node) is not { } place)
        {
            return null;
        }

        site.Places.Add(new WrittenPlaces(PathOf(field.Key), [place], [node.Start]));
        Input(field, QuantityKind.Place, site.Complaints.Source.Of(node).Trim('[', ']', ' '), 0);
        return place;
    }

    /// <summary>Four numbers: least x, least y, largest x, largest y.</summary>
    /// <param name="field">The key.</param>
    public Envelope? Frame(Field field)
    {
        if (Value(field) is not { } node)
        {
            return null;
        }

        if (Numbers(node, 4) is not { } n)
        {
            Error(field.Key, $"{field.Key} must be four numbers, [xmin, ymin, xmax, ymax]; found {Found(node)}");
            return null;
        }

        if (n[0] >= n[2] || n[1] >= n[3])
        {
            Error(
                field.Key,
                $"{field.Key} is [xmin, ymin, xmax, ymax]: the first number must be below the third, the second below the fourth");
            return null;
        }

        site.Places.Add(new WrittenPlaces(PathOf(field.Key), [new(n[0], n[1]), new(n[2], n[3])], [node.Start]));
        return new Envelope(n[0], n[2], n[1], n[3]);
    }

    /// <summary>A list of places; null where one of them is none.</summary>
    /// <param name="field">The key.</param>
    /// <param name="least">How many there must be.</param>
    public Coordinate[]? Places(Field field, int least)
    {
        if (Value(field) is not { } node)
        {
            return null;
        }

        if (node is not TomlArray list)
        {
            Error(field.Key, $"{field.Key} must be a list of places, such as {field.Example}; found {Words.KindOf(node)}");
            return null;
        }

        Coordinate?[] places = [.. list.Items.Select(item => PlaceOf(field, item))];
        if (places.Contains(null))
        {
            return null;
        }

        if (places.Length < least)
        {
            Error(field.Key, $"{field.Key} needs at least {Words.Number(least)} places; found {Words.Number(places.Length)}");
            return null;
        }

        if (places.Length > 0)
        {
            site.Places.Add(new WrittenPlaces(PathOf(field.Key), places!, [.. list.Items.Select(item => item.Start)]));
        }

        return places!;
    }

    /// <summary>The shape of a GeoJSON file that the table names, in the site's coordinates.</summary>
    /// <param name="field">The key.</param>
    public Geometry? ShapeFile(Field field)
    {
        if (Text(field) is not { } name || site.Coordinates is not { } system)
        {
            return null;
        }

        if (!site.Files.TryRead(name, out byte[]? bytes, out string? problem))
        {
            Error(field.Key, $"the file {Words.Quote(name)} {problem}");
            return null;
        }

        if (GeoJsonShape.Read(bytes, system, out string trouble) is not { } shape)
        {
            Error(field.Key, $"the file {Words.Quote(name)} {trouble}");
            return null;
        }

        site.Places.Add(new WrittenPlaces(PathOf(field.Key), shape.Coordinates, [PlaceOf(field.Key)]));
        return shape;
    }

    private Coordinate? PlaceOf(Field field, TomlNode node)
    {
        if (Numbers(node, 2) is { } n)
        {
            return new Coordinate(n[0], n[1]);
        }

        site.Complaints.Error(node.Start, $"a place in {field.Key} must be two numbers, [x, y], without units; found {Found(node)}");
        return null;
    }

    private string Found(TomlNode node) => node is TomlArray ? Words.Short(site.Complaints.Source.Of(node)) : Words.KindOf(node);

    private static double[]? Numbers(TomlNode node, int count) =>
        node is TomlArray list
        && list.Items.Length == count
        && list.Items.All(item => item is TomlNumber { Value: var v } && double.IsFinite(v))
            ? [.. list.Items.Select(item => ((TomlNumber)item).Value)]
            : null;
}
