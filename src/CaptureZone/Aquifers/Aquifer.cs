using System.Runtime.Intrinsics;

namespace CaptureZone.Aquifers;

/// <summary>
/// A homogeneous aquifer on a level base, confined under a level top where the head reaches it, else a water table.
/// Heads are elevations on the same datum as <see cref="Base"/>; the discharge potential is the one of Girinskii and Strack
/// (O.D.L. Strack, <i>Groundwater Mechanics</i>, 1989): Phi = K b h' - K b^2 / 2 confined, K h'^2 / 2 with a water table,
/// h' being the head above the base, b the thickness. Both have one value and one slope where they meet, at K b^2 / 2.
/// </summary>
/// <param name="Conductivity">Hydraulic conductivity K, m/d; positive.</param>
/// <param name="Base">Elevation of the base, m.</param>
/// <param name="Top">Elevation of the underside of the confining bed, m; null: a water table everywhere.</param>
/// <param name="Porosity">Effective porosity n; above 0, at most 1.</param>
public sealed record Aquifer(double Conductivity, double Base, double? Top, double Porosity)
{
    /// <summary>Distance from base to top, m; infinite without a top.</summary>
    public double Thickness => Top - Base ?? double.PositiveInfinity;

    /// <summary>The potential at which the head stands at the top, m3/d; infinite without a top.</summary>
    public double PotentialAtTop => Conductivity * Thickness * Thickness / 2;

    /// <summary>Discharge potential of a head, m3/d; 0 at the base, never negative.</summary>
    /// <param name="head">Elevation, m.</param>
    public double PotentialOf(double head)
    {
        double above = Math.Max(head - Base, 0);
        return above <= Thickness
            ? Conductivity * above * above / 2
            : Conductivity * Thickness * (above - Thickness / 2);
    }

    /// <summary>Head of a discharge potential, m elevation; NaN where the potential is negative: the aquifer is dry there.</summary>
    /// <param name="potential">Discharge potential, m3/d.</param>
    public double HeadOf(double potential) =>
        potential <= PotentialAtTop
            ? Base + Math.Sqrt(2 * potential / Conductivity)
            : Base + potential / (Conductivity * Thickness) + Thickness / 2;

    /// <summary>Heads of many discharge potentials, m elevation, each with the bits of <see cref="HeadOf"/>.</summary>
    /// <param name="potentials">Discharge potentials, m3/d.</param>
    /// <param name="heads">Where they go; may be the same memory.</param>
    public void HeadsOf(ReadOnlySpan<double> potentials, Span<double> heads)
    {
        Vector256<double> conductivity = Vector256.Create(Conductivity), transmissivity = Vector256.Create(Conductivity * Thickness);
        Vector256<double> top = Vector256.Create(PotentialAtTop), floor = Vector256.Create(Base), half = Vector256.Create(Thickness / 2);
        int i = 0;
        for (; i <= potentials.Length - Vector256<double>.Count; i += Vector256<double>.Count)
        {
            Vector256<double> potential = Vector256.Create(potentials[i..]);
            Vector256<double> table = floor + Vector256.Sqrt(2 * potential / conductivity);
            Vector256<double> confined = floor + potential / transmissivity + half;
            Vector256.ConditionalSelect(Vector256.LessThanOrEqual(potential, top), table, confined).CopyTo(heads[i..]);
        }

        for (; i < potentials.Length; i++)
        {
            heads[i] = HeadOf(potentials[i]);
        }
    }

    /// <summary>Saturated thickness, m; 0 where the potential is zero or negative.</summary>
    /// <param name="potential">Discharge potential, m3/d.</param>
    public double SaturatedThickness(double potential) =>
        potential >= PotentialAtTop ? Thickness : Math.Sqrt(2 * Math.Max(potential, 0) / Conductivity);

    /// <summary>Whether a discharge potential belongs to confined flow.</summary>
    /// <param name="potential">Discharge potential, m3/d.</param>
    public bool IsConfined(double potential) => potential >= PotentialAtTop;
}
