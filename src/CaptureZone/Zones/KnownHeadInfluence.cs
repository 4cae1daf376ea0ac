using CaptureZone.Flow;

namespace CaptureZone.Zones;

/// <summary>How much the answers lean on the place at which the head is known.</summary>
/// <param name="Distance">From there to the nearest well, m.</param>
/// <param name="Sensitivity">Largest change of a drawdown at a screen when that distance doubles, m.</param>
/// <param name="DrawdownThere">Drawdown at the known head when it is held twice as far away instead, m.</param>
internal sealed record KnownHeadInfluence(double Distance, double Sensitivity, double DrawdownThere)
{
    /// <summary>Measures the influence; null without wells, or where the aquifer is dry at twice the distance.</summary>
    /// <param name="levels">The levels at the screens.</param>
    /// <param name="field">The field.</param>
    internal static KnownHeadInfluence? Of(ScreenLevels levels, FlowField field)
    {
        if (levels.KnownHeadTwiceAsFar() is not var (distance, on, off))
        {
            return null;
        }

        double sensitivity = Enumerable.Range(0, field.System.Wells.Length)
            .Max(well => Math.Abs(levels.Drawdown(on, off, well) - levels.Drawdown(well)));
        return new KnownHeadInfluence(
            distance, sensitivity, ScreenLevels.DrawdownAt(on, off, field.Parameters.Regional.HeadAt));
    }
}
