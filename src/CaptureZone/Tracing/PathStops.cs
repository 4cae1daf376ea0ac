using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Topology;

namespace CaptureZone.Tracing;

/// <summary>Where paths end: a circle about a well, at which water leaves or enters the aquifer.</summary>
/// <param name="At">The well's axis, m.</param>
/// <param name="Radius">Radius at which a path ends, m.</param>
/// <param name="Well">Index of the well; the first of those that stand at one place.</param>
/// <param name="Rate">What it takes out, m3/d; negative when it injects; summed over wells at one place.</param>
public readonly record struct Screen(Complex At, double Radius, int Well, double Rate);

/// <summary>
/// Everything at which the path of a particle can end, for one field: screens, stagnation points, and a circle outside which
/// the flow is so nearly that of a single uniform flow, source or sink that what moves outward never comes back.
/// </summary>
public sealed class PathStops
{
    /// <summary>
    /// Paths end within this share of the distance to the nearest stagnation point or other screen, where that is less than the
    /// screen's radius: a well too weak for its bore still ends only the water that it takes.
    /// </summary>
    private const double ShareOfClearance = 0.3;

    /// <summary>Largest departure of the far flow from its leading term, as a share of that term.</summary>
    private const double FarDeparture = 0.1;

    /// <summary>What lies beyond this many site diameters counts as at infinity.</summary>
    private const double InfinityInDiameters = 1e6;

    /// <summary>A site is taken to be at least this wide, m: the bore of a lone well says nothing of how far its water comes.</summary>
    private const double LeastDiameter = 1;

    /// <summary>The circle at which paths end is larger than the reach that is asked for by this factor.</summary>
    private const double ReachMargin = 1.5;

    private PathStops(FlowField field, StagnationSet stagnation, Screen[] screens, double reach)
    {
        Field = field;
        Stagnation = stagnation;
        Screens = [.. screens];
        Centre = screens.Length == 0 ? field.Parameters.Regional.HeadAt : Mean(screens);
        Diameter = Math.Max(
            LeastDiameter, 2 * screens.Select(screen => Complex.Abs(screen.At - Centre) + screen.Radius).DefaultIfEmpty().Max());
        FarRadius = Math.Max(FarRadiusOf(field), ReachMargin * reach);
        TotalRate = screens.Sum(screen => Math.Abs(screen.Rate));
    }

    /// <summary>The field.</summary>
    public FlowField Field { get; }

    /// <summary>Its stagnation points, those that no path can tell apart taken together.</summary>
    public StagnationSet Stagnation { get; }

    /// <summary>The screens of wells that run, wells at one place taken together.</summary>
    public ImmutableArray<Screen> Screens { get; }

    /// <summary>Centre of the site, m.</summary>
    public Complex Centre { get; }

    /// <summary>Diameter of the circle about the centre that holds every screen, m.</summary>
    public double Diameter { get; }

    /// <summary>What lies beyond this distance from the centre counts as at infinity, m.</summary>
    public double InfinityRadius => InfinityInDiameters * Diameter;

    /// <summary>Beyond this distance from the centre, what moves outward never comes back, m.</summary>
    public double FarRadius { get; }

    /// <summary>Sum of the rates of all screens regardless of sign, m3/d.</summary>
    public double TotalRate { get; }

    /// <summary>Finds where paths end in a field.</summary>
    /// <param name="field">The field.</param>
    /// <param name="stagnation">Its stagnation points.</param>
    /// <param name="reach">Radius about the site's centre that must lie well inside the circle at which paths end, m.</param>
    public static PathStops Of(FlowField field, StagnationSet stagnation, double reach = 0)
    {
        List<Screen> merged = [];
        for (int i = 0; i < field.System.Wells.Length; i++)
        {
            Well well = field.System.Wells[i];
            int same = merged.FindIndex(screen => screen.At == well.At);
            if (same < 0)
            {
                merged.Add(new Screen(well.At, well.Radius, i, field.Parameters.Rates[i]));
            }
            else
            {
                Screen first = merged[same];
                merged[same] = first with
                {
                    Rate = first.Rate + field.Parameters.Rates[i],
                    Radius = Math.Max(first.Radius, well.Radius),
                };
            }
        }

        Screen[] running = [.. merged.Where(screen => screen.Rate != 0)];
        StagnationSet joined = CloseStagnation.Joined(field, stagnation, running.Sum(screen => Math.Abs(screen.Rate)));
        Screen[] cleared = [.. running.Select(screen => screen with { Radius = EndRadius(screen, running, joined) })];
        return new PathStops(field, joined, cleared, reach);
    }

    private static double EndRadius(Screen screen, Screen[] all, StagnationSet stagnation)
    {
        double clearance = double.PositiveInfinity;
        foreach (Screen other in all)
        {
            if (other.Well != screen.Well)
            {
                clearance = Math.Min(clearance, Complex.Abs(other.At - screen.At));
            }
        }

        foreach (StagnationPoint point in stagnation.Points)
        {
            clearance = Math.Min(clearance, Complex.Abs(point.At - screen.At));
        }

        return Math.Min(screen.Radius, ShareOfClearance * clearance);
    }

    private static Complex Mean(Screen[] screens)
    {
        Complex sum = Complex.Zero;
        foreach (Screen screen in screens)
        {
            sum += screen.At;
        }

        return sum / screens.Length;
    }

    /// <summary>
    /// With uniform flow Q0 the wells' part is below sum|q| / (2 pi (R - r)) outside R, r being the site's radius; without it the
    /// departure from the one net well of rate S is below sum|q| r / (2 pi R (R - r)).
    /// </summary>
    private double FarRadiusOf(FlowField field)
    {
        double radius = Diameter / 2;
        double uniform = Complex.Abs(field.Parameters.Regional.Discharge(field.Parameters.Aquifer));
        double total = Screens.Sum(screen => Math.Abs(screen.Rate));
        double net = Math.Abs(Screens.Sum(screen => screen.Rate));
        if (total == 0)
        {
            return 10 * radius;
        }

        double needed = uniform > 0
            ? radius + total / (2 * Math.PI * FarDeparture * uniform)
            : radius + total * radius / (FarDeparture * net);
        return Math.Min(Math.Max(needed, 2 * radius), InfinityRadius);
    }
}
