using System.Collections.Immutable;
using NetTopologySuite.Geometries;

namespace CaptureZone.Flow;

/// <summary>stub</summary>
public sealed record HeadContourSet(ImmutableArray<HeadContour> Contours, double Interval);

/// <summary>stub</summary>
public static class HeadContours
{
    /// <summary>stub</summary>
    public static HeadContourSet Find(FlowField field, Envelope extent, double headUnit) => new([], 1);
}

/// <summary>stub</summary>
public static class FlowArrows
{
    /// <summary>stub</summary>
    public static ImmutableArray<FlowArrow> Sample(FlowField field, Envelope extent, int across) => [];
}
