using System.Collections.Immutable;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>The plumes with their verdicts.</summary>
public static class PlumesLayer
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("plume", ColumnKind.Text),
        new("retardation", ColumnKind.Number, "retard"),
        new("captured", ColumnKind.Flag),
        new("captured_fraction", ColumnKind.Number, "capt_frac"),
        new("margin_m", ColumnKind.Number),
        new("arrival_p50_d", ColumnKind.Number, "arrive_d"),
    ];

    /// <summary>The layer of a report.</summary>
    /// <param name="report">The report.</param>
    public static Layer Of(Report report) =>
        new("plumes", ShapeKind.Polygon, Columns, [.. report.Answers.Plumes.Select(answer => Feature(report, answer))]);

    private static Feature Feature(Report report, PlumeAnswer answer)
    {
        Plume plume = report.Answers.Questions.Plumes[answer.Plume];
        return new Feature(
            plume.Outline,
            [plume.Name, plume.Retardation, answer.Captured, answer.CapturedFraction, answer.Margin, answer.Arrival?.P50]);
    }
}
