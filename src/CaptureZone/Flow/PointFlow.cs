namespace CaptureZone.Flow;

/// <summary>
/// The flow at one point while banks add to it; what was not asked for stays zero. Handed from bank to bank by reference, so that
/// asking one point costs no more than its arithmetic.
/// </summary>
public struct PointFlow
{
    /// <summary>Discharge potential, m3/d.</summary>
    public double Potential;

    /// <summary>East component of the discharge vector, m2/d.</summary>
    public double Qx;

    /// <summary>North component of the discharge vector, m2/d.</summary>
    public double Qy;

    /// <summary>dQx/dx, m/d.</summary>
    public double Qxx;

    /// <summary>dQx/dy, which equals dQy/dx, m/d.</summary>
    public double Qxy;

    /// <summary>dQy/dy, m/d. Qxx + Qyy is the recharge, m/d.</summary>
    public double Qyy;
}
