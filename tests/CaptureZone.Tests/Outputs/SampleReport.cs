using System.Collections.Immutable;
using System.Numerics;
using System.Security.Cryptography;
using System.Text;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Outputs;
using CaptureZone.Sites;
using CaptureZone.Sites.Coordinates;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using NetTopologySuite.Operation.Union;

namespace CaptureZone.Tests.Outputs;

/// <summary>
/// A report made by hand, so that outputs are tested without the engine: shapes and figures look like a site's but are invented and
/// agree with no calculation (only the flow field and the arrows are real). Three containment wells, one injection well, one supply
/// well; one plume that is captured and one that is not.
/// </summary>
public static class SampleReport
{
    private const int Rw1 = 0, Rw2 = 1, Rw3 = 2, Iw1 = 3, Sw1 = 4;

    /// <summary>Regional flow turns from east by this angle, radians: toward 112 degrees from grid north.</summary>
    private static readonly double Downstream = -22 * Math.PI / 180;

    private static readonly GeometryFactory Factory = new();

    /// <summary>The calculation's reach upstream, m.</summary>
    private const double Reach = 3000;

    private static readonly Envelope Extent = new(-900, 1300, -700, 700);

    /// <summary>The sample in a projected system.</summary>
    public static Report Create(ReportUnits units = ReportUnits.Metric) => Create(SampleProjectedSystem.Create(), units);

    /// <summary>The sample in a coordinate system of choice.</summary>
    public static Report Create(CoordinateSystem coordinates, ReportUnits units = ReportUnits.Metric)
    {
        Model model = MakeModel();
        Questions questions = new(MakePlumes(), [365.25, 5 * 365.25, 10 * 365.25], Extent, units == ReportUnits.Us ? 0.3048 : 1);
        return new Report(MakeSite(model, questions, coordinates, units), MakeAnswers(model, questions), "0.1.0");
    }

    private static Model MakeModel() => new(
        new Aquifer(18, 212, 224, 0.24),
        new RegionalFlow(0.0031, Downstream, 231.6, At(-1100, 100)),
        [
            new Well("RW-1", At(0, 170), 150, 0.15, WellPurpose.Containment),
            new Well("RW-2", At(10, 0), 160, 0.15, WellPurpose.Containment),
            new Well("RW-3", At(0, -170), 140, 0.15, WellPurpose.Containment),
            new Well("IW-1", At(280, -120), -180, 0.15, WellPurpose.Other),
            new Well("SW-1", At(900, 380), 250, 0.3, WellPurpose.Supply),
        ]);

    private static ImmutableArray<Plume> MakePlumes() =>
    [
        new Plume("Cr(VI) above 50 ug/L", Oval(-330, 10, 260, 110, 12), 1.4),
        new Plume("TCE above 5 ug/L", Oval(-120, 260, 190, 90, 14), 2),
    ];

