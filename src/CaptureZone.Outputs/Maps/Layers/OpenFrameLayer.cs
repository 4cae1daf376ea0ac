using CaptureZone.Elements.Wells;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Marks where zones leave the frame, so that none is taken for closed.</summary>
internal sealed class OpenFrameLayer : IMapLayer
{
    /// <summary>From the frame to the label, units of the sheet.</summary>
    private const float LabelOffset = 40;

    /// <summary>Distance of the places that are tried for the label, units of the sheet.</summary>
    private const float LabelStep = 40;

    private readonly MapScene _scene;
    private readonly List<(IReadOnlyList<SKPoint> Line, SKColor Color)> _openings = [];

    /// <summary>Finds the openings: of the joint zone, and of each zone that is no part of it.</summary>
    /// <param name="scene">What is drawn.</param>
    public OpenFrameLayer(MapScene scene)
    {
        _scene = scene;
        Add(scene.Answers.ContainmentZone, Look.Containment);
        foreach (WellAnswer answer in scene.Answers.Wells)
        {
            if (answer.Zone is { } zone && scene.Model.Wells[answer.Well].Purpose != WellPurpose.Containment)
            {
                Add(zone.Polygon, Look.Supply);
            }
        }
    }

    /// <inheritdoc/>
    public string Name => "open-at-frame";

    /// <inheritdoc/>
    public IEnumerable<LabelRequest> Labels
    {
        get
        {
            foreach ((IReadOnlyList<SKPoint> line, SKColor color) in _openings)
            {
                LabelBlock block = LabelBlock.Of("open at frame", new TextStyle(Look.SmallSize, color, Bold: true, Halo: true));
                yield return new LabelRequest(block, Spots(line, block));
            }
        }
    }

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach ((IReadOnlyList<SKPoint> line, SKColor color) in _openings)
        {
            Shape opening = new([new Trace(line, false)]);
            canvas.Stroke(opening, Look.GapPen);
            canvas.Stroke(opening, Look.OpenPen(color));
        }
    }

    /// <summary>Just inside the frame, from the middle of the opening to its ends; then anywhere near with a leader.</summary>
    private IEnumerable<LabelSpot> Spots(IReadOnlyList<SKPoint> line, LabelBlock block)
    {
        float middle = LabelSpots.Length(line) / 2;
        for (float off = 0; off <= middle; off += LabelStep)
        {
            yield return Inside(LabelSpots.PointAt(line, middle + off));
            yield return Inside(LabelSpots.PointAt(line, middle - off));
        }

        foreach (LabelSpot spot in LabelSpots.Around(LabelSpots.PointAt(line, middle), LabelOffset, block))
        {
            yield return spot;
        }
    }

    private LabelSpot Inside(SKPoint on)
    {
        SKRect area = _scene.View.Area;
        bool side = MathF.Min(on.X - area.Left, area.Right - on.X) < MathF.Min(on.Y - area.Top, area.Bottom - on.Y);
        return side
            ? new LabelSpot(new(on.X + (on.X < area.MidX ? LabelOffset : -LabelOffset), on.Y), -90)
            : new LabelSpot(new(on.X, on.Y + (on.Y < area.MidY ? LabelOffset : -LabelOffset)));
    }

    private void Add(Geometry zone, SKColor color) =>
        _openings.AddRange(_scene.View.Openings(zone).Traces.Select(trace => (trace.Points, color)));
}
