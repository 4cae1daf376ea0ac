namespace CaptureZone.Sites.Units;

/// <summary>What a quantity of a site file measures.</summary>
public enum Dimension
{
    /// <summary>A length or an elevation, m.</summary>
    Length,

    /// <summary>An area, m2.</summary>
    Area,

    /// <summary>A time, d.</summary>
    Time,

    /// <summary>Resistance of a bed or a wall: thickness over conductivity, d.</summary>
    Resistance,

    /// <summary>Hydraulic conductivity, m/d.</summary>
    Conductivity,

    /// <summary>Rate of recharge per area, m/d.</summary>
    Recharge,

    /// <summary>Transmissivity, m2/d.</summary>
    Transmissivity,

    /// <summary>A pumping rate, m3/d.</summary>
    Rate,
}
