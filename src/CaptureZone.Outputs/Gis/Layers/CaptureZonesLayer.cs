using System.Collections.Immutable;
using CaptureZone.Elements.Wells;
using CaptureZone.Outputs.Text;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>Capture zones, clipped to the extent.</summary>
public static class CaptureZonesLayer
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("well", ColumnKind.Text),
        new("purpose", ColumnKind.Text),
        new("rate_m3_d", ColumnKind.Number),
        new("open", ColumnKind.Flag),
        new("area_m2", ColumnKind.Number),
        new("area_in_extent_m2", ColumnKind.Number, "area_in_m2"),
        new("width_at_well_m", ColumnKind.Number, "width_w_m"),
        new("width_upgradient_m", ColumnKind.Number, "width_up_m"),
        new("stagnation_distance_m", ColumnKind.Number, "stagdist_m"),
    ];

    /// <summary>The layer of a report.</summary>
    /// <param name="report">The report.</param>
    public static Layer Of(Report report) =>
        new("capture_zones", ShapeKind.Polygon, Columns, [.. report.Answers.Wells.SelectMany(answer => Features(report, answer))]);

    private static IEnumerable<Feature> Features(Report report, WellAnswer answer)
    {
        if (answer.Zone is { InExtent.IsEmpty: false } zone)
        {
            Well well = report.Site.Model.Wells[answer.Well];
            yield return new Feature(
                zone.InExtent,
                [
                    well.Name,
                    WellText.Token(well.Purpose),
                    well.Rate,
                    zone.Open,
                    zone.Area,
                    zone.AreaInExtent,
                    zone.WidthAtWell,
                    zone.WidthUpgradient,
                    zone.StagnationDistance,
                ]);
        }
    }
}
