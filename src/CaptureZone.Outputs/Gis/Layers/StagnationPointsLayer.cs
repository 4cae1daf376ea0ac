using System.Collections.Immutable;
using CaptureZone.Outputs.Text;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>Stagnation points, all of them, also outside the extent.</summary>
public static class StagnationPointsLayer
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("kind", ColumnKind.Text),
        new("multiplicity", ColumnKind.Whole, "multiplic"),
        new("head_m", ColumnKind.Number),
    ];

    /// <summary>The layer of a report.</summary>
    /// <param name="report">The report.</param>
    public static Layer Of(Report report) => new(
        "stagnation_points",
        ShapeKind.Point,
        Columns,
        [
            .. report.Answers.StagnationPoints.Select(
                point => new Feature(Shapes.Point(point.At), [StagnationText.Token(point.Kind), point.Multiplicity, point.Head])),
        ]);
}
