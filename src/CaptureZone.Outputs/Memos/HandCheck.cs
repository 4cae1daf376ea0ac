namespace CaptureZone.Outputs.Memos;

/// <summary>
/// Formulas that fit on the back of an envelope, to set beside computed values: one well alone in uniform flow (D.K. Todd,
/// <i>Groundwater Hydrology</i>, 2nd ed., 1980; I. Javandel and C.-F. Tsang, Ground Water 24(5), 1986; EPA/600/R-08/003, 2008), and the
/// calculated fixed radius (EPA 440/6-87-010, 1987). Sources cited from memory.
/// </summary>
public static class HandCheck
{
    /// <summary>From the well to its stagnation point, Q / (2 pi T i), m.</summary>
    /// <param name="rate">Rate Q, m3/d.</param>
    /// <param name="dischargePerWidth">Regional discharge per unit width T i, m2/d.</param>
    public static double StagnationDistance(double rate, double dischargePerWidth) => rate / (2 * Math.PI * dischargePerWidth);

    /// <summary>Width of the zone on the line through the well across the flow, Q / (2 T i), m.</summary>
    /// <param name="rate">Rate Q, m3/d.</param>
    /// <param name="dischargePerWidth">Regional discharge per unit width T i, m2/d.</param>
    public static double WidthAtWell(double rate, double dischargePerWidth) => rate / (2 * dischargePerWidth);

    /// <summary>Width of the zone far upgradient, Q / (T i), m.</summary>
    /// <param name="rate">Rate Q, m3/d.</param>
    /// <param name="dischargePerWidth">Regional discharge per unit width T i, m2/d.</param>
    public static double WidthUpgradient(double rate, double dischargePerWidth) => rate / dischargePerWidth;

    /// <summary>Radius of the cylinder that holds what the well takes within a time, sqrt(Q t / (pi n b)), m.</summary>
    /// <param name="rate">Rate Q, m3/d.</param>
    /// <param name="time">Time t, d.</param>
    /// <param name="porosity">Effective porosity n.</param>
    /// <param name="thickness">Saturated thickness b, m.</param>
    public static double FixedRadius(double rate, double time, double porosity, double thickness) =>
        Math.Sqrt(rate * time / (Math.PI * porosity * thickness));

    /// <summary>Radius of the circle of an area, m.</summary>
    /// <param name="area">The area, m2.</param>
    public static double EquivalentRadius(double area) => Math.Sqrt(area / Math.PI);
}
