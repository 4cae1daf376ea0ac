using System.Collections.Immutable;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Algorithm.Locate;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones;

/// <summary>The checks that a run makes of itself.</summary>
internal static class SelfChecks
{
    private const double SideFlowLimit = 1e-3;
    private const double PoreVolumeLimit = 1e-3;
    private const double ResidualLimit = 1e-10;
    private const double DriftLimit = 1e-8;
    private const double FractionLimit = 1e-3;

    /// <summary>Points that are followed to see whether they end in the well whose zone they lie in.</summary>
    private const int SpotPoints = 2000;

    /// <summary>Points within this share of the extent's diagonal of a zone's edge are not told apart from it.</summary>
    private const double EdgeShare = 1e-4;

    /// <summary>All checks.</summary>
    internal static ImmutableArray<Check> Of(
        FlowTopology topology,
        FaceMap map,
        Envelope extent,
        IReadOnlyList<WellAnswer> wells,
        IReadOnlyList<PlumeAnswer> plumes,
        IWorkers workers)
    {
        StagnationSet stagnation = topology.Stops.Stagnation;
        int missing = stagnation.Expected - stagnation.Points.Sum(point => point.Multiplicity);
        IEnumerable<WellZone> zones = wells.Select(well => well.Zone).OfType<WellZone>();
        IEnumerable<TravelTimeZone> timed = wells.SelectMany(well => well.TravelTimeZones);
        double total = Math.Max(topology.Stops.TotalRate, double.Epsilon);
        return
        [
            new Check("stagnation points missing", Math.Abs(missing), 0),
            new Check("largest residual discharge at a stagnation point, share of what cancels there", stagnation.Residual, ResidualLimit),
            new Check(
                "largest drift of the stream function on a dividing streamline, share of the total rate",
                Largest(topology.Branches.Select(branch => Math.Abs(branch.End.FluxDrift) / total)),
                DriftLimit),
            new Check("largest side flow of a capture zone, share of the well's rate", Largest(zones.Select(zone => zone.SideFlow)), SideFlowLimit),
            new Check("stretches of a screen whose two sides tell of different origins", Contradictions(topology), 0),
            new Check("largest pore volume error of a travel-time zone", Largest(timed.Select(zone => zone.PoreVolumeError)), PoreVolumeLimit),
            new Check(
                "largest gap between the verdict and the polygons, share of the plume's area",
                Largest(plumes.Select(VerdictGap)),
                FractionLimit),
            new Check(
                "spot check: of 2 000 seeded points followed with the water, those that end elsewhere than their zone says "
                + "(none: below 0.15 % of the area at 95 % confidence)",
                SpotMisses(topology, map, extent, workers),
                0),
        ];
    }

    /// <summary>The water between two branches that arrive at a screen was followed to its origin beside each of them.</summary>
    private static int Contradictions(FlowTopology topology) => topology.Stops.Screens
        .Where(screen => screen.Rate > 0)
        .SelectMany(screen => WaterOrigins.Stretches(topology, screen))
        .Count(stretch => stretch is { Begin: { } begin, End: { } end } && begin.Right != end.Left);

    /// <summary>A captured plume lies wholly in the polygons; one that is not captured does not.</summary>
    private static double VerdictGap(PlumeAnswer plume)
    {
        double inside = plume.CapturedBy.Sum(share => share.Fraction);
        return plume.Captured ? Math.Abs(1 - inside) : inside >= 1 ? 1 : 0;
    }

    private static double Largest(IEnumerable<double> values) => values.DefaultIfEmpty(0).Max();

    private static int SpotMisses(FlowTopology topology, FaceMap map, Envelope extent, IWorkers workers)
    {
        (int Well, Geometry Zone, IndexedPointInAreaLocator Locator)[] zones =
        [
            .. topology.Stops.Screens.Where(screen => screen.Rate > 0)
                .Select(screen => (screen.Well, map.ZoneOf(new Fate(FateKind.Well, screen.Well))))
                .Where(zone => !zone.Item2.IsEmpty)
                .Select(zone => (zone.Well, zone.Item2, new IndexedPointInAreaLocator(zone.Item2))),
        ];
        foreach ((_, _, IndexedPointInAreaLocator locator) in zones)
        {
            // The index is built at the first question: asked here, so that the workers only read it.
            locator.Locate(extent.Centre);
        }

        double edge = EdgeShare * extent.Diameter;
        bool[] missed = new bool[SpotPoints];
        workers.For(SpotPoints, i =>
        {
            Coordinate at = new(
                extent.MinX + extent.Width * SeededUniform.At(2 * i),
                extent.MinY + extent.Height * SeededUniform.At(2 * i + 1));
            Fate fate = topology.Scout.Trace(GeometryKit.ToComplex(at), Sense.Downstream, double.PositiveInfinity, null).Fate;
            foreach ((int well, Geometry zone, IndexedPointInAreaLocator locator) in zones)
            {
                bool inZone = locator.Locate(at) != Location.Exterior;
                bool ends = fate == new Fate(FateKind.Well, well);
                missed[i] |= inZone != ends && zone.Boundary.Distance(GeometryKit.Factory.CreatePoint(at)) > edge;
            }
        });
        return missed.Count(miss => miss);
    }

    /// <summary>Numbers between 0 and 1 as a pure function of an index: the finalizer of the generator SplitMix64 (Steele, Lea and Flood 2014).</summary>
    private static class SeededUniform
    {
        private const ulong Seed = 20_260_101;

        internal static double At(int index)
        {
            ulong z = Seed + (ulong)(index + 1) * 0x9E3779B97F4A7C15UL;
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9UL;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EBUL;
            return ((z ^ (z >> 31)) >> 11) * (1.0 / (1UL << 53));
        }
    }
}
