using System.Collections.Immutable;
using CaptureZone.Elements.Wells;
using CaptureZone.Outputs.Text;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>The wells; rates positive for extraction.</summary>
public static class WellsLayer
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("well", ColumnKind.Text),
        new("purpose", ColumnKind.Text),
        new("rate_m3_d", ColumnKind.Number),
        new("radius_m", ColumnKind.Number),
        new("head_at_screen_m", ColumnKind.Number, "head_m"),
        new("drawdown_at_screen_m", ColumnKind.Number, "drawdown_m"),
        new("largest_rate_m3_d", ColumnKind.Number, "largest_m3"),
    ];

    /// <summary>The layer of a report.</summary>
    /// <param name="report">The report.</param>
    public static Layer Of(Report report) =>
        new("wells", ShapeKind.Point, Columns, [.. report.Answers.Wells.Select(answer => Feature(report, answer))]);

    private static Feature Feature(Report report, WellAnswer answer)
    {
        Well well = report.Site.Model.Wells[answer.Well];
        return new Feature(
            Shapes.Point(well.At),
            [
                well.Name,
                WellText.Token(well.Purpose),
                well.Rate,
                well.Radius,
                answer.HeadAtScreen,
                answer.DrawdownAtScreen,
                answer.LargestRate,
            ]);
    }
}
