using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>A place as an offset from a sink, m.</summary>
internal readonly record struct NearSink(int Sink, double X, double Y)
{
    internal Complex Offset => new(X, Y);

    internal double Distance => Math.Sqrt(X * X + Y * Y);

    internal NearSink Moved(Complex by) => new(Sink, X + by.Real, Y + by.Imaginary);

    internal NearSink SeenFrom(int sink, RationalFlow flow) =>
        sink == Sink ? this : new NearSink(sink, 0, 0).Moved(flow.Between(sink, Sink) + Offset);
}

/// <summary>W near a sink, its pole lifted.</summary>
internal readonly struct LiftedFlow
{
    /// <summary>g = W (z - z_a), m3/d.</summary>
    internal Complex Value { get; init; }

    /// <summary>dg/dz, m2/d.</summary>
    internal Complex Slope { get; init; }

    /// <summary>Sum of 1 / (z - z_j) over the other sinks, 1/m.</summary>
    internal Complex OtherPoles { get; init; }

    /// <summary>Sum of the sizes of the terms of <see cref="Value"/>, m3/d; at most sqrt 2 too large, never too small.</summary>
    internal double Size { get; init; }

    /// <summary>The sink that is clearly nearer; else the one it was asked from.</summary>
    internal int Nearest { get; init; }
}
