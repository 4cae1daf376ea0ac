using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>What the head does around a stagnation point.</summary>
public enum StagnationKind
{
    /// <summary>Higher on two sides, lower on two others.</summary>
    Saddle,

    /// <summary>Lower all round: water starts out here (with recharge only).</summary>
    Summit,

    /// <summary>Higher all round.</summary>
    Pit,
}

/// <summary>A place where the water stands still.</summary>
/// <param name="At">The place, m.</param>
/// <param name="Kind">What the head does around it.</param>
/// <param name="Multiplicity">1; more where several fall together.</param>
/// <param name="Head">Head, m elevation; NaN where the aquifer is dry.</param>
public sealed record StagnationPoint(Complex At, StagnationKind Kind, int Multiplicity, double Head);
