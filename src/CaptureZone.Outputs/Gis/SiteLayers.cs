using System.Collections.Immutable;
using CaptureZone.Outputs.Gis.Layers;

namespace CaptureZone.Outputs.Gis;

/// <summary>The layers that a report gives.</summary>
public static class SiteLayers
{
    /// <summary>What was computed: the layers that are GeoJSON files as well.</summary>
    /// <param name="report">The report.</param>
    public static ImmutableArray<Layer> Computed(Report report) =>
    [
        CaptureZonesLayer.Of(report),
        TravelTimeZonesLayer.Of(report),
        PathsLayer.Of(report),
        StagnationPointsLayer.Of(report),
        HeadContoursLayer.Of(report),
    ];

    /// <summary>Everything: what was computed and what was given.</summary>
    /// <param name="report">The report.</param>
    public static ImmutableArray<Layer> All(Report report) =>
        [.. Computed(report), WellsLayer.Of(report), PlumesLayer.Of(report), .. BackdropsLayers.Of(report)];
}
