using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Places where a label may stand, best first.</summary>
internal static class LabelSpots
{
    /// <summary>Steps outward when the places beside a thing are taken, units of the sheet.</summary>
    private const float RingStep = 32;

    /// <summary>How far a label may move away: a longer leader is not followed by the eye.</summary>
    private const int Rings = (int)(Look.LongestLeader / RingStep);

    private const int Directions = 24;

    /// <summary>A label above or below to one side begins this share of the clearance from the thing's middle.</summary>
    private const float CornerInset = 0.3f;

    /// <summary>Distance of the places that are tried along a line, units of the sheet.</summary>
    private const float LineStep = 36;

    /// <summary>A stretch of line is straight enough for a label when its chord is at least this share of it.</summary>
    private const float StraightEnough = 0.97f;

    /// <summary>Right and above first, as map readers expect (common practice, no source).</summary>
    private static readonly SKPoint[] Beside =
        [new(1, -1), new(1, 0), new(1, 1), new(-1, -1), new(-1, 0), new(-1, 1), new(0, -1), new(0, 1)];

    /// <summary>Round a point: beside it, then farther and farther away with a leader.</summary>
    /// <param name="at">The point.</param>
    /// <param name="clearance">Distance to keep from it.</param>
    /// <param name="block">The label.</param>
    public static IEnumerable<LabelSpot> Around(SKPoint at, float clearance, LabelBlock block)
    {
        foreach (SKPoint way in Beside)
        {
            float aside = way.Y == 0 ? clearance : CornerInset * clearance;
            yield return new LabelSpot(
                at + new SKPoint(way.X * (aside + block.HalfWidth), way.Y * (clearance + block.HalfHeight)), Side: MathF.Sign(way.X));
        }

        for (int ring = 1; ring <= Rings; ring++)
        {
            for (int i = 0; i < Directions; i++)
            {
                SKPoint way = Shape.Polar(1, i * MathF.Tau / Directions - MathF.PI / 4);
                float gap = clearance + ring * RingStep;
                SKPoint centre = at + new SKPoint(way.X * (gap + block.HalfWidth), way.Y * (gap + block.HalfHeight));
                SKPoint toward = block.At(new LabelSpot(centre)).Nearest(at) - at;
                SKPoint leaderFrom = at + Shape.Polar(clearance, MathF.Atan2(toward.Y, toward.X));
                yield return new LabelSpot(centre, 0, leaderFrom, MathF.Sign(MathF.Round(way.X)));
            }
        }
    }

    /// <summary>On a line where it is straight enough, turned with it and upright.</summary>
    /// <param name="line">The line.</param>
    /// <param name="block">The label.</param>
    /// <param name="badness">Lowest first.</param>
    public static IEnumerable<LabelSpot> Along(IReadOnlyList<SKPoint> line, LabelBlock block, Func<SKPoint, float> badness)
    {
        float[] reached = Distances(line);
        List<LabelSpot> spots = [];
        for (float at = block.HalfWidth; at <= reached[^1] - block.HalfWidth; at += LineStep)
        {
            SKPoint from = PointAt(line, reached, at - block.HalfWidth), to = PointAt(line, reached, at + block.HalfWidth);
            SKPoint chord = from.X <= to.X ? to - from : from - to;
            if (chord.Length >= StraightEnough * 2 * block.HalfWidth)
            {
                SKPoint on = PointAt(line, reached, at), middle = new((from.X + to.X) / 2, (from.Y + to.Y) / 2);
                spots.Add(new LabelSpot(
                    new((on.X + middle.X) / 2, (on.Y + middle.Y) / 2), MathF.Atan2(chord.Y, chord.X) * 180 / MathF.PI));
            }
        }

        return spots.OrderBy(spot => badness(spot.Centre));
    }

    /// <summary>Length of a line.</summary>
    /// <param name="line">Its vertices.</param>
    public static float Length(IReadOnlyList<SKPoint> line) => Distances(line)[^1];

    /// <summary>The place on a line at a distance from its start.</summary>
    /// <param name="line">Its vertices.</param>
    /// <param name="distance">The distance.</param>
    public static SKPoint PointAt(IReadOnlyList<SKPoint> line, float distance) => PointAt(line, Distances(line), distance);

    /// <summary>The part of a line between two distances from its start.</summary>
    /// <param name="line">Its vertices.</param>
    /// <param name="start">The lesser distance.</param>
    /// <param name="end">The greater.</param>
    public static IReadOnlyList<SKPoint> Part(IReadOnlyList<SKPoint> line, float start, float end)
    {
        float[] reached = Distances(line);
        return
        [
            PointAt(line, reached, start),
            .. line.Where((_, i) => reached[i] > start && reached[i] < end),
            PointAt(line, reached, end),
        ];
    }

    private static float[] Distances(IReadOnlyList<SKPoint> line)
    {
        float[] reached = new float[line.Count];
        for (int i = 1; i < line.Count; i++)
        {
            reached[i] = reached[i - 1] + SKPoint.Distance(line[i - 1], line[i]);
        }

        return reached;
    }

    private static SKPoint PointAt(IReadOnlyList<SKPoint> line, float[] reached, float distance)
    {
        int found = Array.BinarySearch(reached, distance);
        int next = Math.Clamp(found < 0 ? ~found : found, 1, line.Count - 1);
        float step = reached[next] - reached[next - 1];
        float share = step > 0 ? Math.Clamp((distance - reached[next - 1]) / step, 0, 1) : 0;
        SKPoint way = line[next] - line[next - 1];
        return line[next - 1] + new SKPoint(share * way.X, share * way.Y);
    }
}
