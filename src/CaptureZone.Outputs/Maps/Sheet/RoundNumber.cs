namespace CaptureZone.Outputs.Maps;

/// <summary>Round numbers: 1, 2 or 5 times a power of ten.</summary>
internal static class RoundNumber
{
    /// <summary>The largest round number that is not above a value.</summary>
    /// <param name="value">The value; positive.</param>
    public static double NotAbove(double value)
    {
        double power = Math.Pow(10, Math.Floor(Math.Log10(value)));
        return power * (value / power) switch
        {
            >= 5 => 5,
            >= 2 => 2,
            _ => 1,
        };
    }

    /// <summary>The least round number that is not below a value.</summary>
    /// <param name="value">The value; positive.</param>
    public static double NotBelow(double value)
    {
        double power = Math.Pow(10, Math.Floor(Math.Log10(value)));
        return power * (value / power) switch
        {
            <= 1 => 1,
            <= 2 => 2,
            <= 5 => 5,
            _ => 10,
        };
    }
}
