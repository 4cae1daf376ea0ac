using CaptureZone.Topology;

namespace CaptureZone.Outputs.Text;

/// <summary>Words for stagnation points.</summary>
public static class StagnationText
{
    /// <summary>The kind as files write it: <c>saddle</c>, <c>summit</c>, <c>pit</c>.</summary>
    /// <param name="kind">The kind.</param>
    /// <exception cref="ArgumentOutOfRangeException">The kind has no name.</exception>
    public static string Token(StagnationKind kind) => kind switch
    {
        StagnationKind.Saddle => "saddle",
        StagnationKind.Summit => "summit",
        StagnationKind.Pit => "pit",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "The kind has no name."),
    };
}
