namespace CaptureZone.Flow;

/// <summary>
/// Where the answers for very many points go when several workers write them; a memory may be empty when its quantity is not
/// asked for. The counterpart of <see cref="FlowBlock"/> that may leave the stack.
/// </summary>
public readonly record struct FlowMemory
{
    /// <summary>Discharge potential, m3/d.</summary>
    public Memory<double> Potential { get; init; }

    /// <summary>East component of the discharge vector, m2/d.</summary>
    public Memory<double> Qx { get; init; }

    /// <summary>North component of the discharge vector, m2/d.</summary>
    public Memory<double> Qy { get; init; }

    /// <summary>dQx/dx, m/d.</summary>
    public Memory<double> Qxx { get; init; }

    /// <summary>dQx/dy, which equals dQy/dx, m/d.</summary>
    public Memory<double> Qxy { get; init; }

    /// <summary>dQy/dy, m/d.</summary>
    public Memory<double> Qyy { get; init; }

    /// <summary>All of it, for the calling thread.</summary>
    public FlowBlock Block => new()
    {
        Potential = Potential.Span,
        Qx = Qx.Span,
        Qy = Qy.Span,
        Qxx = Qxx.Span,
        Qxy = Qxy.Span,
        Qyy = Qyy.Span,
    };
}
