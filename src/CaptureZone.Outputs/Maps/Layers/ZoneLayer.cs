using CaptureZone.Elements.Wells;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using NetTopologySuite.Operation.Distance;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>The capture zone of every well, tinted so that zones which touch differ.</summary>
internal sealed class ZoneLayer : IMapLayer
{
    private readonly List<TintedZone> _zones = [];

    private sealed record TintedZone(bool Containment, Geometry Polygon, int Tint, Shape Inside, Shape Edge);

    /// <summary>Chooses the tints.</summary>
    /// <param name="scene">What is drawn.</param>
    public ZoneLayer(MapScene scene)
    {
        double touching = 1 / scene.View.Scale;
        foreach (WellAnswer answer in scene.Answers.Wells)
        {
            if (answer.Zone is not { } zone)
            {
                continue;
            }

            bool containment = scene.Model.Wells[answer.Well].Purpose == WellPurpose.Containment;
            HashSet<int> used =
            [
                .. _zones.Where(other => other.Containment == containment && Touch(other.Polygon, zone.InExtent, touching))
                    .Select(other => other.Tint),
            ];
            int tints = Look.Tints(containment).Length;
            int tint = Enumerable.Range(0, tints).FirstOrDefault(i => !used.Contains(i), _zones.Count % tints);
            _zones.Add(new(containment, zone.InExtent, tint, scene.View.Inside(zone.Polygon), scene.View.Lines(zone.Polygon)));
        }
    }

    /// <inheritdoc/>
    public string Name => "capture-zones";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend
    {
        get
        {
            if (_zones.Any(zone => zone.Containment))
            {
                yield return Sample("Capture zones of containment wells, one tint per neighbour", true);
            }

            if (_zones.Any(zone => !zone.Containment))
            {
                yield return Sample("Capture zones of other extraction wells", false);
            }
        }
    }

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach (TintedZone zone in _zones)
        {
            canvas.Fill(zone.Inside, Look.Tints(zone.Containment)[zone.Tint]);
        }

        foreach (TintedZone zone in _zones)
        {
            canvas.Stroke(zone.Edge, EdgePen(zone.Containment));
        }
    }

    private static bool Touch(Geometry a, Geometry b, double distance) =>
        !a.IsEmpty && !b.IsEmpty && IndexedFacetDistance.IsWithinDistance(a, b, distance);

    private static Pen EdgePen(bool containment) => containment ? Look.ContainmentZonePen : Look.SupplyZonePen;

    private LegendItem Sample(string text, bool containment) => new(text, (canvas, area) =>
    {
        int tints = _zones.Where(zone => zone.Containment == containment).Max(zone => zone.Tint) + 1;
        for (int i = 0; i < tints; i++)
        {
            SKRect part = SKRect.Create(area.Left + i * area.Width / tints, area.Top, area.Width / tints, area.Height);
            canvas.Fill(Shape.Rectangle(part), Look.Tints(containment)[i]);
            canvas.Stroke(Shape.Rectangle(part), EdgePen(containment));
        }
    });
}
