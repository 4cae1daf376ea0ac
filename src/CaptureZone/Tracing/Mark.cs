using System.Numerics;

namespace CaptureZone.Tracing;

/// <summary>Kinds of marks.</summary>
internal enum MarkKind
{
    /// <summary>A circle is entered.</summary>
    Circle,

    /// <summary>The water table meets the base.</summary>
    Base,

    /// <summary>A time is up.</summary>
    Time,
}

/// <summary>Something at which a path must end exactly.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Centre">The circle's centre, m.</param>
/// <param name="Value">The circle's radius, m, or the time, d.</param>
internal readonly record struct Mark(MarkKind Kind, Complex Centre, double Value)
{
    /// <summary>A way this short, as a share of the last step, is straight to all digits: the error is of its square.</summary>
    internal const double StraightShare = 1e-7;

    /// <summary>Trials after which what double precision gives has been reached.</summary>
    internal const int MostTrials = 30;

    /// <summary>What remains before the mark: positive before it, negative behind it.</summary>
    /// <param name="node">The particle.</param>
    internal double Remaining(in Node node) => Kind switch
    {
        MarkKind.Circle => Complex.Abs(node.At - Centre) - Value,
        MarkKind.Base => node.Potential,
        _ => Value - node.Time,
    };

    /// <summary>By how much less remains for each metre along the path.</summary>
    /// <param name="node">The particle.</param>
    internal double Rate(in Node node) => Kind switch
    {
        MarkKind.Circle => -((node.At - Centre) * Complex.Conjugate(node.Direction)).Real / Complex.Abs(node.At - Centre),
        MarkKind.Base => node.Speed,
        _ => node.Slowness,
    };
}
