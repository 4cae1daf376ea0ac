using System.Collections.Immutable;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Outlines of the travel-time zones, each with its time.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class TravelTimeLayer(MapScene scene) : IMapLayer
{
    private static readonly TextStyle TimeStyle = new(Look.SmallSize, Look.TravelTime, Bold: true, Halo: true);

    private readonly ImmutableArray<(int Well, ImmutableArray<Shape> Outlines)> _wells =
    [
        .. scene.Answers.Wells.Select(answer =>
            (answer.Well, answer.TravelTimeZones.Select(zone => scene.View.Lines(zone.Polygon)).ToImmutableArray())),
    ];

    private ImmutableArray<string> Times => scene.Report.Site.TravelTimeLabels;

    /// <inheritdoc/>
    public string Name => "travel-time-zones";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend => _wells.All(well => well.Outlines.IsEmpty)
        ? []
        : Times.Select((time, i) => LegendItem.Line($"Travel-time zone, {time}", Look.TravelTimePen(i)));

    /// <summary>At the end of each zone that is farthest from its well: there the times stand farthest apart.</summary>
    public IEnumerable<LabelRequest> Labels
    {
        get
        {
            foreach ((int index, ImmutableArray<Shape> outlines) in _wells)
            {
                SKPoint well = scene.View.At(scene.Model.Wells[index].At);
                for (int i = 0; i < outlines.Length; i++)
                {
                    LabelBlock block = LabelBlock.Of(Times[i], TimeStyle);
                    yield return new LabelRequest(
                        block,
                        outlines[i].Traces.SelectMany(trace => LabelSpots.Along(trace.Points, block, at => -SKPoint.Distance(at, well))),
                        Optional: true);
                }
            }
        }
    }

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach ((_, ImmutableArray<Shape> outlines) in _wells)
        {
            for (int i = 0; i < outlines.Length; i++)
            {
                canvas.Stroke(outlines[i], Look.TravelTimePen(i));
            }
        }
    }
}
