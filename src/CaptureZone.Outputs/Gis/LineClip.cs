using System.Collections.Immutable;
using System.Numerics;
using NetTopologySuite.Geometries;

namespace CaptureZone.Outputs.Gis;

/// <summary>
/// Clips lines to a frame and keeps their direction and order, which an overlay of geometries does not. Each segment is cut by the
/// parametric method of Y.-D. Liang and B. A. Barsky, ACM Transactions on Graphics 3 (1984).
/// </summary>
public static class LineClip
{
    /// <summary>The parts of a line within a frame, in the line's order and direction; empty when there are none.</summary>
    /// <param name="line">The line.</param>
    /// <param name="frame">The frame.</param>
    public static MultiLineString Clip(ImmutableArray<Complex> line, Envelope frame)
    {
        List<ImmutableArray<Complex>> parts = [];
        List<Complex> part = [];
        for (int i = 1; i < line.Length; i++)
        {
            if (Cut(line[i - 1], line[i], frame) is not { } inside)
            {
                continue;
            }

            if (part.Count > 0 && part[^1] != inside.Start)
            {
                parts.Add([.. part]);
                part.Clear();
            }

            if (part.Count == 0)
            {
                part.Add(inside.Start);
            }

            if (inside.End != inside.Start)
            {
                part.Add(inside.End);
            }
        }

        parts.Add([.. part]);
        return Shapes.Lines(parts);
    }

    private static Segment? Cut(Complex a, Complex b, Envelope frame)
    {
        double from = 0, to = 1;
        Complex d = b - a;
        bool meets = Limit(-d.Real, a.Real - frame.MinX, ref from, ref to)
            && Limit(d.Real, frame.MaxX - a.Real, ref from, ref to)
            && Limit(-d.Imaginary, a.Imaginary - frame.MinY, ref from, ref to)
            && Limit(d.Imaginary, frame.MaxY - a.Imaginary, ref from, ref to);
        return meets ? new Segment(from == 0 ? a : a + from * d, to == 1 ? b : a + to * d) : null;
    }

    /// <summary>Narrows the interval of t to where outward x t is at most room.</summary>
    private static bool Limit(double outward, double room, ref double from, ref double to)
    {
        if (outward == 0)
        {
            return room >= 0;
        }

        double t = room / outward;
        if (outward > 0)
        {
            to = Math.Min(to, t);
        }
        else
        {
            from = Math.Max(from, t);
        }

        return from <= to;
    }

    private readonly record struct Segment(Complex Start, Complex End);
}
