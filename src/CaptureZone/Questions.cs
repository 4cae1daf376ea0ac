using System.Collections.Immutable;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;

namespace CaptureZone;

/// <summary>What is asked of a model.</summary>
/// <param name="Plumes">Plumes to judge.</param>
/// <param name="TravelTimes">Times of the travel-time zones, d, increasing.</param>
/// <param name="Extent">The frame for clipped output, m; null: chosen so that every well, plume and stagnation point shows.</param>
/// <param name="HeadUnit">The unit in which contours should be round, m: 1 or 0.3048.</param>
public sealed record Questions(ImmutableArray<Plume> Plumes, ImmutableArray<double> TravelTimes, Envelope? Extent, double HeadUnit);
