using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Zones;

/// <summary>A seeded site: a model and what is asked of it.</summary>
public sealed record RandomSite(Model Model, Questions Questions)
{
    private const double Year = 365.25;
    private const int FewestWells = 2, MostWells = 8;
    private const double Side = 1000, LeastApart = 5;

    /// <summary>
    /// 2 to 8 wells of 20 to 800 m3/d in a square of 1 km, three in ten injecting, the first always extracting; every fourth site
    /// without regional flow; every fifth with a water table, as deep as it must be to yield the rates. Two plumes.
    /// </summary>
    public static RandomSite Of(int seed)
    {
        Random random = new(seed);
        Well[] wells = Wells(random, FewestWells + seed % (MostWells - FewestWells + 1));
        double gradient = seed % 4 == 3 ? 0 : Log(random, 5e-4, 5e-3), direction = 2 * Math.PI * random.NextDouble();
        Questions questions = new(
            [.. Enumerable.Range(0, 2).Select(i => RandomPlume(random, i))], [Year, 5 * Year], Extent: null, HeadUnit: 1);
        bool hasTop = seed % 5 != 4;
        Complex headAt = Complex.FromPolarCoordinates(-3 * Side, direction);
        for (double head = hasTop ? 200 : 20; ; head *= 1.5)
        {
            RegionalFlow regional = new(hasTop ? gradient : gradient * 12 / head, direction, head, headAt);
            Model model = new(new Aquifer(18, 0, hasTop ? 12 : null, 0.24), regional, [.. wells]);
            if (Yields(model))
            {
                return new RandomSite(model, questions);
            }
        }
    }

    /// <summary>A star-shaped plume of 20 to 300 m somewhere in the square.</summary>
    public static Plume RandomPlume(Random random, int index)
    {
        Complex centre = new(Side * (random.NextDouble() - 0.5), Side * (random.NextDouble() - 0.5));
        double size = Log(random, 20, 300);
        int corners = random.Next(3, 12);
        Coordinate[] ring =
        [
            .. Enumerable.Range(0, corners).Select(k => GeometryKit.ToCoordinate(
                centre + Complex.FromPolarCoordinates(size * (0.4 + 0.6 * random.NextDouble()), 2 * Math.PI * k / corners))),
        ];
        return new Plume($"plume {index}", GeometryKit.Factory.CreatePolygon([.. ring, ring[0].Copy()]), 1 + random.NextDouble());
    }

    private static Well[] Wells(Random random, int count)
    {
        List<Well> wells = [];
        while (wells.Count < count)
        {
            Complex at = new(Side * (random.NextDouble() - 0.5), Side * (random.NextDouble() - 0.5));
            bool injects = random.NextDouble() < 0.3 && wells.Count > 0;
            double rate = Log(random, 20, 800) * (injects ? -1 : 1);
            WellPurpose purpose = random.NextDouble() < 0.6 ? WellPurpose.Containment : WellPurpose.Supply;
            if (wells.All(other => Complex.Abs(other.At - at) > LeastApart))
            {
                wells.Add(new Well($"W-{wells.Count + 1}", at, rate, 0.15, purpose));
            }
        }

        return [.. wells];
    }

    private static bool Yields(Model model)
    {
        try
        {
            SiteAnalysis.CheckYield(model);
            return true;
        }
        catch (DewateredException)
        {
            return false;
        }
    }

    private static double Log(Random random, double low, double high) => low * Math.Pow(high / low, random.NextDouble());
}
