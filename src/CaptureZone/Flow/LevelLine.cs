using System.Numerics;

namespace CaptureZone.Flow;

/// <summary>Places where the head has a given value.</summary>
/// <param name="field">The flow.</param>
/// <param name="level">The head, m elevation.</param>
internal readonly struct LevelLine(FlowField field, double level)
{
    /// <summary>How far the head at a vertex may be from its line's, m: a thousandth of what a level can be read to.</summary>
    public const double Residual = 1e-7;

    /// <summary>Steps along a grid edge at most: bisection alone halves it below any residual in so many.</summary>
    private const int EdgeSteps = 60;

    /// <summary>Steps off a chord at most: Newton's method doubles its digits in each.</summary>
    private const int ChordSteps = 8;

    /// <summary>The place between two places of which one lies above the level and the other not: Newton's method, kept in between.</summary>
    /// <param name="below">Where the head is at the level or below, m.</param>
    /// <param name="above">Where it is above, m.</param>
    /// <param name="start">First guess, from 0 (below) to 1 (above).</param>
    public Complex Between(Complex below, Complex above, double start)
    {
        Complex span = above - below;
        double low = 0, high = 1, t = start;
        for (int i = 0; i < EdgeSteps; i++)
        {
            Complex at = below + t * span;
            (double excess, Complex gradient) = ExcessAt(at);
            if (Math.Abs(excess) < Residual)
            {
                return at;
            }

            (low, high) = excess > 0 ? (low, t) : (t, high);
            double next = t - excess / (gradient.Real * span.Real + gradient.Imaginary * span.Imaginary);
            t = next > low && next < high ? next : (low + high) / 2;
        }

        return below + t * span;
    }

    /// <summary>The place on the line nearest to a place beside it, up or down the gradient; null when it is farther than a limit.</summary>
    /// <param name="beside">The place, m.</param>
    /// <param name="limit">The limit, m.</param>
    public Complex? From(Complex beside, double limit)
    {
        Complex at = beside;
        for (int i = 0; i < ChordSteps; i++)
        {
            (double excess, Complex gradient) = ExcessAt(at);
            if (Math.Abs(excess) < Residual)
            {
                return at;
            }

            at -= excess / Complex.Conjugate(gradient);
            if (!((at - beside).Magnitude <= limit))
            {
                return null;
            }
        }

        return null;
    }

    /// <summary>Head above the level, m, and the gradient of the head, dh/dx + i dh/dy; both NaN where the aquifer is dry.</summary>
    private (double Excess, Complex Gradient) ExcessAt(Complex at)
    {
        FlowAt flow = field.FlowAt(at);
        Aquifers.Aquifer aquifer = field.AquiferAt(at);
        double transmissivity = aquifer.Conductivity * aquifer.SaturatedThickness(flow.Potential);
        return (aquifer.HeadOf(flow.Potential) - level, -flow.Discharge / transmissivity);
    }
}
