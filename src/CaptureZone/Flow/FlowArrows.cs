using System.Collections.Immutable;
using System.Numerics;
using NetTopologySuite.Geometries;

namespace CaptureZone.Flow;

/// <summary>The flow on a grid over a frame, to be drawn as arrows.</summary>
public static class FlowArrows
{
    /// <summary>Samples the flow at the centres of square cells; leaves out dry places and the inside of screens.</summary>
    /// <param name="field">The flow.</param>
    /// <param name="extent">The frame, m.</param>
    /// <param name="across">How many cells from west to east; positive.</param>
    public static ImmutableArray<FlowArrow> Sample(FlowField field, Envelope extent, int across)
    {
        double cell = extent.Width / across;
        if (extent.IsNull || !(cell > 0))
        {
            return [];
        }

        int up = Math.Max(1, (int)Math.Round(extent.Height / cell));
        return
        [
            .. from row in Enumerable.Range(0, up)
               from column in Enumerable.Range(0, across)
               let at = new Complex(
                   extent.MinX + (column + 0.5) * cell, extent.Centre.Y + (row + 0.5 - up / 2.0) * cell)
               where !InScreen(field, at)
               let flow = field.FlowAt(at)
               where field.AquiferAt(at).SaturatedThickness(flow.Potential) > 0
               select new FlowArrow(at, flow.Discharge),
        ];
    }

    private static bool InScreen(FlowField field, Complex at) =>
        Array.Exists(field.System.Wells, well => (at - well.At).Magnitude < well.Radius);
}
