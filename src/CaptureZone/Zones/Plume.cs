using System.Collections.Immutable;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones;

/// <summary>A body of contaminated ground water, seen in plan.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Outline">A valid polygon, m.</param>
/// <param name="Retardation">R: the contaminant moves at 1/R of the water's velocity; at least 1.</param>
public sealed record Plume(string Name, Polygon Outline, double Retardation);

/// <summary>A share of the plume's area and where its water goes.</summary>
/// <param name="Fate">Where to.</param>
/// <param name="Fraction">Share of the plume's area.</param>
public sealed record PlumeShare(Fate Fate, double Fraction);

/// <summary>Days until the plume's present water arrives, retardation included, for shares of its captured area.</summary>
/// <param name="P5">For 5 %.</param>
/// <param name="P50">For 50 %.</param>
/// <param name="P95">For 95 %.</param>
public sealed record ArrivalTimes(double P5, double P50, double P95);

/// <summary>Whether a plume is captured by the containment wells, and by how much.</summary>
/// <param name="Plume">Index of the plume.</param>
/// <param name="Captured">Decided by topology: no dividing streamline of the containment wells meets the plume.</param>
/// <param name="CapturedFraction">Share of its area in the joint containment zone.</param>
/// <param name="Margin">From its outline to the nearest edge of that zone, m; negative where it sticks out, by the farthest point; null without a zone.</param>
/// <param name="MarginSide">The same across the regional flow; null where no edge lies that way.</param>
/// <param name="MarginDowngradient">The same toward the stagnation points; null where no edge lies that way.</param>
/// <param name="MarginShare">Clean water on its tighter side, of the containment pumping; null where there is no stream function or no edge, or where it sticks out.</param>
/// <param name="CapturedBy">By containment well, largest first.</param>
/// <param name="EscapesTo">Where the rest goes, largest first.</param>
/// <param name="Arrival">Null when nothing is captured.</param>
public sealed record PlumeAnswer(
    int Plume,
    bool Captured,
    double CapturedFraction,
    double? Margin,
    double? MarginSide,
    double? MarginDowngradient,
    double? MarginShare,
    ImmutableArray<PlumeShare> CapturedBy,
    ImmutableArray<PlumeShare> EscapesTo,
    ArrivalTimes? Arrival);
