using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;

namespace CaptureZone;

/// <summary>Everything that a run finds; metres, days, local coordinates.</summary>
public sealed record SiteAnswers
{
    /// <summary>The flow, for those who want more points of it.</summary>
    public required FlowField Field { get; init; }

    /// <summary>The questions that are answered.</summary>
    public required Questions Questions { get; init; }

    /// <summary>The frame of clipped output and of the map, m.</summary>
    public required Envelope Extent { get; init; }

    /// <summary>Every stagnation point.</summary>
    public required ImmutableArray<StagnationPoint> StagnationPoints { get; init; }

    /// <summary>Whether it is certain that none is missing.</summary>
    public required bool StagnationComplete { get; init; }

    /// <summary>One answer per well, in the model's order.</summary>
    public required ImmutableArray<WellAnswer> Wells { get; init; }

    /// <summary>Union of the containment wells' zones within the calculation's circle, m; empty without containment wells.</summary>
    public required Geometry ContainmentZone { get; init; }

    /// <summary>One answer per plume, in the questions' order.</summary>
    public required ImmutableArray<PlumeAnswer> Plumes { get; init; }

    /// <summary>Dividing streamlines and the plumes' paths, clipped to nothing.</summary>
    public required ImmutableArray<FlowPath> Paths { get; init; }

    /// <summary>Lines of equal head within the extent, from low to high.</summary>
    public required ImmutableArray<HeadContour> Contours { get; init; }

    /// <summary>Interval between the contours, m.</summary>
    public required double ContourInterval { get; init; }

    /// <summary>Discharge on a grid over the extent, for flow arrows; dry places left out.</summary>
    public required ImmutableArray<FlowArrow> Arrows { get; init; }

    /// <summary>Checks that the calculation makes of itself.</summary>
    public required ImmutableArray<Check> Checks { get; init; }

    /// <summary>What the user must know, most serious first.</summary>
    public required ImmutableArray<Finding> Findings { get; init; }

    /// <summary>Distance from the known head to the nearest well, m; null without wells.</summary>
    public required double? KnownHeadDistance { get; init; }

    /// <summary>How much the drawdowns at the screens change when that distance doubles, m, at most; null without wells.</summary>
    public required double? KnownHeadSensitivity { get; init; }
}

/// <summary>A line of equal head.</summary>
/// <param name="Head">The head, m elevation.</param>
/// <param name="Lines">Its pieces, m.</param>
public sealed record HeadContour(double Head, ImmutableArray<ImmutableArray<Complex>> Lines);

/// <summary>The flow at a place.</summary>
/// <param name="At">The place, m.</param>
/// <param name="Discharge">Discharge vector Qx + i Qy, m2/d.</param>
public readonly record struct FlowArrow(Complex At, Complex Discharge);

/// <summary>A check that the calculation makes of itself.</summary>
/// <param name="Name">What is checked.</param>
/// <param name="Value">What was found.</param>
/// <param name="Limit">What is allowed.</param>
public sealed record Check(string Name, double Value, double Limit)
{
    /// <summary>Whether the value keeps the limit; a value that is no number does not.</summary>
    public bool Passed => Value <= Limit;
}

/// <summary>What a finding is about; each has its sentence in the outputs.</summary>
public enum FindingKind
{
    /// <summary>Plume water reaches a supply or other well. Subject: plume; Other: well; Value: share of the plume's area.</summary>
    PlumeReachesOtherWell,

    /// <summary>Plume water passes the containment wells. Subject: plume; Value: share of its area.</summary>
    PlumeEscapes,

    /// <summary>The level at a screen is below half the saturated thickness without pumping. Subject: well; Value: thickness left, m; Limit: half of the unpumped thickness, m.</summary>
    LevelBelowHalf,

    /// <summary>The level at a screen is below the aquifer's top. Subject: well; Value: level, m; Limit: top, m.</summary>
    LevelBelowTop,

    /// <summary>Wells lower or raise the head where it is held. Value: drawdown there if it were not held, m; Limit: a tenth of the largest drawdown in the extent, m.</summary>
    KnownHeadInfluenced,

    /// <summary>The water table meets the base within the extent. Value: share of the extent that is dry.</summary>
    DryInExtent,

    /// <summary>A well's stagnation point lies inside its screen. Subject: well.</summary>
    StagnationInsideScreen,

    /// <summary>Without regional flow the well draws on the whole aquifer. Subject: well.</summary>
    WholeAquifer,

    /// <summary>Two wells stand at one place and are one sink. Subject: one; Other: the other.</summary>
    WellsCoincide,

    /// <summary>A plume lies outside the extent. Subject: plume.</summary>
    PlumeOutsideExtent,

    /// <summary>It is not certain that every stagnation point was found.</summary>
    StagnationIncomplete,
}

/// <summary>Something the user must know.</summary>
/// <param name="Kind">What it is about.</param>
/// <param name="Subject">Name of the well, plume or other thing; empty where there is none.</param>
/// <param name="Other">Name of the other thing; empty where there is none.</param>
/// <param name="Value">The figure that belongs to it, in the unit its kind states.</param>
/// <param name="Limit">What the figure is held against; 0 where there is nothing.</param>
public sealed record Finding(FindingKind Kind, string Subject, string Other, double Value, double Limit);
