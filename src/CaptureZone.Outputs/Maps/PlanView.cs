using System.Numerics;
using NetTopologySuite.Geometries;
using NetTopologySuite.Operation.Linemerge;
using NetTopologySuite.Operation.Overlay;
using NetTopologySuite.Operation.OverlayNG;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>From local metres to the sheet: one scale in both directions, grid north up.</summary>
internal sealed class PlanView
{
    /// <summary>Vertices nearer than this to the last one drawn are left out, units of the sheet.</summary>
    private const float Finest = 1.5f;

    /// <summary>Shapes are cut this far outside the frame, as a share of it, so that the cut never shows.</summary>
    private const double CutBeyond = 0.05;

    private readonly Geometry _cut;

    /// <summary>Fits a frame into the sheet.</summary>
    /// <param name="frame">The frame, m.</param>
    /// <param name="left">Its left edge on the sheet.</param>
    /// <param name="top">Its top edge on the sheet.</param>
    /// <param name="width">Its width on the sheet.</param>
    public PlanView(Envelope frame, float left, float top, float width)
    {
        Frame = frame;
        Scale = width / frame.Width;
        Area = SKRect.Create(left, top, width, (float)(frame.Height * Scale));
        Envelope cut = frame.Copy();
        cut.ExpandBy(CutBeyond * frame.Width, CutBeyond * frame.Height);
        _cut = new GeometryFactory().ToGeometry(cut);
    }

    /// <summary>What is shown, m.</summary>
    public Envelope Frame { get; }

    /// <summary>The frame on the sheet.</summary>
    public SKRect Area { get; }

    /// <summary>Units of the sheet per metre.</summary>
    public double Scale { get; }

    /// <summary>A place on the sheet.</summary>
    /// <param name="at">The place, m.</param>
    public SKPoint At(Complex at) => At(at.Real, at.Imaginary);

    /// <summary>A place on the sheet.</summary>
    /// <param name="at">The place, m.</param>
    public SKPoint At(Coordinate at) => At(at.X, at.Y);

    /// <summary>Whether a place lies in the frame.</summary>
    /// <param name="at">The place, m.</param>
    public bool Shows(Complex at) => Frame.Contains(at.Real, at.Imaginary);

    /// <summary>What of a polygon is in the frame, for filling.</summary>
    /// <param name="area">The polygon, m; holes and several parts allowed.</param>
    public Shape Inside(Geometry area) => new(
    [
        .. Rings(OverlayNGRobust.Overlay(area, _cut, SpatialFunction.Intersection))
            .Select(ring => new Trace(Thinned([.. ring.Coordinates.Select(At)]), true)),
    ]);

    /// <summary>What of a geometry's lines, or of a polygon's rings, is in the frame or passes near it.</summary>
    /// <param name="geometry">The geometry, m.</param>
    public Shape Lines(Geometry geometry) => new(
    [
        .. (geometry is IPolygonal ? Rings(geometry) : Parts(geometry).OfType<LineString>())
            .SelectMany(line => Runs([.. line.Coordinates.Select(at => new Complex(at.X, at.Y))])),
    ]);

    /// <summary>What of a line is in the frame or passes near it.</summary>
    /// <param name="line">The line, m.</param>
    public Shape Line(IReadOnlyList<Complex> line) => new([.. Runs(line)]);

    /// <summary>Where a polygon leaves the frame: its parts of the frame's line.</summary>
    /// <param name="area">The polygon, m.</param>
    public Shape Openings(Geometry area)
    {
        if (area.IsEmpty || Frame.Contains(area.EnvelopeInternal))
        {
            return new([]);
        }

        LineMerger merger = new();
        merger.Add(OverlayNGRobust.Overlay(area, new GeometryFactory().ToGeometry(Frame).Boundary, SpatialFunction.Intersection));
        return new(
        [
            .. merger.GetMergedLineStrings().OfType<LineString>()
                .Select(line => new Trace([.. line.Coordinates.Select(At)], line.IsClosed)),
        ]);
    }

    private static IEnumerable<Geometry> Parts(Geometry geometry) =>
        Enumerable.Range(0, geometry.NumGeometries).Select(geometry.GetGeometryN);

    private static IEnumerable<LineString> Rings(Geometry geometry) =>
        Parts(geometry).OfType<Polygon>().Where(part => !part.IsEmpty).SelectMany(part => part.InteriorRings.Prepend(part.ExteriorRing));

    private static List<SKPoint> Thinned(IReadOnlyList<SKPoint> line)
    {
        List<SKPoint> kept = [];
        for (int i = 0; i < line.Count; i++)
        {
            if (kept.Count == 0 || i == line.Count - 1 || SKPoint.Distance(kept[^1], line[i]) >= Finest)
            {
                kept.Add(line[i]);
            }
        }

        return kept;
    }

    private SKPoint At(double x, double y) =>
        new((float)(Area.Left + (x - Frame.MinX) * Scale), (float)(Area.Top + (Frame.MaxY - y) * Scale));

    private IEnumerable<Trace> Runs(IReadOnlyList<Complex> line)
    {
        List<SKPoint> run = [];
        for (int i = 1; i < line.Count; i++)
        {
            Envelope step = new(line[i - 1].Real, line[i].Real, line[i - 1].Imaginary, line[i].Imaginary);
            if (step.Intersects(_cut.EnvelopeInternal))
            {
                run.AddRange(run.Count == 0 ? [At(line[i - 1]), At(line[i])] : [At(line[i])]);
            }
            else if (run.Count > 0)
            {
                yield return new Trace(Thinned(run), false);
                run = [];
            }
        }

        if (run.Count > 0)
        {
            yield return new Trace(Thinned(run), false);
        }
    }
}
