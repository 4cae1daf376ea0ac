using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones;

/// <summary>The extent of clipped output, and the circle within which zones are computed so that the extent cuts nothing off.</summary>
/// <param name="Extent">The extent, m.</param>
/// <param name="Radius">Radius of the circle about the site's centre, m.</param>
/// <param name="Reach">Radius within which dividing streamlines are needed, m: travel-time zones may go beyond the circle.</param>
internal sealed record Framing(Envelope Extent, double Radius, double Reach)
{
    /// <summary>Room round what must show, as a share of its size.</summary>
    private const double Room = 0.15;

    /// <summary>The shorter side of a chosen extent is at least this share of the longer.</summary>
    private const double LeastAspect = 0.6;

    /// <summary>What lies farther off than this many diameters of wells and plumes widens neither a chosen extent nor the circle.</summary>
    private const double FarPoints = 30;

    /// <summary>The circle reaches beyond everything by this factor.</summary>
    private const double RoomBeyond = 1.25;

    /// <summary>Half the side of the extent of a site with nothing in it, m.</summary>
    private const double EmptySite = 500;

    /// <summary>Chooses extent and circle.</summary>
    /// <param name="field">The field.</param>
    /// <param name="questions">The questions.</param>
    internal static Framing Of(FlowField field, Questions questions)
    {
        StagnationSet stagnation = StagnationFinder.Find(field);
        PathStops stops = PathStops.Of(field, stagnation);
        Complex centre = stops.Centre;
        Envelope things = new();
        foreach (Well well in field.System.Wells)
        {
            things.ExpandToInclude(well.At.Real, well.At.Imaginary);
        }

        foreach (Plume plume in questions.Plumes)
        {
            things.ExpandToInclude(plume.Outline.EnvelopeInternal);
        }

        if (things.IsNull)
        {
            things.ExpandToInclude(centre.Real, centre.Imaginary);
        }

        Envelope all = things.Copy();
        foreach (StagnationPoint point in stagnation.Points)
        {
            if (Complex.Abs(point.At - centre) <= FarPoints * Math.Max(things.Diameter, EmptySite))
            {
                all.ExpandToInclude(point.At.Real, point.At.Imaginary);
            }
        }

        Envelope extent = questions.Extent ?? Roomy(all);
        all.ExpandToInclude(extent);
        double radius = Corners(all).Max(corner => Complex.Abs(corner - centre));

        // Beside the wells no zone reaches farther: half of all that they move, spread over the regional flow.
        double widest = stops.Diameter / 2 + stops.TotalRate / (2 * Complex.Abs(field.UniformDischarge));
        if (widest <= FarPoints * Math.Max(things.Diameter, EmptySite))
        {
            radius = Math.Max(radius, widest);
        }

        radius *= RoomBeyond;
        return new Framing(extent, radius, radius + FarthestFront(field, stops, questions));
    }

    /// <summary>How far the water of the oldest travel-time zone comes, about: with the regional flow, and from all round, m.</summary>
    private static double FarthestFront(FlowField field, PathStops stops, Questions questions)
    {
        Aquifer aquifer = field.Parameters.Aquifer;
        double time = questions.TravelTimes.DefaultIfEmpty(0).Max();
        double water = aquifer.Porosity * aquifer.SaturatedThickness(aquifer.PotentialOf(field.Parameters.Regional.Head));
        return Complex.Abs(field.UniformDischarge) * time / water + Math.Sqrt(stops.TotalRate * time / (Math.PI * water));
    }

    private static Envelope Roomy(Envelope all)
    {
        double longer = Math.Max(all.Width, all.Height);
        longer = longer > 0 ? longer : 2 * EmptySite;
        double width = Math.Max(all.Width + 2 * Room * longer, LeastAspect * longer * (1 + 2 * Room));
        double height = Math.Max(all.Height + 2 * Room * longer, LeastAspect * longer * (1 + 2 * Room));
        Coordinate centre = all.Centre;
        return new Envelope(centre.X - width / 2, centre.X + width / 2, centre.Y - height / 2, centre.Y + height / 2);
    }

    private static IEnumerable<Complex> Corners(Envelope box) =>
        [new(box.MinX, box.MinY), new(box.MaxX, box.MinY), new(box.MaxX, box.MaxY), new(box.MinX, box.MaxY)];
}
