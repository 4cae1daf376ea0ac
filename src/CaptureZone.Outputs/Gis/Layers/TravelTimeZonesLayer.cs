using System.Collections.Immutable;
using CaptureZone.Elements.Wells;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>Travel-time zones, whole.</summary>
public static class TravelTimeZonesLayer
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("well", ColumnKind.Text),
        new("time_d", ColumnKind.Number),
        new("time_as_asked", ColumnKind.Text, "time_asked"),
        new("rate_m3_d", ColumnKind.Number),
        new("area_m2", ColumnKind.Number),
    ];

    /// <summary>The layer of a report.</summary>
    /// <param name="report">The report.</param>
    public static Layer Of(Report report) => new(
        "travel_time_zones", ShapeKind.Polygon, Columns, [.. report.Answers.Wells.SelectMany(answer => Features(report, answer))]);

    private static IEnumerable<Feature> Features(Report report, WellAnswer answer)
    {
        Well well = report.Site.Model.Wells[answer.Well];
        return answer.TravelTimeZones.Select(
            (TravelTimeZone zone, int index) => new Feature(
                zone.Polygon,
                [well.Name, zone.Time, report.Site.TravelTimeLabels[index], well.Rate, zone.Area]));
    }
}