    private static SiteDocument MakeSite(Model model, Questions questions, CoordinateSystem coordinates, ReportUnits units)
    {
        SiteFrame frame = coordinates.IsLocal
            ? new SiteFrame(5000, 5000, coordinates.MetresPerUnit)
            : new SiteFrame(562_300, 4_641_300, coordinates.MetresPerUnit);
        return new SiteDocument
        {
            FileName = "larch-hollow.toml",
            Text = Text,
            Sha256 = Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(Text))),
            Title = "Larch Hollow Plating Works, chromium plume",
            Coordinates = coordinates,
            Frame = frame,
            Model = model,
            Questions = questions,
            TravelTimeLabels = ["1 yr", "5 yr", "10 yr"],
            Report = new ReportSettings(
                units, "LH-0417", "Larch Hollow Township", "A. Sample, licence 0000", "2026-12-01", "NAVD 88"),
            Inputs = MakeInputs(),
            Backdrops = MakeBackdrops(),
            Warnings = [],
        };
    }

    private const string Text = """
        format = 1
        title  = "Larch Hollow Plating Works, chromium plume"
        crs    = "EPSG:26914"

        [aquifer]
        conductivity = "18 m/d"
        base         = "212 m"
        top          = "224 m"
        porosity     = 0.24

        """;

    private static ImmutableArray<InputEntry> MakeInputs() =>
    [
        new("aquifer.conductivity", "Hydraulic conductivity", "18 m/d", QuantityKind.Conductivity, 18,
            "0.1 to 1000 m/d (common practice, no source)", "pumping test PT-1, May 2026"),
        new("aquifer.base", "Base of the aquifer", "212 m", QuantityKind.Length, 212, "", "boring logs B-1 to B-7"),
        new("aquifer.top", "Top of the aquifer", "224 m", QuantityKind.Length, 224, "", "boring logs B-1 to B-7"),
        new("aquifer.porosity", "Effective porosity", "0.24", QuantityKind.Ratio, 0.24, "0.1 to 0.35 (common practice, no source)", ""),
        new("regional_flow.gradient", "Hydraulic gradient", "0.0031", QuantityKind.Ratio, 0.0031, "", "water levels of 2026-09-14"),
        new("regional_flow.flows_toward", "Flows toward", "112", QuantityKind.Direction, 112, "", "water levels of 2026-09-14"),
        new("regional_flow.head", "Known head", "231.6 m", QuantityKind.Length, 231.6, "", "well MW-1"),
        new("well.RW-1.extracts", "Rate of RW-1", "150 m3/d", QuantityKind.Rate, 150, "", "permit limit"),
        new("well.RW-2.extracts", "Rate of RW-2", "160 m3/d", QuantityKind.Rate, 160, "", "permit limit"),
        new("well.RW-3.extracts", "Rate of RW-3", "140 m3/d", QuantityKind.Rate, 140, "", "permit limit"),
        new("well.IW-1.injects", "Rate of IW-1", "180 m3/d", QuantityKind.Rate, -180, "", ""),
        new("well.SW-1.extracts", "Rate of SW-1", "250 m3/d", QuantityKind.Rate, 250, "", ""),
    ];

    private static ImmutableArray<Backdrop> MakeBackdrops() =>
    [
        new("Property line", Factory.CreatePolygon(Ring([new(-560, -260), new(-160, -300), new(-90, 180), new(-500, 230)]))),
        new("County road 9", Factory.CreateLineString([new(-900, 420), new(-200, 380), new(500, 520), new(1300, 480)])),
        new("Receptors", Factory.CreateMultiPointFromCoords([new(640, -380), new(760, -310)])),
    ];

    private static SiteAnswers MakeAnswers(Model model, Questions questions)
    {
        FlowField field = FlowSystem.Assemble(model).Solve();
        Polygon[] strips = [Strip(1.0 / 3, 1), Strip(-1.0 / 3, 1.0 / 3), Strip(-1, -1.0 / 3)];
        Geometry closed = Oval(830, 380, 420, 190, 40).Difference(Oval(640, 400, 60, 30, 24));
        Geometry joint = UnaryUnionOp.Union(strips);
        return new SiteAnswers
        {
            Field = field,
            Questions = questions,
            Extent = Extent,
            StagnationPoints = MakeStagnationPoints(),
            StagnationComplete = true,
            Wells =
            [
                WellWithZone(model, Rw1, strips[0], true, [Share(FateKind.Far, -1, 150, 1)]),
                WellWithZone(model, Rw2, strips[1], true, [Share(FateKind.Far, -1, 160, 1)]),
                WellWithZone(model, Rw3, strips[2], true, [Share(FateKind.Far, -1, 100, 5.0 / 7), Share(FateKind.Injection, Iw1, 40, 2.0 / 7)]),
                new WellAnswer(Iw1, 232.4, -1.1, null, null, []),
                WellWithZone(model, Sw1, closed, false, [Share(FateKind.Injection, Iw1, 140, 0.56), Share(FateKind.Far, -1, 110, 0.44)]),
            ],
            ContainmentZone = joint,
            Plumes = MakePlumeAnswers(),
            Paths = MakePaths(questions),
            Contours = MakeContours(),
            ContourInterval = 0.5,
            Arrows = MakeArrows(field),
            Checks =
            [
                new Check("side flow of RW-1, share of its rate", 2.3e-7, 1e-3),
                new Check("side flow of RW-2, share of its rate", 4.1e-7, 1e-3),
                new Check("pore volume of RW-1 within 1 yr, share", 1.2e-4, 1e-3),
                new Check("residual at stagnation points, relative", 3.3e-15, 1e-12),
            ],
            Findings =
            [
                new Finding(FindingKind.PlumeReachesOtherWell, "TCE above 5 ug/L", "SW-1", 0.12, 0),
                new Finding(FindingKind.KnownHeadInfluenced, "", "", 0.31, 0.27),
            ],
            KnownHeadDistance = 1102,
            KnownHeadSensitivity = 0.09,
        };
    }

    private static ImmutableArray<StagnationPoint> MakeStagnationPoints() =>
    [
        new(At(60, 0), StagnationKind.Saddle, 1, 230.02),
        new(At(48, 165), StagnationKind.Saddle, 1, 229.97),
        new(At(52, -160), StagnationKind.Saddle, 1, 230.05),
        new(At(1010, 390), StagnationKind.Saddle, 1, 226.41),
    ];

    private static ImmutableArray<PlumeAnswer> MakePlumeAnswers() =>
    [
        new(0, true, 1, 143.2, 168.5, 143.2, 0.31,
            [new(new Fate(FateKind.Well, Rw2), 0.72), new(new Fate(FateKind.Well, Rw1), 0.28)], [], new ArrivalTimes(410, 1320, 2710)),
        new(1, false, 0.88, -41.7, -41.7, 22.4, null,
            [new(new Fate(FateKind.Well, Rw1), 0.88)], [new(new Fate(FateKind.Well, Sw1), 0.12)], new ArrivalTimes(220, 905, 1980)),
    ];

    private static WellAnswer WellWithZone(Model model, int well, Geometry zone, bool open, ImmutableArray<SourceShare> waterFrom)
    {
        Geometry inExtent = zone.Intersection(Factory.ToGeometry(Extent));
        Point centre = Factory.CreatePoint(ToCoordinate(model.Wells[well].At));
        double[] times = [365.25, 5 * 365.25, 10 * 365.25];
        double[] radii = [75, 160, 235];
        return new WellAnswer(
            well,
            230.1 - 0.2 * well,
            1.4 + 0.1 * well,
            1900 - 100 * well,
            new WellZone(
                zone, inExtent, open ? null : zone.Area, inExtent.Area, open, 120 + well, open ? 224 : null, 58 + well, waterFrom, 3e-7),
            [
                .. times.Zip(radii, (time, radius) =>
                {
                    Geometry within = zone.Intersection(centre.Buffer(radius, 24));
                    return new TravelTimeZone(time, within, within.Area, 1.2e-4);
                }),
            ]);
    }

    private static SourceShare Share(FateKind kind, int feature, double rate, double share) => new(new Fate(kind, feature), rate, share);

    private static ImmutableArray<FlowPath> MakePaths(Questions questions)
    {
        List<FlowPath> paths =
        [
            Path(PathRole.DividesDestinations, "", Boundary(1), new Fate(FateKind.Far)),
            Path(PathRole.DividesDestinations, "", Boundary(1.0 / 3), new Fate(FateKind.Far)),
            Path(PathRole.DividesDestinations, "", Boundary(-1.0 / 3), new Fate(FateKind.Far)),
            Path(PathRole.DividesDestinations, "", Boundary(-1), new Fate(FateKind.Far)),
            Path(PathRole.DividesOrigins, "", [At(60, 0), At(38, 1), At(10, 0)], new Fate(FateKind.Well, Rw2)),
            Path(PathRole.DividesOrigins, "", [At(60, 0), At(200, 4), At(800, 10), At(4000, 14)], new Fate(FateKind.Far)),
        ];
        Coordinate[] corners = questions.Plumes[0].Outline.ExteriorRing.Coordinates;
        for (int i = 0; i < corners.Length - 1; i += 2)
        {
            Complex from = new(corners[i].X, corners[i].Y), to = At(10, 0);
            paths.Add(Path(
                PathRole.FromPlume, questions.Plumes[0].Name, [from, 0.6 * from + 0.4 * to, to], new Fate(FateKind.Well, Rw2)));
        }

        return [.. paths];
    }

    private static FlowPath Path(PathRole role, string from, Complex[] line, Fate fate)
    {
        const double Speed = 0.23;
        double length = 0;
        PathPoint[] points = new PathPoint[line.Length];
        for (int i = 0; i < line.Length; i++)
        {
            length += i == 0 ? 0 : (line[i] - line[i - 1]).Magnitude;
            points[i] = new PathPoint(line[i], length / Speed);
        }

        return new FlowPath(role, from, [.. points], fate, length);
    }

    private static ImmutableArray<HeadContour> MakeContours()
    {
        List<HeadContour> contours = [];
        for (double head = 227; head <= 233; head += 0.5)
        {
            double along = (230.2 - head) / 0.0031;
            IEnumerable<Complex> line = Enumerable.Range(-12, 25).Select(i => At(along - 30 * Math.Exp(-i * i / 16.0), 60 * i));
            ImmutableArray<Complex> inside = [.. line.Where(at => Extent.Contains(at.Real, at.Imaginary))];
            if (inside.Length > 1)
            {
                contours.Add(new HeadContour(head, [inside]));
            }
        }

        return [.. contours];
    }

    private static ImmutableArray<FlowArrow> MakeArrows(FlowField field)
    {
        List<FlowArrow> arrows = [];
        for (double x = Extent.MinX + 50; x < Extent.MaxX; x += 150)
        {
            for (double y = Extent.MinY + 50; y < Extent.MaxY; y += 150)
            {
                arrows.Add(new FlowArrow(new Complex(x, y), field.DischargeAt(new Complex(x, y))));
            }
        }

        return [.. arrows];
    }

    /// <summary>A dividing line from the tip upstream; <paramref name="share"/> of the half width, -1 to 1.</summary>
    private static Complex[] Boundary(double share)
    {
        const double Tip = 60, FarHalfWidth = 336, Bend = 40;
        const int Count = 48;
        Complex[] line = new Complex[Count + 1];
        for (int i = 0; i <= Count; i++)
        {
            double along = (Reach + Tip) * Math.Pow((double)i / Count, 2.5);
            line[i] = At(Tip - along, share * FarHalfWidth * 2 / Math.PI * Math.Atan(Math.Sqrt(along / Bend)));
        }

        return line;
    }

    private static Polygon Strip(double right, double left)
    {
        IEnumerable<Complex> outline = Boundary(right).Concat(Boundary(left).Skip(1).Reverse());
        return Factory.CreatePolygon(Ring(outline.Select(ToCoordinate)));
    }

    private static Polygon Oval(double along, double across, double halfLength, double halfWidth, int corners) =>
        Factory.CreatePolygon(Ring(Enumerable.Range(0, corners).Select(i =>
        {
            double angle = 2 * Math.PI * i / corners;
            return ToCoordinate(At(along + halfLength * Math.Cos(angle), across + halfWidth * Math.Sin(angle)));
        })));

    private static Coordinate[] Ring(IEnumerable<Coordinate> corners)
    {
        Coordinate[] open = [.. corners];
        return [.. open, open[0].Copy()];
    }

    private static Coordinate ToCoordinate(Complex at) => new(at.Real, at.Imaginary);

    /// <summary>A place by its distance along the regional flow and to the left of it, m.</summary>
    private static Complex At(double along, double across) => new Complex(along, across) * Complex.FromPolarCoordinates(1, Downstream);
}
