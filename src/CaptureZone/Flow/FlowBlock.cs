namespace CaptureZone.Flow;

/// <summary>
/// Where the answers for many points go; a span may be empty when its quantity is not asked for. Banks add to what stands there.
/// </summary>
public readonly ref struct FlowBlock
{
    /// <summary>Discharge potential, m3/d.</summary>
    public Span<double> Potential { get; init; }

    /// <summary>East component of the discharge vector, m2/d.</summary>
    public Span<double> Qx { get; init; }

    /// <summary>North component of the discharge vector, m2/d.</summary>
    public Span<double> Qy { get; init; }

    /// <summary>dQx/dx, m/d.</summary>
    public Span<double> Qxx { get; init; }

    /// <summary>dQx/dy, which equals dQy/dx, m/d.</summary>
    public Span<double> Qxy { get; init; }

    /// <summary>dQy/dy, m/d. Qxx + Qyy is the recharge, m/d.</summary>
    public Span<double> Qyy { get; init; }

    /// <summary>Adds the flow at one point.</summary>
    /// <param name="i">Index of the point.</param>
    /// <param name="ask">What is wanted of it.</param>
    /// <param name="flow">The flow there.</param>
    public void Add(int i, Ask ask, in PointFlow flow)
    {
        if ((ask & Ask.Potential) != 0)
        {
            Potential[i] += flow.Potential;
        }

        if ((ask & Ask.Discharge) != 0)
        {
            Qx[i] += flow.Qx;
            Qy[i] += flow.Qy;
        }

        if ((ask & Ask.Gradient) != 0)
        {
            Qxx[i] += flow.Qxx;
            Qxy[i] += flow.Qxy;
            Qyy[i] += flow.Qyy;
        }
    }

    /// <summary>A part of the block, for points that are a part of the points.</summary>
    /// <param name="ask">Which spans are there.</param>
    /// <param name="start">First index.</param>
    /// <param name="count">How many.</param>
    public FlowBlock Slice(Ask ask, int start, int count) => new()
    {
        Potential = ask.HasFlag(Ask.Potential) ? Potential.Slice(start, count) : default,
        Qx = ask.HasFlag(Ask.Discharge) ? Qx.Slice(start, count) : default,
        Qy = ask.HasFlag(Ask.Discharge) ? Qy.Slice(start, count) : default,
        Qxx = ask.HasFlag(Ask.Gradient) ? Qxx.Slice(start, count) : default,
        Qxy = ask.HasFlag(Ask.Gradient) ? Qxy.Slice(start, count) : default,
        Qyy = ask.HasFlag(Ask.Gradient) ? Qyy.Slice(start, count) : default,
    };
}
