using System.Collections.Immutable;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones;

/// <summary>Water of one origin in what a well takes.</summary>
/// <param name="Source">Its origin: far (regional flow), an injection well, a stream, recharge.</param>
/// <param name="Rate">How much, m3/d.</param>
/// <param name="Share">How much, of the well's rate.</param>
public sealed record SourceShare(Fate Source, double Rate, double Share);

/// <summary>The steady capture zone of one extraction well.</summary>
/// <param name="Polygon">The zone within the calculation's circle; valid, holes and several parts allowed.</param>
/// <param name="InExtent">The zone within the extent.</param>
/// <param name="Area">Its area, m2; null when it is open to far upstream.</param>
/// <param name="AreaInExtent">Its area within the extent, m2.</param>
/// <param name="Open">Whether it reaches without end.</param>
/// <param name="WidthAtWell">
/// Its extent on the line through the well across the regional flow, m; null without regional flow, or with one so weak that the
/// calculation's circle cuts it off.
/// </param>
/// <param name="WidthUpgradient">The limit of its width far upstream, m: regional water over Q0; null without regional flow.</param>
/// <param name="StagnationDistance">From the well to the nearest saddle on the zone's edge, m; null where there is none.</param>
/// <param name="WaterFrom">Where the water comes from, largest first.</param>
/// <param name="SideFlow">What leaks through the streamline edges within the extent, of the well's rate: the integral of |normal discharge|.</param>
public sealed record WellZone(
    Geometry Polygon,
    Geometry InExtent,
    double? Area,
    double AreaInExtent,
    bool Open,
    double? WidthAtWell,
    double? WidthUpgradient,
    double? StagnationDistance,
    ImmutableArray<SourceShare> WaterFrom,
    double SideFlow);

/// <summary>Where the water is that reaches the well within a time.</summary>
/// <param name="Time">The time, d.</param>
/// <param name="Polygon">The zone; valid, not clipped to the extent.</param>
/// <param name="Area">Its area, m2.</param>
/// <param name="PoreVolumeError">Its pore volume against rate x time, less what entered inside, of the latter.</param>
public sealed record TravelTimeZone(double Time, Geometry Polygon, double Area, double PoreVolumeError);

/// <summary>What was found for one well.</summary>
/// <param name="Well">Index of the well in the model.</param>
/// <param name="HeadAtScreen">Mean head round the screen, m elevation, well loss not included.</param>
/// <param name="DrawdownAtScreen">Head with all wells of the file off, less head with them on, m.</param>
/// <param name="LargestRate">The others held, the rate that brings the level at the screen to the base, m3/d; null for injection.</param>
/// <param name="Zone">Its capture zone; null for injection and idle wells.</param>
/// <param name="TravelTimeZones">In the order asked; empty for injection and idle wells.</param>
public sealed record WellAnswer(
    int Well,
    double HeadAtScreen,
    double DrawdownAtScreen,
    double? LargestRate,
    WellZone? Zone,
    ImmutableArray<TravelTimeZone> TravelTimeZones);
