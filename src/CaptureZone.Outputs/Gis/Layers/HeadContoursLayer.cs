using System.Collections.Immutable;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>Lines of equal head within the extent.</summary>
public static class HeadContoursLayer
{
    private static readonly ImmutableArray<Column> Columns = [new("head_m", ColumnKind.Number)];

    /// <summary>The layer of a report.</summary>
    /// <param name="report">The report.</param>
    public static Layer Of(Report report) => new(
        "head_contours",
        ShapeKind.Line,
        Columns,
        [.. report.Answers.Contours.Select(contour => new Feature(Shapes.Lines(contour.Lines), [contour.Head]))]);
}
