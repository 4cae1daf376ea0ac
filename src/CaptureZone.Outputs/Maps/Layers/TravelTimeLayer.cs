using System.Collections.Immutable;
using CaptureZone.Zones;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Outlines of the travel-time zones, each with its time.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class TravelTimeLayer(MapScene scene) : IMapLayer
{
    private static readonly TextStyle TimeStyle = new(Look.SmallSize, Look.TravelTime, Bold: true, Halo: true);

    private ImmutableArray<string> Times => scene.Report.Site.TravelTimeLabels;

    /// <inheritdoc/>
    public string Name => "travel-time-zones";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend => scene.Answers.Wells.All(well => well.TravelTimeZones.IsEmpty)
        ? []
        : Times.Select((time, i) => LegendItem.Line($"Water reaches the well within {time}", Look.TravelTimePen(i)));

    /// <summary>At the end of each zone that is farthest from its well: there the times stand farthest apart.</summary>
    public IEnumerable<LabelRequest> Labels
    {
        get
        {
            foreach (WellAnswer answer in scene.Answers.Wells)
            {
                SKPoint well = scene.View.At(scene.Model.Wells[answer.Well].At);
                for (int i = 0; i < answer.TravelTimeZones.Length; i++)
                {
                    LabelBlock block = LabelBlock.Of(Times[i], TimeStyle);
                    yield return new LabelRequest(
                        block,
                        scene.View.Lines(answer.TravelTimeZones[i].Polygon).Traces
                            .SelectMany(trace => LabelSpots.Along(trace.Points, block, at => -SKPoint.Distance(at, well))),
                        Optional: true);
                }
            }
        }
    }

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach (ImmutableArray<TravelTimeZone> zones in scene.Answers.Wells.Select(well => well.TravelTimeZones))
        {
            for (int i = 0; i < zones.Length; i++)
            {
                canvas.Stroke(scene.View.Lines(zones[i].Polygon), Look.TravelTimePen(i));
            }
        }
    }
}
