namespace CaptureZone.Tracing;

/// <summary>How the path of a water particle ends.</summary>
public enum FateKind
{
    /// <summary>It ran as long as it was asked to.</summary>
    Time,

    /// <summary>At an extraction well's screen.</summary>
    Well,

    /// <summary>At an injection well's screen (followed upstream).</summary>
    Injection,

    /// <summary>Far away, where it can no longer come back.</summary>
    Far,

    /// <summary>Where the water table meets the base.</summary>
    Dry,

    /// <summary>At a stagnation point, closer than can be told apart.</summary>
    Stagnation,

    /// <summary>In a stream.</summary>
    Stream,

    /// <summary>At a summit of the head, where recharge starts out (followed upstream).</summary>
    Summit,
}

/// <summary>How a path ends, and at which feature.</summary>
/// <param name="Kind">How.</param>
/// <param name="Feature">Index of the well, stream or stagnation point; -1 where there is none.</param>
public readonly record struct Fate(FateKind Kind, int Feature = -1);
