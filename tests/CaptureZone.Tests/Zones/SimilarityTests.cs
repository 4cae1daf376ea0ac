using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Zones;
using FsCheck.Xunit;
using NetTopologySuite.Geometries;
using NetTopologySuite.Geometries.Utilities;
using NetTopologySuite.Operation.Distance;

namespace CaptureZone.Tests.Zones;

/// <summary>What is done to a site is done to its zones. A case is a seed of <see cref="RandomSite"/>.</summary>
public sealed class SimilarityTests
{
    private const int Cases = 5;

    /// <summary>Area by which zones may differ, as a share of the disc that they are compared in.</summary>
    private const double AreaShare = 1e-5;

    /// <summary>Distance from an edge to the other zone's, as a share of the disc's radius.</summary>
    private const double EdgeShare = 1e-4;

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Moving_a_site_moves_its_zones(ushort seed, short east, short north) => AssertSame(seed, 1, new Complex(east, north));

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Turning_a_site_turns_its_zones(ushort seed, byte angle) =>
        AssertSame(seed, Complex.FromPolarCoordinates(1, angle * 2 * Math.PI / 256), 0);

    /// <summary>Lengths, rates and times all change by one factor; drawdowns then only shrink when it is below 1.</summary>
    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Scaling_a_site_and_its_rates_scales_its_zones(ushort seed, byte steps) =>
        AssertSame(seed, Math.Pow(10, -steps / 128.0), 0);

    private static void AssertSame(int seed, Complex factor, Complex by)
    {
        RandomSite before = RandomSite.Of(seed), after = Changed(before, factor, by);
        SiteAnswers first = Run(before), second = Run(after);
        Complex centre = before.Model.Wells.Aggregate(Complex.Zero, (sum, well) => sum + well.At) / before.Model.Wells.Length;
        double scale = Complex.Abs(factor);

        // Both runs compute zones in a circle about this centre that reaches beyond the corners of their extents.
        double radius = Math.Min(Reach(first.Extent, centre), Reach(second.Extent, centre * factor + by) / scale);
        Polygon disc = GeometryKit.Factory.CreatePolygon(GeometryKit.Circle(centre, radius, 360));
        for (int i = 0; i < first.Wells.Length; i++)
        {
            if (first.Wells[i].Zone is { } zone)
            {
                AssertSame(zone.Polygon, Undone(second.Wells[i].Zone!.Polygon, factor, by), disc);
            }

            foreach ((TravelTimeZone a, TravelTimeZone b) in first.Wells[i].TravelTimeZones.Zip(second.Wells[i].TravelTimeZones))
            {
                // A water table lies lower under larger rates, which changes times but no path.
                Assert.True(before.Model.Aquifer.Top is null && scale != 1 || Math.Abs(b.Area / (a.Area * scale * scale) - 1) < 1e-3);
            }
        }
    }

    private static void AssertSame(Geometry a, Geometry b, Polygon disc)
    {
        double radius = Math.Sqrt(disc.Area / Math.PI);
        Geometry difference = GeometryKit.Intersection(disc, a).SymmetricDifference(GeometryKit.Intersection(disc, b));
        Assert.InRange(difference.Area / disc.Area, 0, AreaShare);
        Assert.InRange(Farthest(a, b, disc) / radius, 0, EdgeShare);
        Assert.InRange(Farthest(b, a, disc) / radius, 0, EdgeShare);
    }

    /// <summary>The distance of Hausdorff from one edge to the other, within the disc.</summary>
    private static double Farthest(Geometry from, Geometry to, Polygon disc)
    {
        IndexedFacetDistance index = new(to.Boundary);
        Envelope box = disc.EnvelopeInternal;
        double radius = box.Width / 2;
        return from.Coordinates.Where(corner => corner.Distance(box.Centre) < 0.99 * radius)
            .Select(corner => index.Distance(GeometryKit.Factory.CreatePoint(corner)))
            .DefaultIfEmpty(0).Max();
    }

    private static Geometry Undone(Geometry shape, Complex factor, Complex by)
    {
        Complex back = 1 / factor;
        Complex shift = -by / factor;
        return new AffineTransformation(back.Real, -back.Imaginary, shift.Real, back.Imaginary, back.Real, shift.Imaginary).Transform(shape);
    }

    private static RandomSite Changed(RandomSite site, Complex factor, Complex by)
    {
        double scale = Complex.Abs(factor);
        AffineTransformation change = new(factor.Real, -factor.Imaginary, by.Real, factor.Imaginary, factor.Real, by.Imaginary);
        Model model = site.Model with
        {
            Regional = site.Model.Regional with
            {
                Direction = site.Model.Regional.Direction + factor.Phase,
                HeadAt = site.Model.Regional.HeadAt * factor + by,
            },
            Elements = [.. site.Model.Wells.Select(well => well with { At = well.At * factor + by, Rate = well.Rate * scale, Radius = well.Radius * scale })],
        };
        Questions questions = site.Questions with
        {
            Plumes = [.. site.Questions.Plumes.Select(plume => plume with { Outline = (Polygon)change.Transform(plume.Outline) })],
            TravelTimes = [.. site.Questions.TravelTimes.Select(time => time * scale)],
        };
        return new RandomSite(model, questions);
    }

    private static double Reach(Envelope extent, Complex centre) =>
        new[] { extent.MinX, extent.MaxX }.Max(x => new[] { extent.MinY, extent.MaxY }.Max(y => Complex.Abs(new Complex(x, y) - centre)));

    private static SiteAnswers Run(RandomSite site) =>
        SiteAnalysis.Run(site.Model, site.Questions, new ThreadWorkers(2), null, CancellationToken.None);
}
