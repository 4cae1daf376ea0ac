using System.Collections.Immutable;
using CaptureZone.Sites;
using NetTopologySuite.Geometries;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>
/// What is drawn and never computed with; a layer for each kind of shape that occurs, since a layer of mixed shapes opens in a desktop
/// GIS only after a question.
/// </summary>
public static class BackdropsLayers
{
    private static readonly ImmutableArray<Column> Columns = [new("name", ColumnKind.Text)];

    /// <summary>The layers of a report; none without backdrops.</summary>
    /// <param name="report">The report.</param>
    public static ImmutableArray<Layer> Of(Report report)
    {
        Layer[] layers =
        [
            Make("backdrop_areas", ShapeKind.Polygon, report, Dimension.Surface),
            Make("backdrop_lines", ShapeKind.Line, report, Dimension.Curve),
            Make("backdrop_points", ShapeKind.Point, report, Dimension.Point),
        ];
        return [.. layers.Where(layer => !layer.Features.IsEmpty)];
    }

    private static Layer Make(string name, ShapeKind shape, Report report, Dimension dimension) =>
        new(name, shape, Columns, [.. report.Site.Backdrops.SelectMany(drawn => Features(drawn, dimension))]);

    private static IEnumerable<Feature> Features(Backdrop drawn, Dimension dimension) =>
        Enumerable.Range(0, drawn.Shape.NumGeometries)
            .Select(drawn.Shape.GetGeometryN)
            .Where(part => part.Dimension == dimension)
            .Select(part => new Feature(part, [drawn.Name]));
}
